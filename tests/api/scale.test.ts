import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listSlings } from '../../server/queries/slingList';
import { slingsQuery } from '../../shared/schemas/slings';
import { openTestStore, type TestStore } from '../support/testStore';

const COUNT = Number(process.env.SCALE ?? 50_000);
let store: TestStore;
beforeAll(async () => {
  store = await openTestStore();
  const { slipStore, bladeHall } = store.places;
  const t = performance.now();
  await store.database.adminQuery(`
    INSERT INTO slings (number, kind, spec, maker, maker_serial, lot, received_on, site_id, service_class, legs,
      reach_mm, vertical_kg, entered_units, maker_limits, makers_tag, notes, state_since, custody_since, head_hash,
      next_due_on, created_at, updated_at)
    SELECT CONCAT('SC-', LPAD(seq, 7, '0')),
      ELT(1 + seq % 6, 'alloy-chain', 'wire-rope', 'metal-mesh', 'synthetic-web', 'synthetic-round', 'synthetic-rope'),
      '{}', ELT(1 + seq % 4, 'Tarn Forge', 'Oxbow Rope', 'Lacewing Mesh', 'Brightweave'), CONCAT('S', 1000000 + seq),
      CONCAT('LOT-', seq % 500), '2026-01-01', IF(seq % 10 = 0, ${bladeHall.id}, ${slipStore.id}), 'normal', 2, 3000,
      2000, '{}', '[]', 'legible', '', UTC_TIMESTAMP(3) - INTERVAL seq SECOND, UTC_TIMESTAMP(3), REPEAT('0', 64),
      IF(seq % 7 = 0, NULL, UTC_DATE() + INTERVAL CAST(seq % 600 AS SIGNED) - 100 DAY), UTC_TIMESTAMP(3), UTC_TIMESTAMP(3)
    FROM seq_1_to_${COUNT}`);
  console.error('insert', performance.now() - t);
  const t2 = performance.now();
  await store.database.adminQuery(`
    INSERT INTO ledger (sling_id, sling_seq, type, at, actor_name, from_state, to_state, condemned, custody_kind, data, prev_hash, hash)
    SELECT 1 + 100 * seq, 1, 'registered', UTC_TIMESTAMP(3), 'x', NULL, 'received', 0, 'in_store', '{}', REPEAT('0', 64), REPEAT('1', 64) FROM seq_0_to_${COUNT / 100 - 1};
    INSERT INTO ledger (sling_id, sling_seq, type, at, actor_name, from_state, to_state, condemned, custody_kind, data, prev_hash, hash)
    SELECT 1 + 100 * seq, 2, 'hold', UTC_TIMESTAMP(3), 'x', 'received', 'held', 0, 'unknown', '{}', REPEAT('1', 64), REPEAT('2', 64) FROM seq_0_to_${COUNT / 100 - 1};
    ANALYZE TABLE slings; `);
  console.error('hold', performance.now() - t2);
});
afterAll(() => store.close());

async function measure(query: object, sites: number[]) {
  const seen: string[] = [];
  const options = store.sequelize.options as { logging: unknown };
  options.logging = (sql: string) => seen.push(sql.replace(/^Executing \(.*?\): /, ''));
  const t = performance.now();
  const page = await listSlings(store.sequelize, sites, slingsQuery.parse(query), new Date());
  const ms = performance.now() - t;
  options.logging = false;
  const sql = seen.find((text) => /FROM slings s/.test(text)) ?? '';
  const rows = await store.database.adminQuery(
    `FLUSH STATUS; ${sql}; SHOW SESSION STATUS LIKE 'Handler_read%'`,
  );
  const reads = rows.reduce((sum, row) => sum + Number(row.Value), 0);
  const plan = await store.database.adminQuery(`EXPLAIN ${sql}`);
  return {
    ms,
    reads,
    page,
    plan: plan
      .filter((r) => r.table === 's' || r.table === 'slings')
      .map((r) => `${r.table}:${r.type}:${r.key}:${r.rows}:${r.Extra}`),
  };
}

describe('x', () => {
  it('y', async () => {
    const one = [store.places.slipStore.id];
    const two = [...one, store.places.bladeHall.id];
    for (const sites of [one, two]) {
      for (const query of [
        {},
        { sort: '-number' },
        { sort: 'nextDueOn' },
        { sort: 'stateSince' },
        { sort: '-createdAt' },
        { state: 'received' },
        { state: 'held' },
        { state: 'held', sort: 'stateSince' },
        { state: 'held', secured: 'false' },
        { kind: 'wire-rope' },
        { kind: 'wire-rope', state: 'held' },
        { custody: 'cage' },
        { custody: 'in_store' },
        { due: 'overdue' },
        { due: 'soon' },
        { due: 'overdue', sort: 'nextDueOn' },
        { label: 'none' },
        { label: 'live' },
        { condemned: 'true' },
        { q: 'SC-00401' },
        { q: 'SC-' },
        { q: 'S10401' },
        { q: 'LOT-77' },
        { q: 'Tarn' },
        { q: 'Tarn Forge', state: 'held' },
        { q: 'zzz' },
      ]) {
        const a = await measure({ limit: '50', ...query }, sites);
        const b = a.page.nextCursor
          ? await measure({ limit: '50', ...query, cursor: a.page.nextCursor }, sites)
          : null;
        console.error(
          sites.length,
          JSON.stringify(query),
          `n=${a.page.rows.length} reads=${a.reads} ms=${a.ms.toFixed(0)} next=${b?.reads} ${b?.ms.toFixed(0)}`,
          a.plan.join(' | '),
        );
      }
    }
    expect(1).toBe(1);
  }, 300000);
});
