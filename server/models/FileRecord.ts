import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { StoredFile } from '../../shared/schemas/files';
import { column } from './define';

/** What is known of a kept file; its bytes lie in the file store under their hash. */
export class FileRecord extends Model<InferAttributes<FileRecord>, InferCreationAttributes<FileRecord>> {
  declare id: string;
  declare sha256: string;
  declare originalSha256: string;
  declare contentType: StoredFile['contentType'];
  declare size: number;
  declare originalName: string;
  declare createdBy: CreationOptional<number | null>;
  declare publicCode: CreationOptional<string | null>;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    FileRecord.init(
      {
        id: { ...column.string, primaryKey: true },
        sha256: { ...column.string, field: 'sha256' },
        originalSha256: { ...column.string, field: 'original_sha256' },
        contentType: column.string,
        size: column.number,
        originalName: column.string,
        createdBy: column.optionalNumber,
        publicCode: column.optionalString,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'files' },
    );
  }
}
