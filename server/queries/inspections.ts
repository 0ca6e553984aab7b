import { Op } from 'sequelize';
import type { Inspection as InspectionView } from '../../shared/schemas/inspection';
import { Inspection } from '../models/Inspection';

export function presentInspection(inspection: Inspection): InspectionView {
  return {
    id: inspection.id,
    type: inspection.type,
    inspectedOn: inspection.inspectedOn,
    recordedAt: inspection.createdAt.toISOString(),
    inspector: { id: inspection.inspectorId, name: inspection.inspectorName },
    verdict: inspection.verdict,
    stricter:
      inspection.verdict === inspection.computedVerdict
        ? null
        : { verdict: inspection.verdict, note: inspection.stricterNote ?? '' },
    restClean: Boolean(inspection.restClean),
    answers: inspection.answers,
    findings: inspection.findings,
    notTaken: inspection.notTaken,
    ruleSets: inspection.ruleSets,
    nextDueOn: inspection.nextDueOn,
  };
}

export async function listInspections(
  slingId: number,
  beforeId: number | undefined,
  limit: number,
): Promise<{ items: InspectionView[]; nextCursor: string | null }> {
  const rows = await Inspection.findAll({
    where: { slingId, ...(beforeId === undefined ? {} : { id: { [Op.lt]: beforeId } }) },
    order: [['id', 'DESC']],
    limit: limit + 1,
  });
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return {
    items: page.map(presentInspection),
    nextCursor: rows.length > limit && last ? String(last.id) : null,
  };
}
