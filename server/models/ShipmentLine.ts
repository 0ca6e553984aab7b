import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { EvaluationOutcome, ShipmentPurpose } from '../../shared/domain/lifecycle/facts';
import type { RatedLoads } from '../../shared/domain/slings/spec';
import { column } from './define';

/** One sling of a shipment, its purpose and what the evaluator said. */
export class ShipmentLine extends Model<
  InferAttributes<ShipmentLine>,
  InferCreationAttributes<ShipmentLine>
> {
  declare id: CreationOptional<number>;
  declare shipmentId: number;
  declare slingId: number;
  declare purpose: ShipmentPurpose;
  declare note: string;
  declare sentSeq: CreationOptional<number | null>;
  declare outcome: CreationOptional<EvaluationOutcome | null>;
  declare outcomeAt: CreationOptional<Date | null>;
  declare reportFileId: CreationOptional<string | null>;
  declare repairer: CreationOptional<string | null>;
  declare proofLoadKg: CreationOptional<string | null>;
  declare verticalKg: CreationOptional<string | null>;
  declare ratedLoads: CreationOptional<RatedLoads | null>;

  static define(sequelize: Sequelize): void {
    ShipmentLine.init(
      {
        id: column.id,
        shipmentId: column.number,
        slingId: column.number,
        purpose: column.string,
        note: column.text,
        sentSeq: column.optionalNumber,
        outcome: column.optionalString,
        outcomeAt: column.optionalInstant,
        reportFileId: column.optionalString,
        repairer: column.optionalString,
        proofLoadKg: column.optionalDecimal,
        verticalKg: column.optionalDecimal,
        ratedLoads: column.optionalJson,
      },
      { sequelize, tableName: 'shipment_lines' },
    );
  }
}
