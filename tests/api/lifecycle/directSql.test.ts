import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../../shared/schemas/slings';
import { insertLedger, readRow, type Account, type Forged } from './forging';
import { openScenes, type Scenes } from './scenes';

let scenes: Scenes;
/** A sling in each state that a forger would start from. */
let received: Sling;
let held: Sling;
let condemned: Sling;
let inService: Sling;
let rejected: Sling;

beforeAll(async () => {
  scenes = await openScenes();
  received = await scenes.work.register();
  held = await scenes.held();
  condemned = await scenes.condemned();
  inService = await scenes.work.inService();
  rejected = (await scenes.work.inspect(await scenes.work.inService(), 'frequent', { seen: ['chain.crack'] }))
    .sling;
});
afterAll(() => scenes.close());

const ACCOUNTS: Account[] = ['appQuery', 'adminQuery'];
/** The triggers' own refusal, or a right that the account does not have. */
const REFUSED = /45000|denied/;

async function expectRefused(account: Account, sql: string, values: unknown[] = []): Promise<void> {
  await expect(scenes.store.database[account](sql, values), `${account}: ${sql}`).rejects.toThrow(REFUSED);
}

describe.each(ACCOUNTS)('with %s, the sling’s row', (account) => {
  it.each([
    "state = 'in_service'",
    "state = 'held'",
    "state = 'departed'",
    'condemned = 1',
    'condemned = 0, condemned_by = NULL',
    "custody_kind = 'in_store'",
    'custody_location_id = NULL',
    'ledger_count = ledger_count + 1',
    'ledger_count = 0',
    "head_hash = REPEAT('0', 64)",
    "state = 'in_service', condemned = 0, condemned_by = NULL, ledger_count = ledger_count + 1",
    'last_in_service_seq = 1',
    'last_sent_seq = NULL, came_back_seq = 2',
    "state_since = '2020-01-01'",
    'condemned_by = 1',
  ])('is not moved by SET %s', async (assignment) => {
    // Whatever the statement is, one of these would change by it.
    const slings = [received, held, condemned, rejected];
    const before = await Promise.all(slings.map((sling) => readRow(scenes.store, sling)));
    const tries = await Promise.allSettled(
      slings.map((sling) =>
        scenes.store.database[account](`UPDATE slings SET ${assignment} WHERE id = ${sling.id}`),
      ),
    );
    expect(await Promise.all(slings.map((sling) => readRow(scenes.store, sling)))).toEqual(before);
    const errors = tries.flatMap((one) => (one.status === 'rejected' ? [String(one.reason)] : []));
    expect(errors.length).toBeGreaterThan(0);
    for (const error of errors) expect(error).toMatch(REFUSED);
  });

  it('is neither deleted nor put in as anything but received', async () => {
    await expectRefused(account, `DELETE FROM slings WHERE id = ${received.id}`);
    const shown = await scenes.store.database.adminQuery('SHOW COLUMNS FROM slings');
    const columns = shown
      .filter(({ Extra }) => !/auto_increment|generated/i.test(String(Extra)))
      .map(({ Field }) => String(Field));
    const copied = (changes: Record<string, string>): string =>
      columns.map((column) => changes[column] ?? `\`${column}\``).join(', ');
    const insert = (changes: Record<string, string>): string =>
      `INSERT INTO slings (${columns.join(', ')})
       SELECT ${copied({ number: "'FORGED'", maker_serial: "'FORGED'", ...changes })} FROM slings WHERE id = ${inService.id}`;
    await expectRefused(account, insert({}));
    const fresh = { ledger_count: '0', head_hash: "REPEAT('0', 64)", last_in_service_seq: 'NULL' };
    await expectRefused(account, insert({ ...fresh }));
    await expectRefused(account, insert({ ...fresh, state: "'received'", last_in_service_seq: '1' }));
  });
});

describe.each(ACCOUNTS)('with %s, a ledger row', (account) => {
  const refusedRows: [string, () => Sling, Forged, RegExp][] = [
    ['skips a place', () => held, { type: 'secure', to: 'held', seq: 99 }, /head of the chain/],
    ['takes a place again', () => held, { type: 'secure', to: 'held', seq: 1 }, /head of the chain/],
    [
      'follows another hash',
      () => held,
      { type: 'secure', to: 'held', prevHash: 'a'.repeat(64) },
      /head of the chain/,
    ],
    [
      'starts elsewhere',
      () => held,
      { type: 'accept', from: 'received', to: 'in_service' },
      /start from the state/,
    ],
    ['accepts a held sling', () => held, { type: 'accept', to: 'in_service' }, /lifecycle table/],
    ['releases what is condemned', () => condemned, { type: 'release', to: 'in_service' }, /lifecycle table/],
    [
      'ends a condemnation by hold',
      () => condemned,
      { type: 'hold', to: 'held', condemned: false },
      /lifecycle table/,
    ],
    ['condemns by hold', () => held, { type: 'hold', to: 'held', condemned: true }, /lifecycle table/],
    ['departs a condemned sling', () => condemned, { type: 'depart', to: 'departed' }, /lifecycle table/],
    ['destroys what is not condemned', () => held, { type: 'destroy', to: 'destroyed' }, /lifecycle table/],
    [
      'moves by an event of the record',
      () => held,
      { type: 'inspected', to: 'in_service' },
      /lifecycle table/,
    ],
    ['moves by an unknown event', () => held, { type: 'override', to: 'in_service' }, /lifecycle table/],
    ['registers it again', () => held, { type: 'registered', to: 'received' }, /lifecycle table/],
    [
      'releases over an open reason',
      () => held,
      { type: 'release', to: 'in_service' },
      /reason of a hold is still open/,
    ],
    [
      'releases what was rejected',
      () => rejected,
      { type: 'release', to: 'in_service' },
      /reason of a hold is still open/,
    ],
    [
      'accepts without a live label',
      () => received,
      { type: 'accept', to: 'in_service' },
      /No label is confirmed/,
    ],
  ];

  it.each(refusedRows)('is refused when it %s', async (_what, sling, forged, message) => {
    await expect(insertLedger(scenes.store, account, sling(), forged)).rejects.toThrow(message);
    const now = await readRow(scenes.store, sling());
    expect([now.ledger_count, now.state]).toEqual([sling().version, sling().state]);
  });

  it('is refused when no complete inspection has passed', async () => {
    const labelled = await scenes.work.register();
    await scenes.work.confirm(labelled, await scenes.work.label(labelled));
    await expect(
      insertLedger(scenes.store, account, labelled, { type: 'accept', to: 'in_service' }),
    ).rejects.toThrow(/No complete inspection/);
  });

  it('is never changed and never deleted', async () => {
    for (const change of [
      "actor_name = 'Somebody else'",
      "data = '{}'",
      "to_state = 'in_service'",
      "at = '2020-01-01'",
    ]) {
      await expectRefused(account, `UPDATE ledger SET ${change} WHERE sling_id = ${held.id}`);
    }
    await expectRefused(account, `DELETE FROM ledger WHERE sling_id = ${held.id}`);
    await expectRefused(
      account,
      `REPLACE INTO ledger SELECT * FROM ledger WHERE sling_id = ${held.id} LIMIT 1`,
    );
  });
});

