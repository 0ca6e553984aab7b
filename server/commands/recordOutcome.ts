import { actionsFrom, isInTable } from '../../shared/domain/lifecycle/actions';
import type { LifecycleFacts } from '../../shared/domain/lifecycle/facts';
import { destroyedElsewhereNeeds, listUnmet } from '../../shared/domain/lifecycle/needs';
import type { OutcomeRequest } from '../../shared/schemas/shipments';
import type { ActorContext } from '../context';
import { AppError, invalidField, NotFoundError, UnmetError } from '../errors';
import { HoldReasonRow } from '../models/HoldReasonRow';
import { ShipmentLine } from '../models/ShipmentLine';
import type { SlingRecord } from '../models/SlingRecord';
import { getEvidence } from '../queries/files';
import { loadSlingParts, toFacts } from '../queries/lifecycleFacts';
import { findToday } from '../queries/siteDay';
import { findReasonOnReturn } from './actions/backFromEvaluation';
import { toActor } from '../../shared/domain/lifecycle/actor';
import { appendLedger } from './appendLedger';
import { toDecimal } from './decimals';
import { lockSling } from './lockSling';
import { placeHold } from './placeHold';
import { createCertificate } from './registerSling';
import { lockShipment } from './shipSlings';

/**
 * Writes down what the evaluator found. For a sling that came back before its outcome was known, it has the effect
 * now that it would have had then (product design, section 4).
 */
export async function recordOutcome(
  context: ActorContext,
  shipmentId: number,
  lineId: number,
  request: OutcomeRequest,
): Promise<void> {
  const { transaction, at } = context;
  const line = await getSentLine(context, shipmentId, lineId);
  const sling = await lockSling(context, line.slingId);
  if (line.outcome === 'destroyed' && sling.state === 'destroyed') {
    throw new AppError('conflict', 'The sling is destroyed: its outcome stands.');
  }
  const [report] = request.reportFileId
    ? await getEvidence(context, [request.reportFileId], 'reportFileId')
    : [];
  const { proofCertificate } = request;
  if (proofCertificate && proofCertificate.testedOn > (await findToday(sling.siteId, at, transaction))) {
    throw invalidField('proofCertificate.testedOn', 'This day lies in the future.');
  }
  if (proofCertificate?.fileId)
    await getEvidence(context, [proofCertificate.fileId], 'proofCertificate.fileId');
  await line.update(
    {
      outcome: request.outcome,
      outcomeAt: at,
      reportFileId: request.reportFileId ?? null,
      repairer: request.repairer ?? null,
      proofLoadKg: toDecimal(proofCertificate?.loadKg),
      verticalKg: toDecimal(request.ratedLoads?.verticalKg),
      ratedLoads: request.ratedLoads ?? null,
    },
    { transaction },
  );
  if (proofCertificate) await createCertificate(context, sling.id, proofCertificate, sling.ledgerCount + 1);
  await applyOutcome(context, sling, line, {
    lineId: line.id,
    outcome: request.outcome,
    ...(report ? { report } : {}),
    ...(request.repairer ? { repairer: request.repairer } : {}),
    ...(proofCertificate ? { proofCertificate: { ...proofCertificate } } : {}),
    ...(request.ratedLoads ? { ratedLoads: { ...request.ratedLoads } } : {}),
  });
}

async function applyOutcome(
  context: ActorContext,
  sling: SlingRecord,
  line: ShipmentLine,
  data: Record<string, unknown>,
): Promise<void> {
  const facts = toFacts(sling, await loadSlingParts(sling, context.transaction));
  const isLate = facts.state !== 'sent_for_evaluation' && line.sentSeq === facts.lastSentSeq;
  const isBackToReturned = isLate && findOnlyDoubt(facts) !== null && findReasonOnReturn(facts) === null;
  if (isBackToReturned) {
    await HoldReasonRow.update(
      {
        clearedBy: context.user.id,
        clearedAt: context.at,
        clearedSeq: sling.ledgerCount + 1,
        clearNote: 'The evaluator’s outcome came after the sling.',
      },
      { where: { id: findOnlyDoubt(facts) ?? 0 }, transaction: context.transaction },
    );
    await appendLedger(context, sling, { type: 'outcome_recorded', to: 'returned', data });
    return;
  }
  await appendLedger(context, sling, { type: 'outcome_recorded', data });
  const reason = findReasonOnReturn(facts);
  // In service too: what turns out unfit after all is not used for another hour.
  const isHere = facts.state === 'held' || facts.state === 'returned' || facts.state === 'in_service';
  const isNew = !facts.openReasons.some((open) => open.code === reason);
  if (isLate && isHere && reason && isNew) {
    await placeHold(context, sling, { reasons: [{ code: reason, placedBy: null }], photos: [] });
  }
}

/** The reason that the sling is held for want of an outcome alone, besides those it was sent with. */
function findOnlyDoubt(facts: LifecycleFacts): number | null {
  if (facts.state !== 'held' || facts.condemned) return null;
  const since = facts.openReasons.filter((reason) => reason.placedSeq > (facts.lastSentSeq ?? 0));
  const [doubt] = since;
  const isOnly =
    since.length === 1 && doubt?.code === 'record_in_doubt' && doubt.placedSeq === facts.cameBackSeq;
  return isOnly ? doubt.id : null;
}

/** The evaluator destroyed it and sent the certificate. */
export async function confirmDestroyed(
  context: ActorContext,
  shipmentId: number,
  lineId: number,
): Promise<void> {
  const line = await getSentLine(context, shipmentId, lineId);
  const sling = await lockSling(context, line.slingId);
  const condemned = Boolean(sling.condemned);
  if (!isInTable('destroyed_by_evaluator', sling.state, condemned) || line.sentSeq !== sling.lastSentSeq) {
    throw new AppError('illegal-transition', 'This sling is not with the evaluator.', {
      from: sling.state,
      allowed: actionsFrom(sling.state, condemned),
    });
  }
  const facts = toFacts(sling, await loadSlingParts(sling, context.transaction));
  const today = await findToday(sling.siteId, context.at, context.transaction);
  const unmet = listUnmet(destroyedElsewhereNeeds, facts, toActor(context.user, sling.kind, today));
  if (unmet.length > 0) throw new UnmetError(unmet);
  const certificate = line.reportFileId
    ? await getEvidence(context, [line.reportFileId], 'reportFileId')
    : [];
  await appendLedger(context, sling, {
    type: 'destroyed_by_evaluator',
    to: 'destroyed',
    custody: { kind: 'none', locationId: null },
    data: { lineId, certificate },
  });
}

async function getSentLine(context: ActorContext, shipmentId: number, lineId: number): Promise<ShipmentLine> {
  const shipment = await lockShipment(context, shipmentId);
  const line = await ShipmentLine.findOne({
    where: { id: lineId, shipmentId },
    transaction: context.transaction,
  });
  if (!line) throw new NotFoundError('line of this shipment');
  if (!shipment.sentAt) throw new AppError('conflict', 'The shipment has not left yet.');
  return line;
}
