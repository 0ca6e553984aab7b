import { describe, expect, it } from 'vitest';
import { ROLE_NAMES, ROLES, type Role } from '../../../../shared/domain/access/roles';
import { mayCall, ROUTE_ACCESS, type Access, type RouteKey } from '../../../../shared/domain/access/routes';

const routes = Object.entries(ROUTE_ACCESS) as [RouteKey, Access][];

describe('who may call what', () => {
  it('opens nothing to a guest but what is public', () => {
    for (const [route, access] of routes) expect(mayCall(route, null), route).toBe(access === 'public');
  });

  it('gives an account without roles what any account may, and no more', () => {
    for (const [route, access] of routes) expect(mayCall(route, []), route).toBe(typeof access === 'string');
  });

  it.each(ROLES)('gives a %s what names the role, and public and common calls', (role) => {
    for (const [route, access] of routes) {
      expect(mayCall(route, [role]), route).toBe(typeof access === 'string' || access.includes(role));
    }
  });

  it('adds the roles of a person up', () => {
    expect(mayCall('POST /api/users', ['storekeeper', 'inspector'])).toBe(false);
    expect(mayCall('POST /api/users', ['storekeeper', 'admin'])).toBe(true);
    expect(mayCall('POST /api/slings/:id/inspections', ['manager', 'inspector'])).toBe(true);
  });

  it('lets an auditor change nothing but the own account, and an administrator no sling', () => {
    const writes = routes.filter(([route, access]) => !route.startsWith('GET') && access !== 'public');
    const own = ['DELETE /api/session', 'PATCH /api/account', 'POST /api/account/password'];
    // Verdicts compute and keep nothing.
    const open = [...own, 'POST /api/verdicts'];
    const mine = (role: Role): string[] =>
      writes.map(([route]) => route).filter((route) => mayCall(route, [role]));
    expect(mine('auditor').sort()).toEqual([...open].sort());
    expect(mine('admin').filter((route) => /slings|tags|label|shipments|files/.test(route))).toEqual([]);
  });

  it('opens no call that is public and writes, but signing in, the first start and damage reports', () => {
    const open = routes.filter(([route, access]) => access === 'public' && !route.startsWith('GET'));
    expect(open.map(([route]) => route).sort()).toEqual([
      'POST /api/invitations/:token',
      'POST /api/public/tags/:code/files',
      'POST /api/public/tags/:code/reports',
      'POST /api/session',
      'POST /api/setup',
    ]);
  });

  it('names each role in words', () => {
    expect(Object.keys(ROLE_NAMES)).toEqual([...ROLES]);
  });
});
