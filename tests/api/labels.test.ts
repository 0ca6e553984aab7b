import { randomBytes } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { findStock } from '../../labels';
import { placeLabels } from '../../labels/layout/placeLabels';
import { readWithJsqr } from '../../labels/qr/jsqrReader';
import { drawTagCode, parseTagCode, TAG_ALPHABET } from '../../shared/domain/tags/tagCode';
import type { LabelRun, LabelStockView, ScanResponse } from '../../shared/schemas/labels';
import type { Sling } from '../../shared/schemas/slings';
import { cropImage, rasterisePdf } from '../support/labelPictures';
import { errorPaths, expectProblem, openSecondApp, signInTo, unmetRules } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

const STOCK = 'roll-203-flat';
let store: TestStore;
let work: Work;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

const print = async (slings: Sling[], more: object = {}) =>
  (await store.signIn('storekeeper'))
    .post('/api/label-runs')
    .send({ slingIds: slings.map(({ id }) => id), stock: STOCK, ...more });
const confirm = async (code: string, body: object) =>
  (await store.signIn('storekeeper')).post(`/api/tags/${code}/confirm`).send(body);
const scan = async (code: string) => (await store.signIn('inspector')).get(`/api/tags/${code}`);
const statusOf = async (code: string): Promise<string> =>
  expectStatus<ScanResponse>(await scan(code), 200).tag.status;
const lastFour = (sling: Sling): string => (sling.makerSerial ?? sling.number).slice(-4);
const pdfOf = async (runId: number) =>
  (await store.signIn('auditor'))
    .get(`/api/label-runs/${runId}/pdf`)
    .buffer(true)
    .parse((response, done) => {
      const parts: Buffer[] = [];
      response.on('data', (part: Buffer) => parts.push(part));
      response.on('end', () => done(null, Buffer.concat(parts)));
    });

/** One character of the code replaced by another of the alphabet. */
function spoil(code: string, at: number): string {
  const next = TAG_ALPHABET[(TAG_ALPHABET.indexOf(code[at] ?? '0') + 1) % TAG_ALPHABET.length] ?? '0';
  return code.slice(0, at) + next + code.slice(at + 1);
}

describe('printing', () => {
  it('gives each sling a code of its own, which stands on the record as printed', async () => {
    const slings = [await work.register(), await work.register(), await work.register()];
    const run = expectStatus<LabelRun>(await print(slings), 201);
    expect(run.tags.map(({ slingId }) => slingId)).toEqual(slings.map(({ id }) => id));
    for (const { slingId, code, status } of run.tags) {
      expect(parseTagCode(code, { isStrict: true })).toEqual({ ok: true, code });
      expect(status).toBe('printed');
      expect((await work.read(slingId)).tag).toEqual({ code, status: 'printed' });
    }
    expect(new Set(run.tags.map(({ code }) => code)).size).toBe(3);
  });

  it('again needs a reason, while the old label is printed as well as when it is live', async () => {
    const sling = await work.register();
    const code = await work.label(sling);
    expect(unmetRules(expectProblem(await print([sling]), 422, 'unmet'))).toEqual(['reprint_reason']);
    await work.confirm(sling, code);
    expect(unmetRules(expectProblem(await print([sling]), 422, 'unmet'))).toEqual(['reprint_reason']);
    expect(errorPaths(expectProblem(await print([sling], { reason: 'worn' }), 422, 'invalid'))).toEqual([
      'reason',
    ]);
    expect((await work.read(sling.id)).tag).toEqual({ code, status: 'live' });
  });

  it('is all or nothing: one sling of a run that has a label already stops the run', async () => {
    const fresh = await work.register();
    const labelled = await work.register();
    await work.label(labelled);
    expectProblem(await print([fresh, labelled]), 422, 'unmet');
    expect((await work.read(fresh.id)).tag).toBeNull();
  });

  it.each([
    ['no sling', { slingIds: [] }, 'slingIds'],
    ['a sling twice', { slingIds: [1, 1] }, 'slingIds'],
    ['a stock that is none', { stock: 'a4-gold' }, 'stock'],
    ['a place that is none', { startAt: 0 }, 'startAt'],
    ['a place past the sheet', { stock: 'a4-600-flat', startAt: 25 }, 'startAt'],
    ['a place on a roll', { startAt: 2 }, 'startAt'],
  ])('refuses %s', async (_, more, path) => {
    const sling = await work.register();
    expect(errorPaths(expectProblem(await print([sling], more), 422, 'invalid'))).toEqual([path]);
    expect((await work.read(sling.id)).tag).toBeNull();
  });

  it('gives no label to a sling that is gone', async () => {
    const sling = await work.register();
    await work.act('manager', sling, 'depart', { cause: 'sold', note: 'To Gannet Hire' });
    expect(errorPaths(expectProblem(await print([sling]), 422, 'invalid'))).toEqual(['slingIds']);
  });

  it('warns while the address on the label opens on this machine alone', async () => {
    const sling = await work.register();
    const run = expectStatus<LabelRun>(await print([sling]), 201);
    expect(run.warnings.join()).toMatch(/only this machine can open/);
    const app = openSecondApp(store, { publicUrl: 'http://slings.example' });
    const agent = await signInTo(app, 'manager@marram-quay.example', 'marram-quay-demo');
    const other = await work.register();
    const answer = await agent.post('/api/label-runs').send({ slingIds: [other.id], stock: STOCK });
    expect(expectStatus<LabelRun>(answer, 201).warnings).toEqual([]);
  });
});

