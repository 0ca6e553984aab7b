import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Sling } from '../../shared/schemas/slings';
import { expectProblem } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;
beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

const rackId = (): number =>
  store.places.locations.find(
    (place) => place.purpose === 'rack' && place.siteId === store.places.slipStore.id,
  )?.id ?? 0;

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
