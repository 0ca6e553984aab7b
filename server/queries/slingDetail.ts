import type { Sequelize, Transaction } from 'sequelize';
import { answerActions } from '../../shared/domain/lifecycle/answer';
import { clearingOf } from '../../shared/domain/lifecycle/reasons';
import type { SessionUser } from '../../shared/schemas/people';
import type { Sling } from '../../shared/schemas/slings';
import { toActor } from '../../shared/domain/lifecycle/actor';
import { NotFoundError } from '../errors';
import type { Certificate } from '../models/Certificate';
import { Fitting } from '../models/Fitting';
import type { HoldReasonRow } from '../models/HoldReasonRow';
import { SlingPhoto } from '../models/SlingPhoto';
import { SlingRecord } from '../models/SlingRecord';
import { User } from '../models/User';
import { loadSlingParts, toFacts } from './lifecycleFacts';
import { findSummary, findToday, presentSummary } from './slingSummary';

/** The whole record as this person sees it. @throws NotFoundError outside the person's sites */
export async function getSling(
  context: { sequelize: Sequelize; user: SessionUser; now: () => Date },
  id: number,
  transaction?: Transaction,
): Promise<Sling> {
  const options = transaction ? { transaction } : {};
  const where = { slingId: id };
  const [record, summary, fittings, photos] = await Promise.all([
    SlingRecord.findByPk(id, options),
    findSummary(context.sequelize, id, transaction),
    Fitting.findAll({ where, order: [['id', 'ASC']], raw: true, ...options }),
    SlingPhoto.findAll({ where, order: [['createdAt', 'ASC']], raw: true, ...options }),
  ]);
  if (!record || !summary || !context.user.siteIds.includes(record.siteId)) throw new NotFoundError('sling');
  const at = context.now();
  const [parts, days] = await Promise.all([
    loadSlingParts(record, transaction),
    // In the caller's transaction: a second connection from the pool may never come while others wait for this one.
    findToday([record.siteId], at, transaction),
  ]);
  const names = await findNames(parts.openReasons, transaction);
  const today = days.get(record.siteId) ?? at.toISOString().slice(0, 10);
  return {
    ...presentSummary(
      summary,
      today,
      parts.openReasons.map((reason) => reason.code),
    ),
    ...optional({
      stockNumber: record.stockNumber,
      lot: record.lot,
      madeOn: record.madeOn,
      firstUseOn: record.firstUseOn,
    }),
    receivedOn: record.receivedOn,
    owner: { kind: record.ownerKind, ...optional({ name: record.ownerName, offHireOn: record.offHireOn }) },
    homeLocationId: record.homeLocationId,
    serviceClass: record.serviceClass,
    fittings: fittings.map(presentFitting),
    makerLimits: record.makerLimits,
    discardOn: record.discardOn,
    makersTag: record.makersTag,
    certificates: parts.certificates.map(presentCertificate),
    photos: photos.map(({ fileId, purpose, createdAt }) => ({
      fileId,
      purpose,
      addedAt: createdAt.toISOString(),
    })),
    notes: record.notes,
    cost: record.cost === null ? null : Number(record.cost),
    enteredUnits: record.enteredUnits,
    openReasons: parts.openReasons.map((reason) => ({
      id: reason.id,
      code: reason.code,
      ...optional({ criterionId: reason.criterionId }),
      confirmed: Boolean(reason.confirmed),
      placedBy:
        reason.placedBy === null
          ? null
          : { id: reason.placedBy, name: names.get(reason.placedBy) ?? 'Somebody' },
      placedAt: reason.placedAt.toISOString(),
      note: reason.note,
      clearing: clearingOf(reason.code, record.kind, Boolean(reason.confirmed)),
    })),
    allowedActions: answerActions(toFacts(record, parts), toActor(context.user, record.kind, today)),
    headHash: record.headHash,
    createdAt: record.createdAt.toISOString(),
    updatedAt: record.updatedAt.toISOString(),
  };
}

async function findNames(
  reasons: readonly HoldReasonRow[],
  transaction?: Transaction,
): Promise<Map<number, string>> {
  const ids = [...new Set(reasons.flatMap((reason) => reason.placedBy ?? []))];
  if (ids.length === 0) return new Map();
  const users = await User.findAll({
    attributes: ['id', 'name'],
    where: { id: ids },
    ...(transaction ? { transaction } : {}),
  });
  return new Map(users.map((user) => [user.id, user.name]));
}

/** Leaves out what is null: the API sends no empty fields. */
function optional<T extends Record<string, unknown>>(fields: T): { [K in keyof T]?: NonNullable<T[K]> } {
  const entries = Object.entries(fields).filter(([, value]) => value !== null);
  return Object.fromEntries(entries) as { [K in keyof T]?: NonNullable<T[K]> };
}

export function presentFitting(fitting: Fitting): Sling['fittings'][number] {
  return {
    id: fitting.id,
    position: fitting.position,
    type: fitting.type,
    ...optional({
      sizeMm: fitting.sizeMm === null ? null : Number(fitting.sizeMm),
      throatMm: fitting.throatMm === null ? null : Number(fitting.throatMm),
      hasLatch: fitting.hasLatch === null ? null : Boolean(fitting.hasLatch),
    }),
    detachable: Boolean(fitting.detachable),
  };
}

function presentCertificate(certificate: Certificate): Sling['certificates'][number] {
  return {
    id: certificate.id,
    basis: certificate.basis,
    ...optional({
      loadKg: certificate.loadKg === null ? null : Number(certificate.loadKg),
      fileId: certificate.fileId,
    }),
    testedOn: certificate.testedOn,
    number: certificate.number,
    addedAt: certificate.createdAt.toISOString(),
  };
}
