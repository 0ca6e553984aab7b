import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { column } from './define';

/** A photo on a sling's record. */
export class SlingPhoto extends Model<InferAttributes<SlingPhoto>, InferCreationAttributes<SlingPhoto>> {
  declare slingId: number;
  declare fileId: string;
  declare purpose: string;
  declare ledgerSeq: number;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    SlingPhoto.init(
      {
        slingId: { ...column.number, primaryKey: true },
        fileId: { ...column.string, primaryKey: true },
        purpose: column.string,
        ledgerSeq: column.number,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'sling_photos' },
    );
  }
}
