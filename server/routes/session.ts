import type { NextFunction, Request, Response } from 'express';
import type passport from 'passport';
import { z } from 'zod';
import {
  acceptInvitationRequest,
  changePasswordRequest,
  invitationSchema,
  sessionResponse,
  setUpRequest,
  setUpState,
  signInRequest,
  updateAccountRequest,
} from '../../shared/schemas/people';
import { acceptInvitation, getInvitation, isSetUpNeeded, setUpStore } from '../commands/accounts';
import { asActor, type Services } from '../context';
import { AppError, invalidField, NotFoundError } from '../errors';
import { asSignedIn } from '../middleware/authenticate';
import { User } from '../models/User';
import { findSessionUser } from '../queries/people';
import { raw, read, write } from '../routing/define';
import { parseBody, readJsonBody } from '../routing/parse';
import { transact } from '../routing/transact';
import { hashPassword, verifyOwnPassword } from '../security/passwords';
import { endOtherSessions } from '../security/session';

const tokenParams = z.object({ token: z.string().regex(/^[\w-]{20,100}$/) });

/** Starts the session; passport gives it a new id, so that a planted one is worth nothing. */
async function startSession(services: Services, request: Request, userId: number): Promise<Express.User> {
  const user = await findSessionUser(services.sequelize, userId);
  if (!user) throw new AppError('unauthenticated', 'This account has ended. Ask the administrator.');
  await new Promise<void>((resolve, reject) => {
    request.logIn(user, (error: unknown) => {
      if (error instanceof Error) reject(error);
      else resolve();
    });
  });
  return user;
}

function authenticate(
  authenticator: passport.Authenticator,
  request: Request,
  response: Response,
): Promise<Express.User | false> {
  return new Promise((resolve, reject) => {
    const done = (error: unknown, user?: Express.User | false): void => {
      if (error instanceof Error) reject(error);
      else resolve(user ?? false);
    };
    const middleware: unknown = authenticator.authenticate('local', { session: false }, done);
    (middleware as (request: Request, response: Response, next: NextFunction) => void)(
      request,
      response,
      done,
    );
  });
}

export const sessionRoutes = (authenticator: passport.Authenticator) => [
  raw({
    route: 'POST /api/session',
    summary: 'Sign in',
    body: signInRequest,
    response: sessionResponse,
    limit: 'guess',
    async handle(services, { request, response }) {
      const body = parseBody(signInRequest, await readJsonBody(request, response));
      request.body = body;
      const found = await authenticate(authenticator, request, response);
      if (!found) throw new AppError('unauthenticated', 'E-mail address or password is wrong.');
      response.json({ user: await startSession(services, request, found.id) });
    },
  }),
  read({
    route: 'GET /api/session',
    summary: 'Who is signed in',
    response: sessionResponse,
    handle: ({ user }) => Promise.resolve({ body: { user } }),
  }),
  raw({
    route: 'DELETE /api/session',
    summary: 'Sign out',
    async handle(_services, { request, response }) {
      await new Promise<void>((resolve, reject) => {
        request.session.destroy((error: unknown) => {
          if (error instanceof Error) reject(error);
          else resolve();
        });
      });
      response.clearCookie('slingward.sid', { path: '/' }).status(204).end();
    },
  }),
  raw({
    route: 'GET /api/setup',
    summary: 'Does the store wait for its first administrator?',
    response: setUpState,
    async handle(_services, { response }) {
      response.json({ needed: await isSetUpNeeded() });
    },
  }),
  raw({
    route: 'POST /api/setup',
    summary: 'Make the first administrator and the first site, once',
    body: setUpRequest,
    response: sessionResponse,
    limit: 'guess',
    async handle(services, { request, response }) {
      const body = parseBody(setUpRequest, await readJsonBody(request, response));
      if (!(await isSetUpNeeded()))
        throw new AppError('conflict', 'Slingward is set up already. Please sign in.');
      let userId = 0;
      await transact({ ...services, user: null }, null, async (context) => {
        userId = (await setUpStore(context, body)).id;
        return {};
      });
      response.status(201).json({ user: await startSession(services, request, userId) });
    },
  }),
  raw({
    route: 'GET /api/invitations/:token',
    summary: 'Whose password a one-time link sets',
    params: tokenParams,
    response: invitationSchema,
    limit: 'guess',
    async handle(services, { params, response }) {
      const { invitation, user } = await getInvitation(params.token, services.now());
      response.json({ name: user.name, email: user.email, expiresAt: invitation.expiresAt.toISOString() });
    },
  }),
  raw({
    route: 'POST /api/invitations/:token',
    summary: 'Set the password and sign in',
    params: tokenParams,
    body: acceptInvitationRequest,
    response: sessionResponse,
    limit: 'guess',
    async handle(services, { params, request, response }) {
      const body = parseBody(acceptInvitationRequest, await readJsonBody(request, response));
      let userId = 0;
      await transact({ ...services, user: null }, null, async (context) => {
        userId = (await acceptInvitation(context, params.token, body.password)).id;
        return {};
      });
      const user = await startSession(services, request, userId);
      await endOtherSessions(services.sequelize, userId, request.sessionID);
      response.json({ user });
    },
  }),
  write({
    route: 'PATCH /api/account',
    summary: 'Change my name or units',
    body: updateAccountRequest,
    response: sessionResponse,
    async handle(context, { body }) {
      const { user, transaction } = asActor(context);
      const account = await User.findByPk(user.id, { transaction });
      if (!account) throw new NotFoundError('account');
      await account.update(body, { transaction });
      return { body: { user: { ...user, ...body } } };
    },
  }),
  raw({
    route: 'POST /api/account/password',
    summary: 'Change my password; signs me out everywhere else',
    body: changePasswordRequest,
    async handle(services, { request, response }) {
      const user = asSignedIn(request);
      const body = parseBody(changePasswordRequest, await readJsonBody(request, response));
      const passwordHash = await hashPassword(body.newPassword);
      await transact({ ...services, user }, null, async (context) => {
        if (!(await verifyOwnPassword(asActor(context), body.currentPassword))) {
          throw invalidField('currentPassword', 'This is not your present password.');
        }
        await User.update({ passwordHash }, { where: { id: user.id }, transaction: context.transaction });
        return {};
      });
      await endOtherSessions(services.sequelize, user.id, request.sessionID);
      response.status(204).end();
    },
  }),
];
