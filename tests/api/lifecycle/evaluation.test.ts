import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../../shared/schemas/slings';
import { expectStatus } from '../../support/work';
import { tryAct, unmetRules, verifyLedger } from './calls';
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
const returnIt = (sling: Sling) => act('inspector', sling, 'return_to_service');
const codesOf = (sling: Sling): string[] => sling.openReasons.map(({ code }) => code);

describe('an outcome that comes after the sling', () => {
  it('makes it returned when fit, and its own doubt ends', async () => {
    const { sling, line } = await scenes.back(null);
    const reportFileId = await scenes.work.photo('manager');
    expectStatus(await scenes.shipping.outcome(line, { outcome: 'fit', reportFileId }), 200);
    const now = await scenes.work.read(sling.id);
    expect(now.state).toBe('returned');
    expect(codesOf(now)).toEqual(['damage_suspected']);
    await scenes.work.inspect(sling, 'release');
    expectStatus(await returnIt(now), 200);
  });

  it('leaves it held when another reason was placed meanwhile', async () => {
    const { sling, line } = await scenes.back(null);
    await scenes.work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    expectStatus(await scenes.shipping.outcome(line, { outcome: 'fit' }), 200);
    expect((await scenes.work.read(sling.id)).state).toBe('held');
  });

  it('leaves it condemned when it was condemned meanwhile', async () => {
    const { sling, line } = await scenes.back(null);
    await scenes.work.act('manager', sling, 'condemn', { note: 'Enough' });
    expectStatus(await scenes.shipping.outcome(line, { outcome: 'fit' }), 200);
    expect(await scenes.work.read(sling.id)).toMatchObject({ state: 'held', condemned: true });
  });

  it.each(['unfit', 'not_examined'] as const)(
    'holds a returned sling when it turns out %s',
    async (outcome) => {
      const { sling, line } = await scenes.back('fit');
      expectStatus(await scenes.shipping.outcome(line, { outcome }), 200);
      const now = await scenes.work.read(sling.id);
      expect(now).toMatchObject({ state: 'held', mayUse: false });
      const code = outcome === 'unfit' ? 'evaluation_unfit' : 'record_in_doubt';
      expect(now.openReasons.at(-1)).toMatchObject({ code, confirmed: outcome === 'unfit' });
    },
  );

  it('places the confirmed reason on a held sling when unfit, and that is never released', async () => {
    const { sling, line } = await scenes.back(null);
    expectStatus(await scenes.shipping.outcome(line, { outcome: 'unfit' }), 200);
    const now = await scenes.work.read(sling.id);
    expect(codesOf(now)).toEqual(['damage_suspected', 'record_in_doubt', 'evaluation_unfit']);
    await scenes.work.inspect(sling, 'release');
    const answer = await act('inspector', sling, 'release', scenes.releaseBody(now));
    expect(unmetRules(answer)).toContain('confirmed_reason');
  });

  it('takes a sling out of service again when it turns out unfit after all', async () => {
    const { work, shipping } = scenes;
    const { sling, line } = await scenes.back('fit');
    await work.inspect(sling, 'release');
    expectStatus(await returnIt(sling), 200);
    expectStatus(await shipping.outcome(line, { outcome: 'unfit' }), 200);
    const now = await work.read(sling.id);
    expect(now).toMatchObject({ state: 'held', mayUse: false });
    expect(codesOf(now)).toEqual(['evaluation_unfit']);
  });
});

