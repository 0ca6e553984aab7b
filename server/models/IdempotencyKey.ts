import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { column } from './define';

/** The answer to a write, so that the same key never acts twice. */
export class IdempotencyKey extends Model<
  InferAttributes<IdempotencyKey>,
  InferCreationAttributes<IdempotencyKey>
> {
  declare scope: string;
  declare idempotencyKey: string;
  declare fingerprint: string;
  declare status: number;
  declare body: CreationOptional<string | null>;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    IdempotencyKey.init(
      {
        scope: { ...column.string, primaryKey: true },
        idempotencyKey: { ...column.string, primaryKey: true },
        fingerprint: column.string,
        status: column.number,
        body: column.optionalText,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'idempotency_keys' },
    );
  }
}
