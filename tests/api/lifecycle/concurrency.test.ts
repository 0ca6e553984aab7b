import { randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../../shared/schemas/slings';
import { buildSlingRequest } from '../../factories/slingRequest';
import { openTestStore, type TestStore } from '../../support/testStore';
import { expectStatus, openWork, type Work } from '../../support/work';
import { problemOf, tryAct, verifyLedger } from './calls';

let store: TestStore;
let work: Work;
const CLIENTS = 20;

beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
  // Signed in beforehand, so that all requests set off together.
  for (const account of ['storekeeper', 'storekeeper2', 'inspector', 'inspector2', 'manager', 'manager2']) {
    await store.signIn(account);
  }
});
afterAll(() => store.close());

const atOnce = <T>(count: number, start: (index: number) => Promise<T>): Promise<T[]> =>
  Promise.all(Array.from({ length: count }, (_, index) => start(index)));
const withStatus = (answers: readonly Response[], status: number): Response[] =>
  answers.filter((answer) => answer.status === status);
const statusesOf = (answers: readonly Response[]): number[] => answers.map(({ status }) => status).sort();

async function held(): Promise<Sling> {
  const sling = await work.register();
  return work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'damage_suspected' }] });
}
async function countRows(sling: Sling): Promise<number> {
  const [row] = await store.database.adminQuery('SELECT COUNT(*) AS n FROM ledger WHERE sling_id = ?', [
    sling.id,
  ]);
  return Number(row?.n);
}

describe('twenty clients on one sling at once', () => {
  it('lets one of twenty with the same version win and tells the others what changed', async () => {
    const sling = await held();
    const acts = [
      ['manager', 'condemn', { note: 'Not worth evaluating' }],
      ['storekeeper', 'secure', { locationId: work.cageId }],
      ['manager2', 'report_lost', { note: 'Not found at the count' }],
      ['inspector', 'secure', { locationId: work.cageId }],
    ] as const;
    const answers = await atOnce(CLIENTS, (index) => {
      const [by, action, body] = acts[index % acts.length] ?? acts[0];
      return tryAct(store, by, sling.id, action, body, { 'If-Match': `"${sling.version}"` });
    });
    expect(withStatus(answers, 200)).toHaveLength(1);
    const losers = answers.filter(({ status }) => status !== 200);
    expect(losers.map(({ status }) => status)).toEqual(losers.map(() => 412));
    const winner = answers.find(({ status }) => status === 200)?.body as { event: { type: string } };
    for (const loser of losers) {
      expect(loser.type).toBe('application/problem+json');
      expect(problemOf(loser).changes).toEqual([
        expect.objectContaining({ seq: sling.version + 1, type: winner.event.type }),
      ]);
      expect(problemOf(loser).changes?.[0]?.by).not.toBe('');
    }
    expect(await countRows(sling)).toBe(sling.version + 1);
    expect(await verifyLedger(store, sling.id)).toMatchObject({ ok: true });
  });

  it('lets one of twenty without a version win and tells the others where the sling is now', async () => {
    const sling = await held();
    const answers = await atOnce(CLIENTS, (index) =>
      tryAct(store, index % 2 === 0 ? 'manager' : 'manager2', sling.id, 'condemn', {
        note: `Client ${index}`,
      }),
    );
    expect(statusesOf(answers)).toEqual([200, ...Array<number>(CLIENTS - 1).fill(409)]);
    for (const loser of withStatus(answers, 409)) {
      const problem = problemOf(loser);
      expect(problem.type.endsWith('illegal-transition')).toBe(true);
      expect(problem.from).toBe('held');
      expect(problem.allowed).not.toContain('condemn');
      expect(problem.allowed).toContain('destroy');
    }
    expect(await countRows(sling)).toBe(sling.version + 1);
  });

  it('never lets a hold lose against an acceptance: whichever comes first, the sling ends held', async () => {
    const sling = await work.register();
    await work.confirm(sling, await work.label(sling));
    await work.inspect(sling, 'initial');
    const [accepted, ...holds] = await Promise.all([
      tryAct(store, 'inspector', sling.id, 'accept'),
      ...['storekeeper', 'manager', 'inspector2'].map((by) =>
        tryAct(store, by, sling.id, 'hold', { reasons: [{ code: 'latch' }] }),
      ),
    ]);
    expect(statusesOf(holds)).toEqual([200, 200, 200]);
    expect([200, 409]).toContain(accepted.status);
    const now = await work.read(sling.id);
    expect(now).toMatchObject({ state: 'held', mayUse: false });
    expect(now.openReasons).toHaveLength(3);
  });

  it('counts twenty holds at once, each with its reason, whatever version they know', async () => {
    const sling = await work.inService();
    const people = ['storekeeper', 'storekeeper2', 'inspector', 'inspector2', 'manager', 'manager2'];
    const answers = await atOnce(CLIENTS, (index) =>
      tryAct(
        store,
        people[index % people.length] ?? 'storekeeper',
        sling.id,
        'hold',
        { reasons: [{ code: 'other', note: `Client ${index}` }] },
        { 'If-Match': '"1"' },
      ),
    );
    expect(statusesOf(answers)).toEqual(Array<number>(CLIENTS).fill(200));
    const now = await work.read(sling.id);
    expect(now.state).toBe('held');
    expect(new Set(now.openReasons.map(({ note }) => note))).toEqual(
      new Set(Array.from({ length: CLIENTS }, (_, index) => `Client ${index}`)),
    );
    expect(now.version).toBe(sling.version + CLIENTS);
    expect(await verifyLedger(store, sling.id)).toMatchObject({ ok: true });
  });
});

