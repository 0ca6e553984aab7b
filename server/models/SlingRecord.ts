import {
  Model,
  type CreationOptional,
  type InferAttributes,
  type InferCreationAttributes,
  type Sequelize,
} from 'sequelize';
import type { CustodyKind, SlingState } from '../../shared/domain/lifecycle/states';
import type { MakersTag, ServiceClass, SlingKind } from '../../shared/domain/slings/kinds';
import type { SpecByKind } from '../../shared/domain/slings/spec';
import type { Sling } from '../../shared/schemas/slings';
import type { EnteredUnits } from '../../shared/schemas/spec';
import { column } from './define';

/** The sling record. State, condemnation, custody and chain head are written by ledger rows alone. */
export class SlingRecord extends Model<InferAttributes<SlingRecord>, InferCreationAttributes<SlingRecord>> {
  declare id: CreationOptional<number>;
  declare number: string;
  declare kind: SlingKind;
  declare spec: SpecByKind[SlingKind];
  declare maker: string;
  declare makerSerial: CreationOptional<string | null>;
  declare stockNumber: CreationOptional<string | null>;
  declare lot: CreationOptional<string | null>;
  declare madeOn: CreationOptional<string | null>;
  declare receivedOn: string;
  declare firstUseOn: CreationOptional<string | null>;
  declare ownerKind: 'own' | 'hired';
  declare ownerName: CreationOptional<string | null>;
  declare offHireOn: CreationOptional<string | null>;
  declare siteId: number;
  declare homeLocationId: CreationOptional<number | null>;
  declare serviceClass: ServiceClass;
  declare legs: number;
  declare reachMm: string;
  declare verticalKg: string;
  declare chokerKg: CreationOptional<string | null>;
  declare basketKg: CreationOptional<string | null>;
  declare bridleKg: CreationOptional<string | null>;
  declare bridleAngleDeg: CreationOptional<string | null>;
  declare enteredUnits: EnteredUnits;
  declare makerLimits: Sling['makerLimits'];
  declare discardOn: CreationOptional<string | null>;
  declare makersTag: MakersTag;
  declare notes: string;
  declare cost: CreationOptional<string | null>;
  declare nextDueOn: CreationOptional<string | null>;
  declare state: CreationOptional<SlingState>;
  declare condemned: CreationOptional<boolean>;
  declare condemnedBy: CreationOptional<number | null>;
  declare stateSince: Date;
  declare custodyKind: CreationOptional<CustodyKind>;
  declare custodyLocationId: CreationOptional<number | null>;
  declare custodySince: Date;
  declare lastInServiceSeq: CreationOptional<number | null>;
  declare lastSentSeq: CreationOptional<number | null>;
  declare cameBackSeq: CreationOptional<number | null>;
  declare ledgerCount: CreationOptional<number>;
  declare headHash: string;
  declare createdAt: Date;
  declare updatedAt: Date;

  static define(sequelize: Sequelize): void {
    SlingRecord.init(
      {
        id: column.id,
        number: column.string,
        kind: column.string,
        spec: column.json,
        maker: column.string,
        makerSerial: column.optionalString,
        stockNumber: column.optionalString,
        lot: column.optionalString,
        madeOn: column.optionalDay,
        receivedOn: column.day,
        firstUseOn: column.optionalDay,
        ownerKind: column.string,
        ownerName: column.optionalString,
        offHireOn: column.optionalDay,
        siteId: column.number,
        homeLocationId: column.optionalNumber,
        serviceClass: column.string,
        legs: column.number,
        reachMm: column.decimal,
        verticalKg: column.decimal,
        chokerKg: column.optionalDecimal,
        basketKg: column.optionalDecimal,
        bridleKg: column.optionalDecimal,
        bridleAngleDeg: column.optionalDecimal,
        enteredUnits: column.json,
        makerLimits: column.json,
        discardOn: column.optionalDay,
        makersTag: column.string,
        notes: column.text,
        cost: column.optionalDecimal,
        nextDueOn: column.optionalDay,
        state: column.string,
        condemned: column.boolean,
        condemnedBy: column.optionalNumber,
        stateSince: column.instant,
        custodyKind: column.string,
        custodyLocationId: column.optionalNumber,
        custodySince: column.instant,
        lastInServiceSeq: column.optionalNumber,
        lastSentSeq: column.optionalNumber,
        cameBackSeq: column.optionalNumber,
        ledgerCount: column.number,
        headHash: column.string,
        createdAt: column.instant,
        updatedAt: column.instant,
      },
      { sequelize, tableName: 'slings' },
    );
  }
}
