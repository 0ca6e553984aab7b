import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling, SlingSummary } from '../../shared/schemas/slings';
import { buildSlingRequest } from '../factories/slingRequest';
import { expectProblem } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

async function list(query: Record<string, string | number>, by = 'storekeeper'): Promise<SlingSummary[]> {
  const answer = await (await store.signIn(by)).get('/api/slings').query({ limit: 200, ...query });
  return expectStatus<{ items: SlingSummary[] }>(answer, 200).items;
}

describe('the list', () => {
  const numbers = (items: SlingSummary[]): string[] => items.map(({ number }) => number).sort();
  let held: Sling;
  let cage: Sling;
  let used: Sling;
  let elsewhere: Sling;
  beforeAll(async () => {
    await work.register({
      kind: 'wire-rope',
      number: 'LIST-1',
      lot: 'BATCH-9/7',
      maker: 'Zephyr Cordage',
    });
    held = await work.register({ number: 'LIST-2' });
    await work.act('storekeeper', held, 'hold', { reasons: [{ code: 'latch' }] });
    cage = await work.register({ number: 'LIST-3' });
    await work.act('storekeeper', cage, 'hold', { reasons: [{ code: 'overload_or_shock' }] });
    await work.act('storekeeper', cage, 'secure', { locationId: work.cageId });
    await work.act('manager', cage, 'condemn', { note: 'No use' });
    used = await work.inService({ number: 'LIST-4' });
    const body = buildSlingRequest(store.places.bladeHall.id, { number: 'LIST-5', maker: 'Zephyr Cordage' });
    elsewhere = expectStatus<Sling>(
      await (await store.signIn('storekeeper2')).post('/api/slings').send(body),
      201,
    );
  });

  it('filters by state, kind, custody, security, condemnation and label', async () => {
    const all = async (query: Record<string, string>): Promise<string[]> =>
      numbers(await list({ q: 'LIST-', ...query }));
    expect(await all({})).toEqual(['LIST-1', 'LIST-2', 'LIST-3', 'LIST-4']);
    expect(await all({ state: 'held' })).toEqual(['LIST-2', 'LIST-3']);
    expect(await all({ state: 'in_service' })).toEqual(['LIST-4']);
    expect(await all({ kind: 'wire-rope' })).toEqual(['LIST-1']);
    expect(await all({ custody: 'cage' })).toEqual(['LIST-3']);
    expect(await all({ state: 'held', secured: 'false' })).toEqual(['LIST-2']);
    expect(await all({ condemned: 'true' })).toEqual(['LIST-3']);
    expect(await all({ label: 'live' })).toEqual(['LIST-4']);
    expect(await all({ label: 'none' })).toEqual(['LIST-1', 'LIST-2', 'LIST-3']);
    expect(await all({ state: 'held', kind: 'wire-rope' })).toEqual([]);
  });

  it('says of each why it may not be used, and what holds it', async () => {
    const rows = new Map((await list({ q: 'LIST-' })).map((row) => [row.number, row]));
    expect(rows.get('LIST-4')).toMatchObject({ mayUse: true, mayNotUse: [], due: 'ok', openReasonCodes: [] });
    expect(rows.get('LIST-2')).toMatchObject({ mayUse: false, openReasonCodes: ['latch'] });
    expect(rows.get('LIST-3')).toMatchObject({ condemned: true, custody: { kind: 'cage' } });
  });

  it('sorts the due ones into overdue, soon and ok, by the day of the site', async () => {
    const dues: [string, number, string][] = [
      ['DUE-1', -1, 'overdue'],
      ['DUE-2', 0, 'soon'],
      ['DUE-3', 30, 'soon'],
      ['DUE-4', 31, 'ok'],
    ];
    const today = new Intl.DateTimeFormat('en-CA', { timeZone: 'Europe/London' }).format(new Date());
    for (const [number, offset] of dues) {
      const { id } = await work.register({ number });
      await store.database.adminQuery(
        'UPDATE slings SET next_due_on = DATE_ADD(?, INTERVAL ? DAY) WHERE id = ?',
        [today, offset, id],
      );
    }
    for (const state of ['overdue', 'soon', 'ok']) {
      const rows = await list({ q: 'DUE-', due: state });
      expect(numbers(rows)).toEqual(dues.filter(([, , due]) => due === state).map(([number]) => number));
      expect(rows.every(({ due }) => due === state)).toBe(true);
    }
    const sorted = (await list({ q: 'DUE-', sort: 'nextDueOn' })).map(({ number }) => number);
    expect(sorted).toEqual(dues.map(([number]) => number));
  });

  it('finds by number, serial, lot, maker and tag code in any writing', async () => {
    const code = used.tag?.code ?? '';
    const finds = async (q: string): Promise<string[]> => numbers(await list({ q }));
    expect(await finds('list-1')).toEqual(['LIST-1']);
    expect(await finds('  LIST-1  ')).toEqual(['LIST-1']);
    expect(await finds(used.makerSerial ?? '')).toEqual(['LIST-4']);
    expect(await finds((used.makerSerial ?? '').toLowerCase())).toEqual(['LIST-4']);
    expect(await finds('BATCH-9/7')).toEqual(['LIST-1']);
    expect(await finds('batch')).toEqual(['LIST-1']);
    expect(await finds('Zephyr')).toEqual(['LIST-1']);
    expect(await finds('cordage')).toEqual(['LIST-1']);
    for (const writing of [
      code,
      code.toLowerCase(),
      `${code.slice(0, 4)}-${code.slice(4, 7)}-${code.slice(7)}`,
      `${code.slice(0, 4)} ${code.slice(4)}`,
      code.replaceAll('0', 'o').replaceAll('1', 'l'),
      code.slice(0, 6),
    ]) {
      expect(await finds(writing), writing).toEqual(['LIST-4']);
    }
  });

  it('finds nothing by what only looks like a pattern', async () => {
    for (const q of ['%', '_', '\\', '*', '"', '+-~<>()', '@', "LIST-2' OR '1'='1", 'LIST-2 -- x']) {
      expect(await list({ q, state: 'held' }), q).toEqual([]);
    }
    expect(numbers(await list({ q: 'LIST_2', state: 'held' }))).toEqual(['LIST-2']);
  });

  it.each([
    'colour=red',
    'limit=0',
    'limit=201',
    'limit=many',
    'limit=5&limit=6',
    'state=broken',
    'state=',
    'siteId=abc',
    'cursor=nonsense',
    `cursor=${Buffer.from('{"a":1}').toString('base64url')}`,
    `cursor=${Buffer.from('[1,"x"]').toString('base64url')}`,
    'sort=maker',
    `q=${'x'.repeat(81)}`,
  ])('refuses ?%s as malformed', async (query) => {
    expectProblem(await (await store.signIn('storekeeper')).get(`/api/slings?${query}`), 400, 'malformed');
  });

  describe('across sites', () => {
    it('shows each person the slings of their own sites alone', async () => {
      expect(numbers(await list({ q: 'LIST-' }, 'storekeeper2'))).toContain('LIST-5');
      expect(numbers(await list({ q: 'LIST-' }))).not.toContain('LIST-5');
      expect(await list({ siteId: store.places.bladeHall.id })).toEqual([]);
      expect(numbers(await list({ siteId: store.places.bladeHall.id }, 'storekeeper2'))).toEqual(['LIST-5']);
    });

    it('answers 404 on every call about a sling of another site, the same as for one that is not', async () => {
      const label = await (
        await store.signIn('storekeeper2')
      )
        .post('/api/label-runs')
        .send({ slingIds: [elsewhere.id], stock: 'roll-203-flat' });
      const run = expectStatus<{ id: number; tags: { code: string }[] }>(label, 201);
      const code = run.tags[0]?.code ?? '';
      const manager = await store.signIn('manager');
      const inspector = await store.signIn('inspector');
      const path = `/api/slings/${elsewhere.id}`;
      const hold = { reasons: [{ code: 'damage_suspected' }] };
      const answers = await Promise.all([
        manager.get(path),
        manager.patch(path).send({ notes: 'x' }),
        manager.post(`${path}/certificates`).send({ basis: 'assembly', testedOn: '2026-01-01', number: '1' }),
        manager.post(`${path}/actions/hold`).send(hold),
        manager.post(`${path}/actions/report_lost`).send({ note: 'x' }),
        manager.get(`${path}/inspections`),
        inspector.post(`${path}/inspections`).send({ type: 'frequent', answers: [], restClean: true }),
        inspector
          .post(`${path}/corrections`)
          .send({ changes: { number: 'X' }, reason: 'x', evidenceFileIds: [await work.photo()] }),
        manager.get(`/api/criteria/alloy-chain?slingId=${elsewhere.id}`),
        manager.get(`/api/ledger?slingId=${elsewhere.id}`),
        manager.get(`/api/ledger/verify?slingId=${elsewhere.id}`),
        manager.get(`/api/tags/${code}`),
        manager.post(`/api/tags/${code}/confirm`).send({ via: 'camera', lastFour: 'IST5' }),
        manager.post(`/api/tags/${code}/void`).send({ reason: 'lost', note: 'x' }),
        manager.get(`/api/label-runs/${run.id}`),
        manager.get(`/api/label-runs/${run.id}/pdf`),
        manager.post('/api/label-runs').send({ slingIds: [elsewhere.id], stock: 'roll-203-flat' }),
      ]);
      expect(answers.map(({ status }) => status)).toEqual(answers.map(() => 404));
      for (const answer of answers) expectProblem(answer, 404, 'not-found');
      expect((await work.read(elsewhere.id, 'storekeeper2')).version).toBe(2);
    });
  });
});

