import type { Sequelize } from 'sequelize';
import { Certificate } from './Certificate';
import { DamageReport } from './DamageReport';
import { Designation } from './Designation';
import { Evaluator } from './Evaluator';
import { FileRecord } from './FileRecord';
import { Fitting } from './Fitting';
import { HoldReasonRow } from './HoldReasonRow';
import { IdempotencyKey } from './IdempotencyKey';
import { Inspection } from './Inspection';
import { Invitation } from './Invitation';
import { LabelRun } from './LabelRun';
import { LedgerEntry } from './LedgerEntry';
import { Location } from './Location';
import { Shipment } from './Shipment';
import { ShipmentLine } from './ShipmentLine';
import { Site } from './Site';
import { SlingPhoto } from './SlingPhoto';
import { SlingRecord } from './SlingRecord';
import { Tag } from './Tag';
import { User } from './User';
import { UserSite } from './UserSite';

const MODELS = [
  Certificate,
  DamageReport,
  Designation,
  Evaluator,
  FileRecord,
  Fitting,
  HoldReasonRow,
  IdempotencyKey,
  Inspection,
  Invitation,
  LabelRun,
  LedgerEntry,
  Location,
  Shipment,
  ShipmentLine,
  Site,
  SlingPhoto,
  SlingRecord,
  Tag,
  User,
  UserSite,
];

/** Ties every model to this connection; called once, before the first query. */
export function defineModels(sequelize: Sequelize): void {
  for (const model of MODELS) model.define(sequelize);
}
