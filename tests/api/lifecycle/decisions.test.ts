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
const HIRED = { owner: { kind: 'hired', name: 'Dock Hire', offHireOn: '2099-01-01' } } as const;

describe('a condemned sling', () => {
  it('is open to nothing but hold, secure, report_lost, withdraw_as_error, destroy and a shipment', async () => {
    const { work } = scenes;
    const sling = await scenes.condemned();
    const refused = ['accept', 'release', 'condemn', 'receive_back', 'return_to_service', 'found', 'depart'];
    const bodies: Record<string, object> = {
      release: { clear: [] },
      condemn: { note: 'Again' },
      receive_back: { locationId: work.cageId },
      depart: { cause: 'sold', note: 'Scrap' },
    };
    for (const action of refused) {
      const by = ['accept', 'release', 'return_to_service'].includes(action) ? 'inspector' : 'manager2';
      const answer = await act(by, sling, action, bodies[action]);
      expect([action, answer.status]).toEqual([action, 409]);
      expect(problemOf(answer).type).toMatch(/illegal-transition$/);
      expect(problemOf(answer).from).toBe('held');
      expect([...(problemOf(answer).allowed ?? [])].sort()).toEqual(
        ['destroy', 'hold', 'report_lost', 'secure', 'send', 'withdraw_as_error'].sort(),
      );
    }
    expect((await work.read(sling.id)).version).toBe(sling.version);
    await work.act('storekeeper', sling, 'hold', { reasons: [{ code: 'latch' }] });
    await work.act('storekeeper', sling, 'secure', { locationId: work.cageId });
    expect(await work.read(sling.id)).toMatchObject({ state: 'held', condemned: true });
  });

  it('is destroyed by another than who condemned it, with photo, every fate and their own password', async () => {
    const { work } = scenes;
    const sling = await scenes.condemned();
    const body = await scenes.destroyBody(sling);
    const [fitting] = sling.fittings;
    const own = await act('manager', sling, 'destroy', body);
    expect([own.status, problemOf(own).type.split('/').at(-1)]).toEqual([403, 'same-person']);
    for (const [change, path] of [
      [{ photoIds: [] }, 'photoIds'],
      [{ method: ' ' }, 'method'],
      [{ fittings: [] }, 'fittings'],
      [{ fittings: sling.fittings.map(() => ({ fittingId: fitting?.id, fate: 'destroyed' })) }, 'fittings'],
      [{ legs: [{ leg: 1, fate: 'destroyed' }] }, 'legs'],
      [{ password: 'marram-quay-dem' }, 'password'],
    ] as const) {
      const answer = await act('storekeeper', sling, 'destroy', { ...body, ...change });
      expect([path, answer.status]).toEqual([path, 422]);
      expect(errorPaths(answer)).toContain(path);
    }
    expect(await work.read(sling.id)).toMatchObject({ state: 'held', version: sling.version });
    await work.act('manager2', sling, 'destroy', body);
    expect(await work.read(sling.id)).toMatchObject({
      state: 'destroyed',
      tag: null,
      custody: { kind: 'none' },
    });
    for (const [by, action, again] of [
      ['storekeeper', 'hold', { reasons: [{ code: 'latch' }] }],
      ['storekeeper', 'destroy', body],
      ['storekeeper', 'found', {}],
    ] as const) {
      const answer = await act(by, sling, action, again);
      expect([answer.status, problemOf(answer).allowed]).toEqual([409, []]);
    }
  });

  it('was held first: nothing is condemned out of another state, nor destroyed without it', async () => {
    const sling = await scenes.work.inService();
    expect((await act('manager', sling, 'condemn', { note: 'Old' })).status).toBe(409);
    const held = await scenes.secured();
    expect((await act('storekeeper', held, 'destroy', await scenes.destroyBody(held))).status).toBe(409);
  });
});

