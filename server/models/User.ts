import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Role } from '../../shared/domain/access/roles';
import type { LengthUnit, LoadUnit } from '../../shared/domain/units/units';
import { column } from './define';

/** An account. Without a password hash nobody can sign in to it yet. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<number>;
  declare email: string;
  declare name: string;
  declare passwordHash: CreationOptional<string | null>;
  declare roles: Role[];
  declare endsOn: CreationOptional<string | null>;
  declare loadUnit: CreationOptional<LoadUnit>;
  declare lengthUnit: CreationOptional<LengthUnit>;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    User.init(
      {
        id: column.id,
        email: column.string,
        name: column.string,
        passwordHash: column.optionalString,
        roles: column.json,
        endsOn: column.optionalDay,
        loadUnit: { ...column.string, defaultValue: 'kg' },
        lengthUnit: { ...column.string, defaultValue: 'm' },
        createdAt: column.instant,
      },
      { sequelize, tableName: 'users' },
    );
  }
}
