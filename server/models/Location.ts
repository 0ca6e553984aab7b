import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { LocationPurpose } from '../../shared/domain/lifecycle/states';
import { column } from './define';

/** A rack, cage, counter … of a site. */
export class Location extends Model<InferAttributes<Location>, InferCreationAttributes<Location>> {
  declare id: CreationOptional<number>;
  declare siteId: number;
  declare name: string;
  declare purpose: LocationPurpose;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Location.init(
      {
        id: column.id,
        siteId: column.number,
        name: column.string,
        purpose: column.string,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'locations' },
    );
  }
}
