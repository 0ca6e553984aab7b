import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import PDFDocument from 'pdfkit';
import { SLING_KINDS, type SlingKind } from '../../shared/domain/slings/kinds';
import type { CreateSlingInput, Sling, SlingSummary } from '../../shared/schemas/slings';
import { buildSlingRequest } from '../factories/slingRequest';
import { day, errorPaths, expectProblem } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
let siteId: number;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
  siteId = store.places.slipStore.id;
});
afterAll(() => store.close());

const post = async (body: object, by = 'storekeeper') =>
  (await store.signIn(by)).post('/api/slings').send(body);
const rackId = (): number =>
  store.places.locations.find((place) => place.purpose === 'rack' && place.siteId === siteId)?.id ?? 0;
const bladeRackId = (): number => store.places.locations.find((place) => place.name === 'Rack N')?.id ?? 0;

async function uploadPdf(): Promise<string> {
  const pdf = await new Promise<Buffer>((resolve) => {
    const document = new PDFDocument();
    const parts: Buffer[] = [];
    document.on('data', (part: Buffer) => parts.push(part)).on('end', () => resolve(Buffer.concat(parts)));
    document.text('Proof test certificate').end();
  });
  const answer = await (
    await store.signIn('storekeeper')
  )
    .post('/api/files')
    .attach('file', pdf, { filename: 'certificate.pdf', contentType: 'application/pdf' });
  return expectStatus<{ id: string }>(answer, 201).id;
}

/** A spec of each kind with every field that it can have. */
const FULL_SPECS: Record<SlingKind, object> = {
  'alloy-chain': { grade: 100, chainMm: 9.5, endless: true },
  'wire-rope': {
    construction: 'cable_laid',
    className: '7x6x19',
    diameterMm: 28.6,
    core: 'fc',
    ropeGrade: 'eeips',
    splice: 'swaged_socket',
    ferrule: 'aluminium',
  },
  'metal-mesh': { duty: 'medium', widthMm: 304.8, wireMm: 2.69, coated: true },
  'synthetic-web': { fibre: 'nylon', widthMm: 101.6, plies: 4, type: 'reversed_eye' },
  'synthetic-round': { fibre: 'high_performance', size: 'TP 5' },
  'synthetic-rope': { fibre: 'polypropylene', diameterMm: 38.1 },
};

async function buildFull(kind: SlingKind): Promise<CreateSlingInput> {
  return buildSlingRequest(siteId, {
    kind,
    spec: FULL_SPECS[kind],
    stockNumber: 'STOCK 77',
    lot: 'LOT-2026-03',
    madeOn: '2025-11-30',
    receivedOn: '2026-01-15',
    firstUseOn: '2026-02-01',
    owner: { kind: 'hired', name: 'Gannet Hire', offHireOn: day(200) },
    homeLocationId: rackId(),
    serviceClass: 'severe',
    legs: 3,
    reachMm: 3657.6,
    ratedLoads: {
      verticalKg: 3991.61,
      chokerKg: 3129.787,
      basketKg: 7983.22578,
      bridle: { kg: 6894.6, angleDeg: 60 },
    },
    fittings: [
      { position: 'upper', type: 'master_link', sizeMm: 25.4, detachable: false },
      { position: 'lower', type: 'self_locking_hook', throatMm: 41.275, hasLatch: true, detachable: true },
      { position: 'other', type: 'choker_fitting', detachable: false },
    ],
    makerLimits: [{ criterionId: 'chain.nick_gouge', limit: 0.5, source: 'Tarn Forge leaflet 12' }],
    discardOn: '2036-11-30',
    makersTag: 'illegible',
    proofCertificate: {
      basis: 'components',
      loadKg: 7983.22,
      testedOn: '2025-12-24',
      number: 'TF/C 9001',
      fileId: await uploadPdf(),
    },
    notes: 'First line\nsecond line',
    cost: 412.5,
    photoIds: [await work.photo()],
    enteredUnits: { 'ratedLoads.verticalKg': 'lb', reachMm: 'ft', 'spec.chainMm': 'in' },
  } as Parameters<typeof buildSlingRequest>[1]);
}

