import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../../shared/schemas/slings';
import { expectStatus } from '../../support/work';
import { errorPaths, problemOf, tryAct, unmetRules, verifyLedger } from './calls';
import { openScenes, type Scenes } from './scenes';

let scenes: Scenes;

beforeAll(async () => {
  scenes = await openScenes();
});
afterAll(async () => {
  // Whatever was tried: every chain still holds.
  expect(await verifyLedger(scenes.store)).toMatchObject({ ok: true });
  await scenes.close();
});

const act = (by: string, sling: Pick<Sling, 'id'>, action: string, body: object = {}) =>
  tryAct(scenes.store, by, sling.id, action, body);
const release = async (sling: Sling, by = 'inspector', evidenceFileId?: string) =>
  act(by, sling, 'release', scenes.releaseBody(await scenes.work.read(sling.id), evidenceFileId));

describe('received, held, released', () => {
  it('asks a release for all that acceptance asks when the sling was never accepted', async () => {
    const { work } = scenes;
    const registered = await work.register({ proofCertificate: undefined });
    const sling = await work.act('storekeeper', registered, 'hold', { reasons: [{ code: 'latch' }] });
    const first = await release(sling);
    expect(first.status).toBe(422);
    expect(unmetRules(first)).toEqual([
      'certificate',
      'initial_inspection',
      'live_label',
      'release_inspection',
    ]);

    await work.inspect(sling, 'release');
    expect(unmetRules(await release(sling))).toEqual(['certificate', 'initial_inspection', 'live_label']);
    await work.inspect(sling, 'initial');
    expect(unmetRules(await release(sling))).toEqual(['certificate', 'live_label']);
    await work.confirm(sling, await work.label(sling));
    expect(unmetRules(await release(sling))).toEqual(['certificate']);
    expectStatus(
      await (
        await scenes.store.signIn('storekeeper')
      )
        .post(`/api/slings/${sling.id}/certificates`)
        .send(scenes.proof(6300)),
      201,
    );
    expectStatus(await release(sling), 200);
    expect(await work.read(sling.id)).toMatchObject({ state: 'in_service', mayUse: true, openReasons: [] });
  });

  it('asks no certificate and no initial inspection again once it was in service', async () => {
    const sling = await scenes.held();
    await scenes.work.inspect(sling, 'release');
    expectStatus(await release(sling), 200);
  });

  it('counts only a complete passing release inspection of the releaser, after the last reason', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    await work.inspect(sling, 'release');
    await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'overload_or_shock' }] });
    expect(unmetRules(await release(sling))).toEqual(['release_inspection']);
    await work.inspect(sling, 'periodic');
    await work.inspect(sling, 'initial');
    expect(unmetRules(await release(sling))).toEqual(['release_inspection']);
    await work.inspect(sling, 'release', { by: 'inspector2' });
    expect(unmetRules(await release(sling))).toEqual(['release_inspection']);
    await work.inspect(sling, 'release');
    await work.act('manager', sling, 'hold', { reasons: [{ code: 'latch' }] });
    expect(unmetRules(await release(sling))).toEqual(['release_inspection']);
    await work.inspect(sling, 'release');
    expectStatus(await release(sling), 200);
  });

  it('wants each open reason cleared, with a note, and no other', async () => {
    const { work } = scenes;
    const held = await scenes.held();
    const sling = await work.act('manager', held, 'hold', { reasons: [{ code: 'latch' }] });
    await work.inspect(sling, 'release');
    const [first, second] = sling.openReasons;
    const clear = (...ids: (number | undefined)[]) =>
      act('inspector', sling, 'release', { clear: ids.map((reasonId) => ({ reasonId, note: 'Sound' })) });
    expect((await clear()).status).toBe(422);
    expect((await clear(first?.id)).status).toBe(422);
    expect((await clear(first?.id, second?.id, 999_999)).status).toBe(422);
    const noNote = { clear: sling.openReasons.map(({ id }) => ({ reasonId: id, note: '  ' })) };
    expect(errorPaths(await act('inspector', sling, 'release', noNote))).toContain('clear.0.note');
    expect((await work.read(sling.id)).state).toBe('held');
    expectStatus(await clear(first?.id, second?.id), 200);
  });

  it('lets nobody release a reason of their own, not even with another inspector’s inspection', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    await work.act('inspector', sling, 'hold', { reasons: [{ code: 'damage_suspected' }] });
    await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    await work.inspect(sling, 'release');
    await work.inspect(sling, 'release', { by: 'inspector2' });
    const own = await release(sling);
    expect(own.status).toBe(403);
    expect(problemOf(own).type).toMatch(/same-person$/);
    expectStatus(await release(sling, 'inspector2'), 200);
  });
});

