import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { SLING_KINDS } from '../../shared/domain/slings/kinds';
import type { DesignationInput, User } from '../../shared/schemas/people';
import { addPerson, day, errorPaths, expectProblem, PERSON_PASSWORD, unmetRules } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus, openWork, type Work } from '../support/work';

const FIRST = {
  name: 'Wren Castell',
  email: 'wren@quay.example',
  password: 'the-very-first-password',
  siteName: 'North Store',
  timeZone: 'Europe/London',
  ruleSets: 'uk_eu',
};

describe('the first start', () => {
  let empty: TestStore;
  beforeAll(async () => {
    empty = await openTestStore({ isEmpty: true });
  });
  afterAll(() => empty.close());
  const setUp = (body: object) => request(empty.app).post('/api/setup').send(body);

  it('says that it waits, and takes no half-filled form', async () => {
    expect((await empty.guest().get('/api/setup')).body).toEqual({ needed: true });
    expect(errorPaths(expectProblem(await setUp({ ...FIRST, password: 'short' }), 422))).toEqual([
      'password',
    ]);
    expect(errorPaths(expectProblem(await setUp({ ...FIRST, timeZone: 'Mars/North' }), 422))).toEqual([
      'timeZone',
    ]);
    expect((await empty.guest().get('/api/setup')).body).toEqual({ needed: true });
  });

  it('makes one administrator when two people press at the same moment, and signs that one in', async () => {
    const [a, b] = await Promise.all([setUp(FIRST), setUp({ ...FIRST, email: 'second@quay.example' })]);
    expect([a.status, b.status].sort()).toEqual([201, 409]);
    const won = a.status === 201 ? a : b;
    expect(won.body).toMatchObject({ user: { roles: ['admin'] } });
    expect(won.headers['set-cookie']).toBeDefined();
    expectProblem(a.status === 201 ? b : a, 409, 'conflict');
    expect(await empty.database.adminQuery('SELECT COUNT(*) AS n FROM users')).toEqual([{ n: 1 }]);
    expect(await empty.database.adminQuery('SELECT COUNT(*) AS n FROM sites')).toEqual([{ n: 1 }]);
  });

  it('is over for good then', async () => {
    expect((await empty.guest().get('/api/setup')).body).toEqual({ needed: false });
    expectProblem(await setUp({ ...FIRST, email: 'third@quay.example', siteName: 'Other' }), 409, 'conflict');
  });

  it('gave the site a cage, so that a held sling has somewhere to go', async () => {
    const rows = await empty.database.adminQuery("SELECT name FROM locations WHERE purpose = 'cage'");
    expect(rows).toHaveLength(1);
  });
});