describe('a record', () => {
  it.each(SLING_KINDS)('of a %s gives back every field as it was sent', async (kind) => {
    const sent = await buildFull(kind);
    const made = expectStatus<Sling>(await post(sent), 201);
    const { proofCertificate, photoIds, fittings, ...plain } = sent;
    for (const sling of [made, await work.read(made.id, 'auditor')]) {
      expect(sling).toMatchObject(plain);
      expect(sling.fittings.map(({ id, ...fitting }) => (expect(id).toBeGreaterThan(0), fitting))).toEqual(
        fittings,
      );
      expect(sling.certificates).toMatchObject([proofCertificate]);
      expect(sling.photos.map(({ fileId }) => fileId)).toEqual(photoIds);
      expect(sling).toMatchObject({ state: 'received', condemned: false, mayUse: false, version: 1 });
      expect(sling.custody).toMatchObject({ kind: 'in_store', locationId: rackId() });
    }
  });

  it('leaves out what was left out', async () => {
    const sling = await work.register({ kind: 'synthetic-round', proofCertificate: undefined });
    expect(sling).toMatchObject({
      owner: { kind: 'own' },
      discardOn: null,
      cost: null,
      notes: '',
      tag: null,
    });
    expect(sling).not.toHaveProperty('lot');
    expect(sling.certificates).toEqual([]);
  });

  it.each(['alloy-chain', 'metal-mesh'] as const)('of a %s needs the serial of its tag', async (kind) => {
    const { makerSerial: _, ...body } = buildSlingRequest(siteId, { kind });
    expect(errorPaths(expectProblem(await post(body), 422, 'invalid'))).toContain('makerSerial');
    expect(
      errorPaths(expectProblem(await post({ ...body, makerSerial: '   ', stockNumber: 'S 1' }), 422)),
    ).toContain('makerSerial');
  });

  it.each(['wire-rope', 'synthetic-web', 'synthetic-round', 'synthetic-rope'] as const)(
    'of a %s goes by a stock number instead, and by nothing it does not',
    async (kind) => {
      const { makerSerial: _, ...body } = buildSlingRequest(siteId, { kind });
      expect((await post({ ...body, stockNumber: 'S 44' })).status).toBe(201);
      const bare = buildSlingRequest(siteId, { kind });
      delete bare.makerSerial;
      expect(errorPaths(expectProblem(await post(bare), 422))).toEqual(['stockNumber']);
    },
  );

  it('is refused with the spec of another kind, a field that its spec lacks, or one too many', async () => {
    const chain = buildSlingRequest(siteId);
    const paths = async (spec: object): Promise<string[]> => {
      const answer = await post({ ...chain, spec });
      expect([400, 422]).toContain(answer.status);
      return errorPaths(expectProblem(answer, answer.status));
    };
    expect(await paths({ fibre: 'nylon', diameterMm: 24 })).toContain('spec.grade');
    expect(await paths({ grade: 80 })).toEqual(['spec.chainMm']);
    expect(await paths({ grade: 90, chainMm: 10 })).toEqual(['spec.grade']);
    expect(await paths({ grade: 80, chainMm: 10, colour: 'red' })).toEqual(['spec']);
  });

  it.each([
    ['receivedOn', { receivedOn: day(2) }],
    ['madeOn', { madeOn: day(2), receivedOn: day(3) }],
    ['firstUseOn', { firstUseOn: day(2) }],
    ['proofCertificate.testedOn', { proofCertificate: { basis: 'assembly', testedOn: day(2), number: 'C' } }],
  ])('with %s in the future is refused', async (path, overrides) => {
    const body = buildSlingRequest(siteId, overrides as Partial<CreateSlingInput>);
    expect(errorPaths(expectProblem(await post(body), 422, 'invalid'))).toContain(path);
  });

  it.each([
    ['no load', { ratedLoads: { verticalKg: 0 } }, 'ratedLoads.verticalKg'],
    ['a load under zero', { ratedLoads: { verticalKg: -1 } }, 'ratedLoads.verticalKg'],
    ['a load that rounds to none', { ratedLoads: { verticalKg: 0.000001 } }, 'ratedLoads.verticalKg'],
    ['a load in the wrong unit', { ratedLoads: { verticalKg: 2e6 } }, 'ratedLoads.verticalKg'],
    [
      'a bridle under 30°',
      { ratedLoads: { verticalKg: 1, bridle: { kg: 1, angleDeg: 29 } } },
      'ratedLoads.bridle.angleDeg',
    ],
    ['no legs', { legs: 0 }, 'legs'],
    ['five legs', { legs: 5 }, 'legs'],
    ['a reach of nothing', { reachMm: 0.001 }, 'reachMm'],
    [
      'a hook larger than any',
      { fittings: [{ position: 'lower', type: 'hook', sizeMm: 1e6, detachable: true }] },
      'fittings.0.sizeMm',
    ],
    ['a day that is none', { madeOn: '2025-02-29' }, 'madeOn'],
    [
      'a width of nothing',
      { fittings: [{ position: 'lower', type: 'hook', throatMm: 1e-9, detachable: true }] },
      'fittings.0.throatMm',
    ],
    ['a year that is none', { madeOn: '0000-01-01' }, 'madeOn'],
    ['made after it was received', { madeOn: day(-1), receivedOn: day(-5) }, 'madeOn'],
    ['a hire without its owner', { owner: { kind: 'hired' } }, 'owner.name'],
    ['a number of spaces', { number: '   ' }, 'number'],
    ['a number too long', { number: 'N'.repeat(41) }, 'number'],
    ['a file that is not here', { photoIds: ['00000000-0000-4000-8000-000000000000'] }, 'photoIds'],
    ['a place of another site', { homeLocationId: -1 }, 'homeLocationId'],
  ])('with %s is refused at its field', async (_, overrides, path) => {
    const answer = await post({ ...buildSlingRequest(siteId), ...overrides });
    expect(errorPaths(expectProblem(answer, 422, 'invalid'))).toContain(path);
  });

  it('is refused at a site, or with a home, where its maker does not work', async () => {
    const other = store.places.bladeHall.id;
    expect(errorPaths(expectProblem(await post(buildSlingRequest(other)), 422))).toEqual(['siteId']);
    const home = await post(buildSlingRequest(siteId, { homeLocationId: bladeRackId() }));
    expect(errorPaths(expectProblem(home, 422))).toEqual(['homeLocationId']);
  });
});