describe.each(ACCOUNTS)('with %s, what the ledger’s rows stand on', (account) => {
  it('keeps a cleared reason cleared and a confirmed one confirmed', async () => {
    const { work } = scenes;
    const released = await scenes.held();
    await work.inspect(released, 'release');
    await work.act('inspector', released, 'release', scenes.releaseBody(released));
    const where = `WHERE sling_id = ${released.id}`;
    await expectRefused(account, `UPDATE hold_reasons SET cleared_at = NULL, cleared_by = NULL ${where}`);
    await expectRefused(account, `UPDATE hold_reasons SET clear_note = 'Another' ${where}`);
    await expectRefused(account, `DELETE FROM hold_reasons ${where}`);
    const confirmed = `WHERE sling_id = ${rejected.id}`;
    await expectRefused(account, `UPDATE hold_reasons SET cleared_at = UTC_TIMESTAMP(3) ${confirmed}`);
    await expectRefused(account, `UPDATE hold_reasons SET confirmed = 0 ${confirmed}`);
    await expectRefused(account, `UPDATE hold_reasons SET code = 'latch' ${confirmed}`);
    await expectRefused(account, `UPDATE hold_reasons SET placed_by = NULL ${confirmed}`);
    await expectRefused(account, `UPDATE hold_reasons SET placed_seq = 0 ${confirmed}`);
    await expectRefused(account, `UPDATE hold_reasons SET sling_id = ${received.id} ${confirmed}`);
    await expectRefused(account, `DELETE FROM hold_reasons ${confirmed}`);
  });

  it('never brings a void label back, nor moves a live one to another sling', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    await work.label(sling, 'lost');
    const isVoid = `WHERE sling_id = ${sling.id} AND status = 'void'`;
    await expectRefused(account, `UPDATE tags SET status = 'live' ${isVoid}`);
    await expectRefused(account, `UPDATE tags SET status = 'printed' ${isVoid}`);
    const live = `WHERE sling_id = ${inService.id} AND status = 'live'`;
    await expectRefused(account, `UPDATE tags SET status = 'printed' ${live}`);
    await expectRefused(account, `UPDATE tags SET sling_id = ${held.id} ${live}`);
    await expectRefused(account, `UPDATE tags SET code = '0000000000' ${live}`);
    await expectRefused(account, `DELETE FROM tags ${live}`);
  });

  it('never changes or deletes an inspection', async () => {
    const where = `WHERE sling_id = ${rejected.id}`;
    await expectRefused(account, `UPDATE inspections SET verdict = 'pass' ${where}`);
    await expectRefused(account, `UPDATE inspections SET inspector_id = 1 ${where}`);
    await expectRefused(account, `DELETE FROM inspections ${where}`);
  });
});

describe('the working account', () => {
  it.each([
    'DROP TRIGGER ledger_rows_stay',
    'CREATE TRIGGER mine BEFORE INSERT ON ledger FOR EACH ROW SET @a = 1',
    'ALTER TABLE slings DROP CONSTRAINT slings_condemned',
    'ALTER TABLE ledger ADD COLUMN extra INT',
    'DROP TABLE ledger',
    'TRUNCATE TABLE ledger',
    'RENAME TABLE ledger TO old_ledger',
    'CREATE TABLE mine (id INT)',
    'CREATE PROCEDURE mine() SELECT 1',
    "INSERT INTO lifecycle_transitions VALUES ('accept', 'held', 0, 'in_service', 0)",
    "UPDATE lifecycle_transitions SET to_state = 'in_service'",
    'DELETE FROM lifecycle_transitions',
    "INSERT INTO migrations (name) VALUES ('mine')",
    'SET GLOBAL read_only = 1',
    'GRANT ALL ON *.* TO CURRENT_USER()',
    'SELECT * FROM mysql.global_priv',
  ])('may not %s', async (sql) => {
    await expect(scenes.store.database.appQuery(sql)).rejects.toThrow(/denied/);
  });
});
