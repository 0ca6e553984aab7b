import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { FittingPosition, FittingType } from '../../shared/domain/slings/spec';
import { column } from './define';

/** An end fitting of a sling. */
export class Fitting extends Model<InferAttributes<Fitting>, InferCreationAttributes<Fitting>> {
  declare id: CreationOptional<number>;
  declare slingId: number;
  declare position: FittingPosition;
  declare type: FittingType;
  declare sizeMm: CreationOptional<string | null>;
  declare throatMm: CreationOptional<string | null>;
  declare hasLatch: CreationOptional<boolean | null>;
  declare detachable: boolean;

  static define(sequelize: Sequelize): void {
    Fitting.init(
      {
        id: column.id,
        slingId: column.number,
        position: column.string,
        type: column.string,
        sizeMm: column.optionalDecimal,
        throatMm: column.optionalDecimal,
        hasLatch: column.optionalBoolean,
        detachable: column.boolean,
      },
      { sequelize, tableName: 'sling_fittings' },
    );
  }
}
