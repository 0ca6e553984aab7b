import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { column } from './define';

/** Slings on their way to one evaluator. */
export class Shipment extends Model<InferAttributes<Shipment>, InferCreationAttributes<Shipment>> {
  declare id: CreationOptional<number>;
  declare evaluatorId: number;
  declare siteId: number;
  declare expectedBackOn: string;
  declare createdBy: number;
  declare createdAt: Date;
  declare sentAt: CreationOptional<Date | null>;

  static define(sequelize: Sequelize): void {
    Shipment.init(
      {
        id: column.id,
        evaluatorId: column.number,
        siteId: column.number,
        expectedBackOn: column.day,
        createdBy: column.number,
        createdAt: column.instant,
        sentAt: column.optionalInstant,
      },
      { sequelize, tableName: 'shipments' },
    );
  }
}