describe('a reprint', () => {
  it.each(['lost', 'misprint'])('for %s voids the live label at once', async (reason) => {
    const sling = await work.inService();
    const old = sling.tag?.code ?? '';
    const code = await work.label(sling, reason);
    expect(await statusOf(old)).toBe('void');
    const now = await work.read(sling.id);
    expect(now).toMatchObject({ tag: { code, status: 'printed' }, mayUse: false, state: 'in_service' });
    expect(now.mayNotUse.map(({ rule }) => rule)).toEqual(['live_label']);
  });

  it.each(['illegible', 'retagged'])(
    'for %s keeps the live label until the new one is on',
    async (reason) => {
      const sling = await work.inService();
      const old = sling.tag?.code ?? '';
      const code = await work.label(sling, reason);
      expect([await statusOf(old), await statusOf(code)]).toEqual(['live', 'printed']);
      expect((await work.read(sling.id)).mayUse).toBe(true);
      await work.confirm(sling, code);
      expect([await statusOf(old), await statusOf(code)]).toEqual(['void', 'live']);
      expect(await work.read(sling.id)).toMatchObject({ tag: { code, status: 'live' }, mayUse: true });
    },
  );

  it('voids a label that was printed and never confirmed, whatever the reason', async () => {
    const sling = await work.register();
    const first = await work.label(sling);
    const second = await work.label(sling, 'retagged');
    expect([await statusOf(first), await statusOf(second)]).toEqual(['void', 'printed']);
    expectProblem(await confirm(first, { via: 'camera', lastFour: lastFour(sling) }), 409, 'conflict');
  });

  it('by two people at the same moment leaves one live and one printed label at most', async () => {
    const sling = await work.inService();
    const answers = await Promise.all(
      Array.from({ length: 4 }, () => print([sling], { reason: 'illegible' })),
    );
    expect(answers.some(({ status }) => status === 201)).toBe(true);
    const rows = await store.database.adminQuery(
      "SELECT status, COUNT(*) AS n FROM tags WHERE sling_id = ? AND status <> 'void' GROUP BY status ORDER BY status",
      [sling.id],
    );
    expect(rows).toEqual([
      { status: 'live', n: 1 },
      { status: 'printed', n: 1 },
    ]);
  });
});

