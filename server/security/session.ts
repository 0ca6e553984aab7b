import connectSessionSequelize from 'connect-session-sequelize';
import session from 'express-session';
import type { RequestHandler } from 'express';
import { DataTypes, literal, Op, QueryTypes, type Sequelize } from 'sequelize';

/** A working day with some reserve; then the person signs in again. */
const SESSION_LIFE_MS = 14 * 3_600_000;
const COOKIE = 'slingward.sid';

declare module 'express-session' {
  interface SessionData {
    passport?: { user?: number };
  }
}

/** Sessions live in the database: a restart signs nobody out, and a changed password can end them. */
export function sessions(
  sequelize: Sequelize,
  options: { secret: string; isSecure: boolean },
): RequestHandler {
  sequelize.define(
    'Session',
    {
      sid: { type: DataTypes.STRING(64), primaryKey: true },
      userId: DataTypes.INTEGER.UNSIGNED,
      expires: DataTypes.DATE(3),
      data: DataTypes.TEXT,
      createdAt: DataTypes.DATE(3),
      updatedAt: DataTypes.DATE(3),
    },
    {
      tableName: 'sessions',
      timestamps: true,
      // The store itself never looks at the date: a copied cookie would work until the row is swept away.
      defaultScope: { where: { expires: { [Op.gt]: literal('UTC_TIMESTAMP(3)') } } },
    },
  );
  const SequelizeStore = connectSessionSequelize(session.Store);
  const storeOptions = {
    db: sequelize,
    table: 'Session',
    // Reading a page writes nothing: a session ends a fixed time after sign-in. Its types leave this option out.
    disableTouch: true,
    checkExpirationInterval: 0,
    expiration: SESSION_LIFE_MS,
    extendDefaultFields: (defaults: object, data: session.SessionData) => ({
      ...defaults,
      userId: data.passport?.user ?? null,
    }),
  };
  const store = new SequelizeStore(storeOptions);
  return session({
    name: COOKIE,
    secret: options.secret,
    store,
    resave: false,
    saveUninitialized: false,
    cookie: {
      httpOnly: true,
      sameSite: 'lax',
      secure: options.isSecure,
      maxAge: SESSION_LIFE_MS,
      path: '/',
    },
  });
}

/** Signs the person out everywhere but here. */
export async function endOtherSessions(sequelize: Sequelize, userId: number, keepSid: string): Promise<void> {
  await sequelize.query('DELETE FROM sessions WHERE user_id = ? AND sid <> ?', {
    replacements: [userId, keepSid],
    type: QueryTypes.DELETE,
  });
}

export async function deleteExpiredSessions(sequelize: Sequelize): Promise<void> {
  await sequelize.query('DELETE FROM sessions WHERE expires < UTC_TIMESTAMP(3) LIMIT 10000', {
    type: QueryTypes.DELETE,
  });
}