describe('numbers and serials', () => {
  it('are taken once, in whatever case they are typed', async () => {
    const first = await work.register();
    const again = await post(buildSlingRequest(siteId, { number: first.number.toLowerCase() }));
    expect(errorPaths(expectProblem(again, 409, 'duplicate'))).toEqual(['number']);
    const twin = await post(
      buildSlingRequest(siteId, { maker: first.maker.toUpperCase(), makerSerial: first.makerSerial }),
    );
    expect(errorPaths(expectProblem(twin, 409, 'duplicate'))).toEqual(['makerSerial']);
    const otherMaker = buildSlingRequest(siteId, { maker: 'Oxbow Rope', makerSerial: first.makerSerial });
    expect((await post(otherMaker)).status).toBe(201);
  });

  it('are taken once also at another site, and by two people at the same moment', async () => {
    const body = buildSlingRequest(siteId);
    const answers = await Promise.all([post(body), post(body, 'storekeeper2'), post(body, 'manager')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409]);
    const elsewhere = await post({ ...body, siteId: store.places.bladeHall.id }, 'storekeeper2');
    expectProblem(elsewhere, 409, 'duplicate');
  });
});

describe('words of any script', () => {
  it.each([
    ['emoji', '🦺🪝 sling 👩🏽‍🔧'],
    ['right to left', 'حبل رفع ٣ أطنان'],
    ['right to left marks', '\u202Eabc\u202C \u200Fdef'],
    ['SQL', "'; DROP TABLE slings; -- \\' OR 1=1 /*"],
    ['HTML', '<script>alert(1)</script> <b>&amp;'],
    ['a format', '%s %d ${7*7} {{7*7}} $& $1'],
    ['combining marks', 'Zą̸̨́͠lgo é'],
  ])('come back unharmed: %s', async (_, words) => {
    const number = words.slice(0, 36).trim();
    const sling = await work.register({
      number,
      maker: words,
      makerSerial: `${words}1`,
      stockNumber: words,
      lot: words,
      notes: `${words}\n${words}`,
      owner: { kind: 'hired', name: words },
    });
    const read = await work.read(sling.id);
    expect(read).toMatchObject({
      number,
      maker: words,
      makerSerial: `${words}1`,
      stockNumber: words,
      lot: words,
    });
    expect(read).toMatchObject({ notes: `${words}\n${words}`, owner: { name: words } });
    const found = await list({ q: number });
    expect(found.map(({ id }) => id)).toContain(sling.id);
    const code = await work.label(sling);
    expect((await (await store.signIn('storekeeper')).get(`/api/tags/${code}`)).status).toBe(200);
  });

  it('leave the ledger whole', async () => {
    const answer = await (await store.signIn('manager')).get('/api/ledger/verify');
    expect(answer.body).toMatchObject({ ok: true });
  });

  it.each([
    ['half a character', 'TS \ud83e'],
    ['a control character', 'TS \u0000 1'],
    ['an escape', '\u001b[31mTS'],
  ])('are refused with %s in them', async (_, number) => {
    expect(errorPaths(expectProblem(await post(buildSlingRequest(siteId, { number })), 422))).toEqual([
      'number',
    ]);
  });
});

