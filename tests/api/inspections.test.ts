import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { nextDueOn } from '../../shared/domain/inspection/due';
import { SLING_KINDS } from '../../shared/domain/slings/kinds';
import type { CreateInspectionResponse, CriteriaResponse } from '../../shared/schemas/inspection';
import type { Sling } from '../../shared/schemas/slings';
import { day, errorPaths, expectProblem } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

type Row = CriteriaResponse['items'][number];
let store: TestStore;
let work: Work;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

const rowsOf = async (sling: Pick<Sling, 'id' | 'kind'>): Promise<Row[]> => {
  const answer = await (
    await store.signIn('inspector')
  ).get(`/api/criteria/${sling.kind}?slingId=${sling.id}`);
  return expectStatus<CriteriaResponse>(answer, 200).items;
};
const inspect = async (id: number, body: object, by = 'inspector', headers: Record<string, string> = {}) =>
  (await store.signIn(by)).post(`/api/slings/${id}/inspections`).set(headers).send(body);
const clean = (rows: readonly Row[]) => rows.map((row) => row.clean);
const seeing = (rows: readonly Row[], id: string, more: object = {}) =>
  rows.map((row) => (row.id === id ? { ...row.clean, seen: true, ...more } : row.clean));

describe('the criteria', () => {
  it.each(SLING_KINDS)(
    'of a %s are those of its kind, each with a source and a clean answer',
    async (kind) => {
      const sling = await work.register({ kind });
      const rows = await rowsOf(sling);
      const all = expectStatus<CriteriaResponse>(
        await (await store.signIn('auditor')).get(`/api/criteria/${kind}`),
        200,
      ).items;
      expect(rows.length).toBeGreaterThan(5);
      for (const row of rows) {
        expect(all.map(({ id }) => id)).toContain(row.id);
        expect(row.clean).toMatchObject({ criterionId: row.id });
        expect(row.limits.length, row.id).toBeGreaterThan(0);
        expect(row.question).toMatch(/\?$/);
      }
    },
  );

  it('are asked once per fitting that they are about', async () => {
    const sling = await work.register();
    const rows = await rowsOf(sling);
    const hooks = sling.fittings.filter(({ type }) => type === 'hook').map(({ id }) => id);
    expect(rows.filter(({ id }) => id === 'hook.crack').map(({ fittingId }) => fittingId)).toEqual(hooks);
    expect(rows.filter(({ id }) => id === 'fitting.crack_distortion')).toHaveLength(sling.fittings.length);
  });

  it('of one kind are not given for a sling of another', async () => {
    const sling = await work.register();
    const answer = await (await store.signIn('inspector')).get(`/api/criteria/wire-rope?slingId=${sling.id}`);
    expect(errorPaths(expectProblem(answer, 422, 'invalid'))).toEqual(['slingId']);
  });
});

describe('a complete inspection', () => {
  it.each(['initial', 'periodic', 'release'])(
    '(%s) needs every answer, and names the missing ones',
    async (type) => {
      const sling = await work.register();
      const rows = await rowsOf(sling);
      const left = rows.filter(({ id }) => !['chain.crack', 'hook.crack'].includes(id));
      const problem = expectProblem(await inspect(sling.id, { type, answers: clean(left) }), 422, 'invalid');
      const words = (problem.errors ?? []).map(({ message }) => message);
      expect(words).toHaveLength(rows.length - left.length);
      expect(words.join('\n')).toContain('chain.crack');
      const hooks = rows.filter(({ id }) => id === 'hook.crack').map(({ fittingId }) => String(fittingId));
      for (const hook of hooks) expect(words.join('\n')).toContain(hook);
      expect((await work.read(sling.id)).version).toBe(1);
    },
  );

  it.each(['initial', 'periodic', 'release'])('(%s) never takes “the rest is clean”', async (type) => {
    const sling = await work.register();
    const answers = clean(await rowsOf(sling));
    for (const some of [answers, answers.slice(0, 3), []]) {
      const problem = expectProblem(await inspect(sling.id, { type, answers: some, restClean: true }), 422);
      expect(errorPaths(problem)).toContain('restClean');
    }
  });

  it('that passes sets the next due date a year on; a frequent one sets none', async () => {
    const sling = await work.register();
    const answers = clean(await rowsOf(sling));
    const frequent = await inspect(sling.id, { type: 'frequent', answers: [], restClean: true });
    expect(frequent.body).toMatchObject({
      inspection: { verdict: 'pass', nextDueOn: null },
      sling: { nextDueOn: null },
    });
    const kept = expectStatus<CreateInspectionResponse>(
      await inspect(sling.id, { type: 'initial', answers }),
      201,
    );
    expect(kept.inspection).toMatchObject({ verdict: 'pass', findings: [] });
    expect(kept.inspection.nextDueOn).toBe(nextDueOn(kept.inspection.inspectedOn));
    expect(kept.sling.nextDueOn).toBe(kept.inspection.nextDueOn);
    expect(kept.inspection.ruleSets.map(({ id }) => id)).toEqual(['osha', 'asme', 'maker']);
  });

  it('of a 29 February falls due on a 28th, and an older one never brings the date forward', async () => {
    const sling = await work.register({ receivedOn: '2023-06-01', madeOn: '2023-01-01' });
    const answers = clean(await rowsOf(sling));
    const leap = await inspect(sling.id, { type: 'initial', answers, inspectedOn: '2024-02-29' });
    expect(expectStatus<CreateInspectionResponse>(leap, 201).sling.nextDueOn).toBe('2025-02-28');
    const older = await inspect(sling.id, { type: 'periodic', answers, inspectedOn: '2023-12-31' });
    expect(older.body).toMatchObject({
      inspection: { nextDueOn: '2024-12-31' },
      sling: { nextDueOn: '2025-02-28' },
    });
  });

  it.each([
    ['in the future', () => day(2)],
    ['before the sling was received', () => '2020-01-01'],
    ['on no day', () => '2026-02-30'],
  ])('is refused %s', async (_, on) => {
    const sling = await work.register();
    const answers = clean(await rowsOf(sling));
    const problem = expectProblem(
      await inspect(sling.id, { type: 'initial', answers, inspectedOn: on() }),
      422,
    );
    expect(errorPaths(problem)).toEqual(['inspectedOn']);
  });

  it('guards the version like every write', async () => {
    const sling = await work.register();
    const body = { type: 'initial', answers: clean(await rowsOf(sling)) };
    expect((await inspect(sling.id, body, 'inspector', { 'If-Match': '"1"' })).status).toBe(201);
    expectProblem(await inspect(sling.id, body, 'inspector', { 'If-Match': '"1"' }), 412, 'stale');
  });
});

