import type { z } from 'zod';
import { idParam, listOf, pageOf, pageQuery } from '../../shared/schemas/common';
import {
  createUserRequest,
  oneTimeLinkResponse,
  updateUserRequest,
  userSchema,
} from '../../shared/schemas/people';
import {
  createLocationRequest,
  createSiteRequest,
  locationSchema,
  locationsQuery,
  siteSchema,
} from '../../shared/schemas/places';
import { createOneTimeLink, createUser, updateUser } from '../commands/accounts';
import { asActor } from '../context';
import { AppError, invalidField, NotFoundError } from '../errors';
import { Location } from '../models/Location';
import { Site } from '../models/Site';
import { User } from '../models/User';
import { UserSite } from '../models/UserSite';
import { listUsers, presentUsers } from '../queries/people';
import { read, write } from '../routing/define';
import { idParams } from './params';

const usersQuery = pageQuery.extend({ cursor: idParam.optional() });

const presentSite = ({ id, name, timeZone, ruleSets }: Site) => ({ id, name, timeZone, ruleSets });
const presentLocation = ({ id, siteId, name, purpose }: Location) => ({ id, siteId, name, purpose });

export const administrationRoutes = [
  read({
    route: 'GET /api/users',
    summary: 'All accounts',
    query: usersQuery,
    response: pageOf(userSchema),
    async handle(_context, { query }) {
      return { body: await listUsers(query.cursor ?? 0, query.limit) };
    },
  }),
  write({
    route: 'POST /api/users',
    summary: 'Add an account; answers a one-time link, shown once',
    body: createUserRequest,
    response: oneTimeLinkResponse,
    isSecret: true,
    async handle(context, { body }) {
      const user = await createUser(context, body);
      return { status: 201, body: await createOneTimeLink(context, user.id) };
    },
  }),
  write({
    route: 'PATCH /api/users/:id',
    summary: 'Change roles, sites, designations, end date',
    params: idParams,
    body: updateUserRequest,
    response: userSchema,
    load: (_context, params) => getUserId(params.id),
    async handle(context, { body, loaded }) {
      const user = await updateUser(context, loaded, body);
      const [view] = await presentUsers([user], context.transaction);
      return { body: view };
    },
  }),
  write({
    route: 'POST /api/users/:id/link',
    summary: 'A new one-time link that sets the password, shown once',
    params: idParams,
    response: oneTimeLinkResponse,
    isSecret: true,
    load: (_context, params) => getUserId(params.id),
    async handle(context, { loaded }) {
      return { status: 201, body: await createOneTimeLink(context, loaded) };
    },
  }),
  read({
    route: 'GET /api/sites',
    summary: 'The sites where I work',
    response: listOf(siteSchema),
    async handle({ user }) {
      // The administrator gives people sites, so has to see them all.
      const where = user.roles.includes('admin') ? {} : { id: user.siteIds };
      const sites = await Site.findAll({ where, order: [['name', 'ASC']] });
      return { body: { items: sites.map(presentSite) } };
    },
  }),
  write({
    route: 'POST /api/sites',
    summary: 'Add a site; its maker works there',
    body: createSiteRequest,
    response: siteSchema,
    async handle(context, { body }) {
      const { transaction, at, user } = asActor(context);
      if (await Site.findOne({ where: { name: body.name }, transaction })) {
        throw new AppError('duplicate', 'There is a site of this name already.', {
          errors: [{ path: 'name', message: 'There is a site of this name already.' }],
        });
      }
      const site = await Site.create({ ...body, createdAt: at }, { transaction });
      await UserSite.create({ userId: user.id, siteId: site.id }, { transaction });
      return { status: 201, body: presentSite(site) };
    },
  }),
  read<unknown, z.infer<typeof locationsQuery>>({
    route: 'GET /api/locations',
    summary: 'Racks, cages and other places of my sites',
    query: locationsQuery,
    response: listOf(locationSchema),
    async handle({ user }, { query }) {
      const isAdmin = user.roles.includes('admin');
      const siteIds =
        query.siteId === undefined
          ? user.siteIds
          : [query.siteId].filter((id) => isAdmin || user.siteIds.includes(id));
      const where = isAdmin && query.siteId === undefined ? {} : { siteId: siteIds };
      const locations = await Location.findAll({ where, order: [['name', 'ASC']] });
      return { body: { items: locations.map(presentLocation) } };
    },
  }),
  write({
    route: 'POST /api/locations',
    summary: 'Add a place to a site',
    body: createLocationRequest,
    response: locationSchema,
    async handle({ transaction, at }, { body }) {
      if (!(await Site.findByPk(body.siteId, { transaction })))
        throw invalidField('siteId', 'There is no such site.');
      if (await Location.findOne({ where: { siteId: body.siteId, name: body.name }, transaction })) {
        throw new AppError('duplicate', 'The site has a place of this name already.', {
          errors: [{ path: 'name', message: 'The site has a place of this name already.' }],
        });
      }
      const location = await Location.create({ ...body, createdAt: at }, { transaction });
      return { status: 201, body: presentLocation(location) };
    },
  }),
];

async function getUserId(id: number): Promise<number> {
  const user = await User.findByPk(id, { attributes: ['id'] });
  if (!user) throw new NotFoundError('account');
  return user.id;
}
