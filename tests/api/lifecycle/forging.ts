import { createHash } from 'node:crypto';
import type { Sling } from '../../../shared/schemas/slings';
import type { TestStore } from '../../support/testStore';

export type Account = 'appQuery' | 'adminQuery';

export async function readRow(store: TestStore, sling: Pick<Sling, 'id'>): Promise<Record<string, unknown>> {
  return (await store.database.adminQuery('SELECT * FROM slings WHERE id = ?', [sling.id]))[0] ?? {};
}

export interface Forged {
  type: string;
  to: string;
  from?: string;
  seq?: number;
  prevHash?: string;
  condemned?: boolean;
}

/** A ledger row as a forger would write it: all columns right but for what is forged. */
export async function insertLedger(
  store: TestStore,
  account: Account,
  sling: Pick<Sling, 'id'>,
  forged: Forged,
): Promise<void> {
  const now = await readRow(store, sling);
  await store.database[account](
    `INSERT INTO ledger (sling_id, sling_seq, type, at, actor_id, actor_name, from_state, to_state, condemned,
       custody_kind, custody_location_id, data, prev_hash, hash)
     VALUES (?, ?, ?, UTC_TIMESTAMP(3), NULL, 'Nobody', ?, ?, ?, ?, ?, '{}', ?, ?)`,
    [
      sling.id,
      forged.seq ?? Number(now.ledger_count) + 1,
      forged.type,
      forged.from ?? String(now.state),
      forged.to,
      forged.condemned ?? Boolean(now.condemned),
      now.custody_kind,
      now.custody_location_id,
      forged.prevHash ?? String(now.head_hash),
      createHash('sha256').update(JSON.stringify(forged)).digest('hex'),
    ],
  );
}

const GUARDS = ['ledger_rows_stay', 'ledger_rows_are_kept', 'slings_move_by_ledger'];

/** As somebody with every right and a grudge would do it: takes the guards away, acts, puts them back. */
export async function forge({ database: { adminQuery } }: TestStore, sql: string): Promise<void> {
  const bodies: string[] = [];
  for (const name of GUARDS) {
    const [shown] = await adminQuery(`SHOW CREATE TRIGGER ${name}`);
    bodies.push(String(shown?.['SQL Original Statement']));
    await adminQuery(`DROP TRIGGER ${name}`);
  }
  try {
    await adminQuery(sql);
  } finally {
    for (const body of bodies) await adminQuery(body);
  }
}
