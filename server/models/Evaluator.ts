import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { SlingKind } from '../../shared/domain/slings/kinds';
import { column } from './define';

/** A maker or qualified repairer who examines slings. */
export class Evaluator extends Model<InferAttributes<Evaluator>, InferCreationAttributes<Evaluator>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare email: string;
  declare isMaker: boolean;
  declare mayRepair: SlingKind[];
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Evaluator.init(
      {
        id: column.id,
        name: column.string,
        email: column.string,
        isMaker: column.boolean,
        mayRepair: column.json,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'evaluators' },
    );
  }
}
