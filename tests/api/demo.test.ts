import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Sequelize } from 'sequelize';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { connectDatabase } from '../../server/db/connection';
import { loadDemo } from '../../server/demo/loadDemo';
import { openDiskStore, type FileStore } from '../../server/files/fileStore';
import { Shipment } from '../../server/models/Shipment';
import { ShipmentLine } from '../../server/models/ShipmentLine';
import { Site } from '../../server/models/Site';
import { SlingRecord } from '../../server/models/SlingRecord';
import { User } from '../../server/models/User';
import { verifyLedger } from '../../server/queries/ledger';
import { dueState } from '../../shared/domain/inspection/due';
import { createTestDatabase, type TestDatabase } from '../support/freshDatabase';

const DAY_MS = 86_400_000;
/** Loading takes about half a minute on an idle machine, and tests are not run on idle ones. */
const LOAD_LIMIT_MS = 300_000;

let database: TestDatabase;
let sequelize: Sequelize;
let filesDir: string;
let slings: SlingRecord[];
const said: string[] = [];

beforeAll(async () => {
  database = await createTestDatabase();
  sequelize = connectDatabase(database.databaseUrl);
  filesDir = mkdtempSync(path.join(tmpdir(), 'slingward-demo-'));
});
afterAll(async () => {
  await sequelize.close();
  await database.drop();
  rmSync(filesDir, { recursive: true, force: true });
});

const load = (files: FileStore = openDiskStore(filesDir)): Promise<void> =>
  loadDemo({
    sequelize,
    files,
    publicUrl: 'https://slings.marram-quay.example',
    say: (line) => said.push(line),
  });

function countBy(keyOf: (sling: SlingRecord) => string): Record<string, number> {
  const counts: Record<string, number> = {};
  for (const sling of slings) counts[keyOf(sling)] = (counts[keyOf(sling)] ?? 0) + 1;
  return counts;
}

describe('a load that breaks off', () => {
  it('leaves nothing behind, so that the next start loads all of it', async () => {
    const full: FileStore = {
      ...openDiskStore(filesDir),
      put: () => Promise.reject(new Error('No space left.')),
    };
    await expect(load(full)).rejects.toThrow('No space left.');
    expect(await User.count()).toBe(0);
    expect(await Site.count()).toBe(0);
  });
});