describe('accounts', () => {
  let store: TestStore;
  let work: Work;
  beforeAll(async () => {
    store = await openTestStore();
    work = await openWork(store);
  });
  afterAll(() => store.close());

  const account = (overrides: object = {}) => ({
    name: 'Piet Varga',
    email: `piet${Math.random().toString(36).slice(2)}@marram-quay.example`,
    roles: ['storekeeper'],
    siteIds: [store.places.slipStore.id],
    endsOn: null,
    designations: [],
    ...overrides,
  });
  const invite = async (overrides: object = {}): Promise<{ user: User; link: string; token: string }> => {
    const answer = await (await store.signIn('admin')).post('/api/users').send(account(overrides));
    const made = expectStatus<{ user: User; link: string }>(answer, 201);
    return { ...made, token: made.link.split('/').at(-1) ?? '' };
  };
  const open = (token: string) => request(store.app).get(`/api/invitations/${token}`);
  const accept = (token: string, password = PERSON_PASSWORD) =>
    request(store.app).post(`/api/invitations/${token}`).send({ password });

  it('come with a one-time link that works once and stands in no list', async () => {
    const { user, token } = await invite();
    expect(user.hasPassword).toBe(false);
    expect((await open(token)).body).toMatchObject({ email: user.email });
    expectProblem(await accept(token, 'too-short'), 422, 'invalid');
    const used = await accept(token);
    expect(used.body).toMatchObject({ user: { id: user.id } });
    expect(used.headers['set-cookie']).toBeDefined();
    expectProblem(await accept(token, 'a-later-other-password'), 404, 'not-found');
    expectProblem(await open(token), 404);
    const list = await (await store.signIn('admin')).get('/api/users');
    expect(list.text).not.toContain(token);
    const [kept] = await store.database.adminQuery('SELECT token_hash FROM invitations WHERE user_id = ?', [
      user.id,
    ]);
    expect(kept?.token_hash).not.toBe(token);
  });

  it('let one of two who use the link at the same moment in', async () => {
    const { token } = await invite();
    const answers = await Promise.all([
      accept(token, 'the-first-password'),
      accept(token, 'the-other-password'),
    ]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404]);
  });

  it('refuse a link that has expired', async () => {
    const { user, token } = await invite();
    await store.database.adminQuery(
      'UPDATE invitations SET expires_at = UTC_TIMESTAMP(3) - INTERVAL 1 SECOND WHERE user_id = ?',
      [user.id],
    );
    expectProblem(await open(token), 404, 'not-found');
    expectProblem(await accept(token), 404, 'not-found');
  });

  it('lose the earlier link and every open session with a new link', async () => {
    const { agent, user } = await addPerson(store, { roles: ['storekeeper'] });
    const admin = await store.signIn('admin');
    const first = expectStatus<{ link: string }>(
      await admin.post(`/api/users/${user.id}/link`).send({}),
      201,
    );
    const second = expectStatus<{ link: string }>(
      await admin.post(`/api/users/${user.id}/link`).send({}),
      201,
    );
    const tokenOf = ({ link }: { link: string }): string => link.split('/').at(-1) ?? '';
    expectProblem(await accept(tokenOf(first)), 404);
    expect((await accept(tokenOf(second), 'a-new-long-password')).status).toBe(200);
    expectProblem(await agent.get('/api/session'), 401);
  });

  it('never repeat the link to a repeated request', async () => {
    const admin = await store.signIn('admin');
    const body = account();
    const send = () => admin.post('/api/users').set('Idempotency-Key', 'invite-once').send(body);
    expect((await send()).status).toBe(201);
    const again = await send();
    expect(again.text).not.toContain('/invitation/');
    const rows = await store.database.adminQuery('SELECT body FROM idempotency_keys');
    expect(JSON.stringify(rows)).not.toContain('/invitation/');
  });

  it.each([
    ['an auditor without an end', { roles: ['auditor'] }, 'endsOn'],
    ['no role', { roles: [] }, 'roles'],
    ['a role that is none', { roles: ['owner'] }, 'roles.0'],
    ['a site that is none', { siteIds: [999_999] }, 'siteIds'],
    ['an address that is none', { email: 'not an address' }, 'email'],
    ['a day that is none', { endsOn: '2026-02-30' }, 'endsOn'],
  ])('are refused with %s', async (_, overrides, path) => {
    const answer = await (await store.signIn('admin')).post('/api/users').send(account(overrides));
    expect(errorPaths(expectProblem(answer, 422, 'invalid'))).toEqual([path]);
  });

  it('are refused twice for one address, in any case', async () => {
    const answer = await (
      await store.signIn('admin')
    )
      .post('/api/users')
      .send(account({ email: 'Storekeeper@Marram-Quay.example' }));
    expect(errorPaths(expectProblem(answer, 409, 'duplicate'))).toEqual(['email']);
  });

  it('stay an auditor’s only while they end by date', async () => {
    const admin = await store.signIn('admin');
    const { user } = await invite({ roles: ['auditor'], endsOn: '2099-01-01' });
    const patch = (body: object) => admin.patch(`/api/users/${user.id}`).send(body);
    expect(errorPaths(expectProblem(await patch({ endsOn: null }), 422))).toEqual(['endsOn']);
    expect((await patch({ endsOn: '2099-06-30' })).body).toMatchObject({ endsOn: '2099-06-30' });
    const { user: keeper } = await invite();
    const toAuditor = await admin
      .patch(`/api/users/${keeper.id}`)
      .send({ roles: ['storekeeper', 'auditor'] });
    expect(errorPaths(expectProblem(toAuditor, 422))).toEqual(['endsOn']);
  });

  it('keep an administrator: nobody takes the role, or the account, from themselves', async () => {
    const admin = await store.signIn('admin');
    const me = store.people.get('admin')?.id ?? 0;
    const patch = (body: object) => admin.patch(`/api/users/${me}`).send(body);
    expect(errorPaths(expectProblem(await patch({ roles: ['manager'] }), 422))).toEqual(['roles']);
    expect(errorPaths(expectProblem(await patch({ endsOn: '2020-01-01' }), 422))).toEqual(['endsOn']);
    expect((await patch({ roles: ['admin', 'manager'] })).status).toBe(200);
    expect((await patch({ roles: ['admin'] })).status).toBe(200);
  });

  it('are listed a page at a time, without anything secret', async () => {
    const admin = await store.signIn('admin');
    const seen: number[] = [];
    let cursor: string | null = null;
    do {
      const answer = await admin.get('/api/users').query({ limit: 3, ...(cursor ? { cursor } : {}) });
      const page = expectStatus<{ items: User[]; nextCursor: string | null }>(answer, 200);
      expect(answer.text).not.toMatch(/argon2|password_?hash/i);
      seen.push(...page.items.map(({ id }) => id));
      cursor = page.nextCursor;
    } while (cursor !== null);
    const rows = await store.database.adminQuery('SELECT id FROM users ORDER BY id');
    expect(seen).toEqual(rows.map(({ id }) => id));
  });

  describe('designations', () => {
    const designation = (overrides: Partial<DesignationInput> = {}): DesignationInput => ({
      kinds: [...SLING_KINDS],
      designatedBy: 'Nell Abara, store manager',
      designatedOn: day(-400),
      until: null,
      isQualified: false,
      ...overrides,
    });
    const inspectInitial = async (who: Awaited<ReturnType<typeof addPerson>>['agent'], id: number) => {
      const rows = await who.get('/api/criteria/alloy-chain').query({ slingId: id });
      const { items } = expectStatus<{ items: { clean: object }[] }>(rows, 200);
      return who.post(`/api/slings/${id}/inspections`).send({
        type: 'initial',
        answers: items.map(({ clean }) => clean),
      });
    };

    it.each([
      ['has lapsed', [designation({ until: day(-2) })]],
      ['has not begun', [designation({ designatedOn: day(2) })]],
      ['does not cover the kind', [designation({ kinds: ['wire-rope', 'synthetic-web'] })]],
      ['was never given', []],
    ])('stop an inspector whose own %s', async (_, designations) => {
      const { agent } = await addPerson(store, { roles: ['inspector'], designations });
      const sling = await work.register();
      await work.confirm(sling, await work.label(sling));
      expect(unmetRules(expectProblem(await inspectInitial(agent, sling.id), 422, 'unmet'))).toEqual([
        'designation',
      ]);
      await work.inspect(sling, 'initial');
      const accept = await agent.post(`/api/slings/${sling.id}/actions/accept`).send({});
      expect(unmetRules(expectProblem(accept, 422, 'unmet'))).toEqual(['designation']);
      expect((await work.read(sling.id)).state).toBe('received');
      // Removing from service never asks for one.
      const hold = await agent
        .post(`/api/slings/${sling.id}/actions/hold`)
        .send({ reasons: [{ code: 'damage_suspected' }] });
      expect(hold.status).toBe(200);
    });

    it('end at once when they are taken away, and stay on record', async () => {
      const { agent, user } = await addPerson(store, {
        roles: ['inspector'],
        designations: [designation()],
      });
      const sling = await work.register();
      expect((await inspectInitial(agent, sling.id)).status).toBe(201);
      const admin = await store.signIn('admin');
      const patched = await admin.patch(`/api/users/${user.id}`).send({ designations: [] });
      expect(patched.body).toMatchObject({ designations: [] });
      const again = await work.register();
      expectProblem(await inspectInitial(agent, again.id), 422, 'unmet');
      const rows = await store.database.adminQuery(
        'SELECT ended_at IS NOT NULL AS ended FROM designations WHERE user_id = ?',
        [user.id],
      );
      expect(rows).toEqual([{ ended: 1 }]);
    });
  });
});

