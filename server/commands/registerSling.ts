import { UniqueConstraintError } from 'sequelize';
import { CHAIN_START } from '../../shared/domain/ledger/chain';
import type { FieldError } from '../../shared/errors';
import type { CertificateInput, CreateSlingRequest } from '../../shared/schemas/slings';
import type { ActorContext } from '../context';
import { AppError, InvalidError } from '../errors';
import { Certificate } from '../models/Certificate';
import { Fitting } from '../models/Fitting';
import { Location } from '../models/Location';
import { SlingRecord } from '../models/SlingRecord';
import { getEvidence, getPhotos } from '../queries/files';
import { findToday } from '../queries/siteDay';
import { addPhotos } from './addPhotos';
import { appendLedger } from './appendLedger';
import { toDecimal } from './decimals';

/**
 * Puts a sling on the books as `received`, with its fittings, certificate and first ledger row.
 * @throws AppError 409 `duplicate` for a number, or a maker's serial, that is on the books already
 */
export async function registerSling(
  context: ActorContext,
  request: CreateSlingRequest,
): Promise<SlingRecord> {
  await checkPlaceAndDates(context, request);
  const photos = await getPhotos(context, request.photoIds ?? [], 'photoIds');
  const certificateFile = request.proofCertificate?.fileId
    ? await getEvidence(context, [request.proofCertificate.fileId], 'proofCertificate.fileId')
    : [];
  await checkNotOnBooks(context, request);
  const sling = await createRecord(context, request);
  await Fitting.bulkCreate(
    request.fittings.map((fitting) => ({
      slingId: sling.id,
      position: fitting.position,
      type: fitting.type,
      sizeMm: toDecimal(fitting.sizeMm),
      throatMm: toDecimal(fitting.throatMm),
      hasLatch: fitting.hasLatch ?? null,
      detachable: fitting.detachable,
    })),
    { transaction: context.transaction },
  );
  const row = await appendLedger(context, sling, {
    type: 'registered',
    data: {
      record: describeRecord(request),
      ...(photos.length > 0 ? { photos } : {}),
      ...(certificateFile.length > 0 ? { certificateFile: certificateFile[0] } : {}),
    },
  });
  if (request.proofCertificate) {
    await createCertificate(context, sling.id, request.proofCertificate, row.slingSeq);
  }
  await addPhotos(context, sling.id, photos, 'record', row.slingSeq);
  return sling;
}

async function createRecord(context: ActorContext, request: CreateSlingRequest): Promise<SlingRecord> {
  const { at, transaction } = context;
  const { owner, ratedLoads } = request;
  try {
    return await SlingRecord.create(
      {
        number: request.number,
        kind: request.kind,
        spec: request.spec,
        maker: request.maker,
        makerSerial: request.makerSerial ?? null,
        stockNumber: request.stockNumber ?? null,
        lot: request.lot ?? null,
        madeOn: request.madeOn ?? null,
        receivedOn: request.receivedOn,
        firstUseOn: request.firstUseOn ?? null,
        ownerKind: owner?.kind ?? 'own',
        ownerName: owner?.name ?? null,
        offHireOn: owner?.offHireOn ?? null,
        siteId: request.siteId,
        homeLocationId: request.homeLocationId ?? null,
        serviceClass: request.serviceClass,
        legs: request.legs,
        reachMm: String(request.reachMm),
        verticalKg: String(ratedLoads.verticalKg),
        chokerKg: toDecimal(ratedLoads.chokerKg),
        basketKg: toDecimal(ratedLoads.basketKg),
        bridleKg: toDecimal(ratedLoads.bridle?.kg),
        bridleAngleDeg: toDecimal(ratedLoads.bridle?.angleDeg),
        enteredUnits: request.enteredUnits ?? {},
        makerLimits: request.makerLimits ?? [],
        discardOn: request.discardOn ?? null,
        makersTag: request.makersTag,
        notes: request.notes ?? '',
        cost: toDecimal(request.cost),
        state: 'received',
        condemned: false,
        stateSince: at,
        custodyKind: 'in_store',
        custodyLocationId: request.homeLocationId ?? null,
        custodySince: at,
        ledgerCount: 0,
        headHash: CHAIN_START,
        createdAt: at,
        updatedAt: at,
      },
      { transaction },
    );
  } catch (error) {
    // Two storekeepers at the same moment: the database's own word.
    if (error instanceof UniqueConstraintError) throw duplicate('number', 'It is on the books already.');
    throw error;
  }
}

/** @throws InvalidError for a site or place that is not this person's, and for dates in the future of the site */
async function checkPlaceAndDates(context: ActorContext, request: CreateSlingRequest): Promise<void> {
  const errors: FieldError[] = [];
  if (!context.user.siteIds.includes(request.siteId)) {
    throw new InvalidError([{ path: 'siteId', message: 'You do not work at this site.' }]);
  }
  if (request.homeLocationId !== undefined) {
    const home = await Location.findByPk(request.homeLocationId, { transaction: context.transaction });
    if (home?.siteId !== request.siteId) {
      errors.push({ path: 'homeLocationId', message: 'This is no place of the site.' });
    }
  }
  const today = await findToday(request.siteId, context.at, context.transaction);
  const dates: [string, string | undefined][] = [
    ['receivedOn', request.receivedOn],
    ['madeOn', request.madeOn],
    ['firstUseOn', request.firstUseOn],
    ['proofCertificate.testedOn', request.proofCertificate?.testedOn],
  ];
  for (const [path, date] of dates) {
    if (date !== undefined && date > today) errors.push({ path, message: 'This day lies in the future.' });
  }
  if (errors.length > 0) throw new InvalidError(errors);
}

async function checkNotOnBooks({ transaction }: ActorContext, request: CreateSlingRequest): Promise<void> {
  if (await SlingRecord.findOne({ attributes: ['id'], where: { number: request.number }, transaction })) {
    throw duplicate('number', `The number ${request.number} is taken.`);
  }
  if (!request.makerSerial) return;
  const twin = await SlingRecord.findOne({
    attributes: ['number'],
    where: { maker: request.maker, makerSerial: request.makerSerial },
    transaction,
  });
  if (twin) {
    throw duplicate(
      'makerSerial',
      `${request.maker} ${request.makerSerial} is on the books already, as ${twin.number}.`,
    );
  }
}

function duplicate(path: string, message: string): AppError {
  return new AppError('duplicate', message, { errors: [{ path, message }] });
}

export async function createCertificate(
  context: ActorContext,
  slingId: number,
  certificate: CertificateInput,
  ledgerSeq: number,
): Promise<void> {
  await Certificate.create(
    {
      slingId,
      basis: certificate.basis,
      loadKg: toDecimal(certificate.loadKg),
      testedOn: certificate.testedOn,
      number: certificate.number,
      fileId: certificate.fileId ?? null,
      ledgerSeq,
      createdBy: context.user.id,
      createdAt: context.at,
    },
    { transaction: context.transaction },
  );
}

/** The record as it was first written down, for the ledger. */
function describeRecord(request: CreateSlingRequest): Record<string, unknown> {
  const { photoIds, ...record } = request;
  void photoIds;
  // JSON has no undefined: fields that were left out are left out here too.
  return JSON.parse(JSON.stringify(record)) as Record<string, unknown>;
}
