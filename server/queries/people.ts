import { Op, QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import type { Role } from '../../shared/domain/access/roles';
import type { SlingKind } from '../../shared/domain/slings/kinds';
import type { LengthUnit, LoadUnit } from '../../shared/domain/units/units';
import type { SessionUser, User as UserView } from '../../shared/schemas/people';
import { Designation } from '../models/Designation';
import { User } from '../models/User';
import { UserSite } from '../models/UserSite';

interface SessionRow {
  id: number;
  name: string;
  email: string;
  roles: Role[];
  loadUnit: LoadUnit;
  lengthUnit: LengthUnit;
  siteIds: string | null;
  designations: string | null;
}

interface StoredDesignation {
  kinds: SlingKind[];
  designatedBy: string;
  designatedOn: string;
  until: string | null;
  isQualified: number;
}

/** One round trip: it runs with each request. An account that ended by date is no account. */
const SESSION_SQL = `
  SELECT u.id, u.name, u.email, u.roles, u.load_unit AS loadUnit, u.length_unit AS lengthUnit,
    (SELECT GROUP_CONCAT(us.site_id ORDER BY us.site_id) FROM user_sites us WHERE us.user_id = u.id) AS siteIds,
    (SELECT JSON_ARRAYAGG(JSON_OBJECT('kinds', d.kinds, 'designatedBy', d.designated_by,
        'designatedOn', d.designated_on, 'until', d.until_on, 'isQualified', d.is_qualified) ORDER BY d.id)
      FROM designations d WHERE d.user_id = u.id AND d.ended_at IS NULL) AS designations
  FROM users u
  WHERE u.id = ? AND u.password_hash IS NOT NULL AND (u.ends_on IS NULL OR u.ends_on >= UTC_DATE())`;

export async function findSessionUser(sequelize: Sequelize, id: number): Promise<SessionUser | null> {
  const [row] = await sequelize.query<SessionRow>(SESSION_SQL, {
    replacements: [id],
    type: QueryTypes.SELECT,
  });
  if (!row) return null;
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    roles: parseJson<Role[]>(row.roles),
    loadUnit: row.loadUnit,
    lengthUnit: row.lengthUnit,
    siteIds: row.siteIds ? row.siteIds.split(',').map(Number) : [],
    designations: parseJson<StoredDesignation[]>(row.designations ?? '[]').map((designation) => ({
      ...designation,
      isQualified: Boolean(designation.isQualified),
    })),
  };
}

/** MariaDB's JSON is text to some drivers' eyes and a value to others'. */
function parseJson<T>(value: unknown): T {
  return (typeof value === 'string' ? JSON.parse(value) : value) as T;
}

export async function presentUsers(users: readonly User[], transaction?: Transaction): Promise<UserView[]> {
  const options = transaction ? { transaction } : {};
  const ids = users.map((user) => user.id);
  const [sites, designations] = await Promise.all([
    UserSite.findAll({ where: { userId: ids }, ...options }),
    Designation.findAll({ where: { userId: ids, endedAt: null }, order: [['id', 'ASC']], ...options }),
  ]);
  return users.map((user) => ({
    id: user.id,
    name: user.name,
    email: user.email,
    roles: user.roles,
    siteIds: sites.filter((site) => site.userId === user.id).map((site) => site.siteId),
    endsOn: user.endsOn,
    designations: designations
      .filter((designation) => designation.userId === user.id)
      .map(({ kinds, designatedBy, designatedOn, untilOn, isQualified }) => ({
        kinds,
        designatedBy,
        designatedOn,
        until: untilOn,
        isQualified: Boolean(isQualified),
      })),
    hasPassword: user.passwordHash !== null,
    createdAt: user.createdAt.toISOString(),
  }));
}

/** The accounts by id, a page at a time. */
export async function listUsers(
  afterId: number,
  limit: number,
): Promise<{ items: UserView[]; nextCursor: string | null }> {
  const users = await User.findAll({
    where: { id: { [Op.gt]: afterId } },
    order: [['id', 'ASC']],
    limit: limit + 1,
  });
  const page = users.slice(0, limit);
  const last = page.at(-1);
  return {
    items: await presentUsers(page),
    nextCursor: users.length > limit && last ? String(last.id) : null,
  };
}
