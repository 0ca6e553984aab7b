import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openTestStore, type TestStore } from '../support/testStore';
import { openWork, type Work } from '../support/work';

let store: TestStore;
let work: Work;

beforeAll(async () => {
  store = await openTestStore();
  work = await openWork(store);
});
afterAll(() => store.close());

describe('the main job over the API', () => {
  it('takes a sling from the books to its destruction, and nobody takes a shorter way', async () => {
    const sling = await work.register();
    expect(sling.state).toBe('received');
    expect(sling.mayUse).toBe(false);

    const inspector = await store.signIn('inspector');
    const tooEarly = await inspector.post(`/api/slings/${sling.id}/actions/accept`).send({});
    expect(tooEarly.status).toBe(422);

    const code = await work.label(sling);
    await work.confirm(sling, code);
    await work.inspect(sling, 'initial');
    const accepted = await work.act('inspector', sling, 'accept');
    expect(accepted.mayUse).toBe(true);
    expect(accepted.nextDueOn).not.toBeNull();

    const photo = await work.photo();
    const held = await work.act('storekeeper', sling, 'hold', {
      reasons: [{ code: 'damage_suspected', note: 'Link looks stretched' }],
      photoIds: [photo],
    });
    expect(held.state).toBe('held');
    await work.act('storekeeper', sling, 'secure', { locationId: work.cageId });

    await work.act('manager', sling, 'condemn', { note: 'Not worth evaluating' });
    const manager = await store.signIn('manager');
    const samePerson = await manager.post(`/api/slings/${sling.id}/actions/destroy`).send({
      method: 'Cut through all load-bearing parts',
      photoIds: [photo],
      fittings: held.fittings.map(({ id }) => ({ fittingId: id, fate: 'destroyed' })),
      password: 'marram-quay-demo',
    });
    expect(samePerson.status).toBe(403);
    const destroyed = await work.act('storekeeper', sling, 'destroy', {
      method: 'Cut through all load-bearing parts',
      photoIds: [photo],
      fittings: held.fittings.map(({ id }) => ({ fittingId: id, fate: 'destroyed' })),
      password: 'marram-quay-demo',
    });
    expect(destroyed.state).toBe('destroyed');

    const publicAnswer = await store.guest().get(`/api/public/tags/${code}`);
    expect(publicAnswer.body).toMatchObject({ verdict: 'do_not_use' });
    const scan = await inspector.get(`/api/tags/${code}`);
    expect(scan.body).toMatchObject({ tag: { status: 'void' } });

    const verify = await manager.get('/api/ledger/verify');
    expect(verify.body).toMatchObject({ ok: true });
  });
});
