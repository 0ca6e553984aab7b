import type { EvaluationOutcome } from '../../../shared/domain/lifecycle/facts';
import { requiredProofLoadKg } from '../../../shared/domain/quarantine/proofLoad';
import { confirmDestroyed, recordOutcome } from '../../commands/recordOutcome';
import { createShipment, sendShipment } from '../../commands/shipSlings';
import type { ActorContext } from '../../context';
import { ShipmentLine } from '../../models/ShipmentLine';
import { SlingRecord } from '../../models/SlingRecord';
import { kindAndSpecOf } from '../../queries/lifecycleFacts';
import { keepFile } from '../evidence/keepFile';
import { writePaper } from '../evidence/papers';
import type { DemoSling } from '../plan/fleet';
import { EVALUATORS, type DemoShipment, type ShipmentFate } from '../plan/shipments';
import { getTrace, type World } from './world';

export interface ShippedSling {
  sling: DemoSling;
  fate: ShipmentFate;
  note: string;
}

const OUTCOME_SENTENCES: Record<EvaluationOutcome, string> = {
  fit: 'examined, no defect found: fit for use at its rated load.',
  repaired: 'damaged parts replaced with our own, proof tested: fit for use at its rated load.',
  unfit: 'worn beyond repair: unfit for use.',
  not_examined: 'not examined.',
  destroyed: 'cut through all load-bearing parts and scrapped.',
};

/** Drafts the shipment and sends it. */
export async function ship(
  context: ActorContext,
  world: World,
  plan: DemoShipment,
  slings: readonly ShippedSling[],
): Promise<void> {
  const shipment = await createShipment(context, {
    evaluatorId: world.evaluators[plan.evaluator],
    siteId: world.places[plan.site].id,
    expectedBackOn: world.clock.dayOf(plan.expectedAgo),
    lines: slings.map(({ sling, fate, note }) => ({
      slingId: getTrace(world, sling).id,
      purpose: fate.purpose,
      note,
    })),
  });
  await sendShipment(context, shipment.id);
}

/** The evaluator's word on one sling, with the paper that says it. */
export async function report(
  context: ActorContext,
  world: World,
  plan: DemoShipment,
  { sling, fate }: ShippedSling,
): Promise<void> {
  const { outcome } = fate;
  if (!outcome) return;
  const line = await getLine(context, world, sling);
  const proofLoadKg = outcome === 'repaired' ? await findProofLoadKg(context, line.slingId) : null;
  const { name } = EVALUATORS[plan.evaluator];
  const day = context.at.toISOString().slice(0, 10);
  const original = await writePaper({
    from: name,
    title: outcome === 'destroyed' ? 'Certificate of destruction' : 'Report of examination',
    on: day,
    lines: [
      `${sling.number} (${sling.lot.model.maker}): ${OUTCOME_SENTENCES[outcome]}`,
      ...(proofLoadKg === null ? [] : [`Proof load ${proofLoadKg} kg, no lasting change.`]),
    ],
  });
  const reportFileId = await keepFile(world, {
    original,
    name: `${sling.number}-report.pdf`,
    createdBy: context.user.id,
    at: context.at,
  });
  await recordOutcome(context, line.shipmentId, line.id, {
    outcome,
    reportFileId,
    ...(outcome === 'repaired' ? { repairer: name } : {}),
    ...(proofLoadKg === null
      ? {}
      : {
          proofCertificate: {
            basis: 'assembly',
            loadKg: proofLoadKg,
            testedOn: day,
            number: `PT-${day.slice(0, 4)}-${sling.number.slice(-4)}`,
            fileId: reportFileId,
          },
        }),
  });
}

export async function confirmScrapped(context: ActorContext, world: World, sling: DemoSling): Promise<void> {
  const line = await getLine(context, world, sling);
  await confirmDestroyed(context, line.shipmentId, line.id);
}

async function findProofLoadKg({ transaction }: ActorContext, slingId: number): Promise<number | null> {
  const record = await SlingRecord.findByPk(slingId, { transaction });
  return record ? requiredProofLoadKg(kindAndSpecOf(record), Number(record.verticalKg)) : null;
}

async function getLine({ transaction }: ActorContext, world: World, sling: DemoSling): Promise<ShipmentLine> {
  const line = await ShipmentLine.findOne({
    where: { slingId: getTrace(world, sling).id },
    order: [['id', 'DESC']],
    transaction,
  });
  if (!line) throw new Error(`${sling.number} is on no shipment.`);
  return line;
}
