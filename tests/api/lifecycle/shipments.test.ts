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
  expect(await verifyLedger(scenes.store)).toMatchObject({ ok: true });
  await scenes.close();
});

const act = (by: string, sling: Pick<Sling, 'id'>, action: string, body: object = {}) =>
  tryAct(scenes.store, by, sling.id, action, body);
const codesOf = (sling: Sling): string[] => sling.openReasons.map(({ code }) => code);

describe('a shipment', () => {
  it('takes only a held sling that stands in a cage, and all of them or none', async () => {
    const { shipping, work } = scenes;
    const loose = await scenes.held();
    const draft = expectStatus<{ id: number }>(await shipping.draft(loose, 'evaluate'), 201);
    const notSecured = await shipping.send(draft.id);
    expect([notSecured.status, unmetRules(notSecured)]).toEqual([422, ['secured']]);
    expect((await work.read(loose.id)).state).toBe('held');

    await work.act('inspector', loose, 'secure', { locationId: work.cageId });
    expect((await shipping.send(draft.id, 'storekeeper')).status).toBe(403);
    expectStatus(await shipping.send(draft.id), 200);
    expect(await work.read(loose.id)).toMatchObject({
      state: 'sent_for_evaluation',
      mayUse: false,
      custody: { kind: 'evaluator' },
    });
    expect((await shipping.send(draft.id)).status).toBe(409);

    const inService = await work.inService();
    const other = expectStatus<{ id: number }>(await shipping.draft(inService, 'evaluate'), 201);
    const refused = await shipping.send(other.id);
    expect(refused.status).toBe(409);
    expect(problemOf(refused)).toMatchObject({ from: 'in_service' });
  });

  it('is the only way out: the action alone is refused', async () => {
    const sling = await scenes.secured();
    const answer = await act('manager', sling, 'send');
    expect([answer.status, unmetRules(answer)]).toEqual([422, ['shipment']]);
  });

  it.each(['wire-rope', 'synthetic-web', 'synthetic-round', 'synthetic-rope'] as const)(
    'never takes a %s sling to be repaired',
    async (kind) => {
      const sling = await scenes.work.register({ kind });
      const answer = await scenes.shipping.draft(sling, 'repair');
      expect([answer.status, unmetRules(answer)]).toEqual([422, ['purpose']]);
      expect((await scenes.shipping.draft(sling, 'evaluate')).status).toBe(201);
    },
  );

  it('takes a condemned sling to be destroyed and for nothing else, and only a condemned one', async () => {
    const condemned = await scenes.condemned();
    for (const purpose of ['evaluate', 'repair'] as const) {
      expect((await scenes.shipping.draft(condemned, purpose)).status).toBe(422);
    }
    const sound = await scenes.secured();
    expect((await scenes.shipping.draft(sound, 'destroy')).status).toBe(422);
    // Condemned after it was put on the shipment: it stays here.
    const draft = expectStatus<{ id: number }>(await scenes.shipping.draft(sound, 'repair'), 201);
    await scenes.work.act('manager', sound, 'condemn', { note: 'Cracked' });
    expect(unmetRules(await scenes.shipping.send(draft.id))).toEqual(['purpose']);
  });
});

describe('receiving back', () => {
  it.each([
    ['fit', 'returned', []],
    ['repaired', 'returned', []],
    ['unfit', 'held', ['evaluation_unfit']],
    ['not_examined', 'held', ['record_in_doubt']],
    [null, 'held', ['record_in_doubt']],
  ] as const)('with the outcome %s leads to %s', async (outcome, state, added) => {
    const { sling } = await scenes.back(outcome);
    expect(sling).toMatchObject({ state, mayUse: false, custody: { locationId: scenes.rackId } });
    expect(codesOf(sling)).toEqual(['damage_suspected', ...added]);
    const confirmed = sling.openReasons.filter((reason) => reason.confirmed).map(({ code }) => code);
    expect(confirmed).toEqual(added.filter((code) => code === 'evaluation_unfit'));
    for (const reason of sling.openReasons.slice(1)) expect(reason.placedBy).toBeNull();
  });

  it('leaves a condemned sling condemned and held, whatever the evaluator says', async () => {
    const { sling } = await scenes.back('fit', { purpose: 'destroy' });
    expect(sling).toMatchObject({ state: 'held', condemned: true });
    expect((await act('inspector', sling, 'return_to_service')).status).toBe(409);
  });

  it('asks for nothing but a place, which is one of this site', async () => {
    const { sling } = await scenes.sent();
    expect((await act('storekeeper', sling, 'receive_back', {})).status).toBe(422);
    const elsewhere = await act('storekeeper', sling, 'receive_back', {
      locationId: scenes.otherSiteCageId,
    });
    expect([elsewhere.status, errorPaths(elsewhere)]).toEqual([422, ['locationId']]);
    expect(
      await scenes.work.act('manager', sling, 'receive_back', { locationId: scenes.work.cageId }),
    ).toMatchObject({ state: 'held', custody: { kind: 'cage' } });
  });

  it('keeps it held when a report came while it was away', async () => {
    const { work, store, shipping } = scenes;
    const { sling, line } = await scenes.sent();
    const answer = await store
      .guest()
      .post(`/api/public/tags/${sling.tag?.code}/reports`)
      .send({ name: 'Crew 3', note: 'It was dropped before' });
    expect(answer.status).toBe(201);
    await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    const away = await work.read(sling.id);
    expect(away.state).toBe('sent_for_evaluation');
    expect(codesOf(away)).toEqual(['damage_suspected', 'damage_suspected', 'latch']);
    const reportFileId = await work.photo('manager');
    expectStatus(await shipping.outcome(line, { outcome: 'fit', reportFileId }), 200);
    const back = await work.act('storekeeper', sling, 'receive_back', { locationId: scenes.rackId });
    expect(back).toMatchObject({ state: 'held', mayUse: false });
    expect(codesOf(back)).toHaveLength(3);
  });
});

describe('destruction by the evaluator', () => {
  it.each(['evaluate', 'destroy'] as const)('needs the certificate, sent to %s', async (purpose) => {
    const { work, shipping } = scenes;
    const { sling, line } = await scenes.sent({ purpose });
    expect(unmetRules(await shipping.destroyed(line))).toEqual(['destruction_certificate']);
    const reportFileId = await work.photo('manager');
    expectStatus(await shipping.outcome(line, { outcome: 'unfit', reportFileId }), 200);
    expect(unmetRules(await shipping.destroyed(line))).toEqual(['destruction_certificate']);
    expectStatus(await shipping.outcome(line, { outcome: 'destroyed' }), 200);
    expect(unmetRules(await shipping.destroyed(line))).toEqual(['destruction_certificate']);
    expectStatus(await shipping.outcome(line, { outcome: 'destroyed', reportFileId }), 200);
    expect((await act('manager', sling, 'destroyed_by_evaluator')).status).toBe(422);
    expect((await shipping.destroyed(line, 'storekeeper')).status).toBe(403);
    expectStatus(await shipping.destroyed(line), 200);
    expect(await work.read(sling.id)).toMatchObject({
      state: 'destroyed',
      mayUse: false,
      custody: { kind: 'none' },
      tag: null,
    });
    expect((await shipping.destroyed(line)).status).toBe(409);
    expect((await shipping.outcome(line, { outcome: 'fit' })).status).toBe(409);
    expect((await act('storekeeper', sling, 'receive_back', { locationId: scenes.rackId })).status).toBe(409);
  });
});
