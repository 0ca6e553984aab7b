import passport from 'passport';
import { Strategy } from 'passport-local';
import type { Sequelize } from 'sequelize';
import type { SessionUser } from '../../shared/schemas/people';
import { User } from '../models/User';
import { findSessionUser } from '../queries/people';
import { isPassword } from './passwords';

/** Sign-in by e-mail and password; the session keeps the account's id alone, rights are read anew each time. */
export function createPassport(sequelize: Sequelize): passport.Authenticator {
  const authenticator = new passport.Passport();
  authenticator.use(
    new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      signIn(sequelize, email, password).then(
        (user) => done(null, user ?? false),
        (error: unknown) => done(error),
      );
    }),
  );
  authenticator.serializeUser<number>((user, done) => done(null, user.id));
  authenticator.deserializeUser<number>((id, done) => {
    findSessionUser(sequelize, id).then(
      (user) => done(null, user ?? false),
      (error: unknown) => done(error),
    );
  });
  return authenticator;
}

async function signIn(sequelize: Sequelize, email: string, password: string): Promise<SessionUser | null> {
  const account = await User.findOne({ where: { email: email.trim().toLowerCase() } });
  if (!(await isPassword(account?.passwordHash ?? null, password)) || !account) return null;
  return findSessionUser(sequelize, account.id);
}
