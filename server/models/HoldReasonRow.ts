import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { HoldReason } from '../../shared/domain/lifecycle/reasons';
import { column } from './define';

/** Why a sling is held: placed once, confirmed or cleared, never rewritten. */
export class HoldReasonRow extends Model<
  InferAttributes<HoldReasonRow>,
  InferCreationAttributes<HoldReasonRow>
> {
  declare id: CreationOptional<number>;
  declare slingId: number;
  declare code: HoldReason;
  declare criterionId: CreationOptional<string | null>;
  declare confirmed: boolean;
  declare note: string;
  declare placedBy: CreationOptional<number | null>;
  declare placedAt: Date;
  declare placedSeq: number;
  declare withdrawnSeq: CreationOptional<number | null>;
  declare clearedBy: CreationOptional<number | null>;
  declare clearedAt: CreationOptional<Date | null>;
  declare clearedSeq: CreationOptional<number | null>;
  declare clearNote: CreationOptional<string | null>;
  declare evidenceFileId: CreationOptional<string | null>;

  static define(sequelize: Sequelize): void {
    HoldReasonRow.init(
      {
        id: column.id,
        slingId: column.number,
        code: column.string,
        criterionId: column.optionalString,
        confirmed: column.boolean,
        note: column.text,
        placedBy: column.optionalNumber,
        placedAt: column.instant,
        placedSeq: column.number,
        withdrawnSeq: column.optionalNumber,
        clearedBy: column.optionalNumber,
        clearedAt: column.optionalInstant,
        clearedSeq: column.optionalNumber,
        clearNote: column.optionalText,
        evidenceFileId: column.optionalString,
      },
      { sequelize, tableName: 'hold_reasons' },
    );
  }
}
