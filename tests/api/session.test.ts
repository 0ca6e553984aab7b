import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { SessionUser } from '../../shared/schemas/people';
import { addPerson, expectProblem, openSecondApp, PERSON_PASSWORD, signInTo } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';
import { expectStatus } from '../support/work';

const PASSWORD = 'marram-quay-demo';
const emailOf = (account: string): string => `${account}@marram-quay.example`;

let store: TestStore;
beforeAll(async () => {
  store = await openTestStore();
});
afterAll(() => store.close());

const signIn = (email: string, password: string, app = store.app) =>
  request(app).post('/api/session').send({ email, password });
const cookieOf = (answer: request.Response): string => String(answer.headers['set-cookie']);

describe('signing in', () => {
  it('answers who it is, with roles and sites and no password hash', async () => {
    const answer = await signIn(emailOf('storekeeper2'), PASSWORD);
    const { user } = expectStatus<{ user: SessionUser }>(answer, 200);
    expect(user).toMatchObject({ email: emailOf('storekeeper2'), roles: ['storekeeper'] });
    expect([...user.siteIds].sort()).toEqual([store.places.slipStore.id, store.places.bladeHall.id].sort());
    expect(answer.text).not.toContain('argon2');
  });

  it('takes the address in any case and with spaces around it', async () => {
    expect((await signIn(`  ${emailOf('auditor').toUpperCase()} `, PASSWORD)).status).toBe(200);
  });

  it('answers a wrong password and an unknown address alike', async () => {
    const wrong = expectProblem(await signIn(emailOf('auditor'), 'not-the-password'), 401, 'unauthenticated');
    const unknown = expectProblem(await signIn('nobody@marram-quay.example', PASSWORD), 401);
    expect({ ...wrong, requestId: '' }).toEqual({ ...unknown, requestId: '' });
  });

  it('works as long on an unknown address as on a known one', async () => {
    const timeOf = async (email: string): Promise<number> => {
      const from = performance.now();
      await signIn(email, 'not-the-password');
      return performance.now() - from;
    };
    const known = Math.min(await timeOf(emailOf('inspector2')), await timeOf(emailOf('storekeeper2')));
    const unknown = Math.min(await timeOf('nobody2@x.example'), await timeOf('nobody3@x.example'));
    // Without the hash of nobody's password it would take about a tenth.
    expect(unknown).toBeGreaterThan(known / 3);
  });

  it.each([
    ['nothing', {}],
    ['an empty password', { email: emailOf('admin'), password: '' }],
    ['a list as address', { email: [emailOf('admin')], password: PASSWORD }],
    ['an object that pretends to be text', { email: { toString: 'x', valueOf: 'x' }, password: PASSWORD }],
    ['an operator as password', { email: emailOf('admin'), password: { $ne: '' } }],
    ['a password longer than any', { email: emailOf('admin'), password: 'x'.repeat(5000) }],
  ])('refuses %s as malformed or invalid, not as a fault of its own', async (_, body) => {
    const answer = await request(openSecondApp(store)).post('/api/session').send(body);
    expect([400, 422]).toContain(answer.status);
    expectProblem(answer, answer.status);
  });
});

