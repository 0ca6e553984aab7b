import type { Role } from './roles';

/** `public`: anybody; `signed_in`: any account in date; otherwise one of these roles. */
export type Access = 'public' | 'signed_in' | readonly Role[];

const store = ['storekeeper', 'inspector', 'manager'] as const;
const inspector = ['inspector'] as const;
const manager = ['manager'] as const;
const admin = ['admin'] as const;
const overseers = ['manager', 'admin', 'auditor'] as const;

/**
 * Who may call what, in one place; a route that is not in this table cannot be registered.
 * The roles of a single action (`…/actions/:action`) stand with the action in ../lifecycle/actions.ts.
 */
export const ROUTE_ACCESS = {
  'GET /healthz': 'public',
  'GET /readyz': 'public',
  'GET /api/openapi.json': 'public',
  'GET /api/docs': 'public',

  'GET /api/setup': 'public',
  'POST /api/setup': 'public',
  'POST /api/session': 'public',
  'GET /api/session': 'signed_in',
  'DELETE /api/session': 'signed_in',
  'GET /api/invitations/:token': 'public',
  'POST /api/invitations/:token': 'public',
  'PATCH /api/account': 'signed_in',
  'POST /api/account/password': 'signed_in',
  'GET /api/users': admin,
  'POST /api/users': admin,
  'PATCH /api/users/:id': admin,
  'POST /api/users/:id/link': admin,

  'GET /api/sites': 'signed_in',
  'POST /api/sites': admin,
  'GET /api/locations': 'signed_in',
  'POST /api/locations': admin,

  'GET /api/slings': 'signed_in',
  'POST /api/slings': store,
  'GET /api/slings/:id': 'signed_in',
  'PATCH /api/slings/:id': store,
  'POST /api/slings/:id/corrections': inspector,
  'POST /api/slings/:id/certificates': store,
  'POST /api/slings/:id/actions/:action': store,
  'GET /api/slings/:id/inspections': 'signed_in',
  'POST /api/slings/:id/inspections': inspector,

  'GET /api/criteria/:kind': 'signed_in',
  'POST /api/verdicts': 'signed_in',

  'GET /api/label-stocks': 'signed_in',
  'GET /api/label-stocks/:id/test-page': store,
  'POST /api/label-runs': store,
  'GET /api/label-runs/:id': 'signed_in',
  'GET /api/label-runs/:id/pdf': 'signed_in',
  'GET /api/tags/:code': 'signed_in',
  'POST /api/tags/:code/confirm': store,
  'POST /api/tags/:code/void': store,

  'GET /api/public/tags/:code': 'public',
  'POST /api/public/tags/:code/reports': 'public',
  'POST /api/public/tags/:code/files': 'public',

  'POST /api/files': store,
  'GET /api/files/:id': 'signed_in',

  'GET /api/evaluators': 'signed_in',
  'POST /api/evaluators': manager,
  'POST /api/shipments': manager,
  'GET /api/shipments/:id': 'signed_in',
  'POST /api/shipments/:id/send': manager,
  'PUT /api/shipments/:id/lines/:lineId/outcome': manager,
  'POST /api/shipments/:id/lines/:lineId/destroyed': manager,

  'GET /api/ledger': 'signed_in',
  'GET /api/ledger/verify': overseers,
} as const satisfies Record<string, Access>;

export type RouteKey = keyof typeof ROUTE_ACCESS;

/** @returns true when a person with these roles may call the route; a guest has no roles and only gets what is public. */
export function mayCall(route: RouteKey, roles: readonly Role[] | null): boolean {
  const access: Access = ROUTE_ACCESS[route];
  if (access === 'public') return true;
  if (roles === null) return false;
  return access === 'signed_in' || access.some((role) => roles.includes(role));
}
