import type { WriteContext } from '../context';
import { AppError, NotFoundError } from '../errors';
import { LedgerEntry } from '../models/LedgerEntry';
import { SlingRecord } from '../models/SlingRecord';

type Base = Omit<WriteContext, 'transaction' | 'at'>;

/** Does this person work where the sling is? Guests come through a label and see no sites. */
function worksAt(context: Base, siteId: number): boolean {
  return context.user === null || context.user.siteIds.includes(siteId);
}

/** @throws NotFoundError also for a sling of a site where this person doesn't work */
export async function getSlingId(context: Base, id: number): Promise<number> {
  const sling = await SlingRecord.findByPk(id, { attributes: ['id', 'siteId'] });
  if (!sling || !worksAt(context, sling.siteId)) throw new NotFoundError('sling');
  return sling.id;
}

/** Reads the sling with a row lock: whoever comes second waits here and then sees what the first one did. */
export async function lockSling(context: WriteContext, id: number): Promise<SlingRecord> {
  const { transaction } = context;
  const sling = await SlingRecord.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
  if (!sling || !worksAt(context, sling.siteId)) throw new NotFoundError('sling');
  return sling;
}

/** @throws AppError 412 with what happened since the version that the caller knew */
export async function checkVersion(
  context: WriteContext,
  sling: SlingRecord,
  ifMatch: number | null,
): Promise<void> {
  if (ifMatch === null || ifMatch === sling.ledgerCount) return;
  const rows = await LedgerEntry.findAll({
    where: { slingId: sling.id },
    order: [['slingSeq', 'DESC']],
    limit: Math.min(10, Math.max(1, sling.ledgerCount - ifMatch)),
    transaction: context.transaction,
  });
  throw new AppError(
    'stale',
    'Somebody changed this record since you opened it. Look at what is new, then decide.',
    {
      changes: rows.map((row) => ({
        seq: row.slingSeq,
        type: row.type,
        at: row.at.toISOString(),
        by: row.actorName,
      })),
    },
  );
}
