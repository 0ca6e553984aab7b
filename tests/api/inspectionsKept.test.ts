import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { CriteriaResponse, Inspection, VerdictResponse } from '../../shared/schemas/inspection';
import { addPerson, expectProblem } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

describe('who and when', () => {
  it('only while the sling is here', async () => {
    const sling = await work.register();
    const inspector = await store.signIn('inspector');
    const rows = expectStatus<CriteriaResponse>(
      await inspector.get(`/api/criteria/alloy-chain?slingId=${sling.id}`),
      200,
    ).items;
    await work.act('manager', sling, 'report_lost', { note: 'Gone' });
    const body = { type: 'initial', answers: rows.map(({ clean }) => clean) };
    expectProblem(await inspector.post(`/api/slings/${sling.id}/inspections`).send(body), 409, 'conflict');
  });

  it('keeps who inspected, and lists the newest first, a page at a time', async () => {
    const sling = await work.register();
    await work.inspect(sling, 'frequent');
    await work.inspect(sling, 'initial', { by: 'inspector2' });
    await work.inspect(sling, 'periodic');
    const auditor = await store.signIn('auditor');
    const seen: Inspection[] = [];
    let cursor: string | null = null;
    do {
      const answer = await auditor
        .get(`/api/slings/${sling.id}/inspections`)
        .query({ limit: 2, ...(cursor ? { cursor } : {}) });
      const page = expectStatus<{ items: Inspection[]; nextCursor: string | null }>(answer, 200);
      seen.push(...page.items);
      cursor = page.nextCursor;
    } while (cursor !== null);
    expect(seen.map(({ type, inspector }) => [type, inspector.name])).toEqual([
      ['periodic', 'Ruth Osei'],
      ['initial', 'Dov Lindqvist'],
      ['frequent', 'Ruth Osei'],
    ]);
  });

  it('is written once and for all', async () => {
    const sling = await work.register();
    const { inspectionId } = await work.inspect(sling, 'initial');
    for (const sql of [
      "UPDATE inspections SET verdict = 'reject' WHERE id = ?",
      'DELETE FROM inspections WHERE id = ?',
    ]) {
      await expect(store.database.appQuery(sql, [inspectionId])).rejects.toThrow();
      await expect(store.database.adminQuery(sql, [inspectionId])).rejects.toThrow(/An inspection is never/);
    }
  });
});

describe('a verdict asked for', () => {
  const chain = {
    kind: 'alloy-chain',
    spec: { grade: 80, chainMm: 10 },
    fittings: [{ id: 'a', type: 'hook' }],
  };
  const ask = async (body: object) => (await store.signIn('auditor')).post('/api/verdicts').send(body);

  it('computes with the rule sets of the site, and keeps nothing', async () => {
    const [before] = await store.database.adminQuery('SELECT COUNT(*) AS n FROM ledger');
    const none = expectStatus<VerdictResponse>(await ask({ ...chain, answers: [] }), 200);
    expect(none).toMatchObject({ verdict: 'pass', findings: [] });
    expect(none.ruleSets.map(({ id }) => id)).toEqual(['osha', 'asme', 'maker']);
    const answers = [
      { criterionId: 'chain.crack', seen: true },
      { criterionId: 'hook.crack', seen: true, fittingId: 'a' },
    ];
    const found = expectStatus<VerdictResponse>(await ask({ ...chain, answers, ruleSets: ['en'] }), 200);
    expect(found.verdict).toBe('reject');
    expect(found.findings).toMatchObject([
      {
        criterionId: 'chain.crack',
        ruleSet: 'en',
        others: expect.arrayContaining([{ ruleSet: 'osha', outcome: 'reject' }]) as unknown,
      },
      { criterionId: 'hook.crack', fittingId: 'a', ruleSet: 'en' },
    ]);
    expect(await store.database.adminQuery('SELECT COUNT(*) AS n FROM ledger')).toEqual([before]);
  });

  it('is never silent: what no chosen set speaks on, another one does', async () => {
    const answers = [{ criterionId: 'chain.weld_spatter', seen: true }];
    const answer = expectStatus<VerdictResponse>(await ask({ ...chain, answers, ruleSets: ['en'] }), 200);
    expect(answer.findings).toMatchObject([{ ruleSet: 'asme', isFromOtherSet: true }]);
    expect(answer.verdict).not.toBe('pass');
  });

  it.each([
    ['no kind', { kind: 'rubber-band' }],
    ['the spec of another kind', { spec: { fibre: 'nylon', diameterMm: 20 } }],
    ['a rule set that is none', { ruleSets: ['house'] }],
    ['an answer to nothing', { answers: [{ criterionId: 'web.cut', seen: true }] }],
  ])('is refused with %s', async (_, more) => {
    const answer = await ask({ ...chain, answers: [], ...more });
    expect([400, 422]).toContain(answer.status);
    expectProblem(answer, answer.status);
  });

  it('is answered also for somebody without a site', async () => {
    const { agent } = await addPerson(store, { roles: ['storekeeper'], siteIds: [] });
    const answer = await agent.post('/api/verdicts').send({ ...chain, answers: [] });
    expect(answer.body).toMatchObject({ verdict: 'pass' });
  });
});
