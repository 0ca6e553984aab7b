import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import { column } from './define';

/** A one-time link that sets a password; only the hash of its token is kept. */
export class Invitation extends Model<InferAttributes<Invitation>, InferCreationAttributes<Invitation>> {
  declare id: CreationOptional<number>;
  declare userId: number;
  declare tokenHash: string;
  declare expiresAt: Date;
  declare usedAt: CreationOptional<Date | null>;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Invitation.init(
      {
        id: column.id,
        userId: column.number,
        tokenHash: column.string,
        expiresAt: column.instant,
        usedAt: column.optionalInstant,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'invitations' },
    );
  }
}