describe('return to service', () => {
  it('asks for the evaluator’s report', async () => {
    const { sling, line } = await scenes.back('fit', { more: { reportFileId: undefined } });
    await scenes.work.inspect(sling, 'release');
    expect(unmetRules(await returnIt(sling))).toEqual(['evaluation_report']);
    const reportFileId = await scenes.work.photo('manager');
    expectStatus(await scenes.shipping.outcome(line, { outcome: 'fit', reportFileId }), 200);
    expectStatus(await returnIt(sling), 200);
    const now = await scenes.work.read(sling.id);
    expect(now).toMatchObject({ state: 'in_service', mayUse: true, openReasons: [] });
  });

  it('asks for a release inspection made since it came back', async () => {
    const { work, shipping } = scenes;
    const held = await scenes.secured();
    await work.inspect(held, 'release');
    const line = await shipping.ship(held);
    const reportFileId = await work.photo('manager');
    expectStatus(await shipping.outcome(line, { outcome: 'fit', reportFileId }), 200);
    const back = await work.act('storekeeper', held, 'receive_back', { locationId: scenes.rackId });
    expect(unmetRules(await returnIt(back))).toEqual(['release_inspection']);
    await work.inspect(back, 'periodic');
    expect(unmetRules(await returnIt(back))).toEqual(['release_inspection']);
    await work.inspect(back, 'release', { by: 'inspector2' });
    expectStatus(await returnIt(back), 200);
  });

  it('asks after a repair who repaired it and for a proof test at twice the rated load or more', async () => {
    const { shipping, work } = scenes;
    const { sling, line } = await scenes.back('repaired');
    await work.inspect(sling, 'release');
    const reportFileId = await work.photo('manager');
    const repairer = 'Fennel & Stroud';
    const tries = [
      [{}, ['proof_test', 'repairer']],
      [{ repairer }, ['proof_test']],
      // 2 × 3,150 kg: product design section 4 with 29 CFR 1910.184(e)(4), trade facts 1.7.
      [{ repairer, proofCertificate: scenes.proof(6299) }, ['proof_test']],
      [{ proofCertificate: scenes.proof(6300) }, ['repairer']],
    ] as const;
    for (const [more, unmet] of tries) {
      expectStatus(await shipping.outcome(line, { outcome: 'repaired', reportFileId, ...more }), 200);
      expect(unmetRules(await returnIt(sling))).toEqual(unmet);
    }
    const proofCertificate = scenes.proof(6300);
    expectStatus(
      await shipping.outcome(line, { outcome: 'repaired', reportFileId, repairer, proofCertificate }),
      200,
    );
    expectStatus(await returnIt(sling), 200);
  });

  it('never lets a repaired web sling back, whatever comes with it', async () => {
    const { sling } = await scenes.back('repaired', {
      overrides: { kind: 'synthetic-web' },
      more: { repairer: 'Somebody handy', proofCertificate: scenes.proof(90_000) },
    });
    await scenes.work.inspect(sling, 'release');
    expect(unmetRules(await returnIt(sling))).toContain('repair_not_allowed');
  });

  it('asks for a live label and a legible maker’s tag', async () => {
    const { work, store } = scenes;
    const { sling } = await scenes.back('fit');
    await work.inspect(sling, 'release');
    expectStatus(
      await (
        await store.signIn('storekeeper')
      )
        .post(`/api/tags/${sling.tag?.code}/void`)
        .send({ reason: 'lost', note: 'Fell off on the lorry' }),
      200,
    );
    await correct(sling, { makersTag: 'illegible' });
    expect(unmetRules(await returnIt(sling))).toEqual(['live_label', 'makers_tag']);
  });

  it('closes the reasons that were open when it was sent, rejected ones too', async () => {
    const { work, shipping } = scenes;
    const sling = await work.inService();
    await work.inspect(sling, 'frequent', { seen: ['chain.nick_gouge'] });
    await work.act('storekeeper', sling, 'secure', { locationId: work.cageId });
    const line = await shipping.ship(sling, 'repair');
    const reportFileId = await work.photo('manager');
    expectStatus(
      await shipping.outcome(line, {
        outcome: 'repaired',
        reportFileId,
        repairer: 'Fennel & Stroud',
        proofCertificate: scenes.proof(6300),
      }),
      200,
    );
    const back = await work.act('storekeeper', sling, 'receive_back', { locationId: scenes.rackId });
    expect(codesOf(back)).toEqual(['criterion']);
    await work.inspect(back, 'release');
    expectStatus(await returnIt(back), 200);
    expect(await work.read(sling.id)).toMatchObject({ state: 'in_service', openReasons: [], mayUse: true });
  });
});

