import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { column } from './define';

/** One row of a sling's ledger; the insert itself moves the sling (migration 0004). */
export class LedgerEntry extends Model<InferAttributes<LedgerEntry>, InferCreationAttributes<LedgerEntry>> {
  declare id: CreationOptional<number>;
  declare slingId: number;
  declare slingSeq: number;
  declare type: string;
  declare at: Date;
  declare actorId: CreationOptional<number | null>;
  declare actorName: string;
  declare fromState: CreationOptional<string | null>;
  declare toState: string;
  declare condemned: boolean;
  declare custodyKind: string;
  declare custodyLocationId: CreationOptional<number | null>;
  declare data: string;
  declare prevHash: string;
  declare hash: string;

  static define(sequelize: Sequelize): void {
    LedgerEntry.init(
      {
        id: column.id,
        slingId: column.number,
        slingSeq: column.number,
        type: column.string,
        at: column.instant,
        actorId: column.optionalNumber,
        actorName: column.string,
        fromState: column.optionalString,
        toState: column.string,
        condemned: column.boolean,
        custodyKind: column.string,
        custodyLocationId: column.optionalNumber,
        data: column.text,
        prevHash: column.string,
        hash: column.string,
      },
      { sequelize, tableName: 'ledger' },
    );
  }
}