describe('what each reason asks', () => {
  it('never releases what an inspection rejected', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    const rejected = await work.inspect(sling, 'frequent', { by: 'inspector2', seen: ['chain.crack'] });
    expect(rejected.verdict).toBe('reject');
    expect(rejected.sling).toMatchObject({ state: 'held', mayUse: false });
    expect(rejected.sling.openReasons[0]).toMatchObject({ code: 'criterion', confirmed: true });
    await work.inspect(sling, 'release');
    expect(unmetRules(await release(sling))).toContain('confirmed_reason');
  });

  it('never releases an unauthorised repair', async () => {
    const sling = await scenes.held('unauthorised_repair');
    await scenes.work.inspect(sling, 'release');
    expect(unmetRules(await release(sling))).toContain('confirmed_reason');
  });

  it.each(['missing', 'illegible'] as const)(
    'wants evidence of the new tag for a maker’s tag that is %s, and then shows it legible',
    async (makersTag) => {
      const { work } = scenes;
      const sling = await work.register({ makersTag });
      await work.confirm(sling, await work.label(sling));
      await work.inspect(sling, 'initial');
      const reasons = [{ code: `makers_tag_${makersTag}` }];
      await work.act('storekeeper', sling, 'hold', { reasons });
      await work.inspect(sling, 'release');
      const without = await release(sling);
      expect(without.status).toBe(422);
      expect(errorPaths(without)).toEqual(['clear.0.evidenceFileId']);
      expectStatus(await release(sling, 'inspector', await work.photo()), 200);
      expect(await work.read(sling.id)).toMatchObject({
        state: 'in_service',
        makersTag: 'legible',
        mayUse: true,
      });
    },
  );

  it.each(['synthetic-web', 'synthetic-round', 'synthetic-rope'] as const)(
    'never clears heat or chemicals on a %s sling',
    async (kind) => {
      const sling = await scenes.held('heat_or_chemical', { kind });
      await scenes.work.inspect(sling, 'release');
      const answer = await release(sling, 'inspector', await scenes.work.photo());
      expect(answer.status).toBe(422);
      expect(unmetRules(answer)).toEqual(['reason_not_clearable']);
    },
  );

  it('clears heat on a chain with evidence by a qualified inspector alone', async () => {
    const { work, store } = scenes;
    const sling = await scenes.held('heat_or_chemical');
    await work.inspect(sling, 'release');
    const evidence = await work.photo();
    await setQualified(false);
    expect(unmetRules(await release(sling, 'inspector', evidence))).toEqual(['qualified_person']);
    await setQualified(true);
    expect(errorPaths(await release(sling))).toEqual(['clear.0.evidenceFileId']);
    expectStatus(await release(sling, 'inspector', evidence), 200);
    expect(await verifyLedger(store, sling.id)).toMatchObject({ ok: true });
  });

  it('leaves a referred sling to a qualified inspector', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    const referred = await work.inspect(sling, 'frequent', { by: 'inspector2', seen: ['any.doubt'] });
    expect(referred.sling.openReasons.map(({ code }) => code)).toEqual(['referred']);
    await work.inspect(sling, 'release');
    await setQualified(false);
    expect(unmetRules(await release(sling))).toEqual(['qualified_person']);
    await setQualified(true);
    expectStatus(await release(sling), 200);
  });

  it('takes no reason by hand that only an inspection, a notice or the system sets', async () => {
    const sling = await scenes.work.register();
    for (const code of [
      'criterion',
      'referred',
      'makers_notice',
      'evaluation_unfit',
      'found',
      'identity_unknown',
    ]) {
      const answer = await act('inspector', sling, 'hold', { reasons: [{ code }] });
      expect([code, answer.status]).toEqual([code, 422]);
    }
    expect((await act('inspector', sling, 'hold', { reasons: [{ code: 'other' }] })).status).toBe(422);
  });
});

/** Whether `inspector` is a qualified person, as an administrator would say it. */
async function setQualified(isQualified: boolean): Promise<void> {
  const id = scenes.store.people.get('inspector')?.id ?? 0;
  await scenes.store.database.adminQuery('UPDATE designations SET is_qualified = ? WHERE user_id = ?', [
    isQualified,
    id,
  ]);
}

describe('the inspector’s designation', () => {
  it('gates acceptance, inspection and release when it lapsed or does not cover the kind', async () => {
    const { work, store } = scenes;
    const id = store.people.get('inspector')?.id ?? 0;
    const sling = await scenes.held();
    await work.inspect(sling, 'release');
    const fresh = await work.register();
    for (const change of ["until_on = '2020-01-01'", `until_on = NULL, kinds = '["wire-rope"]'`]) {
      await store.database.adminQuery(`UPDATE designations SET ${change} WHERE user_id = ?`, [id]);
      expect(unmetRules(await release(sling))).toContain('designation');
      expect(unmetRules(await act('inspector', fresh, 'accept'))).toContain('designation');
      const inspection = await (
        await store.signIn('inspector')
      )
        .post(`/api/slings/${fresh.id}/inspections`)
        .send({ type: 'frequent', answers: [], restClean: true });
      expect([inspection.status, unmetRules(inspection)]).toEqual([422, ['designation']]);
    }
    const kinds = JSON.stringify([
      'alloy-chain',
      'wire-rope',
      'metal-mesh',
      'synthetic-web',
      'synthetic-round',
      'synthetic-rope',
    ]);
    await store.database.adminQuery('UPDATE designations SET kinds = ? WHERE user_id = ?', [kinds, id]);
    expectStatus(await release(sling), 200);
  });
});