describe('a frequent inspection', () => {
  it('passes with “the rest is clean” and says what was not measured', async () => {
    const sling = await work.inService();
    const kept = expectStatus<CreateInspectionResponse>(
      await inspect(sling.id, { type: 'frequent', answers: [], restClean: true }),
      201,
    );
    expect(kept.inspection).toMatchObject({ verdict: 'pass', restClean: true });
    expect(kept.sling).toMatchObject({ state: 'in_service', nextDueOn: sling.nextDueOn });
  });

  it('is no pass with half the answers and nothing said of the rest', async () => {
    const sling = await work.register();
    const problem = expectProblem(await inspect(sling.id, { type: 'frequent', answers: [] }), 422, 'invalid');
    expect(errorPaths(problem)).toContain('restClean');
  });
});

describe('a rejection', () => {
  it('holds the sling in the same act, with the criterion, confirmed, and photos', async () => {
    const sling = await work.inService();
    const rows = await rowsOf(sling);
    const photo = await work.photo('inspector');
    const answers = seeing(rows, 'chain.crack', {
      note: 'Third link',
      photoIds: [photo],
      at: { leg: 1, positionMm: 900 },
    });
    const kept = expectStatus<CreateInspectionResponse>(
      await inspect(sling.id, { type: 'periodic', answers }),
      201,
    );
    expect(kept.inspection).toMatchObject({ verdict: 'reject', nextDueOn: null });
    expect(kept.inspection.findings).toMatchObject([
      { criterionId: 'chain.crack', outcome: 'reject', ruleSet: 'osha' },
    ]);
    expect(kept.sling).toMatchObject({ state: 'held', mayUse: false, nextDueOn: sling.nextDueOn });
    expect(kept.sling.openReasons).toMatchObject([
      { code: 'criterion', criterionId: 'chain.crack', confirmed: true, clearing: { isClearable: false } },
    ]);
    expect(kept.sling.openReasons[0]?.note).toContain('Third link');
    expect(kept.sling.photos.map(({ fileId }) => fileId)).toContain(photo);
    const ledger = await (await store.signIn('auditor')).get(`/api/ledger?slingId=${sling.id}&limit=2`);
    const [hold, inspected] = expectStatus<{ items: { type: string; at: string }[] }>(ledger, 200).items;
    expect([inspected?.type, hold?.type]).toEqual(['inspected', 'hold']);
    expect(hold?.at).toBe(inspected?.at);
  });

  it('needs no answer more: one finding holds even a frequent one with all else unsaid', async () => {
    const sling = await work.inService();
    const [row] = (await rowsOf(sling)).filter(({ id }) => id === 'chain.crack');
    const kept = await inspect(sling.id, { type: 'frequent', answers: [{ ...row?.clean, seen: true }] });
    expect(kept.body).toMatchObject({ inspection: { verdict: 'reject' }, sling: { state: 'held' } });
  });

  it('on a hook names that hook', async () => {
    const sling = await work.register();
    const rows = await rowsOf(sling);
    const hook = rows.filter(({ id }) => id === 'hook.crack')[1];
    const answers = rows.map((row) => (row === hook ? { ...row.clean, seen: true } : row.clean));
    const kept = expectStatus<CreateInspectionResponse>(
      await inspect(sling.id, { type: 'initial', answers }),
      201,
    );
    expect(kept.inspection.findings).toMatchObject([
      { criterionId: 'hook.crack', fittingId: hook?.fittingId },
    ]);
    expect(kept.sling.state).toBe('held');
  });

  it.each([
    ['tag.missing_illegible', 'makers_tag_missing', false],
    ['any.improper_repair', 'unauthorised_repair', true],
    ['hook.latch', 'latch', false],
    ['any.doubt', 'referred', false],
  ])('on %s holds as %s', async (criterionId, code, confirmed) => {
    const sling = await work.register();
    const answers = seeing(await rowsOf(sling), criterionId);
    const kept = expectStatus<CreateInspectionResponse>(
      await inspect(sling.id, { type: 'initial', answers }),
      201,
    );
    expect(kept.sling.state).toBe('held');
    expect(kept.sling.openReasons.length).toBeGreaterThan(0);
    for (const reason of kept.sling.openReasons)
      expect(reason).toMatchObject({ code, criterionId, confirmed });
    expect(kept.inspection.verdict).toBe(code === 'referred' ? 'refer' : 'reject');
  });
});

