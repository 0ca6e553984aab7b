import { Op, QueryTypes, Transaction, type Sequelize } from 'sequelize';
import {
  canonicalJson,
  CHAIN_START,
  followChain,
  type LedgerContent,
} from '../../shared/domain/ledger/chain';
import type { LedgerEventType } from '../../shared/domain/lifecycle/events';
import type { CustodyKind, SlingState } from '../../shared/domain/lifecycle/states';
import type { LedgerRow, VerifyResponse } from '../../shared/schemas/ledger';
import { sha256 } from '../security/sha256';
import { LedgerEntry } from '../models/LedgerEntry';
import { SlingRecord } from '../models/SlingRecord';

export function presentLedgerRow(entry: LedgerEntry): LedgerRow {
  return { seq: entry.id, id: entry.id, ...contentOf(entry), hash: entry.hash };
}

function contentOf(entry: LedgerEntry): LedgerContent {
  return {
    slingId: entry.slingId,
    slingSeq: entry.slingSeq,
    type: entry.type as LedgerEventType,
    at: entry.at.toISOString(),
    actor: { id: entry.actorId, name: entry.actorName },
    from: entry.fromState as SlingState | null,
    to: entry.toState as SlingState,
    condemned: Boolean(entry.condemned),
    custody: { kind: entry.custodyKind as CustodyKind, locationId: entry.custodyLocationId },
    data: readData(entry.data),
    prevHash: entry.prevHash,
  };
}

/** Text that is not as it was written is shown as it stands, so that its hash no longer fits and the row is named. */
function readData(text: string): Record<string, unknown> {
  try {
    const data = JSON.parse(text) as Record<string, unknown>;
    return canonicalJson(data) === text ? data : { unreadable: text };
  } catch {
    return { unreadable: text };
  }
}

export async function listLedger(
  sequelize: Sequelize,
  siteIds: readonly number[],
  query: {
    slingId?: number | undefined;
    order: 'newest' | 'oldest';
    cursor?: string | undefined;
    limit: number;
  },
): Promise<{ items: LedgerRow[]; nextCursor: string | null }> {
  if (siteIds.length === 0) return { items: [], nextCursor: null };
  const direction = query.order === 'newest' ? 'DESC' : 'ASC';
  const cursor = query.cursor === undefined ? null : Number(query.cursor);
  const ids = await sequelize.query<{ id: number }>(
    `SELECT l.id FROM ledger l JOIN slings s ON s.id = l.sling_id
     WHERE s.site_id IN (:siteIds) ${query.slingId === undefined ? '' : 'AND l.sling_id = :slingId'}
       ${cursor === null ? '' : `AND l.id ${direction === 'DESC' ? '<' : '>'} :cursor`}
     ORDER BY l.id ${direction} LIMIT :limit`,
    {
      replacements: { siteIds: [...siteIds], slingId: query.slingId, cursor, limit: query.limit + 1 },
      type: QueryTypes.SELECT,
    },
  );
  const page = ids.slice(0, query.limit).map((row) => row.id);
  const entries = await LedgerEntry.findAll({ where: { id: page }, order: [['id', direction]] });
  const last = page.at(-1);
  return {
    items: entries.map(presentLedgerRow),
    nextCursor: ids.length > query.limit && last !== undefined ? String(last) : null,
  };
}

const BATCH = 500;

/**
 * Recomputes every hash of every chain (or of one sling's) and compares its end with the head that the sling keeps.
 * Reads in batches, so that a large ledger needs little memory, and all from one moment: an act that is written
 * meanwhile is no fault.
 */
export async function verifyLedger(siteIds: readonly number[], slingId?: number): Promise<VerifyResponse> {
  const { sequelize } = SlingRecord;
  if (!sequelize) throw new Error('The models are not defined yet.');
  return sequelize.transaction(
    { isolationLevel: Transaction.ISOLATION_LEVELS.REPEATABLE_READ, readOnly: true },
    (transaction) => verifyChains(transaction, siteIds, slingId),
  );
}

async function verifyChains(
  transaction: Transaction,
  siteIds: readonly number[],
  slingId?: number,
): Promise<VerifyResponse> {
  let rows = 0;
  let slings = 0;
  for (let after = 0; ;) {
    const batch = await SlingRecord.findAll({
      attributes: ['id', 'ledgerCount', 'headHash', 'state', 'condemned', 'custodyKind', 'custodyLocationId'],
      where: {
        siteId: [...siteIds],
        id: slingId === undefined ? { [Op.gt]: after } : slingId,
      },
      order: [['id', 'ASC']],
      limit: BATCH,
      transaction,
    });
    for (const sling of batch) {
      const result = await verifyChain(sling, transaction);
      rows += result.rows;
      slings += 1;
      if (result.fault) return { ok: false, rows, slings, firstBad: { slingId: sling.id, ...result.fault } };
    }
    const last = batch.at(-1);
    if (slingId !== undefined || batch.length < BATCH || !last) return { ok: true, rows, slings };
    after = last.id;
  }
}

async function verifyChain(
  sling: SlingRecord,
  transaction: Transaction,
): Promise<{ rows: number; fault: { slingSeq: number; message: string } | null }> {
  let head = { seq: 0, hash: CHAIN_START };
  let last: LedgerEntry | null = null;
  for (;;) {
    const entries = await LedgerEntry.findAll({
      where: { slingId: sling.id, slingSeq: { [Op.gt]: head.seq } },
      order: [['slingSeq', 'ASC']],
      limit: BATCH,
      transaction,
    });
    const result = followChain(
      entries.map((entry) => ({ ...contentOf(entry), hash: entry.hash })),
      head,
      sha256,
    );
    if (result.fault) return { rows: head.seq, fault: result.fault };
    head = result;
    last = entries.at(-1) ?? last;
    if (entries.length < BATCH) break;
  }
  if (head.seq !== sling.ledgerCount || head.hash !== sling.headHash) {
    return {
      rows: head.seq,
      fault: {
        slingSeq: head.seq + 1,
        message: 'Rows at the end are missing: the sling’s own head is another.',
      },
    };
  }
  if (last && !isWhereRowSays(sling, last)) {
    return {
      rows: head.seq,
      fault: { slingSeq: head.seq, message: 'The sling’s state or place is not what its last row says.' },
    };
  }
  return { rows: head.seq, fault: null };
}

/** The record itself could have been changed past its guards, with every row left as it was. */
function isWhereRowSays(sling: SlingRecord, row: LedgerEntry): boolean {
  return (
    sling.state === row.toState &&
    Boolean(sling.condemned) === Boolean(row.condemned) &&
    sling.custodyKind === row.custodyKind &&
    sling.custodyLocationId === row.custodyLocationId
  );
}
