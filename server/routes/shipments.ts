import { z } from 'zod';
import { idParam, listOf } from '../../shared/schemas/common';
import {
  createEvaluatorRequest,
  createShipmentRequest,
  evaluatorSchema,
  outcomeRequest,
  shipmentSchema,
} from '../../shared/schemas/shipments';
import { confirmDestroyed, recordOutcome } from '../commands/recordOutcome';
import { createShipment, sendShipment } from '../commands/shipSlings';
import { asActor } from '../context';
import { AppError, NotFoundError } from '../errors';
import { Evaluator } from '../models/Evaluator';
import { Shipment } from '../models/Shipment';
import { presentShipment } from '../queries/shipments';
import { read, write } from '../routing/define';
import { idParams } from './params';

const lineParams = z.object({ id: idParam, lineId: idParam });

function presentEvaluator({ id, name, email, isMaker, mayRepair }: Evaluator) {
  return { id, name, email, isMaker: Boolean(isMaker), mayRepair };
}

async function getShipmentId(siteIds: readonly number[], id: number): Promise<number> {
  const shipment = await Shipment.findByPk(id);
  if (!shipment || !siteIds.includes(shipment.siteId)) throw new NotFoundError('shipment');
  return shipment.id;
}

export const shipmentRoutes = [
  read({
    route: 'GET /api/evaluators',
    summary: 'Makers and qualified repairers who evaluate slings',
    response: listOf(evaluatorSchema),
    async handle() {
      const evaluators = await Evaluator.findAll({ order: [['name', 'ASC']] });
      return { body: { items: evaluators.map(presentEvaluator) } };
    },
  }),
  write({
    route: 'POST /api/evaluators',
    summary: 'Add an evaluator',
    body: createEvaluatorRequest,
    response: evaluatorSchema,
    async handle({ transaction, at }, { body }) {
      if (await Evaluator.findOne({ where: { name: body.name }, transaction })) {
        throw new AppError('duplicate', 'There is an evaluator of this name already.', {
          errors: [{ path: 'name', message: 'There is an evaluator of this name already.' }],
        });
      }
      const evaluator = await Evaluator.create({ ...body, createdAt: at }, { transaction });
      return { status: 201, body: presentEvaluator(evaluator) };
    },
  }),
  write({
    route: 'POST /api/shipments',
    summary: 'Draft a shipment to an evaluator',
    body: createShipmentRequest,
    response: shipmentSchema,
    async handle(context, { body }) {
      const shipment = await createShipment(asActor(context), body);
      return { status: 201, body: await presentShipment(shipment, context.transaction) };
    },
  }),
  read({
    route: 'GET /api/shipments/:id',
    summary: 'One shipment with its lines',
    params: idParams,
    response: shipmentSchema,
    async handle({ user }, { params }) {
      const id = await getShipmentId(user.siteIds, params.id);
      const shipment = await Shipment.findByPk(id);
      if (!shipment) throw new NotFoundError('shipment');
      return { body: await presentShipment(shipment) };
    },
  }),
  write({
    route: 'POST /api/shipments/:id/send',
    summary: 'Send every sling of the shipment, or none',
    params: idParams,
    response: shipmentSchema,
    load: ({ user }, params) => getShipmentId(user?.siteIds ?? [], params.id),
    async handle(context, { loaded }) {
      const shipment = await sendShipment(asActor(context), loaded);
      return { body: await presentShipment(shipment, context.transaction) };
    },
  }),
  write({
    route: 'PUT /api/shipments/:id/lines/:lineId/outcome',
    summary: 'Write down what the evaluator found',
    params: lineParams,
    body: outcomeRequest,
    response: shipmentSchema,
    load: ({ user }, params) => getShipmentId(user?.siteIds ?? [], params.id),
    async handle(context, { params, body, loaded }) {
      await recordOutcome(asActor(context), loaded, params.lineId, body);
      return { body: await loadShipment(context, loaded) };
    },
  }),
  write({
    route: 'POST /api/shipments/:id/lines/:lineId/destroyed',
    summary: 'Confirm that the evaluator destroyed the sling',
    params: lineParams,
    response: shipmentSchema,
    load: ({ user }, params) => getShipmentId(user?.siteIds ?? [], params.id),
    async handle(context, { params, loaded }) {
      await confirmDestroyed(asActor(context), loaded, params.lineId);
      return { body: await loadShipment(context, loaded) };
    },
  }),
];

async function loadShipment(
  { transaction }: Parameters<typeof asActor>[0],
  id: number,
): Promise<z.infer<typeof shipmentSchema>> {
  const shipment = await Shipment.findByPk(id, { transaction });
  if (!shipment) throw new NotFoundError('shipment');
  return presentShipment(shipment, transaction);
}