describe('the inspector’s own verdict', () => {
  it.each([
    ['reject', 'criterion', true],
    ['refer', 'referred', false],
  ])('may be stricter: %s holds as %s', async (verdict, code, confirmed) => {
    const sling = await work.inService();
    const body = {
      type: 'periodic',
      answers: clean(await rowsOf(sling)),
      stricter: { verdict, note: 'It sounds wrong' },
    };
    const kept = expectStatus<CreateInspectionResponse>(await inspect(sling.id, body), 201);
    expect(kept.inspection).toMatchObject({
      verdict,
      stricter: { verdict, note: 'It sounds wrong' },
      nextDueOn: null,
    });
    expect(kept.sling.openReasons).toMatchObject([{ code, confirmed, note: 'It sounds wrong' }]);
  });

  it('is never laxer: a crack called a pass stays a rejection', async () => {
    for (const verdict of ['pass', 'refer']) {
      const sling = await work.inService();
      const body = {
        type: 'periodic',
        answers: seeing(await rowsOf(sling), 'chain.crack'),
        stricter: { verdict, note: 'Looks fine to me' },
      };
      const kept = await inspect(sling.id, body);
      expect(kept.body).toMatchObject({ inspection: { verdict: 'reject' }, sling: { state: 'held' } });
    }
  });

  it('needs a note', async () => {
    const sling = await work.register();
    const body = {
      type: 'frequent',
      answers: [],
      restClean: true,
      stricter: { verdict: 'reject', note: ' ' },
    };
    expect(errorPaths(expectProblem(await inspect(sling.id, body), 422))).toEqual(['stricter.note']);
  });
});

describe('an answer', () => {
  it.each([
    ['to no criterion', { criterionId: 'chain.colour', seen: false }, 'criterionId'],
    ['to one of another kind', { criterionId: 'web.cut', seen: false }, 'criterionId'],
    ['without its figure', { criterionId: 'chain.crack' }, 'seen'],
    ['with a figure too many', { criterionId: 'chain.crack', seen: false, count: 3 }, 'count'],
    ['about a hook without saying which', { criterionId: 'hook.crack', seen: false }, 'fittingId'],
    [
      'about a hook of another sling',
      { criterionId: 'hook.crack', seen: false, fittingId: 999_999 },
      'fittingId',
    ],
    [
      'about a fitting where there is none',
      { criterionId: 'chain.crack', seen: false, fittingId: 1 },
      'fittingId',
    ],
  ])('%s is refused at its place', async (_, answer, field) => {
    const sling = await work.register();
    const body = { type: 'frequent', answers: [answer], restClean: true };
    expect(errorPaths(expectProblem(await inspect(sling.id, body), 422, 'invalid'))).toEqual([
      `answers.0.${field}`,
    ]);
  });

  it('given twice for one place is refused', async () => {
    const sling = await work.register();
    const answers = [true, false].map((seen) => ({ criterionId: 'chain.crack', seen }));
    const problem = expectProblem(
      await inspect(sling.id, { type: 'frequent', answers, restClean: true }),
      422,
    );
    expect(errorPaths(problem)).toEqual(['answers.1.criterionId']);
  });

  it('with a photo that is not here is refused, and nothing is kept', async () => {
    const sling = await work.inService();
    const rows = await rowsOf(sling);
    const answers = seeing(rows, 'chain.crack', { photoIds: ['00000000-0000-4000-8000-000000000000'] });
    expectProblem(await inspect(sling.id, { type: 'frequent', answers, restClean: true }), 422, 'invalid');
    expect((await work.read(sling.id)).state).toBe('in_service');
  });
});
