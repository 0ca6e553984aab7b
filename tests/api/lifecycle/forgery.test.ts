import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../../shared/schemas/slings';
import { verifyLedger } from './calls';
import { forge, insertLedger } from './forging';
import { openScenes, type Scenes } from './scenes';

let scenes: Scenes;

beforeAll(async () => {
  scenes = await openScenes();
});
afterAll(() => scenes.close());

describe('a forger who may drop triggers', () => {
  const fresh = async (): Promise<Sling> => {
    const sling = await scenes.work.register();
    for (const code of ['latch', 'damage_suspected', 'overload_or_shock']) {
      await scenes.work.act('storekeeper', sling, 'hold', { reasons: [{ code }] });
    }
    const now = await scenes.work.read(sling.id);
    expect(await verifyLedger(scenes.store, sling.id)).toMatchObject({
      ok: true,
      rows: now.version,
      slings: 1,
    });
    return now;
  };

  it.each([
    "actor_name = 'Somebody else'",
    'actor_id = NULL',
    'at = at - INTERVAL 1 SECOND',
    "type = 'moved'",
    "to_state = 'in_service'",
    "from_state = 'received'",
    'condemned = 1',
    "custody_kind = 'cage'",
    'custody_location_id = 1',
    `data = '{"verdict":"pass"}'`,
    "data = 'no JSON at all'",
    "data = CONCAT(data, ' ')",
    "prev_hash = REPEAT('1', 64)",
    "hash = REPEAT('1', 64)",
  ])('is found and named when a row’s %s', async (assignment) => {
    const sling = await fresh();
    await forge(
      scenes.store,
      `UPDATE ledger SET ${assignment} WHERE sling_id = ${sling.id} AND sling_seq = 3`,
    );
    const found = await verifyLedger(scenes.store, sling.id);
    expect(found.ok).toBe(false);
    expect(found.firstBad).toMatchObject({ slingId: sling.id });
    // A changed hash is seen at the row itself.
    expect(found.firstBad?.slingSeq).toBe(3);
    expect(found.firstBad?.message).toMatch(/Row 3/);
    // The check of everything names it as well.
    expect((await verifyLedger(scenes.store)).ok).toBe(false);
  });

  it.each(["state = 'in_service'", 'condemned = 1', "custody_kind = 'cage'"])(
    'is found when the record alone is changed: %s',
    async (assignment) => {
      const sling = await fresh();
      await forge(scenes.store, `UPDATE slings SET ${assignment} WHERE id = ${sling.id}`);
      const found = await verifyLedger(scenes.store, sling.id);
      expect(found.ok).toBe(false);
      expect(found.firstBad?.message).toMatch(/not what its last row says/);
    },
  );

  it('is found and named when a row is taken out, the first, one between or the last', async () => {
    for (const which of ['first', 'middle', 'last'] as const) {
      const sling = await fresh();
      const seq = { first: 1, middle: 3, last: sling.version }[which];
      await forge(scenes.store, `DELETE FROM ledger WHERE sling_id = ${sling.id} AND sling_seq = ${seq}`);
      const found = await verifyLedger(scenes.store, sling.id);
      expect([which, found.ok, found.firstBad?.slingId, found.firstBad?.slingSeq]).toEqual([
        which,
        false,
        sling.id,
        seq,
      ]);
    }
  });

  it('is found when the head is set back with the last row', async () => {
    const sling = await fresh();
    await forge(
      scenes.store,
      `DELETE FROM ledger WHERE sling_id = ${sling.id} AND sling_seq = ${sling.version}`,
    );
    await forge(scenes.store, `UPDATE slings SET ledger_count = ledger_count - 1 WHERE id = ${sling.id}`);
    expect((await verifyLedger(scenes.store, sling.id)).firstBad?.slingId).toBe(sling.id);
  });

  it('is found when two rows change places', async () => {
    const sling = await fresh();
    await forge(
      scenes.store,
      `UPDATE ledger SET sling_seq = 900 WHERE sling_id = ${sling.id} AND sling_seq = 2;
      UPDATE ledger SET sling_seq = 2 WHERE sling_id = ${sling.id} AND sling_seq = 3;
      UPDATE ledger SET sling_seq = 3 WHERE sling_id = ${sling.id} AND sling_seq = 900`,
    );
    expect((await verifyLedger(scenes.store, sling.id)).firstBad).toMatchObject({
      slingId: sling.id,
      slingSeq: 2,
    });
  });

  it('is found when a row was put in with a hash that is not its own', async () => {
    const sling = await fresh();
    // The database cannot compute the canonical form: it lets a well-placed row in, and the check names it.
    await insertLedger(scenes.store, 'adminQuery', sling, { type: 'secure', to: 'held' });
    expect((await verifyLedger(scenes.store, sling.id)).firstBad).toMatchObject({
      slingId: sling.id,
      slingSeq: sling.version + 1,
    });
  });

  it('leaves the guards as they were', async () => {
    const sling = await fresh();
    const { adminQuery } = scenes.store.database;
    for (const sql of [
      `UPDATE slings SET state = 'in_service' WHERE id = ${sling.id}`,
      `DELETE FROM ledger WHERE sling_id = ${sling.id}`,
      `UPDATE ledger SET actor_name = 'Me' WHERE sling_id = ${sling.id}`,
    ]) {
      await expect(adminQuery(sql)).rejects.toThrow(/45000/);
    }
  });
});
