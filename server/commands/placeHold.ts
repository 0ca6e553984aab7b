import { REASON_FACTS, type HoldReason } from '../../shared/domain/lifecycle/reasons';
import type { WriteContext } from '../context';
import { HoldReasonRow } from '../models/HoldReasonRow';
import type { LedgerEntry } from '../models/LedgerEntry';
import type { SlingRecord } from '../models/SlingRecord';
import type { Evidence } from '../queries/files';
import { addPhotos, type PhotoPurpose } from './addPhotos';
import { appendLedger, type LedgerEvent } from './appendLedger';

export interface NewReason {
  code: HoldReason;
  criterionId?: string | undefined;
  note?: string | undefined;
  /** Null when the system or a guest places it. */
  placedBy: number | null;
}

export interface Hold {
  reasons: readonly NewReason[];
  photos: readonly Evidence[];
  photoPurpose?: PhotoPurpose;
  /** More for the ledger row, such as the offline time. */
  data?: Record<string, unknown>;
  /** Another event than `hold` that brings reasons with it, such as a sling received back. */
  event?: Omit<LedgerEvent, 'data'>;
}

/** Places reasons and removes the sling from service, whatever its state; a lost one is found by it. */
export async function placeHold(context: WriteContext, sling: SlingRecord, hold: Hold): Promise<LedgerEntry> {
  const found: NewReason[] = sling.state === 'lost' ? [{ code: 'found', placedBy: null }] : [];
  const reasons = [...found, ...hold.reasons];
  await addReasons(context, sling, reasons);
  const row = await appendLedger(context, sling, {
    type: 'hold',
    to: sling.state === 'sent_for_evaluation' ? 'sent_for_evaluation' : 'held',
    ...(sling.state === 'lost' ? { custody: { kind: 'unknown', locationId: null } } : {}),
    ...hold.event,
    data: {
      ...hold.data,
      reasons: reasons.map(({ code, criterionId, note }) => ({
        code,
        ...(criterionId ? { criterionId } : {}),
        ...(note ? { note } : {}),
      })),
      ...(hold.photos.length > 0 ? { photos: hold.photos } : {}),
    },
  });
  await addPhotos(context, sling.id, hold.photos, hold.photoPurpose ?? 'hold', row.slingSeq);
  return row;
}

/** Writes the reasons as placed by the sling's next ledger row. */
async function addReasons(
  context: WriteContext,
  sling: SlingRecord,
  reasons: readonly NewReason[],
): Promise<void> {
  await HoldReasonRow.bulkCreate(
    reasons.map(({ code, criterionId, note, placedBy }) => ({
      slingId: sling.id,
      code,
      criterionId: criterionId ?? null,
      confirmed: REASON_FACTS[code].isConfirmed,
      note: note ?? '',
      placedBy,
      placedAt: context.at,
      placedSeq: sling.ledgerCount + 1,
    })),
    { transaction: context.transaction },
  );
}
