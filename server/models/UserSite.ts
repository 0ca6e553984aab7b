import { Model, type InferAttributes, type InferCreationAttributes, type Sequelize } from 'sequelize';
import { column } from './define';

/** At which sites a person works. */
export class UserSite extends Model<InferAttributes<UserSite>, InferCreationAttributes<UserSite>> {
  declare userId: number;
  declare siteId: number;

  static define(sequelize: Sequelize): void {
    UserSite.init(
      {
        userId: { ...column.number, primaryKey: true },
        siteId: { ...column.number, primaryKey: true },
      },
      { sequelize, tableName: 'user_sites' },
    );
  }
}
