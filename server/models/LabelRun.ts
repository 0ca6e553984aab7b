import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { column } from './define';

/** A print run of labels on one stock. */
export class LabelRun extends Model<InferAttributes<LabelRun>, InferCreationAttributes<LabelRun>> {
  declare id: CreationOptional<number>;
  declare stock: string;
  declare startAt: number;
  declare warnings: string[];
  declare createdBy: number;
  declare createdByName: string;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    LabelRun.init(
      {
        id: column.id,
        stock: column.string,
        startAt: column.number,
        warnings: column.json,
        createdBy: column.number,
        createdByName: column.string,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'label_runs' },
    );
  }
}