describe('paging', () => {
  it.each(['number', '-number', 'nextDueOn', 'stateSince', '-createdAt'])(
    'by %s shows each sling once, while others are being registered',
    async (sort) => {
      const agent = await store.signIn('storekeeper');
      const before = (await list({})).map(({ id }) => id);
      while (before.length <= 25) before.push((await work.register()).id);
      const seen: number[] = [];
      let cursor: string | null = null;
      let pages = 0;
      do {
        const answer = await agent
          .get('/api/slings')
          .query({ sort, limit: 7, ...(cursor ? { cursor } : {}) });
        const page = expectStatus<{ items: SlingSummary[]; nextCursor: string | null }>(answer, 200);
        expect(page.items.length).toBeLessThanOrEqual(7);
        seen.push(...page.items.map(({ id }) => id));
        cursor = page.nextCursor;
        pages += 1;
        if (pages <= 3) await work.register({ number: `A${sort}${pages}${Math.random()}`.slice(0, 40) });
      } while (cursor !== null);
      expect(new Set(seen).size).toBe(seen.length);
      expect(before.filter((id) => !seen.includes(id))).toEqual([]);
    },
  );

  it('holds fifty slings when no limit is asked for, and at most two hundred', async () => {
    const agent = await store.signIn('storekeeper');
    const total = (await list({})).length;
    const answer = await agent.get('/api/slings');
    const page = expectStatus<{ items: unknown[]; nextCursor: string | null }>(answer, 200);
    expect(page.items).toHaveLength(Math.min(50, total));
    expect(page.nextCursor === null).toBe(total <= 50);
  });
});
