import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { ReprintReason } from '../../shared/schemas/labels';
import type { Tag as TagView } from '../../shared/schemas/slings';
import { column } from './define';

/** A label of ours: printed, live once confirmed on the sling, void for good. */
export class Tag extends Model<InferAttributes<Tag>, InferCreationAttributes<Tag>> {
  declare code: string;
  declare slingId: number;
  declare status: TagView['status'];
  declare payload: string;
  declare qrLevel: string;
  declare qrVersion: number;
  declare qrMask: number;
  declare runId: number;
  declare runPosition: number;
  declare reprintReason: CreationOptional<ReprintReason | null>;
  declare printedAt: Date;
  declare confirmedAt: CreationOptional<Date | null>;
  declare confirmedBy: CreationOptional<number | null>;
  declare confirmedVia: CreationOptional<string | null>;
  declare voidedAt: CreationOptional<Date | null>;
  declare voidReason: CreationOptional<string | null>;

  static define(sequelize: Sequelize): void {
    Tag.init(
      {
        code: { ...column.string, primaryKey: true },
        slingId: column.number,
        status: column.string,
        payload: column.string,
        qrLevel: column.string,
        qrVersion: column.number,
        qrMask: column.number,
        runId: column.number,
        runPosition: column.number,
        reprintReason: column.optionalString,
        printedAt: column.instant,
        confirmedAt: column.optionalInstant,
        confirmedBy: column.optionalNumber,
        confirmedVia: column.optionalString,
        voidedAt: column.optionalInstant,
        voidReason: column.optionalString,
      },
      { sequelize, tableName: 'tags' },
    );
  }
}
