import { randomBytes } from 'node:crypto';
import type { Express } from 'express';
import request from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROLES, type Role } from '../../shared/domain/access/roles';
import { ROUTE_ACCESS, type RouteKey } from '../../shared/domain/access/routes';
import { SLING_ACTIONS, type SlingAction } from '../../shared/domain/lifecycle/actions';
import { drawTagCode } from '../../shared/domain/tags/tagCode';
import { findProblemFault, openSecondApp, signInTo } from '../support/requests';
import { openTestStore, type TestStore } from '../support/testStore';

type Who = 'anybody' | 'signed in' | readonly Role[];
const STORE: Who = ['storekeeper', 'inspector', 'manager'];
const INSPECTOR: Who = ['inspector'];
const MANAGER: Who = ['manager'];
const ADMIN: Who = ['admin'];

/** Written again from the design (product design, section 1), so that a slip in the table of the product shows. */
const EXPECTED = {
  'GET /healthz': 'anybody',
  'GET /readyz': 'anybody',
  'GET /api/openapi.json': 'anybody',
  'GET /api/docs': 'anybody',
  'GET /api/setup': 'anybody',
  'POST /api/setup': 'anybody',
  'POST /api/session': 'anybody',
  'GET /api/session': 'signed in',
  'DELETE /api/session': 'signed in',
  'GET /api/invitations/:token': 'anybody',
  'POST /api/invitations/:token': 'anybody',
  'PATCH /api/account': 'signed in',
  'POST /api/account/password': 'signed in',
  'GET /api/users': ADMIN,
  'POST /api/users': ADMIN,
  'PATCH /api/users/:id': ADMIN,
  'POST /api/users/:id/link': ADMIN,
  'GET /api/sites': 'signed in',
  'POST /api/sites': ADMIN,
  'GET /api/locations': 'signed in',
  'POST /api/locations': ADMIN,
  'GET /api/slings': 'signed in',
  'POST /api/slings': STORE,
  'GET /api/slings/:id': 'signed in',
  'PATCH /api/slings/:id': STORE,
  'POST /api/slings/:id/corrections': INSPECTOR,
  'POST /api/slings/:id/certificates': STORE,
  'POST /api/slings/:id/actions/:action': STORE,
  'GET /api/slings/:id/inspections': 'signed in',
  'POST /api/slings/:id/inspections': INSPECTOR,
  'GET /api/criteria/:kind': 'signed in',
  'POST /api/verdicts': 'signed in',
  'GET /api/label-stocks': 'signed in',
  'GET /api/label-stocks/:id/test-page': STORE,
  'POST /api/label-runs': STORE,
  'GET /api/label-runs/:id': 'signed in',
  'GET /api/label-runs/:id/pdf': 'signed in',
  'GET /api/tags/:code': 'signed in',
  'POST /api/tags/:code/confirm': STORE,
  'POST /api/tags/:code/void': STORE,
  'GET /api/public/tags/:code': 'anybody',
  'POST /api/public/tags/:code/reports': 'anybody',
  'POST /api/public/tags/:code/files': 'anybody',
  'POST /api/files': STORE,
  'GET /api/files/:id': 'signed in',
  'GET /api/evaluators': 'signed in',
  'POST /api/evaluators': MANAGER,
  'POST /api/shipments': MANAGER,
  'GET /api/shipments/:id': 'signed in',
  'POST /api/shipments/:id/send': MANAGER,
  'PUT /api/shipments/:id/lines/:lineId/outcome': MANAGER,
  'POST /api/shipments/:id/lines/:lineId/destroyed': MANAGER,
  'GET /api/ledger': 'signed in',
  'GET /api/ledger/verify': ['manager', 'admin', 'auditor'],
} as const satisfies Record<RouteKey, Who>;
const ROUTES = Object.keys(EXPECTED) as (keyof typeof EXPECTED)[];

/** The column "by" of the table in section 4 of the product design. */
const EXPECTED_ACTIONS = {
  accept: INSPECTOR,
  hold: STORE,
  secure: STORE,
  release: INSPECTOR,
  condemn: MANAGER,
  withdraw_as_error: MANAGER,
  send: MANAGER,
  receive_back: STORE,
  return_to_service: INSPECTOR,
  destroy: STORE,
  destroyed_by_evaluator: MANAGER,
  report_lost: MANAGER,
  found: STORE,
  depart: MANAGER,
} as const satisfies Record<SlingAction, readonly Role[]>;

const UNKNOWN_CODE = drawTagCode(randomBytes);
const PARAMS: Record<string, string> = {
  id: '999999',
  lineId: '999999',
  code: UNKNOWN_CODE,
  kind: 'alloy-chain',
  token: 'x'.repeat(43),
  action: 'hold',
};

