import { randomBytes } from 'node:crypto';
import { gzipSync } from 'node:zlib';
import type TestAgent from 'supertest/lib/agent';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { ROUTE_ACCESS, type RouteKey } from '../../shared/domain/access/routes';
import { SLING_ACTIONS } from '../../shared/domain/lifecycle/actions';
import { SLING_KINDS } from '../../shared/domain/slings/kinds';
import { drawTagCode } from '../../shared/domain/tags/tagCode';
import { buildSlingRequest } from '../factories/slingRequest';
import {
  addPerson,
  countRows,
  expectProblem,
  findProblemFault,
  openSecondApp,
  PERSON_PASSWORD,
  signInTo,
} from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
/** Somebody with every role, so that nothing but the input stands in the way. */
let agent: TestAgent;
let email = '';
const params: Record<string, string> = {};

/** A server whose limits on repeated calls have counted nothing yet. */
async function startAnew(): Promise<void> {
  agent = await signInTo(openSecondApp(store, { trustProxy: 1 }), email, PERSON_PASSWORD);
}

beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
  const person = await addPerson(store, {
    roles: ['storekeeper', 'inspector', 'manager', 'admin'],
    designations: [
      {
        kinds: [...SLING_KINDS],
        designatedBy: 'A',
        designatedOn: '2020-01-01',
        until: null,
        isQualified: true,
      },
    ],
  });
  email = person.email;
  await startAnew();
  const sling = await work.register();
  await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
  await work.act('storekeeper', sling, 'secure', { locationId: work.cageId });
  const evaluator = expectStatus<{ id: number }>(
    await agent
      .post('/api/evaluators')
      .send({ name: 'Fennel & Stroud', email: 'f@s.example', isMaker: false, mayRepair: ['alloy-chain'] }),
    201,
  );
  const shipment = expectStatus<{ id: number; lines: { id: number }[] }>(
    await agent.post('/api/shipments').send({
      evaluatorId: evaluator.id,
      siteId: store.places.slipStore.id,
      lines: [{ slingId: sling.id, purpose: 'evaluate' }],
      expectedBackOn: '2099-01-01',
    }),
    201,
  );
  Object.assign(params, {
    slings: String(sling.id),
    users: String(person.user.id),
    shipments: String(shipment.id),
    lineId: String(shipment.lines[0]?.id),
    code: await work.label(sling),
    token: 'x'.repeat(43),
  });
});
afterAll(() => store.close());

const WRITES = (Object.keys(ROUTE_ACCESS) as RouteKey[]).filter(
  (route) => !route.startsWith('GET') && route !== 'DELETE /api/session' && !route.endsWith('/files'),
);
/** Every write with real records in its path, each action of the lifecycle on its own. */
const TARGETS = WRITES.flatMap((route) =>
  route.endsWith(':action') ? SLING_ACTIONS.map((action) => route.replace(':action', action)) : [route],
);

let caller = 0;
function send(target: string, type: string, body: string | Buffer, headers: Record<string, string> = {}) {
  const [method = '', path = ''] = target.split(' ');
  const filled = path
    .replace(/\/(\w+)\/:id/, (_, noun: string) => `/${noun}/${params[noun] ?? '1'}`)
    .replace(/:(\w+)/g, (_, name: string) => params[name] ?? name);
  caller += 1;
  const verb = method.toLowerCase() as 'post' | 'put' | 'patch';
  const request = agent[verb](filled)
    .set('Content-Type', type)
    // Each from an address of its own: limits on guesses are tested elsewhere.
    .set('X-Forwarded-For', `10.${caller >> 16}.${(caller >> 8) & 255}.${caller & 255}`)
    .set(headers);
  // A serialiser that does nothing: superagent would write buffers as JSON.
  return request.serialize((data: unknown) => data as string).send(body as string);
}

const JSON_TYPE = 'application/json';
const deep = `${'['.repeat(20_000)}${']'.repeat(20_000)}`;
const deepObject = `${'{"a":'.repeat(20_000)}1${'}'.repeat(20_000)}`;
const GARBAGE: unknown[] = [
  null,
  true,
  1.5,
  -1,
  1e308,
  'x',
  '',
  [],
  [null],
  {},
  { $gt: '' },
  { toString: 'x' },
];
/** A body whose every field that any route knows holds something else than it should. */
const everyFieldAs = (value: unknown): string =>
  JSON.stringify(
    Object.fromEntries(
      'number kind spec maker makerSerial siteId legs reachMm ratedLoads fittings receivedOn makersTag serviceClass notes cost photoIds changes reason evidenceFileIds basis testedOn reasons locationId clear note condemnation inspectionId reasonId method password cause type inspectedOn answers restClean stricter slingIds stock startAt via lastFour name email roles siteIds endsOn designations timeZone ruleSets purpose isMaker mayRepair evaluatorId lines expectedBackOn outcome currentPassword newPassword loadUnit'
        .split(' ')
        .map((field) => [field, value]),
    ),
  );