describe('withdrawing as error', () => {
  /** Rejected by `inspector`, in the cage. */
  async function rejected(): Promise<Sling> {
    const sling = await scenes.work.inService();
    await scenes.work.inspect(sling, 'frequent', { seen: ['chain.crack'] });
    return scenes.work.act('storekeeper', sling, 'secure', { locationId: scenes.work.cageId });
  }
  const withdraw = async (sling: Sling, inspectionId: number, what: object, by = 'manager') =>
    act(by, sling, 'withdraw_as_error', {
      inspectionId,
      photoIds: [await scenes.work.photo('manager')],
      note: 'Another sling was meant',
      ...what,
    });

  it('of a rejection needs another inspector’s complete new inspection that does not reject again', async () => {
    const { work } = scenes;
    const sling = await rejected();
    const reasonId = sling.openReasons[0]?.id;
    const by = 'inspector2';
    const own = await work.inspect(sling, 'periodic');
    expect((await withdraw(sling, own.inspectionId, { reasonId })).status).toBe(403);
    const frequent = await work.inspect(sling, 'frequent', { by });
    expect(unmetRules(await withdraw(sling, frequent.inspectionId, { reasonId }))).toEqual([
      'complete_inspection',
    ]);
    const other = await work.inspect(await work.register(), 'periodic', { by });
    expect(errorPaths(await withdraw(sling, other.inspectionId, { reasonId }))).toEqual(['inspectionId']);
    const good = await work.inspect(sling, 'periodic', { by });
    expect(errorPaths(await withdraw(sling, good.inspectionId, { reasonId, photoIds: [] }))).toEqual([
      'photoIds',
    ]);
    expect((await withdraw(sling, good.inspectionId, { reasonId }, 'inspector2')).status).toBe(403);

    expectStatus(await withdraw(sling, good.inspectionId, { reasonId }), 200);
    const after = await work.read(sling.id);
    // Unconfirmed, but open and on record: the rules of release apply.
    expect(after).toMatchObject({ state: 'held', openReasons: [{ id: reasonId, confirmed: false }] });
    expect((await withdraw(sling, good.inspectionId, { reasonId })).status).toBe(422);
  });

  it('does not count an inspection from before what is withdrawn, nor one that rejects', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    const early = await work.inspect(sling, 'periodic', { by: 'inspector2' });
    const rejection = await work.inspect(sling, 'frequent', { seen: ['chain.crack'] });
    const reasonId = rejection.sling.openReasons[0]?.id;
    expect(unmetRules(await withdraw(sling, early.inspectionId, { reasonId }))).toEqual(['new_inspection']);
    const again = await work.inspect(sling, 'periodic', { by: 'inspector2', seen: ['chain.nick_gouge'] });
    expect(unmetRules(await withdraw(sling, again.inspectionId, { reasonId }))).toEqual([
      'inspection_rejects',
    ]);
  });

  it('is not for the author: of a reason by hand, or of the condemnation', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    const held = await work.act('manager', sling, 'hold', { reasons: [{ code: 'unauthorised_repair' }] });
    const reasonId = held.openReasons[0]?.id;
    const first = await work.inspect(sling, 'periodic');
    expect((await withdraw(sling, first.inspectionId, { reasonId })).status).toBe(403);
    expectStatus(await withdraw(sling, first.inspectionId, { reasonId }, 'manager2'), 200);

    const condemned = await work.act('manager', sling, 'condemn', { note: 'Cracked' });
    expect(
      unmetRules(await withdraw(condemned, first.inspectionId, { condemnation: true }, 'manager2')),
    ).toEqual(['new_inspection']);
    const second = await work.inspect(sling, 'periodic');
    expect((await withdraw(condemned, second.inspectionId, { condemnation: true })).status).toBe(403);
    expectStatus(await withdraw(condemned, second.inspectionId, { condemnation: true }, 'manager2'), 200);
    const after = await work.read(sling.id);
    expect(after).toMatchObject({ state: 'held', condemned: false });
    expect(after.openReasons).toHaveLength(1);
    expect((await withdraw(after, second.inspectionId, { condemnation: true }, 'manager2')).status).toBe(422);
    // Then, and not before, it may be released by the usual rules.
    await work.inspect(sling, 'release');
    expectStatus(await act('inspector', sling, 'release', scenes.releaseBody(after)), 200);
  });

  it('is no way round a reason that is not confirmed', async () => {
    const sling = await scenes.held();
    const { inspectionId } = await scenes.work.inspect(sling, 'periodic');
    const answer = await withdraw(sling, inspectionId, { reasonId: sling.openReasons[0]?.id });
    expect([answer.status, errorPaths(answer)]).toEqual([422, ['reasonId']]);
  });
});

