import { QueryTypes, type Sequelize } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listSlings } from '../../server/queries/slingList';
import type { SummaryRow } from '../../server/queries/slingSummary';
import { slingsQuery } from '../../shared/schemas/slings';
import { openTestStore, type TestStore } from '../support/testStore';

/** Enough that a list that reads them all shows at once; `npm run bench` measures with more. */
const COUNT = 50_000;
const HELD_EVERY = 100;
const LABEL_EVERY = 2;

let store: TestStore;
let sites: { one: number[]; two: number[] };
beforeAll(async () => {
  store = await openTestStore();
  const { slipStore, bladeHall } = store.places;
  sites = { one: [slipStore.id], two: [slipStore.id, bladeHall.id] };
  await fillRegister(slipStore.id, bladeHall.id);
}, 120_000);
afterAll(() => store.close());

/** A tenth at the second site; numbers and ids run together, so that row n has id n. */
async function fillRegister(siteId: number, otherSiteId: number): Promise<void> {
  await store.database.adminQuery(`
    INSERT INTO slings (number, kind, spec, maker, maker_serial, lot, received_on, site_id, service_class, legs,
      reach_mm, vertical_kg, entered_units, maker_limits, makers_tag, notes, state_since, custody_since, head_hash,
      next_due_on, created_at, updated_at)
    SELECT CONCAT('SC-', LPAD(seq, 7, '0')),
      ELT(1 + seq % 6, 'alloy-chain', 'wire-rope', 'metal-mesh', 'synthetic-web', 'synthetic-round', 'synthetic-rope'),
      '{}', ELT(1 + (seq DIV ${HELD_EVERY}) % 4, 'Tarn Forge', 'Oxbow Rope', 'Lacewing Mesh', 'Brightweave'),
      CONCAT('S', 1000000 + seq), CONCAT('LOT-', seq % 500), '2026-01-01',
      IF(seq % 10 = 0, ${otherSiteId}, ${siteId}), 'normal', 2, 3000, 2000, '{}', '[]', 'legible', '',
      UTC_TIMESTAMP(3) - INTERVAL seq SECOND, UTC_TIMESTAMP(3), REPEAT('0', 64),
      IF(seq % 7 = 0, NULL, UTC_DATE() + INTERVAL CAST(seq % 600 AS SIGNED) - 100 DAY),
      UTC_TIMESTAMP(3), UTC_TIMESTAMP(3)
    FROM seq_1_to_${COUNT}`);
  const appendRows = (seq: number, type: string, from: string, to: string, custody: string): string => `
    INSERT INTO ledger (sling_id, sling_seq, type, at, actor_name, from_state, to_state, condemned, custody_kind,
      data, prev_hash, hash)
    SELECT 1 + ${HELD_EVERY} * seq, ${seq}, '${type}', UTC_TIMESTAMP(3), 'Ama Tull', ${from}, '${to}', 0, '${custody}',
      '{}', REPEAT('${seq - 1}', 64), REPEAT('${seq}', 64)
    FROM seq_0_to_${COUNT / HELD_EVERY - 1};`;
  await store.database.adminQuery(
    appendRows(1, 'registered', 'NULL', 'received', 'in_store') +
      appendRows(2, 'hold', "'received'", 'held', 'unknown') +
      `INSERT INTO label_runs (id, stock, start_at, warnings, created_by, created_by_name, created_at)
       VALUES (1, 'roll-203-flat', 1, '[]', 1, 'Ama Tull', UTC_TIMESTAMP(3));
       INSERT INTO tags (code, sling_id, status, payload, qr_level, qr_version, qr_mask, run_id, run_position, printed_at)
       SELECT LPAD(seq, 10, 'Z'), ${LABEL_EVERY} * seq, 'live', '', 'M', 3, 0, 1, seq, UTC_TIMESTAMP(3)
       FROM seq_1_to_${COUNT / LABEL_EVERY};
       ANALYZE TABLE slings, tags;`,
  );
}

interface Page {
  rows: SummaryRow[];
  nextCursor: string | null;
  /** Rows that the database's handlers read for it. */
  reads: number;
  /** How each table is reached, with no row of a whole table read one by one. */
  scans: string[];
}

