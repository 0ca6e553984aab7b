import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { column } from './define';

/** What somebody without an account saw. */
export class DamageReport extends Model<
  InferAttributes<DamageReport>,
  InferCreationAttributes<DamageReport>
> {
  declare id: CreationOptional<number>;
  declare slingId: number;
  declare tagCode: string;
  declare name: string;
  declare note: string;
  declare ledgerSeq: number;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    DamageReport.init(
      {
        id: column.id,
        slingId: column.number,
        tagCode: column.string,
        name: column.string,
        note: column.text,
        ledgerSeq: column.number,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'damage_reports' },
    );
  }
}
