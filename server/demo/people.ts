import type { Role } from '../../shared/domain/access/roles';
import type { LocationPurpose } from '../../shared/domain/lifecycle/states';
import { SLING_KINDS } from '../../shared/domain/slings/kinds';
import type { WriteContext } from '../context';
import { Designation } from '../models/Designation';
import { Location } from '../models/Location';
import { Site } from '../models/Site';
import { User } from '../models/User';
import { UserSite } from '../models/UserSite';
import { hashPassword } from '../security/passwords';

/** Demo data, all invented. */
export const DEMO_DOMAIN = 'marram-quay.example';
export const DEMO_PASSWORD = 'marram-quay-demo';

interface DemoPerson {
  account: string;
  name: string;
  roles: Role[];
  isAtBothSites: boolean;
}

/** One account a role; the second of each works at both sites. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [
  { account: 'storekeeper', name: 'Ama Tull', roles: ['storekeeper'], isAtBothSites: false },
  { account: 'storekeeper2', name: 'Piet Varga', roles: ['storekeeper'], isAtBothSites: true },
  { account: 'inspector', name: 'Ruth Osei', roles: ['inspector'], isAtBothSites: false },
  { account: 'inspector2', name: 'Dov Lindqvist', roles: ['inspector'], isAtBothSites: true },
  { account: 'manager', name: 'Nell Abara', roles: ['manager'], isAtBothSites: false },
  { account: 'manager2', name: 'Idris Falk', roles: ['manager'], isAtBothSites: true },
  { account: 'admin', name: 'Wren Castell', roles: ['admin'], isAtBothSites: false },
  { account: 'auditor', name: 'Sol Menard', roles: ['auditor'], isAtBothSites: false },
];

const PLACES: Record<string, [string, LocationPurpose][]> = {
  'Slip Store': [
    ['Goods-in', 'goods_in'],
    ['Rack A', 'rack'],
    ['Rack B', 'rack'],
    ['Rack C', 'rack'],
    ['Counter', 'counter'],
    ['Look-over rack', 'look_over'],
    ['Cage 1', 'cage'],
    ['Cage 2', 'cage'],
  ],
  'Blade Hall Store': [
    ['Goods-in', 'goods_in'],
    ['Rack N', 'rack'],
    ['Rack S', 'rack'],
    ['Counter', 'counter'],
    ['Cage 3', 'cage'],
  ],
};

export interface DemoPlaces {
  slipStore: Site;
  bladeHall: Site;
  locations: Location[];
}

export async function createPlaces({ transaction, at }: WriteContext): Promise<DemoPlaces> {
  const [slipStore, bladeHall] = await Promise.all(
    ['Slip Store', 'Blade Hall Store'].map((name) =>
      Site.create(
        { name, timeZone: 'Europe/London', ruleSets: ['osha', 'asme'], createdAt: at },
        { transaction },
      ),
    ),
  );
  if (!slipStore || !bladeHall) throw new Error('The demo has two sites.');
  const locations: Location[] = [];
  for (const site of [slipStore, bladeHall]) {
    for (const [name, purpose] of PLACES[site.name] ?? []) {
      locations.push(
        await Location.create({ siteId: site.id, name, purpose, createdAt: at }, { transaction }),
      );
    }
  }
  return { slipStore, bladeHall, locations };
}

/** The accounts by their short name. Inspectors are designated for all kinds, qualified. */
export async function createPeople(
  { transaction, at }: WriteContext,
  { slipStore, bladeHall }: DemoPlaces,
  auditorEndsOn: string,
): Promise<Map<string, User>> {
  const people = new Map<string, User>();
  for (const { account, name, roles, isAtBothSites } of DEMO_PEOPLE) {
    const user = await User.create(
      {
        email: `${account}@${DEMO_DOMAIN}`,
        name,
        passwordHash: await hashPassword(DEMO_PASSWORD),
        roles,
        endsOn: roles.includes('auditor') ? auditorEndsOn : null,
        createdAt: at,
      },
      { transaction },
    );
    people.set(account, user);
    const sites = isAtBothSites ? [slipStore, bladeHall] : [slipStore];
    await UserSite.bulkCreate(
      sites.map((site) => ({ userId: user.id, siteId: site.id })),
      { transaction },
    );
    if (roles.includes('inspector')) {
      await Designation.create(
        {
          userId: user.id,
          kinds: [...SLING_KINDS],
          designatedBy: 'Nell Abara, store manager',
          designatedOn: at.toISOString().slice(0, 10),
          untilOn: null,
          isQualified: true,
          createdAt: at,
        },
        { transaction },
      );
    }
  }
  return people;
}