async function correct(sling: Sling, changes: object): Promise<void> {
  const evidenceFileIds = [await scenes.work.photo('inspector')];
  expectStatus(
    await (
      await scenes.store.signIn('inspector')
    )
      .post(`/api/slings/${sling.id}/corrections`)
      .send({ changes, reason: 'Read again on the sling', evidenceFileIds }),
    200,
  );
}

describe('another rated load after evaluation', () => {
  it('is never higher', async () => {
    const { sling } = await scenes.back('fit', { more: { ratedLoads: { verticalKg: 3151 } } });
    await scenes.work.inspect(sling, 'release');
    expect(unmetRules(await returnIt(sling))).toEqual(['rated_load']);
  });

  it('is lower only with a certificate made since it was sent, and then stands on the record', async () => {
    const { work, store } = scenes;
    const { sling } = await scenes.back('fit', {
      more: { ratedLoads: { verticalKg: 2000, chokerKg: 1600 } },
    });
    await work.inspect(sling, 'release');
    expect(unmetRules(await returnIt(sling))).toEqual(['rated_load']);
    expectStatus(
      await (
        await store.signIn('manager')
      )
        .post(`/api/slings/${sling.id}/certificates`)
        .send(scenes.proof(4000)),
      201,
    );
    expectStatus(await returnIt(sling), 200);
    expect((await work.read(sling.id)).ratedLoads).toEqual({ verticalKg: 2000, chokerKg: 1600 });
  });

  it('stands on the record too when it was held again and released', async () => {
    const { work } = scenes;
    const { sling } = await scenes.back('fit', {
      more: { ratedLoads: { verticalKg: 2000 }, proofCertificate: scenes.proof(4000) },
    });
    const held = await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    await work.inspect(sling, 'release');
    expectStatus(await act('inspector', sling, 'release', scenes.releaseBody(held)), 200);
    expect((await work.read(sling.id)).ratedLoads).toEqual({ verticalKg: 2000 });
    // A later hold and release has nothing to do with that evaluation any more.
    await correct(sling, { ratedLoads: { verticalKg: 1500 } });
    const again = await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    await work.inspect(sling, 'release');
    expectStatus(await act('inspector', sling, 'release', scenes.releaseBody(again)), 200);
    expect((await work.read(sling.id)).ratedLoads).toEqual({ verticalKg: 1500 });
  });
});

describe('release of a sling that was sent since it was last in service', () => {
  it('asks for all that return to service asks', async () => {
    const { work, shipping } = scenes;
    const { sling, line } = await scenes.back(null);
    await work.inspect(sling, 'release');
    const now = await work.read(sling.id);
    const tryRelease = () => act('inspector', sling, 'release', scenes.releaseBody(now));
    expect(unmetRules(await tryRelease())).toEqual(['evaluation_outcome', 'evaluation_report']);
    await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    expectStatus(await shipping.outcome(line, { outcome: 'repaired' }), 200);
    expect(unmetRules(await tryRelease())).toEqual([
      'evaluation_report',
      'proof_test',
      'release_inspection',
      'repairer',
    ]);
  });

  it('does not count a release inspection from before it was sent', async () => {
    const { work, shipping } = scenes;
    const held = await scenes.secured();
    await work.inspect(held, 'release');
    await work.act('manager', held, 'condemn', { note: 'Not worth it' });
    const line = await shipping.ship(held, 'destroy');
    const reportFileId = await work.photo('manager');
    expectStatus(await shipping.outcome(line, { outcome: 'fit', reportFileId }), 200);
    await work.act('storekeeper', held, 'receive_back', { locationId: scenes.rackId });
    const { inspectionId } = await work.inspect(held, 'periodic', { by: 'inspector2' });
    expectStatus(
      await act('manager2', held, 'withdraw_as_error', {
        condemnation: true,
        inspectionId,
        photoIds: [reportFileId],
        note: 'It was another sling',
      }),
      200,
    );
    const body = scenes.releaseBody(await work.read(held.id));
    expect(unmetRules(await act('inspector', held, 'release', body))).toEqual(['release_inspection']);
  });
});