const CASES: [string, number[], string, string | Buffer][] = [
  ['malformed JSON', [400], JSON_TYPE, '{"number": "TS-1"'],
  ['JSON with a comment', [400], JSON_TYPE, '{} // so'],
  ['a bare string', [400], JSON_TYPE, '"text"'],
  ['a bare null', [400], JSON_TYPE, 'null'],
  ['a list', [400], JSON_TYPE, '[1, 2, 3]'],
  ['bytes that are no text', [400], JSON_TYPE, Buffer.concat([Buffer.from('{"a":"'), randomBytes(64)])],
  ['lists nested twenty thousand deep', [400], JSON_TYPE, deep],
  ['objects nested twenty thousand deep', [400], JSON_TYPE, deepObject],
  [
    'keys of the prototype',
    [400, 422],
    JSON_TYPE,
    '{"__proto__":{"isAdmin":true},"constructor":{"prototype":{}}}',
  ],
  ['a megabyte in one string', [413], JSON_TYPE, JSON.stringify({ note: 'x'.repeat(1024 * 1024) })],
  ['a form', [415], 'application/x-www-form-urlencoded', 'number=TS-1'],
  ['plain text', [415], 'text/plain', '{}'],
  [
    'XML',
    [415],
    'application/xml',
    '<?xml version="1.0"?><!DOCTYPE a [<!ENTITY b SYSTEM "file:///etc/passwd">]><a>&b;</a>',
  ],
  ['JSON in a charset of its own', [415], 'application/json; charset=klingon', '{}'],
  ...GARBAGE.map((value): [string, number[], string, string] => [
    `every field as ${JSON.stringify(value) ?? 'nothing'}`,
    [400, 404, 409, 422],
    JSON_TYPE,
    everyFieldAs(value),
  ]),
];

/** These take no body, so an empty one is the right one for them. */
const isRight = (target: string, status: number): boolean =>
  status < 300 && /\/(link|send|destroyed|account)$/.test(target);

describe('every write', () => {
  beforeEach(startAnew);

  it.each(CASES)('refuses %s in words, and writes nothing', async (_, statuses, type, body) => {
    const before = await countRows(store);
    const wrong: string[] = [];
    for (let at = 0; at < TARGETS.length; at += 6) {
      const some = TARGETS.slice(at, at + 6);
      const answers = await Promise.all(some.map(async (target) => send(target, type, body)));
      answers.forEach((answer, index) => {
        const target = some[index] ?? '';
        if (isRight(target, answer.status)) return;
        const fault = findProblemFault(answer);
        if (fault) wrong.push(`${target}: ${fault.slice(0, 300)}`);
        // A record that is not there, as an invitation's made-up token, comes before the body.
        else if (!statuses.includes(answer.status) && answer.status !== 404) {
          wrong.push(`${target}: ${answer.status} ${answer.text.slice(0, 200)}`);
        }
      });
    }
    expect(wrong).toEqual([]);
    const after = await countRows(store);
    expect({ ...after, invitations: 0 }).toEqual({ ...before, invitations: 0 });
    expect((await agent.get('/readyz')).status).toBe(200);
  });

  it('refuses an unpacked size past the limit, and a packed body that is broken', async () => {
    const bomb = gzipSync(Buffer.from(JSON.stringify({ note: 'x'.repeat(50_000_000) })));
    expectProblem(await send('POST /api/slings', JSON_TYPE, bomb, { 'Content-Encoding': 'gzip' }), 413);
    const broken = await send('POST /api/slings', JSON_TYPE, bomb.subarray(0, 100), {
      'Content-Encoding': 'gzip',
    });
    expectProblem(broken, 400, 'malformed');
    const odd = await send('POST /api/slings', JSON_TYPE, '{}', { 'Content-Encoding': 'zebra' });
    expectProblem(odd, 415, 'unsupported-type');
  });

  it('leaves the prototype of all objects alone', () => {
    expect(({} as Record<string, unknown>).isAdmin).toBeUndefined();
  });
});

