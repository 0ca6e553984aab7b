import { Op, type Transaction } from 'sequelize';
import type { EvaluationFact, LifecycleFacts } from '../../shared/domain/lifecycle/facts';
import type { KindAndSpec } from '../../shared/domain/slings/spec';
import { Certificate } from '../models/Certificate';
import { HoldReasonRow } from '../models/HoldReasonRow';
import { Inspection } from '../models/Inspection';
import { ShipmentLine } from '../models/ShipmentLine';
import type { SlingRecord } from '../models/SlingRecord';
import { Tag } from '../models/Tag';
import { presentRatedLoads } from './slingSummary';

/** Kind and spec belong together by the schema that let the record in; the database keeps them as two columns. */
export function kindAndSpecOf(sling: SlingRecord): KindAndSpec {
  return { kind: sling.kind, spec: sling.spec } as KindAndSpec;
}

export interface SlingParts {
  openReasons: HoldReasonRow[];
  certificates: Certificate[];
  inspections: Inspection[];
  liveTag: Tag | null;
  line: ShipmentLine | null;
}

/** Everything that the lifecycle rules look at, besides the sling's own row. Plain rows: each scan reads them. */
export async function loadSlingParts(sling: SlingRecord, transaction?: Transaction): Promise<SlingParts> {
  const where = { slingId: sling.id };
  const options = transaction ? { transaction } : {};
  const [openReasons, certificates, inspections, liveTag, line] = await Promise.all([
    HoldReasonRow.findAll({
      where: { ...where, clearedAt: null },
      order: [['id', 'ASC']],
      raw: true,
      ...options,
    }),
    Certificate.findAll({ where, order: [['id', 'ASC']], raw: true, ...options }),
    Inspection.findAll({
      attributes: ['id', 'type', 'inspectorId', 'ledgerSeq', 'verdict', 'isComplete'],
      where: { ...where, type: { [Op.in]: ['initial', 'periodic', 'release'] } },
      order: [['ledgerSeq', 'ASC']],
      raw: true,
      ...options,
    }),
    Tag.findOne({ where: { ...where, status: 'live' }, raw: true, ...options }),
    sling.lastSentSeq === null
      ? null
      : ShipmentLine.findOne({ where: { ...where, sentSeq: sling.lastSentSeq }, ...options }),
  ]);
  return { openReasons, certificates, inspections, liveTag, line };
}

export function toFacts(sling: SlingRecord, parts: SlingParts): LifecycleFacts {
  return {
    sling: kindAndSpecOf(sling),
    state: sling.state,
    condemned: Boolean(sling.condemned),
    condemnedBy: sling.condemnedBy,
    ownerKind: sling.ownerKind,
    makersTag: sling.makersTag,
    ratedLoads: presentRatedLoads(sling),
    hasLiveLabel: parts.liveTag !== null,
    certificates: parts.certificates.map((held) => ({
      basis: held.basis,
      loadKg: held.loadKg === null ? null : Number(held.loadKg),
      seq: held.ledgerSeq,
    })),
    openReasons: parts.openReasons.map((reason) => ({
      id: reason.id,
      code: reason.code,
      confirmed: Boolean(reason.confirmed),
      placedBy: reason.placedBy,
      placedSeq: reason.placedSeq,
    })),
    inspections: parts.inspections.map((inspection) => ({
      id: inspection.id,
      type: inspection.type,
      inspectorId: inspection.inspectorId,
      seq: inspection.ledgerSeq,
      verdict: inspection.verdict,
      isComplete: Boolean(inspection.isComplete),
    })),
    lastInServiceSeq: sling.lastInServiceSeq,
    lastSentSeq: sling.lastSentSeq,
    cameBackSeq: sling.cameBackSeq,
    evaluation: parts.line ? toEvaluation(parts.line) : null,
    custody: sling.custodyKind,
    nextDueOn: sling.nextDueOn,
    discardOn: sling.discardOn,
    offHireOn: sling.offHireOn,
  };
}

function toEvaluation(line: ShipmentLine): EvaluationFact {
  return {
    lineId: line.id,
    purpose: line.purpose,
    outcome: line.outcome,
    hasReport: line.reportFileId !== null,
    repairer: line.repairer,
    proofLoadKg: line.proofLoadKg === null ? null : Number(line.proofLoadKg),
    ratedLoads: line.ratedLoads,
    hasDestructionCertificate: line.outcome === 'destroyed' && line.reportFileId !== null,
  };
}
