import { UniqueConstraintError, type Transaction } from 'sequelize';
import type {
  CreateUserRequest,
  DesignationInput,
  SetUpRequest,
  UpdateUserRequest,
  User as UserView,
} from '../../shared/schemas/people';
import { defaultRuleSets } from '../../shared/domain/inspection/ruleSets';
import type { LocationPurpose } from '../../shared/domain/lifecycle/states';
import type { WriteContext } from '../context';
import { AppError, InvalidError, invalidField, NotFoundError } from '../errors';
import { Designation } from '../models/Designation';
import { IdempotencyKey } from '../models/IdempotencyKey';
import { Invitation } from '../models/Invitation';
import { Location } from '../models/Location';
import { Site } from '../models/Site';
import { User } from '../models/User';
import { UserSite } from '../models/UserSite';
import { presentUsers } from '../queries/people';
import { drawToken, hashToken } from '../security/oneTimeTokens';
import { hashPassword } from '../security/passwords';

const LINK_LIFE_MS = 72 * 3_600_000;

export async function isSetUpNeeded(): Promise<boolean> {
  return (await User.count()) === 0;
}

/** The first administrator and the first site, once: with any account there, it is refused. */
export async function setUpStore(context: WriteContext, request: SetUpRequest): Promise<User> {
  const { transaction, at } = context;
  // One row that only one transaction can write: of two first starters the second waits here and is refused.
  await IdempotencyKey.create(
    { scope: 'set-up', idempotencyKey: 'first', fingerprint: '', status: 201, createdAt: at },
    { transaction },
  ).catch((error: unknown) => {
    throw error instanceof UniqueConstraintError ? alreadySetUp() : error;
  });
  if ((await User.count({ transaction })) > 0) throw alreadySetUp();
  const site = await Site.create(
    {
      name: request.siteName,
      timeZone: request.timeZone,
      ruleSets: defaultRuleSets(request.ruleSets),
      createdAt: at,
    },
    { transaction },
  );
  const first: [string, LocationPurpose][] = [
    ['Goods-in', 'goods_in'],
    ['Rack A', 'rack'],
    ['Counter', 'counter'],
    ['Cage 1', 'cage'],
  ];
  await Location.bulkCreate(
    first.map(([name, purpose]) => ({ siteId: site.id, name, purpose, createdAt: at })),
    { transaction },
  );
  const user = await User.create(
    {
      email: request.email,
      name: request.name,
      passwordHash: await hashPassword(request.password),
      roles: ['admin'],
      loadUnit: request.ruleSets === 'us' ? 'lb' : 'kg',
      lengthUnit: request.ruleSets === 'us' ? 'ft' : 'm',
      createdAt: at,
    },
    { transaction },
  );
  await UserSite.create({ userId: user.id, siteId: site.id }, { transaction });
  return user;
}

function alreadySetUp(): AppError {
  return new AppError('conflict', 'Slingward is set up already. Please sign in.');
}

export async function createUser(context: WriteContext, request: CreateUserRequest): Promise<User> {
  const { transaction, at } = context;
  if (await User.findOne({ where: { email: request.email }, transaction })) {
    throw new AppError('duplicate', 'There is an account with this e-mail address already.', {
      errors: [{ path: 'email', message: 'There is an account with this e-mail address already.' }],
    });
  }
  const user = await User.create(
    { email: request.email, name: request.name, roles: request.roles, endsOn: request.endsOn, createdAt: at },
    { transaction },
  );
  await setSites(context, user.id, request.siteIds);
  await setDesignations(context, user.id, request.designations);
  return user;
}

