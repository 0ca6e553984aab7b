import type { WriteContext } from '../context';
import { SlingPhoto } from '../models/SlingPhoto';
import type { Evidence } from '../queries/files';

export type PhotoPurpose = 'record' | 'hold' | 'report' | 'inspection' | 'destruction' | 'withdrawal';

/** Puts photos on the sling's record; one that is there already stays as it is. */
export async function addPhotos(
  context: WriteContext,
  slingId: number,
  photos: readonly Evidence[],
  purpose: PhotoPurpose,
  ledgerSeq: number,
): Promise<void> {
  if (photos.length === 0) return;
  await SlingPhoto.bulkCreate(
    photos.map(({ fileId }) => ({ slingId, fileId, purpose, ledgerSeq, createdAt: context.at })),
    { transaction: context.transaction, ignoreDuplicates: true },
  );
}