describe('confirming', () => {
  it.each(['camera', 'photo', 'scanner'])('makes the label live when it came by %s', async (via) => {
    const sling = await work.register();
    const code = await work.label(sling);
    const answer = await confirm(code, { via, lastFour: lastFour(sling) });
    expect(answer.body).toMatchObject({ tag: { code, status: 'live' }, sling: { id: sling.id } });
    expectProblem(await confirm(code, { via, lastFour: lastFour(sling) }), 409, 'conflict');
  });

  it.each(['typed', 'typing', 'keyboard', '', undefined])(
    'is never done by a code that came by %o',
    async (via) => {
      const sling = await work.register();
      const code = await work.label(sling);
      const answer = await confirm(code, { via, lastFour: lastFour(sling) });
      expect(errorPaths(expectProblem(answer, 422, 'invalid'))).toEqual(['via']);
      expect(await statusOf(code)).toBe('printed');
    },
  );

  it('needs the last four characters that stand on this sling, not on its twin', async () => {
    const sling = await work.register();
    const twin = await work.register();
    const code = await work.label(sling);
    for (const wrong of [lastFour(twin), lastFour(sling).slice(1), '0000', 'ABCD', '____']) {
      const answer = await confirm(code, { via: 'camera', lastFour: wrong });
      expect(errorPaths(expectProblem(answer, 422, 'invalid')), wrong).toEqual(['lastFour']);
    }
    expectProblem(await confirm(code, { via: 'camera', lastFour: sling.makerSerial }), 422);
    expect(await statusOf(code)).toBe('printed');
    expect((await confirm(code, { via: 'camera', lastFour: lastFour(sling).toLowerCase() })).status).toBe(
      200,
    );
  });

  it('takes those of the number where there is no serial', async () => {
    const sling = await work.register({
      kind: 'synthetic-round',
      number: `RS 00-${Date.now() % 1000}a`,
      makerSerial: undefined,
      stockNumber: 'X',
    });
    const code = await work.label(sling);
    const answer = await confirm(code, { via: 'photo', lastFour: lastFour(sling).toUpperCase() });
    expect(answer.status).toBe(200);
  });
});

describe('a code', () => {
  it('is read in any writing', async () => {
    const sling = await work.register();
    const code = await work.label(sling);
    for (const writing of [
      code.toLowerCase(),
      `${code.slice(0, 4)}-${code.slice(4, 7)}-${code.slice(7)}`,
      ` ${code.slice(0, 5)} ${code.slice(5)} `,
      code.replaceAll('0', 'O').replaceAll('1', 'I'),
      code.replaceAll('0', 'o').replaceAll('1', 'l'),
    ]) {
      const answer = expectStatus<ScanResponse>(await scan(encodeURIComponent(writing)), 200);
      expect(answer).toMatchObject({ tag: { code }, sling: { id: sling.id } });
    }
  });

  it('with any one character wrong is refused, and one that was never given is unknown', async () => {
    const code = await work.label(await work.register());
    for (let at = 0; at < code.length; at += 1) {
      const answer = await scan(spoil(code, at));
      expect(errorPaths(expectProblem(answer, 422, 'invalid'))).toEqual(['code']);
    }
    for (const wrong of [code.slice(1), `${code}0`, `U${code.slice(1)}`, '!!!!!!!!!!']) {
      expectProblem(await scan(encodeURIComponent(wrong)), 422, 'invalid');
    }
    expectProblem(await scan(drawTagCode(randomBytes)), 404, 'not-found');
  });

  it('of a void label shows the sling and its live label', async () => {
    const sling = await work.inService();
    const old = sling.tag?.code ?? '';
    const code = await work.label(sling, 'lost');
    await work.confirm(sling, code);
    expect((await scan(old)).body).toMatchObject({
      tag: { code: old, status: 'void' },
      sling: { id: sling.id, tag: { code, status: 'live' }, mayUse: true },
    });
  });

  it('is voided once, with a reason, and never comes back', async () => {
    const sling = await work.inService();
    const code = sling.tag?.code ?? '';
    const voidIt = async (body: object) =>
      (await store.signIn('manager')).post(`/api/tags/${code}/void`).send(body);
    expect(errorPaths(expectProblem(await voidIt({}), 422, 'invalid')).sort()).toEqual(['note', 'reason']);
    const answer = await voidIt({ reason: 'lost', note: 'Torn off' });
    expect(answer.body).toMatchObject({ tag: { status: 'void' }, sling: { tag: null, mayUse: false } });
    expectProblem(await voidIt({ reason: 'lost', note: 'Torn off' }), 409, 'conflict');
    expectProblem(await confirm(code, { via: 'camera', lastFour: lastFour(sling) }), 409, 'conflict');
    await expect(
      store.database.appQuery("UPDATE tags SET status = 'live' WHERE code = ?", [code]),
    ).rejects.toThrow(/never back/);
  });
});

