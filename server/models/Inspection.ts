import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { InspectionFact } from '../../shared/domain/lifecycle/facts';
import type { Inspection as InspectionView } from '../../shared/schemas/inspection';
import { column } from './define';

/** An inspection as it was signed; never edited. */
export class Inspection extends Model<InferAttributes<Inspection>, InferCreationAttributes<Inspection>> {
  declare id: CreationOptional<number>;
  declare slingId: number;
  declare type: InspectionFact['type'];
  declare inspectedOn: string;
  declare inspectorId: number;
  declare inspectorName: string;
  declare verdict: InspectionFact['verdict'];
  declare computedVerdict: InspectionFact['verdict'];
  declare stricterNote: CreationOptional<string | null>;
  declare isComplete: boolean;
  declare restClean: boolean;
  declare ruleSets: InspectionView['ruleSets'];
  declare answers: InspectionView['answers'];
  declare findings: InspectionView['findings'];
  declare notTaken: InspectionView['notTaken'];
  declare nextDueOn: CreationOptional<string | null>;
  declare ledgerSeq: number;
  declare createdAt: Date;

  static define(sequelize: Sequelize): void {
    Inspection.init(
      {
        id: column.id,
        slingId: column.number,
        type: column.string,
        inspectedOn: column.day,
        inspectorId: column.number,
        inspectorName: column.string,
        verdict: column.string,
        computedVerdict: column.string,
        stricterNote: column.optionalText,
        isComplete: column.boolean,
        restClean: column.boolean,
        ruleSets: column.json,
        answers: column.json,
        findings: column.json,
        notTaken: column.json,
        nextDueOn: column.optionalDay,
        ledgerSeq: column.number,
        createdAt: column.instant,
      },
      { sequelize, tableName: 'inspections' },
    );
  }
}