describe('a check of the ledger while others write', () => {
  it('sees one moment: what is written meanwhile is no fault', async () => {
    const sling = await work.register();
    const isDone = { value: false };
    const writing = atOnce(4, async (index) => {
      for (let round = 0; round < 8; round += 1) {
        const reasons = [{ code: 'other', note: `Client ${index}, round ${round}` }];
        expectStatus(await tryAct(store, 'storekeeper', sling.id, 'hold', { reasons }), 200);
      }
    }).finally(() => {
      isDone.value = true;
    });
    const checks = [await verifyLedger(store, sling.id)];
    while (!isDone.value) checks.push(await verifyLedger(store, sling.id));
    await writing;
    expect(checks.filter(({ ok }) => !ok)).toEqual([]);
    expect(await verifyLedger(store, sling.id)).toMatchObject({ ok: true, rows: 33 });
  });
});

describe('the same request again', () => {
  it('acts once for ten at once under one key, with the same answer to all', async () => {
    const sling = await work.register();
    const key = randomUUID();
    const hold = () =>
      tryAct(
        store,
        'storekeeper',
        sling.id,
        'hold',
        { reasons: [{ code: 'damage_suspected', note: 'Once' }] },
        { 'Idempotency-Key': key },
      );
    const answers = await atOnce(10, hold);
    expect(statusesOf(answers)).toEqual(Array<number>(10).fill(200));
    for (const answer of answers) expect(answer.body).toEqual(answers[0]?.body);
    const later = await hold();
    expect(later.body).toEqual(answers[0]?.body);
    const now = await work.read(sling.id);
    expect(now.openReasons).toHaveLength(1);
    expect(now.version).toBe(sling.version + 1);
  });

  it('refuses the key for another body, another sling or another action with 422 and does nothing', async () => {
    const [sling, other] = [await work.register(), await work.register()];
    const headers = { 'Idempotency-Key': randomUUID() };
    const body = { reasons: [{ code: 'latch' }] };
    expectStatus(await tryAct(store, 'storekeeper', sling.id, 'hold', body, headers), 200);
    const answers = [
      await tryAct(
        store,
        'storekeeper',
        sling.id,
        'hold',
        { reasons: [{ code: 'latch', note: 'Other' }] },
        headers,
      ),
      await tryAct(
        store,
        'storekeeper',
        sling.id,
        'hold',
        { reasons: [{ code: 'overload_or_shock' }] },
        headers,
      ),
      await tryAct(store, 'storekeeper', other.id, 'hold', body, headers),
      await tryAct(store, 'storekeeper', sling.id, 'secure', { locationId: work.cageId }, headers),
    ];
    expect(statusesOf(answers)).toEqual([422, 422, 422, 422]);
    expect((await work.read(sling.id)).version).toBe(sling.version + 1);
    expect((await work.read(other.id)).state).toBe('received');
  });

  it('keeps the keys of two people apart', async () => {
    const sling = await work.register();
    const headers = { 'Idempotency-Key': randomUUID() };
    const body = { reasons: [{ code: 'latch' }] };
    expectStatus(await tryAct(store, 'storekeeper', sling.id, 'hold', body, headers), 200);
    expectStatus(await tryAct(store, 'storekeeper2', sling.id, 'hold', body, headers), 200);
    expect((await work.read(sling.id)).openReasons).toHaveLength(2);
  });

  it('leaves a refused request open, so that the same key acts once the need is met', async () => {
    const sling = await work.register();
    await work.confirm(sling, await work.label(sling));
    const headers = { 'Idempotency-Key': randomUUID() };
    expectStatus(await tryAct(store, 'inspector', sling.id, 'accept', {}, headers), 422);
    await work.inspect(sling, 'initial');
    expectStatus(await tryAct(store, 'inspector', sling.id, 'accept', {}, headers), 200);
  });
});

describe('the same sling registered twice at once', () => {
  const registerAtOnce = async (bodies: object[]): Promise<Response[]> => {
    const agent = await store.signIn('storekeeper');
    return Promise.all(bodies.map((body) => agent.post('/api/slings').send(body)));
  };

  it('puts one on the books for ten with the same number', async () => {
    const { number } = buildSlingRequest(store.places.slipStore.id);
    const answers = await registerAtOnce(
      Array.from({ length: 10 }, () => buildSlingRequest(store.places.slipStore.id, { number })),
    );
    expect(statusesOf(answers)).toEqual([201, ...Array<number>(9).fill(409)]);
    for (const loser of withStatus(answers, 409)) expect(problemOf(loser).type).toMatch(/duplicate$/);
  });

  it('puts one on the books for ten with the same maker and serial', async () => {
    const { maker, makerSerial } = buildSlingRequest(store.places.slipStore.id);
    const answers = await registerAtOnce(
      Array.from({ length: 10 }, () => buildSlingRequest(store.places.slipStore.id, { maker, makerSerial })),
    );
    expect(statusesOf(answers)).toEqual([201, ...Array<number>(9).fill(409)]);
    for (const loser of withStatus(answers, 409)) expect(problemOf(loser).type).toMatch(/duplicate$/);
    const [row] = await store.database.adminQuery('SELECT COUNT(*) AS n FROM slings WHERE maker_serial = ?', [
      makerSerial,
    ]);
    expect(Number(row?.n)).toBe(1);
  });
});