describe('the stocks', () => {
  it('are listed with what a printer needs', async () => {
    const answer = await (await store.signIn('storekeeper')).get('/api/label-stocks');
    const { items } = expectStatus<{ items: LabelStockView[] }>(answer, 200);
    expect(items.length).toBeGreaterThan(5);
    for (const stock of items) {
      expect(stock).toMatchObject({
        dpi: expect.any(Number) as number,
        widthMm: expect.any(Number) as number,
        heightMm: expect.any(Number) as number,
      });
      const page = await (await store.signIn('manager')).get(`/api/label-stocks/${stock.id}/test-page`);
      expect(page.status).toBe(200);
      expect(page.headers['content-type']).toBe('application/pdf');
    }
  });
});

describe('a printed run', () => {
  it.each([
    ['roll-203-flat', 1, 4],
    ['roll-300-round-small', 1, 3],
    ['a4-600-flat', 23, 4],
    ['letter-600-round', 41, 3],
  ])('on %s from place %i is read by jsQR as the database holds it', async (id, startAt, count) => {
    const stock = findStock(id);
    if (!stock) throw new Error('There is such a stock.');
    const slings: Sling[] = [];
    for (let n = 0; n < count; n += 1) slings.push(await work.register());
    const run = expectStatus<LabelRun>(await print(slings, { stock: id, startAt }), 201);
    const pages = await rasterisePdf((await pdfOf(run.id)).body as Buffer, stock.dpi);
    const toDots = (mm: number): number => Math.round((mm * stock.dpi) / 25.4);
    const read = placeLabels(count, stock, startAt).map(({ page, xMm, yMm }) => {
      const sheet = pages[page];
      if (!sheet) throw new Error('A label has no page.');
      const size: [number, number] = [toDots(stock.widthMm), toDots(stock.heightMm)];
      return readWithJsqr(cropImage(sheet, toDots(xMm), toDots(yMm), ...size));
    });
    const rows = await store.database.adminQuery(
      'SELECT payload, code FROM tags WHERE run_id = ? ORDER BY run_position',
      [run.id],
    );
    expect(read).toEqual(rows.map(({ payload }) => payload));
    expect(rows.map(({ code }) => code)).toEqual(run.tags.map(({ code }) => code));
    for (const { payload, code } of rows) expect(payload).toBe(`HTTP://127.0.0.1:4173/T/${String(code)}`);
  });

  it('leaves out what is void meanwhile, and is refused when all is', async () => {
    const slings = [await work.register(), await work.register()];
    const run = expectStatus<LabelRun>(await print(slings), 201);
    const [first, second] = slings;
    if (!first || !second) throw new Error('Two slings.');
    await work.label(first, 'misprint');
    const pages = await rasterisePdf((await pdfOf(run.id)).body as Buffer, 203);
    expect(pages.map((page) => readWithJsqr(page))).toEqual([
      expect.stringContaining(run.tags[1]?.code ?? '') as string,
    ]);
    await work.label(second, 'misprint');
    expectProblem(
      await (await store.signIn('auditor')).get(`/api/label-runs/${run.id}/pdf`),
      409,
      'conflict',
    );
  });

  it('prints numbers of any script without breaking', async () => {
    const slings = [
      await work.register({ number: '🪝 حبل 吊索 Ω' }),
      await work.register({ number: '<b>&' }),
    ];
    const run = expectStatus<LabelRun>(await print(slings), 201);
    expect(((await pdfOf(run.id)).body as Buffer).subarray(0, 5).toString()).toBe('%PDF-');
  });
});
