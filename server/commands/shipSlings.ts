import { KIND_FACTS } from '../../shared/domain/slings/kinds';
import { sendNeeds, listUnmet } from '../../shared/domain/lifecycle/needs';
import { actionsFrom, isInTable } from '../../shared/domain/lifecycle/actions';
import type { ShipmentPurpose, Unmet } from '../../shared/domain/lifecycle/facts';
import type { CreateShipmentRequest } from '../../shared/schemas/shipments';
import type { ActorContext } from '../context';
import { AppError, invalidField, NotFoundError, UnmetError } from '../errors';
import { Evaluator } from '../models/Evaluator';
import { Shipment } from '../models/Shipment';
import { ShipmentLine } from '../models/ShipmentLine';
import { SlingRecord } from '../models/SlingRecord';
import { loadSlingParts, toFacts } from '../queries/lifecycleFacts';
import { findToday } from '../queries/siteDay';
import { toActor } from '../../shared/domain/lifecycle/actor';
import { appendLedger } from './appendLedger';
import { lockSling } from './lockSling';

export async function createShipment(
  context: ActorContext,
  request: CreateShipmentRequest,
): Promise<Shipment> {
  const { transaction, at, user } = context;
  if (!user.siteIds.includes(request.siteId)) throw invalidField('siteId', 'You do not work at this site.');
  const evaluator = await Evaluator.findByPk(request.evaluatorId, { transaction });
  if (!evaluator) throw invalidField('evaluatorId', 'There is no such evaluator.');
  if (new Set(request.lines.map((line) => line.slingId)).size < request.lines.length) {
    throw invalidField('lines', 'A sling is named twice.');
  }
  for (const [index, line] of request.lines.entries()) {
    const sling = await SlingRecord.findByPk(line.slingId, { transaction });
    if (sling?.siteId !== request.siteId) {
      throw invalidField(`lines.${index}.slingId`, 'There is no such sling at this site.');
    }
    const refusal = refusePurpose(line.purpose, sling, evaluator);
    if (refusal) throw new UnmetError([refusal]);
  }
  const shipment = await Shipment.create(
    {
      evaluatorId: evaluator.id,
      siteId: request.siteId,
      expectedBackOn: request.expectedBackOn,
      createdBy: user.id,
      createdAt: at,
    },
    { transaction },
  );
  await ShipmentLine.bulkCreate(
    request.lines.map(({ slingId, purpose, note }) => ({
      shipmentId: shipment.id,
      slingId,
      purpose,
      note: note ?? '',
    })),
    { transaction },
  );
  return shipment;
}

/** Which purpose is open to which sling (product design, section 9); null when it is. */
function refusePurpose(purpose: ShipmentPurpose, sling: SlingRecord, evaluator: Evaluator): Unmet | null {
  const refuse = (message: string): Unmet => ({ rule: 'purpose', message: `${sling.number}: ${message}` });
  const condemned = Boolean(sling.condemned);
  if (purpose === 'fittings') {
    return refuse('fittings cannot be shipped without their sling yet.');
  }
  if (purpose === 'destroy')
    return condemned ? null : refuse('only a condemned sling is sent to be destroyed.');
  if (condemned) return refuse('a condemned sling is only sent to be destroyed.');
  if (purpose === 'repair') {
    if (!KIND_FACTS[sling.kind].isRepairable) {
      return refuse(`a ${KIND_FACTS[sling.kind].name.toLowerCase()} is never repaired.`);
    }
    if (!evaluator.isMaker && !evaluator.mayRepair.includes(sling.kind)) {
      return refuse(`${evaluator.name} is not a qualified repairer of this kind.`);
    }
  }
  return null;
}

/** Sends every sling of the shipment, or none: one that is not ready is named. */
export async function sendShipment(context: ActorContext, id: number): Promise<Shipment> {
  const { transaction, at, user } = context;
  const shipment = await lockShipment(context, id);
  if (shipment.sentAt) throw new AppError('conflict', 'This shipment has left already.');
  const evaluator = await Evaluator.findByPk(shipment.evaluatorId, { transaction });
  if (!evaluator) throw new NotFoundError('evaluator');
  const lines = await ShipmentLine.findAll({
    where: { shipmentId: id },
    order: [['slingId', 'ASC']],
    transaction,
  });
  const today = await findToday(shipment.siteId, at, transaction);
  for (const line of lines) {
    const sling = await lockSling(context, line.slingId);
    const condemned = Boolean(sling.condemned);
    if (!isInTable('send', sling.state, condemned)) {
      throw new AppError('illegal-transition', `${sling.number} cannot be sent: it is not held.`, {
        from: sling.state,
        allowed: actionsFrom(sling.state, condemned),
      });
    }
    const refusal = refusePurpose(line.purpose, sling, evaluator);
    const facts = toFacts(sling, await loadSlingParts(sling, transaction));
    const unmet = listUnmet(sendNeeds, facts, toActor(user, sling.kind, today)).map(({ rule, message }) => ({
      rule,
      message: `${sling.number}: ${message}`,
    }));
    if (refusal) unmet.push(refusal);
    if (unmet.length > 0) throw new UnmetError(unmet);
    await line.update({ sentSeq: sling.ledgerCount + 1 }, { transaction });
    await appendLedger(context, sling, {
      type: 'send',
      to: 'sent_for_evaluation',
      custody: { kind: 'evaluator', locationId: null },
      data: { shipmentId: id, lineId: line.id, evaluator: evaluator.name, purpose: line.purpose },
    });
  }
  return shipment.update({ sentAt: at }, { transaction });
}

/** @throws NotFoundError also for a shipment of a site where this person doesn't work */
export async function lockShipment(context: ActorContext, id: number): Promise<Shipment> {
  const { transaction, user } = context;
  const shipment = await Shipment.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
  if (!shipment || !user.siteIds.includes(shipment.siteId)) throw new NotFoundError('shipment');
  return shipment;
}