export async function updateUser(
  context: WriteContext,
  id: number,
  request: UpdateUserRequest,
): Promise<User> {
  const { transaction } = context;
  const user = await User.findByPk(id, { transaction, lock: transaction.LOCK.UPDATE });
  if (!user) throw new NotFoundError('account');
  const { siteIds, designations, ...fields } = request;
  const roles = fields.roles ?? user.roles;
  const endsOn = fields.endsOn === undefined ? user.endsOn : fields.endsOn;
  if (roles.includes('auditor') && endsOn === null) {
    throw invalidField('endsOn', 'An auditor’s account needs a date on which it ends.');
  }
  if (context.user?.id === id && !roles.includes('admin')) {
    throw invalidField('roles', 'You cannot take the administrator’s role from yourself.');
  }
  if (context.user?.id === id && fields.endsOn && fields.endsOn < context.at.toISOString().slice(0, 10)) {
    throw invalidField('endsOn', 'You cannot end your own account: you would be locked out at once.');
  }
  await user.update(fields, { transaction });
  if (siteIds) await setSites(context, id, siteIds);
  if (designations) await setDesignations(context, id, designations);
  return user;
}

async function setSites(
  { transaction }: WriteContext,
  userId: number,
  siteIds: readonly number[],
): Promise<void> {
  const unique = [...new Set(siteIds)];
  const known = await Site.count({ where: { id: unique }, transaction });
  if (known < unique.length) throw new InvalidError([{ path: 'siteIds', message: 'There is no such site.' }]);
  await UserSite.destroy({ where: { userId }, transaction });
  await UserSite.bulkCreate(
    unique.map((siteId) => ({ userId, siteId })),
    { transaction },
  );
}

/** Ends those that are no longer named and adds the new ones: what was once in force stays on record. */
async function setDesignations(
  { transaction, at }: WriteContext,
  userId: number,
  wanted: readonly DesignationInput[],
): Promise<void> {
  const keyOf = (designation: DesignationInput): string =>
    JSON.stringify([
      [...designation.kinds].sort(),
      designation.designatedBy,
      designation.designatedOn,
      designation.until,
      designation.isQualified,
    ]);
  const missing = new Map(wanted.map((designation) => [keyOf(designation), designation]));
  for (const current of await Designation.findAll({ where: { userId, endedAt: null }, transaction })) {
    const key = keyOf({
      ...current.get(),
      until: current.untilOn,
      isQualified: Boolean(current.isQualified),
    });
    if (!missing.delete(key)) await current.update({ endedAt: at }, { transaction });
  }
  await Designation.bulkCreate(
    [...missing.values()].map(({ until, ...designation }) => ({
      ...designation,
      userId,
      untilOn: until,
      createdAt: at,
    })),
    { transaction },
  );
}

/** A link that sets the account's password, once; earlier links of the account die with it. */
export async function createOneTimeLink(
  context: WriteContext,
  userId: number,
): Promise<{ user: UserView; link: string; expiresAt: string }> {
  const { transaction, at, publicUrl } = context;
  const user = await User.findByPk(userId, { transaction });
  if (!user) throw new NotFoundError('account');
  await Invitation.update({ usedAt: at }, { where: { userId, usedAt: null }, transaction });
  const { token, tokenHash } = drawToken();
  const expiresAt = new Date(at.getTime() + LINK_LIFE_MS);
  await Invitation.create({ userId, tokenHash, expiresAt, createdAt: at }, { transaction });
  const [view] = await presentUsers([user], transaction);
  if (!view) throw new NotFoundError('account');
  return { user: view, link: `${publicUrl}/invitation/${token}`, expiresAt: expiresAt.toISOString() };
}

/** The account behind a link that still works; used, expired and made-up links look alike. */
export async function getInvitation(
  token: string,
  at: Date,
  transaction?: Transaction,
): Promise<{ invitation: Invitation; user: User }> {
  const options = transaction ? { transaction, lock: transaction.LOCK.UPDATE } : {};
  const invitation = await Invitation.findOne({
    where: { tokenHash: hashToken(token), usedAt: null },
    ...options,
  });
  const user =
    invitation && invitation.expiresAt > at ? await User.findByPk(invitation.userId, options) : null;
  if (!invitation || !user) {
    throw new AppError('not-found', 'This link does not work any more. Ask the administrator for a new one.');
  }
  return { invitation, user };
}

export async function acceptInvitation(
  context: WriteContext,
  token: string,
  password: string,
): Promise<User> {
  const { transaction, at } = context;
  const { invitation, user } = await getInvitation(token, at, transaction);
  await invitation.update({ usedAt: at }, { transaction });
  return user.update({ passwordHash: await hashPassword(password) }, { transaction });
}
