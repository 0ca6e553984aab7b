import type { RatedLoads } from '../../shared/domain/slings/spec';
import type { CorrectionRequest } from '../../shared/schemas/corrections';
import type { CertificateInput, UpdateSlingRequest } from '../../shared/schemas/slings';
import type { ActorContext } from '../context';
import { AppError, invalidField, InvalidError } from '../errors';
import { Location } from '../models/Location';
import { SlingRecord } from '../models/SlingRecord';
import { getEvidence, getPhotos } from '../queries/files';
import { findToday } from '../queries/siteDay';
import { addPhotos } from './addPhotos';
import { appendLedger } from './appendLedger';
import { toDecimal } from './decimals';
import { checkVersion, lockSling } from './lockSling';
import { placeHold } from './placeHold';
import { createCertificate } from './registerSling';

/** Notes, home, cost and further photos: what neither identifies nor rates the sling. */
export async function updateSling(
  context: ActorContext,
  id: number,
  request: UpdateSlingRequest,
  ifMatch: number | null,
): Promise<void> {
  const sling = await lockSling(context, id);
  await checkVersion(context, sling, ifMatch);
  const { photoIds = [], ...changes } = request;
  if (typeof changes.homeLocationId === 'number') {
    const home = await Location.findByPk(changes.homeLocationId, { transaction: context.transaction });
    if (home?.siteId !== sling.siteId) throw invalidField('homeLocationId', 'This is no place of the site.');
  }
  const photos = await getPhotos(context, photoIds, 'photoIds');
  const { cost, ...rest } = changes;
  if (Object.keys(changes).length > 0) {
    await sling.update(
      { ...rest, ...(cost === undefined ? {} : { cost: cost === null ? null : String(cost) }) },
      { transaction: context.transaction },
    );
    await appendLedger(context, sling, { type: 'edited', data: { changes } });
  }
  if (photos.length > 0) {
    const row = await appendLedger(context, sling, { type: 'photo_added', data: { photos } });
    await addPhotos(context, sling.id, photos, 'record', row.slingSeq);
  }
}

export async function addCertificate(
  context: ActorContext,
  id: number,
  certificate: CertificateInput,
  ifMatch: number | null,
): Promise<void> {
  const sling = await lockSling(context, id);
  await checkVersion(context, sling, ifMatch);
  if (certificate.testedOn > (await findToday(sling.siteId, context.at, context.transaction))) {
    throw invalidField('testedOn', 'This day lies in the future.');
  }
  const [file] = certificate.fileId ? await getEvidence(context, [certificate.fileId], 'fileId') : [];
  const row = await appendLedger(context, sling, {
    type: 'certificate_added',
    data: { certificate: { ...certificate }, ...(file ? { file } : {}) },
  });
  await createCertificate(context, sling.id, certificate, row.slingSeq);
}

/**
 * Corrects what identifies or rates a sling. A sling in service is then held as `record_in_doubt`, unless the
 * correction is only stricter (product design, section 3).
 */
export async function correctSling(
  context: ActorContext,
  id: number,
  request: CorrectionRequest,
  ifMatch: number | null,
): Promise<void> {
  const sling = await lockSling(context, id);
  await checkVersion(context, sling, ifMatch);
  if (sling.state === 'destroyed' || sling.state === 'departed') {
    throw new AppError('conflict', 'The record of a sling that is gone is closed.');
  }
  const { ratedLoads, reachMm, ...plain } = request.changes;
  await checkCorrection(context, sling, request);
  const evidence = await getEvidence(context, request.evidenceFileIds, 'evidenceFileIds');
  const before = describeNow(sling, request);
  await sling.update(
    {
      ...plain,
      ...(reachMm === undefined ? {} : { reachMm: String(reachMm) }),
      ...(ratedLoads ? toLoadColumns(ratedLoads) : {}),
    },
    { transaction: context.transaction },
  );
  await appendLedger(context, sling, {
    type: 'corrected',
    data: {
      before,
      after: JSON.parse(JSON.stringify(request.changes)) as unknown,
      reason: request.reason,
      evidence,
    },
  });
  if (sling.state === 'in_service' && !isOnlyStricter(before, request)) {
    await placeHold(context, sling, {
      reasons: [{ code: 'record_in_doubt', note: request.reason, placedBy: null }],
      photos: [],
    });
  }
}

async function checkCorrection(
  { user, transaction }: ActorContext,
  sling: SlingRecord,
  { changes }: CorrectionRequest,
): Promise<void> {
  if (changes.siteId !== undefined && !user.siteIds.includes(changes.siteId)) {
    throw new InvalidError([{ path: 'changes.siteId', message: 'You do not work at this site.' }]);
  }
  const isTaken = async (where: Record<string, unknown>): Promise<boolean> => {
    const twin = await SlingRecord.findOne({ attributes: ['id'], where, transaction });
    return twin !== null && twin.id !== sling.id;
  };
  if (changes.number !== undefined && (await isTaken({ number: changes.number }))) {
    throw new AppError('duplicate', `The number ${changes.number} is taken.`);
  }
  const makerSerial = changes.makerSerial ?? sling.makerSerial;
  const maker = changes.maker ?? sling.maker;
  if (makerSerial && (await isTaken({ maker, makerSerial }))) {
    throw new AppError('duplicate', `${maker} ${makerSerial} is on the books already.`);
  }
}

function toLoadColumns(
  loads: RatedLoads,
): Partial<Record<'verticalKg', string>> & Record<string, string | null> {
  return {
    verticalKg: String(loads.verticalKg),
    chokerKg: toDecimal(loads.chokerKg),
    basketKg: toDecimal(loads.basketKg),
    bridleKg: toDecimal(loads.bridle?.kg),
    bridleAngleDeg: toDecimal(loads.bridle?.angleDeg),
  };
}

type Before = Record<string, unknown> & { verticalKg?: number };

function describeNow(sling: SlingRecord, { changes }: CorrectionRequest): Before {
  const { ratedLoads, ...plain } = changes;
  const now: Before = {};
  for (const field of Object.keys(plain)) now[field] = sling.get(field);
  if (ratedLoads) {
    now.verticalKg = Number(sling.verticalKg);
    for (const field of ['chokerKg', 'basketKg', 'bridleKg', 'bridleAngleDeg'] as const) {
      const value = sling[field];
      now[field] = value === null ? null : Number(value);
    }
  }
  return now;
}

/** Only a lower rated load or a harder service class: nothing that could let the sling carry or last more. */
function isOnlyStricter(before: Before, { changes }: CorrectionRequest): boolean {
  const { ratedLoads, serviceClass, ...others } = changes;
  if (Object.keys(others).length > 0) return false;
  if (serviceClass === 'normal' && before.serviceClass !== 'normal') return false;
  if (!ratedLoads) return true;
  const isLower = (now: number | undefined, was: unknown): boolean =>
    now === undefined || (typeof was === 'number' && now <= was);
  return (
    isLower(ratedLoads.verticalKg, before.verticalKg) &&
    isLower(ratedLoads.chokerKg, before.chokerKg) &&
    isLower(ratedLoads.basketKg, before.basketKg) &&
    isLower(ratedLoads.bridle?.kg, before.bridleKg) &&
    (ratedLoads.bridle === undefined || ratedLoads.bridle.angleDeg === before.bridleAngleDeg)
  );
}