/** Runs the product's own query, then the same statement again to see what the database did for it. */
async function readPage(siteIds: number[], query: Record<string, string>): Promise<Page> {
  let statement = '';
  const watched = Object.create(store.sequelize) as Sequelize;
  watched.query = ((sql: string, options: { replacements: unknown[] }) => {
    return store.sequelize.query<SummaryRow>(sql, {
      replacements: options.replacements,
      type: QueryTypes.SELECT,
      logging: (text: string) => {
        statement = text.replace(/^Executing \(\w+\): /, '');
      },
    });
  }) as Sequelize['query'];
  const page = await listSlings(watched, siteIds, slingsQuery.parse(query), new Date());
  expect(statement).toContain('FROM slings s');
  const { adminQuery } = store.database;
  const counted = await adminQuery(`FLUSH STATUS; ${statement}; SHOW SESSION STATUS LIKE 'Handler_read%'`);
  const plan = await adminQuery(`EXPLAIN ${statement}`);
  return {
    ...page,
    reads: counted.reduce((sum, row) => sum + Number(row.Value), 0),
    scans: plan
      .filter(({ table, type }) => (table === 's' || table === 'slings') && type === 'ALL')
      .map((row) => JSON.stringify(row)),
  };
}

/** A page of fifty with its joins, from two sites and their merge, and nothing that grows with the register. */
const FEW = 3000;

describe.each(['one', 'two'] as const)('a register of 50,000 slings, seen from %s of the sites', (which) => {
  it.each<Record<string, string>>([
    {},
    { sort: '-number' },
    { sort: 'nextDueOn' },
    { sort: 'stateSince' },
    { sort: '-createdAt' },
    { state: 'received' },
    { state: 'held' },
    { state: 'held', sort: 'stateSince' },
    { state: 'held', secured: 'false' },
    { state: 'held', kind: 'wire-rope' },
    { kind: 'metal-mesh' },
    { custody: 'in_store' },
    { custody: 'cage' },
    { due: 'overdue' },
    { due: 'overdue', sort: 'nextDueOn' },
    { due: 'soon' },
    { due: 'ok', sort: 'nextDueOn' },
    { label: 'live' },
    { q: 'SC-00401' },
    { q: 'S10401' },
    { q: 'LOT-77' },
    { q: 'ZZZZZZ123' },
    { q: 'nothing' },
  ])('gives a page of %o by an index, and the next one, reading few rows', async (query) => {
    const first = await readPage(sites[which], query);
    expect(first.scans).toEqual([]);
    expect(first.reads).toBeLessThan(FEW);
    if (!first.nextCursor) return;
    const next = await readPage(sites[which], { ...query, cursor: first.nextCursor });
    expect(next.scans).toEqual([]);
    expect(next.reads).toBeLessThan(FEW);
    const seen = new Set(first.rows.map(({ id }) => id));
    expect(next.rows.filter(({ id }) => seen.has(id))).toEqual([]);
  });
});

describe('the slings without a label', () => {
  it('are found without reading the whole table, though the more are labelled the longer it takes', async () => {
    const page = await readPage(sites.two, { label: 'none' });
    expect(page.scans).toEqual([]);
    expect(page.rows).toHaveLength(50);
  });
});

describe('a search in a large register', () => {
  it('finds all that match, however many others share the word', async () => {
    const ids: number[] = [];
    let cursor: string | null = null;
    do {
      const page: Page = await readPage(sites.two, {
        q: 'Tarn Forge',
        state: 'held',
        limit: '200',
        ...(cursor ? { cursor } : {}),
      });
      ids.push(...page.rows.map(({ id }) => id));
      cursor = page.nextCursor;
    } while (cursor);
    expect(ids).toHaveLength(COUNT / HELD_EVERY / 4);
    expect(ids).toEqual(Array.from(ids, (_, n) => 1 + 4 * HELD_EVERY * n));
  });

  it('reads as far as the pages go, also where everything matches', async () => {
    const page = await readPage(sites.one, { q: 'SC-', limit: '200', sort: '-number' });
    expect(page.rows[0]?.number).toBe(`SC-00${COUNT - 1}`);
    expect(page.nextCursor).not.toBeNull();
  });
});
