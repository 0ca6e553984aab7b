import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import PDFDocument from 'pdfkit';
import { SLING_KINDS, type SlingKind } from '../../shared/domain/slings/kinds';
import type { CreateSlingInput, Sling } from '../../shared/schemas/slings';
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
    const answer = await (await store.signIn('storekeeper')).get('/api/slings').query({ q: number });
    const found = expectStatus<{ items: Sling[] }>(answer, 200).items;
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