describe('sites and places', () => {
  let store: TestStore;
  beforeAll(async () => {
    store = await openTestStore();
  });
  afterAll(() => store.close());

  it('are shown to those who work there alone; the administrator sees all', async () => {
    const names = async (who: string): Promise<string[]> => {
      const answer = await (await store.signIn(who)).get('/api/sites');
      return expectStatus<{ items: { name: string }[] }>(answer, 200).items.map(({ name }) => name);
    };
    expect(await names('storekeeper')).toEqual(['Slip Store']);
    expect(await names('storekeeper2')).toEqual(['Blade Hall Store', 'Slip Store']);
    expect(await names('admin')).toEqual(['Blade Hall Store', 'Slip Store']);
    const other = await (
      await store.signIn('storekeeper')
    ).get(`/api/locations?siteId=${store.places.bladeHall.id}`);
    expect(other.body).toEqual({ items: [] });
  });

  it('are made by the administrator, each name once', async () => {
    const admin = await store.signIn('admin');
    const site = { name: 'Pier Store', timeZone: 'America/New_York', ruleSets: ['osha'] };
    const made = expectStatus<{ id: number }>(await admin.post('/api/sites').send(site), 201);
    expectProblem(await admin.post('/api/sites').send(site), 409, 'duplicate');
    const place = { siteId: made.id, name: 'Cage 9', purpose: 'cage' };
    expect((await admin.post('/api/locations').send(place)).status).toBe(201);
    expectProblem(await admin.post('/api/locations').send(place), 409, 'duplicate');
    expectProblem(await admin.post('/api/locations').send({ ...place, purpose: 'attic' }), 422, 'invalid');
    expectProblem(await admin.post('/api/locations').send({ ...place, siteId: 999_999 }), 422, 'invalid');
    expectProblem(await admin.post('/api/sites').send({ ...site, name: 'X', ruleSets: [] }), 422, 'invalid');
  });
});