describe('lost and found', () => {
  it.each([
    ['the storekeeper', 'found'],
    ['a hold', 'hold'],
    ['a damage report', 'report'],
  ])('comes back held when found by %s, with everything that was open before', async (_who, way) => {
    const { work, store } = scenes;
    const sling = await scenes.secured();
    const lost = await work.act('manager', sling, 'report_lost', { note: 'Not there at the count' });
    expect(lost).toMatchObject({ state: 'lost', mayUse: false, custody: { kind: 'unknown' } });
    expect(lost.openReasons).toHaveLength(1);
    if (way === 'found') await work.act('storekeeper', lost, 'found', { locationId: scenes.rackId });
    else if (way === 'hold') await work.act('storekeeper', lost, 'hold', { reasons: [{ code: 'latch' }] });
    else {
      const report = await store
        .guest()
        .post(`/api/public/tags/${sling.tag?.code}/reports`)
        .send({ name: 'Crew 4', note: 'Lay behind the shed' });
      expect(report.status).toBe(201);
    }
    const back = await work.read(sling.id);
    expect(back.state).toBe('held');
    const codes = back.openReasons.map(({ code }) => code);
    expect(codes.slice(0, 2)).toEqual(['damage_suspected', 'found']);
    expect(codes[2]).toBe({ found: undefined, hold: 'latch', report: 'damage_suspected' }[way]);
    expect(back.openReasons[1]?.placedBy).toBeNull();
    // Nothing that was seen before it was lost counts any more.
    expect(unmetRules(await release(back))).toEqual(['release_inspection']);
    await work.inspect(back, 'release');
    expectStatus(await release(back), 200);
  });

  it('stays condemned while lost and when found', async () => {
    const { work } = scenes;
    const sling = await scenes.condemned();
    const lost = await work.act('manager2', sling, 'report_lost', { note: 'Gone' });
    expect(lost).toMatchObject({ state: 'lost', condemned: true });
    const found = await work.act('inspector', lost, 'found', {});
    expect(found).toMatchObject({ state: 'held', condemned: true, custody: { kind: 'unknown' } });
    expect((await act('inspector', found, 'release', { clear: [] })).status).toBe(409);
    const samePerson = await act('manager', found, 'destroy', await scenes.destroyBody(found));
    expect(samePerson.status).toBe(403);
  });
});

describe('a cage', () => {
  it('has to be a cage of the site where the sling is', async () => {
    const sling = await scenes.held();
    for (const locationId of [scenes.rackId, scenes.otherSiteCageId, 999_999]) {
      const answer = await act('storekeeper', sling, 'secure', { locationId });
      expect([answer.status, errorPaths(answer)]).toEqual([422, ['locationId']]);
    }
    const secured = await scenes.work.act('storekeeper', sling, 'secure', { locationId: scenes.work.cageId });
    expect(secured.custody).toMatchObject({ kind: 'cage', locationId: scenes.work.cageId });
    await scenes.work.inspect(sling, 'release');
    expectStatus(await release(sling), 200);
    expect((await scenes.work.read(sling.id)).custody.kind).toBe('in_store');
  });
});

describe('a damage report on a label', () => {
  it('holds a received and an in-service sling, and adds to a held one', async () => {
    const { work, store } = scenes;
    const sling = await work.inService();
    for (const count of [1, 2]) {
      const answer = await store
        .guest()
        .post(`/api/public/tags/${sling.tag?.code}/reports`)
        .send({ name: 'Crew 2', note: 'A link is bent' });
      expect(answer.status).toBe(201);
      const now = await work.read(sling.id);
      expect(now.state).toBe('held');
      expect(now.openReasons.map(({ code, placedBy }) => [code, placedBy])).toEqual(
        Array(count).fill(['damage_suspected', null]),
      );
    }
  });

  it('is kept, and holds nothing, on a void label and on that of a destroyed sling', async () => {
    const { work, store } = scenes;
    const relabelled = await work.inService();
    const oldCode = relabelled.tag?.code ?? '';
    await work.confirm(relabelled, await work.label(relabelled, 'lost'));
    const destroyed = await scenes.condemned();
    await work.act('storekeeper', destroyed, 'destroy', await scenes.destroyBody(destroyed));
    for (const [code, sling, state] of [
      [oldCode, relabelled, 'in_service'],
      [destroyed.tag?.code ?? '', destroyed, 'destroyed'],
    ] as const) {
      const before = await work.read(sling.id);
      const answer = await store
        .guest()
        .post(`/api/public/tags/${code}/reports`)
        .send({ name: 'Crew 9', note: 'Found this one' });
      expect(answer.status).toBe(201);
      const after = await work.read(sling.id);
      expect(after).toMatchObject({ state, version: before.version + 1 });
      expect((await store.guest().get(`/api/public/tags/${code}`)).body).toMatchObject({
        verdict: 'do_not_use',
      });
    }
  });
});
