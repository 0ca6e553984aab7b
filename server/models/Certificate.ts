import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { CertificateBasis } from '../../shared/domain/slings/kinds';
import { column } from './define';

/** A certificate on a sling's file; none is ever taken away. */
export class Certificate extends Model<InferAttributes<Certificate>, InferCreationAttributes<Certificate>> {
  declare id: CreationOptional<number>;
  declare slingId: number;
  declare basis: CertificateBasis;
  declare loadKg: CreationOptional<string | null>;
  declare testedOn: string;
  declare number: string;
  declare fileId: CreationOptional<string | null>;
  declare ledgerSeq: number;
  declare createdBy: number;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Certificate.init(
      {
        id: column.id,
        slingId: column.number,
        basis: column.string,
        loadKg: column.optionalDecimal,
        testedOn: column.day,
        number: column.string,
        fileId: column.optionalString,
        ledgerSeq: column.number,
        createdBy: column.number,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'certificates' },
    );
  }
}
