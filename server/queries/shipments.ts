import type { Transaction } from 'sequelize';
import type { Shipment as ShipmentView } from '../../shared/schemas/shipments';
import type { Shipment } from '../models/Shipment';
import { ShipmentLine } from '../models/ShipmentLine';

export async function presentShipment(shipment: Shipment, transaction?: Transaction): Promise<ShipmentView> {
  const lines = await ShipmentLine.findAll({
    where: { shipmentId: shipment.id },
    order: [['id', 'ASC']],
    ...(transaction ? { transaction } : {}),
  });
  return {
    id: shipment.id,
    evaluatorId: shipment.evaluatorId,
    siteId: shipment.siteId,
    status: shipment.sentAt ? 'sent' : 'draft',
    expectedBackOn: shipment.expectedBackOn,
    createdAt: shipment.createdAt.toISOString(),
    sentAt: shipment.sentAt?.toISOString() ?? null,
    lines: lines.map((line) => ({
      id: line.id,
      slingId: line.slingId,
      purpose: line.purpose,
      note: line.note,
      outcome: line.outcome,
      outcomeAt: line.outcomeAt?.toISOString() ?? null,
    })),
  };
}