describe('leaving the store', () => {
  it('refuses to let a held own sling go, for whatever cause', async () => {
    const sling = await scenes.held();
    for (const cause of ['sold', 'off_hire', 'transferred_out', 'registered_in_error']) {
      const answer = await act('manager', sling, 'depart', { cause, note: 'To a buyer' });
      expect([cause, answer.status]).toEqual([cause, 422]);
      expect(unmetRules(answer)).toEqual(['held_leaves_to_owner']);
    }
  });

  it('refuses to let an own sling go that was rejected, also after it came back', async () => {
    const { work, shipping } = scenes;
    const sling = await work.inService();
    await work.inspect(sling, 'frequent', { seen: ['chain.crack'] });
    await work.act('storekeeper', sling, 'secure', { locationId: work.cageId });
    const line = await shipping.ship(sling);
    expectStatus(await shipping.outcome(line, { outcome: 'fit' }), 200);
    await work.act('storekeeper', sling, 'receive_back', { locationId: scenes.rackId });
    const answer = await act('manager', sling, 'depart', { cause: 'sold', note: 'To a buyer' });
    expect([answer.status, unmetRules(answer)]).toEqual([422, ['confirmed_reason']]);
  });

  it('lets a hired one off hire, held and rejected too, with its open reasons on record', async () => {
    const { work, store } = scenes;
    const sling = await work.inService(HIRED);
    const rejected = await work.inspect(sling, 'frequent', { seen: ['chain.crack'] });
    expect((await act('manager', sling, 'depart', { cause: 'sold', note: 'Gone' })).status).toBe(422);
    expect((await act('manager', sling, 'depart', { cause: 'transferred_out', note: 'Gone' })).status).toBe(
      422,
    );
    const gone = await work.act('manager', sling, 'depart', { cause: 'off_hire', note: 'To Dock Hire' });
    expect(gone).toMatchObject({ state: 'departed', mayUse: false, tag: null, custody: { kind: 'none' } });
    const rows = await (await store.signIn('manager')).get(`/api/ledger?slingId=${sling.id}&limit=1`);
    expect((rows.body as { items: { type: string; data: object }[] }).items[0]).toMatchObject({
      type: 'depart',
      data: {
        cause: 'off_hire',
        openReasons: [{ reasonId: rejected.sling.openReasons[0]?.id, code: 'criterion' }],
      },
    });
    const scan = await store.guest().get(`/api/public/tags/${sling.tag?.code}`);
    expect(scan.body).toMatchObject({ verdict: 'do_not_use' });
  });

  it('never lets a condemned sling go, hired or not', async () => {
    const sling = await scenes.condemned(HIRED);
    expect((await act('manager', sling, 'depart', { cause: 'off_hire', note: 'Back' })).status).toBe(409);
  });

  it.each(['sold', 'transferred_out', 'registered_in_error'] as const)(
    'lets a sound own one go: %s',
    async (cause) => {
      const sling = await scenes.work.register();
      expect((await act('manager', sling, 'depart', { cause: 'off_hire', note: 'Back' })).status).toBe(422);
      expect((await act('manager', sling, 'depart', { cause, note: ' ' })).status).toBe(422);
      expectStatus(await act('manager', sling, 'depart', { cause, note: 'To a buyer' }), 200);
      expect((await act('manager', sling, 'depart', { cause, note: 'Again' })).status).toBe(409);
    },
  );
});

