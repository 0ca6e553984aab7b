import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { SlingKind } from '../../shared/domain/slings/kinds';
import { column } from './define';

/** The employer's word that a person inspects these kinds; ended, never deleted. */
export class Designation extends Model<InferAttributes<Designation>, InferCreationAttributes<Designation>> {
  declare id: CreationOptional<number>;
  declare userId: number;
  declare kinds: SlingKind[];
  declare designatedBy: string;
  declare designatedOn: string;
  declare untilOn: CreationOptional<string | null>;
  declare isQualified: boolean;
  declare endedAt: CreationOptional<Date | null>;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Designation.init(
      {
        id: column.id,
        userId: column.number,
        kinds: column.json,
        designatedBy: column.string,
        designatedOn: column.day,
        untilOn: column.optionalDay,
        isQualified: column.boolean,
        endedAt: column.optionalInstant,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'designations' },
    );
  }
}