describe('a field', () => {
  const register = (body: object, headers: Record<string, string> = {}) =>
    agent.post('/api/slings').set(headers).send(body);
  const base = () => buildSlingRequest(store.places.slipStore.id);

  it.each([
    ['notes', 'x'.repeat(400_000)],
    ['maker', 'x'.repeat(400_000)],
    ['number', '🪝'.repeat(100_000)],
  ])('%s of half a megabyte is refused with its limit', async (field, value) => {
    const problem = expectProblem(await register({ ...base(), [field]: value }), 422, 'invalid');
    expect(problem.errors?.[0]).toMatchObject({
      path: field,
      message: expect.stringMatching(/At most/) as string,
    });
  });

  it('that nobody knows does not come in by the side, however deep', async () => {
    const body = `${JSON.stringify(base()).slice(0, -1)},"extra":${deepObject}}`;
    const answer = await send('POST /api/slings', JSON_TYPE, body, { 'Idempotency-Key': 'deep-1' });
    expectProblem(answer, 400, 'malformed');
  });

  it('with the prototype’s name among units is not kept', async () => {
    const body = JSON.stringify({ ...base(), enteredUnits: {} }).replace(
      '"enteredUnits":{}',
      '"enteredUnits":{"__proto__":"lb","reachMm":"ft"}',
    );
    const answer = await send('POST /api/slings', JSON_TYPE, body);
    if (answer.status === 201) expect(answer.body).toMatchObject({ enteredUnits: { reachMm: 'ft' } });
    else expectProblem(answer, answer.status);
  });

  it('of every kind that is wrong is named, all in one answer', async () => {
    const body = { ...base(), number: '', legs: 9, reachMm: -1, ratedLoads: { verticalKg: 0 } };
    const problem = expectProblem(await register(body), 422, 'invalid');
    expect((problem.errors ?? []).map(({ path }) => path).sort()).toEqual([
      'legs',
      'number',
      'ratedLoads.verticalKg',
      'reachMm',
    ]);
  });
});

describe('an id', () => {
  const code = drawTagCode(randomBytes);
  it.each([
    'GET /api/slings/999999',
    'GET /api/slings/0',
    'GET /api/slings/-1',
    'GET /api/slings/1.5',
    'GET /api/slings/1e3',
    'GET /api/slings/abc',
    'GET /api/slings/999999999999999999999999',
    "GET /api/slings/1'%20OR%20'1'='1",
    'GET /api/slings/%00',
    'GET /api/slings/1%20',
    'GET /api/slings/../../etc/passwd',
    'GET /api/slings/999999/inspections',
    'GET /api/files/00000000-0000-4000-8000-000000000000',
    'GET /api/files/..%2F..%2Fetc%2Fpasswd',
    'GET /api/label-runs/999999',
    'GET /api/label-runs/999999/pdf',
    'GET /api/label-stocks/none/test-page',
    'GET /api/shipments/999999',
    `GET /api/tags/${code}`,
    'GET /api/criteria/rubber-band',
    'GET /api/ledger?slingId=999999',
    'GET /api/ledger/verify?slingId=999999',
    'PATCH /api/slings/999999',
    'POST /api/slings/999999/inspections',
    'POST /api/slings/999999/corrections',
    'POST /api/slings/999999/certificates',
    'PATCH /api/users/999999',
    'POST /api/users/999999/link',
    'POST /api/shipments/999999/send',
    `POST /api/tags/${code}/confirm`,
    `POST /api/tags/${code}/void`,
    `POST /api/public/tags/${code}/reports`,
    `POST /api/public/tags/${code}/files`,
  ])('that is none answers 404: %s', async (target) => {
    const [method = '', path = ''] = target.split(' ');
    const verb = method.toLowerCase() as 'get' | 'post' | 'patch';
    const answer = method === 'GET' ? await agent.get(path) : await agent[verb](path).send({});
    expectProblem(answer, 404, 'not-found');
  });

  it('that cannot be decoded is malformed', async () => {
    expectProblem(await agent.get('/api/slings/%E0%A4%A'), 400, 'malformed');
  });
});

describe('a repeated request', () => {
  it.each(['', 'x'.repeat(129), 'with space', 'é'])(
    'needs a key of plain characters, not %o',
    async (key) => {
      const answer = await send('POST /api/slings', JSON_TYPE, '{"number":1}', {
        'Idempotency-Key': Buffer.from(key, 'utf8').toString('latin1'),
      });
      expectProblem(answer, 400, 'malformed');
    },
  );
});