describe('changing a record', () => {
  const patch = async (id: number, body: object, headers: Record<string, string> = {}) =>
    (await store.signIn('storekeeper')).patch(`/api/slings/${id}`).set(headers).send(body);

  it('takes notes, home, cost and photos, each as a row of the ledger', async () => {
    const sling = await work.register();
    const photo = await work.photo();
    const body = { notes: 'On the left', homeLocationId: rackId(), cost: 99.9, photoIds: [photo] };
    const answer = await patch(sling.id, body);
    const changed = expectStatus<Sling>(answer, 200);
    expect(changed).toMatchObject({ notes: 'On the left', homeLocationId: rackId(), cost: 99.9, version: 3 });
    expect(changed.photos).toMatchObject([{ fileId: photo }]);
    expect(answer.headers.etag).toBe('"3"');
    expect(await patch(sling.id, { cost: null, homeLocationId: null })).toMatchObject({
      body: { cost: null, homeLocationId: null },
    });
    const ledger = await (await store.signIn('auditor')).get(`/api/ledger?slingId=${sling.id}&order=oldest`);
    const rows = expectStatus<{ items: { type: string }[] }>(ledger, 200).items;
    expect(rows.map(({ type }) => type)).toEqual(['registered', 'edited', 'photo_added', 'edited']);
  });

  it.each([
    { number: 'NEW-1' },
    { kind: 'wire-rope' },
    { spec: { grade: 120, chainMm: 32 } },
    { maker: 'Other' },
    { makerSerial: 'X' },
    { ratedLoads: { verticalKg: 99_999 } },
    { makersTag: 'legible' },
    { siteId: 2 },
    { serviceClass: 'normal' },
    { fittings: [] },
    { state: 'in_service' },
    { condemned: false },
    { nextDueOn: '2099-01-01' },
    { version: 7 },
    { receivedOn: '2026-01-01' },
  ])('refuses %o, which is no part of it', async (body) => {
    const sling = await work.register();
    expectProblem(await patch(sling.id, { notes: 'x', ...body }), 400, 'malformed');
    expect(await work.read(sling.id)).toEqual(sling);
  });

  it('guards the version: a stale If-Match gets 412 with what changed', async () => {
    const sling = await work.register();
    const read = await (await store.signIn('storekeeper')).get(`/api/slings/${sling.id}`);
    expect(read.headers.etag).toBe('"1"');
    expect((await patch(sling.id, { notes: 'first' }, { 'If-Match': '"1"' })).status).toBe(200);
    const stale = expectProblem(
      await patch(sling.id, { notes: 'second' }, { 'If-Match': '"1"' }),
      412,
      'stale',
    );
    expect(stale.changes).toMatchObject([{ seq: 2, type: 'edited', by: 'Ama Tull' }]);
    expect((await work.read(sling.id)).notes).toBe('first');
    expectProblem(await patch(sling.id, { notes: 'x' }, { 'If-Match': 'newest' }), 400, 'malformed');
    expect((await patch(sling.id, { notes: 'third' }, { 'If-Match': 'W/"2"' })).status).toBe(200);
  });

  it('guards actions as well, all but a hold', async () => {
    const sling = await work.register();
    await patch(sling.id, { notes: 'newer' });
    const act = async (by: string, action: string, body: object) =>
      (await store.signIn(by))
        .post(`/api/slings/${sling.id}/actions/${action}`)
        .set('If-Match', '"1"')
        .send(body);
    expectProblem(await act('manager', 'report_lost', { note: 'Not seen' }), 412, 'stale');
    expect((await act('storekeeper', 'hold', { reasons: [{ code: 'damage_suspected' }] })).status).toBe(200);
    expectProblem(await act('storekeeper', 'secure', { locationId: work.cageId }), 412, 'stale');
  });
});

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
    elsewhere = expectStatus<Sling>(await post(body, 'storekeeper2'), 201);
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
      expect(before.length).toBeGreaterThan(25);
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