describe('a correction', () => {
  const correct = async (sling: Pick<Sling, 'id'>, changes: object, more: object = {}, by = 'inspector') =>
    (await scenes.store.signIn(by)).post(`/api/slings/${sling.id}/corrections`).send({
      changes,
      reason: 'Read again on the sling',
      evidenceFileIds: [await scenes.work.photo('inspector')],
      ...more,
    });

  it('holds a sling in service, its record in doubt, with no placer', async () => {
    const { work } = scenes;
    const changes = [
      { maker: 'Oxbow Rope' },
      { reachMm: 3100 },
      { makersTag: 'illegible' },
      { ratedLoads: { verticalKg: 3151 } },
      // The bridle at another angle cannot be compared.
      { ratedLoads: { verticalKg: 3150, bridle: { kg: 4450, angleDeg: 45 } } },
      { ratedLoads: { verticalKg: 3000, basketKg: 6000 } },
      { ratedLoads: { verticalKg: 3000 }, makerSerial: 'NEW-SERIAL-1' },
    ];
    for (const change of changes) {
      const sling = await work.inService();
      expectStatus(await correct(sling, change), 200);
      const now = await work.read(sling.id);
      expect([change, now.state, now.mayUse]).toEqual([change, 'held', false]);
      expect(now.openReasons).toMatchObject([{ code: 'record_in_doubt', placedBy: null, confirmed: false }]);
    }
  });

  it('leaves it in service when it is only stricter', async () => {
    const sling = await scenes.work.inService();
    expectStatus(await correct(sling, { ratedLoads: { verticalKg: 3000, chokerKg: 2000 } }), 200);
    expectStatus(await correct(sling, { serviceClass: 'severe' }), 200);
    expect(await scenes.work.read(sling.id)).toMatchObject({
      state: 'in_service',
      mayUse: true,
      ratedLoads: { verticalKg: 3000 },
    });
    expectStatus(await correct(sling, { serviceClass: 'normal' }), 200);
    expect((await scenes.work.read(sling.id)).state).toBe('held');
  });

  it('never lifts a hold or a condemnation, and is for an inspector with a reason and evidence', async () => {
    const held = await scenes.condemned();
    expectStatus(await correct(held, { ratedLoads: { verticalKg: 3000 } }), 200);
    expect(await scenes.work.read(held.id)).toMatchObject({ state: 'held', condemned: true });
    for (const by of ['storekeeper', 'manager', 'admin', 'auditor']) {
      expect([by, (await correct(held, { maker: 'Oxbow Rope' }, {}, by)).status]).toEqual([by, 403]);
    }
    expect((await correct(held, { maker: 'Oxbow Rope' }, { reason: ' ' })).status).toBe(422);
    expect((await correct(held, { maker: 'Oxbow Rope' }, { evidenceFileIds: [] })).status).toBe(422);
    expect((await correct(held, {})).status).toBe(422);
  });
});

describe('the order of refusals', () => {
  it('is role, record, form, state, person, needs', async () => {
    const { work } = scenes;
    const sling = await work.inService();
    // Everything is wrong at once; each line mends one thing more.
    expect((await tryAct(scenes.store, 'storekeeper', 999_999, 'condemn', { nonsense: 1 })).status).toBe(403);
    expect((await tryAct(scenes.store, 'manager', 999_999, 'condemn', { nonsense: 1 })).status).toBe(404);
    expect((await act('manager', sling, 'condemn', { nonsense: 1 })).status).toBe(400);
    expect((await act('manager', sling, 'condemn', {})).status).toBe(422);
    expect((await act('manager', sling, 'condemn', { note: 'Old' })).status).toBe(409);

    await work.act('inspector', sling, 'hold', { reasons: [{ code: 'latch' }] });
    const both = await act('inspector', sling, 'release', { clear: [] });
    expect([both.status, problemOf(both).type.split('/').at(-1)]).toEqual([403, 'same-person']);
    expect((await act('inspector2', sling, 'release', { clear: [] })).status).toBe(422);
    expect((await act('inspector2', sling, 'override', {})).status).toBe(404);
  });
});
