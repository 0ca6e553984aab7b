import type { SlingState } from '../../shared/domain/lifecycle/states';
import type { TagCode } from '../../shared/domain/tags/tagCode';
import type { DamageReportRequest } from '../../shared/schemas/publicPage';
import type { WriteContext } from '../context';
import { NotFoundError } from '../errors';
import { DamageReport } from '../models/DamageReport';
import { SlingRecord } from '../models/SlingRecord';
import { Tag } from '../models/Tag';
import { findEvidence } from '../queries/files';
import { addPhotos } from './addPhotos';
import { appendLedger } from './appendLedger';
import { placeHold } from './placeHold';

/**
 * Somebody without an account saw damage: the sling is held at once, whatever its state. On a void label, or one
 * of a sling that is gone, the report is kept on the record as an alarm: which sling it was is not certain.
 */
export async function reportDamage(
  context: WriteContext,
  code: TagCode,
  request: DamageReportRequest,
): Promise<{ isHeld: boolean }> {
  const { transaction, at } = context;
  const tag = await Tag.findByPk(code, { transaction });
  if (!tag) throw new NotFoundError('label');
  const sling = await SlingRecord.findByPk(tag.slingId, { transaction, lock: transaction.LOCK.UPDATE });
  if (!sling) throw new NotFoundError('sling');
  const photos = await findEvidence(context, request.photoIds ?? []);
  const state: SlingState = sling.state;
  const isHeld = tag.status !== 'void' && state !== 'destroyed' && state !== 'departed';
  const guestName = `${request.name} (no account)`;
  const reported = await appendLedger({ ...context, user: null }, sling, {
    type: 'damage_reported',
    guestName,
    data: { code, labelStatus: tag.status, note: request.note, ...(photos.length > 0 ? { photos } : {}) },
  });
  await DamageReport.create(
    {
      slingId: sling.id,
      tagCode: code,
      name: request.name,
      note: request.note,
      ledgerSeq: reported.slingSeq,
      createdAt: at,
    },
    { transaction },
  );
  await addPhotos(context, sling.id, photos, 'report', reported.slingSeq);
  if (isHeld) {
    await placeHold({ ...context, user: null }, sling, {
      reasons: [{ code: 'damage_suspected', note: `${request.name}: ${request.note}`, placedBy: null }],
      photos: [],
    });
  }
  return { isHeld };
}