describe('the demo', () => {
  beforeAll(async () => {
    await load();
    slings = await SlingRecord.findAll({ order: [['number', 'ASC']] });
  }, LOAD_LIMIT_MS);

  it('has slings in every state', () => {
    expect(countBy((sling) => sling.state)).toEqual({
      received: 14,
      in_service: 345,
      held: 24,
      sent_for_evaluation: 5,
      returned: 3,
      destroyed: 20,
      lost: 4,
      departed: 5,
    });
  });

  it('has all six kinds, at both sites', () => {
    expect(countBy((sling) => sling.kind)).toEqual({
      'alloy-chain': 120,
      'synthetic-web': 90,
      'synthetic-round': 80,
      'wire-rope': 80,
      'metal-mesh': 20,
      'synthetic-rope': 30,
    });
    const [slipStore = 0, bladeHall = 0] = Object.values(countBy((sling) => String(sling.siteId)));
    expect(slipStore + bladeHall).toBe(420);
    expect(slipStore).toBeGreaterThanOrEqual(295);
    expect(slipStore).toBeLessThanOrEqual(305);
  });

  it('numbers the slings in the order in which they came', () => {
    const numbers = slings.map((sling) => sling.number);
    expect(numbers).toEqual(
      Array.from({ length: 420 }, (_, index) => `MQ-${String(index + 1).padStart(4, '0')}`),
    );
    const days = slings.map((sling) => sling.receivedOn);
    expect(days).toEqual([...days].sort());
  });

  it('leaves five held slings unsecured since little more than a day, the others in a cage, four condemned', () => {
    const held = slings.filter((sling) => sling.state === 'held');
    const loose = held.filter((sling) => sling.custodyKind !== 'cage');
    expect(loose).toHaveLength(5);
    expect(held.filter((sling) => sling.condemned)).toHaveLength(4);
    for (const sling of loose) expect(Date.now() - sling.stateSince.getTime()).toBeLessThan(2 * DAY_MS);
  });

  it('spreads the next due dates: five overdue, twelve soon, the rest over the coming year', () => {
    const today = new Date().toISOString().slice(0, 10);
    const due = slings
      .filter((sling) => sling.state === 'in_service')
      .map((sling) => dueState(sling.nextDueOn ?? '', today));
    expect(due.filter((state) => state === 'overdue')).toHaveLength(5);
    expect(due.filter((state) => state === 'soon')).toHaveLength(12);
    expect(due.filter((state) => state === 'ok')).toHaveLength(328);
  });

  it('has one shipment that is late', async () => {
    const today = new Date().toISOString().slice(0, 10);
    const out = await ShipmentLine.findAll({ where: { outcome: null } });
    const shipments = await Shipment.findAll({ where: { id: out.map((line) => line.shipmentId) } });
    expect(out).toHaveLength(5);
    expect(shipments.filter((shipment) => shipment.expectedBackOn < today)).toHaveLength(1);
  });

  it('has every outcome that an evaluator gives, and the proof test of what was repaired', async () => {
    const lines = await ShipmentLine.findAll();
    const outcomes = lines.map((line) => line.outcome ?? 'out').sort();
    expect(outcomes.join(' ')).toBe(
      'destroyed destroyed fit fit fit out out out out out repaired repaired unfit',
    );
    for (const line of lines.filter(({ outcome }) => outcome === 'repaired')) {
      expect(line.proofLoadKg).not.toBeNull();
      expect(line.repairer).toBe('Tarn Forge Service');
    }
  });

  it('leaves a ledger that holds, in the order of time, with nothing in the future', async () => {
    const sites = await Site.findAll();
    const verified = await verifyLedger(sites.map((site) => site.id));
    expect(verified).toMatchObject({ ok: true, slings: 420 });
    expect(verified.rows).toBeGreaterThan(2500);
    const [row] = await database.adminQuery(
      `select sum(later) as backwards, max(at) as latest from (
         select at, lag(at) over (order by id) > at as later from ledger) as ordered`,
    );
    expect(Number(row?.backwards)).toBe(0);
    expect(row?.latest).toBeInstanceOf(Date);
    if (row?.latest instanceof Date) expect(row.latest.getTime()).toBeLessThanOrEqual(Date.now());
  });

  it('never lets one person both condemn and destroy, or place and release', async () => {
    const [row] = await database.adminQuery(
      `select
         (select count(*) from ledger d join ledger c on c.sling_id = d.sling_id and c.type = 'condemn'
           where d.type = 'destroy' and d.actor_id = c.actor_id) as condemners,
         (select count(*) from hold_reasons r join ledger l on l.sling_id = r.sling_id and l.sling_seq = r.cleared_seq
           where l.type = 'release' and r.placed_by = r.cleared_by) as placers`,
    );
    expect(Number(row?.condemners)).toBe(0);
    expect(Number(row?.placers)).toBe(0);
  });

  it('draws the same labels each time', async () => {
    const rows = await database.adminQuery(
      'select code from tags order by printed_at, run_id, run_position limit 3',
    );
    expect(rows.map((row) => row.code)).toEqual(['H2RSJEBHR9', '3XYYM7RAAN', '138FNF138F']);
  });

  it('is left as it is by a second start, which names the accounts again', async () => {
    const accounts = said.filter((line) => line.includes('@marram-quay.example'));
    expect(new Set(accounts).size).toBe(8);
    said.length = 0;
    await load();
    expect(await SlingRecord.count()).toBe(420);
    expect(said.filter((line) => line.includes('@marram-quay.example'))).toEqual(accounts);
  });
});
