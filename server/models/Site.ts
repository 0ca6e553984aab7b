import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { Site as SiteView } from '../../shared/schemas/places';
import { column } from './define';

type RuleSetId = SiteView['ruleSets'][number];

/** A place that keeps slings; its time zone decides what "today" is. */
export class Site extends Model<InferAttributes<Site>, InferCreationAttributes<Site>> {
  declare id: CreationOptional<number>;
  declare name: string;
  declare timeZone: string;
  declare ruleSets: RuleSetId[];
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Site.init(
      {
        id: column.id,
        name: column.string,
        timeZone: column.string,
        ruleSets: column.json,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'sites' },
    );
  }
}