describe('the cookie', () => {
  it('is httpOnly and sameSite, and not secure on plain HTTP', async () => {
    const cookie = cookieOf(await signIn(emailOf('admin'), PASSWORD));
    expect(cookie).toMatch(/; HttpOnly/i);
    expect(cookie).toMatch(/; SameSite=Lax/i);
    expect(cookie).toMatch(/; Path=\//i);
    expect(cookie).not.toMatch(/; Secure/i);
  });

  it('is secure where the public address is HTTPS', async () => {
    const app = openSecondApp(store, { publicUrl: 'https://slings.example', trustProxy: 1 });
    const answer = await signIn(emailOf('admin'), PASSWORD, app).set('X-Forwarded-Proto', 'https');
    expect(cookieOf(answer)).toMatch(/; Secure/i);
    // Over plain HTTP the same server gives no cookie away.
    expect((await signIn(emailOf('admin'), PASSWORD, app)).headers['set-cookie']).toBeUndefined();
  });

  it('is worth nothing once its signature is changed', async () => {
    const [cookie = ''] = cookieOf(await signIn(emailOf('admin'), PASSWORD)).split(';');
    const me = (value: string) => request(store.app).get('/api/session').set('Cookie', value);
    expect((await me(cookie)).status).toBe(200);
    expect((await me(`${cookie}x`)).status).toBe(401);
    expect((await me(cookie.replace(/%3A.{10}/, '%3Aaaaaaaaaaa'))).status).toBe(401);
  });

  it('is a new one after each sign-in, so that a planted one is worth nothing', async () => {
    const agent = await signInTo(store.app, emailOf('admin'), PASSWORD);
    const before = await agent.get('/api/session');
    expect(before.headers['set-cookie']).toBeUndefined();
    const first = await agent.post('/api/session').send({ email: emailOf('admin'), password: PASSWORD });
    const second = await agent.post('/api/session').send({ email: emailOf('admin'), password: PASSWORD });
    expect(cookieOf(first).split(';')[0]).not.toBe(cookieOf(second).split(';')[0]);
  });
});

describe('a session', () => {
  it('ends with signing out, also for a kept copy of the cookie', async () => {
    const answer = await signIn(emailOf('auditor'), PASSWORD);
    const [cookie = ''] = cookieOf(answer).split(';');
    const out = await request(store.app).delete('/api/session').set('Cookie', cookie);
    expect(out.status).toBe(204);
    expectProblem(await request(store.app).get('/api/session').set('Cookie', cookie), 401, 'unauthenticated');
    expectProblem(await request(store.app).get('/api/slings').set('Cookie', cookie), 401);
  });

  it('lives in the database: another server process knows it', async () => {
    const [cookie = ''] = cookieOf(await signIn(emailOf('manager2'), PASSWORD)).split(';');
    const answer = await request(openSecondApp(store)).get('/api/session').set('Cookie', cookie);
    expect(answer.body).toMatchObject({ user: { email: emailOf('manager2') } });
  });

  it('ends after its time', async () => {
    const { agent, user } = await addPerson(store, { roles: ['storekeeper'] });
    await store.database.adminQuery(
      'UPDATE sessions SET expires = UTC_TIMESTAMP(3) - INTERVAL 1 SECOND WHERE user_id = ?',
      [user.id],
    );
    expectProblem(await agent.get('/api/session'), 401);
  });

  it('ends everywhere else when the password is changed', async () => {
    const { agent, email } = await addPerson(store, { roles: ['storekeeper'] });
    const other = await signInTo(store.app, email, PERSON_PASSWORD);
    const change = (currentPassword: string, newPassword: string) =>
      agent.post('/api/account/password').send({ currentPassword, newPassword });
    const wrong = expectProblem(await change('not-my-password', 'another-long-password'), 422, 'invalid');
    expect(wrong.errors?.[0]?.path).toBe('currentPassword');
    expectProblem(await change(PERSON_PASSWORD, 'too-short'), 422, 'invalid');
    expect((await other.get('/api/session')).status).toBe(200);
    expect((await change(PERSON_PASSWORD, 'another-long-password')).status).toBe(204);
    expectProblem(await other.get('/api/session'), 401);
    expect((await agent.get('/api/session')).status).toBe(200);
    expectProblem(await signIn(email, PERSON_PASSWORD), 401);
    expect((await signIn(email, 'another-long-password')).status).toBe(200);
  });

  it('dies with the account: one that ended cannot sign in either', async () => {
    const { agent, user, email } = await addPerson(store, { roles: ['auditor'], endsOn: '2099-12-31' });
    expect((await agent.get('/api/slings')).status).toBe(200);
    const admin = await store.signIn('admin');
    const ended = await admin.patch(`/api/users/${user.id}`).send({ endsOn: '2020-01-01' });
    expect(ended.status).toBe(200);
    expectProblem(await agent.get('/api/slings'), 401, 'unauthenticated');
    expectProblem(await signIn(email, PERSON_PASSWORD), 401, 'unauthenticated');
  });

  it('follows a change of roles and sites at once', async () => {
    const { agent, user } = await addPerson(store, { roles: ['storekeeper'] });
    expect((await agent.post('/api/slings').send({})).status).toBe(422);
    const admin = await store.signIn('admin');
    await admin.patch(`/api/users/${user.id}`).send({ roles: ['manager'], siteIds: [] });
    const me = await agent.get('/api/session');
    expect(me.body).toMatchObject({ user: { roles: ['manager'], siteIds: [] } });
    expect((await agent.get('/api/locations')).body).toEqual({ items: [] });
  });
});

describe('guesses', () => {
  it('are cut off for one account, while another from the same address still signs in', async () => {
    const app = openSecondApp(store);
    const tries = await Promise.all(
      Array.from({ length: 13 }, (_, n) => signIn(emailOf('manager'), `guess-number-${n}`, app)),
    );
    const cutOff = tries.filter(({ status }) => status === 429);
    expect(tries.filter(({ status }) => status === 401)).toHaveLength(10);
    expect(cutOff).toHaveLength(3);
    for (const answer of cutOff) {
      expectProblem(answer, 429, 'too-many-requests');
      expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
    }
    // Not even the right password helps now, or guessing on would tell it.
    expectProblem(await signIn(emailOf('manager'), PASSWORD, app), 429);
    expectProblem(await signIn(emailOf('MANAGER'), PASSWORD, app), 429);
    expect((await signIn(emailOf('inspector'), PASSWORD, app)).status).toBe(200);
  });

  it('at my own password in an open session are cut off as well', async () => {
    const { agent } = await addPerson(store, { roles: ['storekeeper'] });
    const guess = (currentPassword: string) =>
      agent.post('/api/account/password').send({ currentPassword, newPassword: 'another-long-password' });
    for (let n = 0; n < 5; n += 1) expect((await guess(`guess-number-${n}`)).status).toBe(422);
    const answer = await guess(PERSON_PASSWORD);
    expectProblem(answer, 429, 'too-many-requests');
    expect(Number(answer.headers['retry-after'])).toBeGreaterThan(0);
  });
});

describe('the origin of a write', () => {
  const write = async (headers: Record<string, string>): Promise<request.Response> =>
    (await store.signIn('storekeeper')).patch('/api/account').set(headers).send({});

  it.each([
    ['no origin, as programs send', {}],
    ['the public address', { Origin: 'http://127.0.0.1:4173' }],
    ['the host that was asked', { Origin: 'http://slings.local', Host: 'slings.local' }],
    ['a page of our own as referer', { Referer: 'http://127.0.0.1:4173/slings/1' }],
  ])('takes %s', async (_, headers) => {
    expect((await write(headers)).status).toBe(200);
  });

  it.each([
    ['another site', { Origin: 'https://elsewhere.example' }],
    ['a page without an origin of its own', { Origin: 'null' }],
    ['our address as the beginning of another', { Origin: 'http://127.0.0.1:4173.elsewhere.example' }],
    ['another port', { Origin: 'http://127.0.0.1:4174' }],
    ['another site as referer', { Referer: 'https://elsewhere.example/127.0.0.1:4173' }],
    ['what is no address', { Origin: '127.0.0.1:4173' }],
  ])('refuses %s', async (_, headers) => {
    expectProblem(await write(headers), 403, 'foreign-origin');
  });

  it('counts for signing in too, and not for reading', async () => {
    const answer = await signIn(emailOf('admin'), PASSWORD).set('Origin', 'https://elsewhere.example');
    expectProblem(answer, 403, 'foreign-origin');
    const agent = await store.signIn('storekeeper');
    expect((await agent.get('/api/slings').set('Origin', 'https://elsewhere.example')).status).toBe(200);
  });
});

describe('my account', () => {
  it('keeps my name and units, and nothing else of what I send', async () => {
    const { agent } = await addPerson(store, { roles: ['storekeeper'] });
    const changed = await agent
      .patch('/api/account')
      .send({ name: ' Ama Tull-Okoro ', loadUnit: 'lb', lengthUnit: 'ft' });
    expect(changed.body).toMatchObject({
      user: { name: 'Ama Tull-Okoro', loadUnit: 'lb', lengthUnit: 'ft' },
    });
    expect((await agent.get('/api/session')).body).toEqual(changed.body);
    for (const extra of [
      { roles: ['admin'] },
      { siteIds: [2] },
      { endsOn: null },
      { email: 'x@y.example' },
    ]) {
      expectProblem(await agent.patch('/api/account').send(extra), 400, 'malformed');
    }
    expectProblem(await agent.patch('/api/account').send({ loadUnit: 'stone' }), 422, 'invalid');
  });
});