let store: TestStore;
let app: Express;
beforeAll(async () => {
  store = await openTestStore();
  // Behind a proxy each call may come from an address of its own, so that no limit on guesses gets in the way.
  app = openSecondApp(store, { trustProxy: 1 });
});
afterAll(() => store.close());

let caller = 0;
async function call(agent: TestAgent, route: string, body: string): Promise<request.Response> {
  const [method = '', path = ''] = route.split(' ');
  const filled = path.replace(/:(\w+)/g, (_, name: string) => PARAMS[name] ?? name);
  caller += 1;
  const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  return agent[verb](filled)
    .set('X-Forwarded-For', `10.1.${caller >> 8}.${caller & 255}`)
    .set('Content-Type', 'application/json')
    .send(body);
}

const mayCall = (who: Who, role: Role): boolean => typeof who === 'string' || who.includes(role);
const signOutLast = (a: string): number => (a === 'DELETE /api/session' ? 1 : 0);
const inOrder = [...ROUTES].sort((a, b) => signOutLast(a) - signOutLast(b));

describe('the table of access', () => {
  it('is the one of the design', () => {
    const words = (who: Who): string => (typeof who === 'string' ? who : [...who].sort().join(' '));
    const product = Object.entries(ROUTE_ACCESS).map(([route, access]) => [
      route,
      words(access === 'public' ? 'anybody' : access === 'signed_in' ? 'signed in' : access),
    ]);
    expect(Object.fromEntries(product)).toEqual(
      Object.fromEntries(Object.entries(EXPECTED).map(([route, who]) => [route, words(who)])),
    );
  });

  it('holds every route that the app answers, and no other', () => {
    const registered = app.router.stack.flatMap(({ route }) =>
      route ? route.stack.map((layer) => `${layer.method.toUpperCase()} ${route.path}`) : [],
    );
    expect([...new Set(registered)].sort()).toEqual([...ROUTES].sort());
  });
});

describe('a guest', () => {
  it('gets 401 on every route that is not public, whatever the body or the record', async () => {
    const wrong: string[] = [];
    for (const route of ROUTES) {
      const answer = await call(request.agent(app), route, '{"broken');
      const isRefused = answer.status === 401;
      if (isRefused !== (EXPECTED[route] !== 'anybody')) wrong.push(`${route}: ${answer.status}`);
      if (isRefused && findProblemFault(answer)) wrong.push(`${route}: ${findProblemFault(answer) ?? ''}`);
    }
    expect(wrong).toEqual([]);
  });
});

describe.each(ROLES)('the role %s', (role) => {
  it('reaches what is its own and gets 403 on all else, before the body and the record are looked at', async () => {
    const agent = await signInTo(app, `${role}@marram-quay.example`, 'marram-quay-demo');
    const wrong: string[] = [];
    for (const route of inOrder) {
      const mine = mayCall(EXPECTED[route], role);
      const answer = await call(agent, route, mine ? '{}' : '{"broken');
      const isRight = mine ? ![401, 403].includes(answer.status) : answer.status === 403;
      // A guess at the password is answered 401 by design; the body was empty, so that none was made.
      if (!isRight || answer.status >= 500) wrong.push(`${route}: ${answer.status}`);
      if (!mine && findProblemFault(answer)) wrong.push(`${route}: ${findProblemFault(answer) ?? ''}`);
    }
    expect(wrong).toEqual([]);
  });

  it.each(SLING_ACTIONS)('may %s only as the table of the lifecycle says', async (action) => {
    const agent = await store.signIn(role);
    const answer = await agent
      .post(`/api/slings/999999/actions/${action}`)
      .set('Content-Type', 'application/json')
      .send('{"broken');
    const by: readonly Role[] = EXPECTED_ACTIONS[action];
    expect(answer.status).toBe(by.includes(role) ? 404 : 403);
  });
});

describe('a path that is no route', () => {
  it.each(['/api/nothing', '/api/slings/1/state', '/api/../api/slings', '/api/slings/1/actions/unheld'])(
    'answers 404 for %s',
    async (path) => {
      const manager = await store.signIn('manager');
      const answer = await manager.post(path).send({});
      expect(findProblemFault(answer)).toBeNull();
      expect(answer.status).toBe(404);
    },
  );

  it('answers 404 for a verb that the path does not take', async () => {
    const manager = await store.signIn('manager');
    expect((await manager.delete('/api/slings/1')).status).toBe(404);
    expect((await manager.put('/api/slings/1').send({ state: 'in_service' })).status).toBe(404);
  });
});
