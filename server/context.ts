import type { Sequelize, Transaction } from 'sequelize';
import type { SessionUser } from '../shared/schemas/people';
import { AppError } from './errors';
import type { FileStore } from './files/fileStore';

/** What a request may reach: the services of this process. */
export interface Services {
  sequelize: Sequelize;
  files: FileStore;
  publicUrl: string;
  /** The clock, so that the demo and the tests can set it. */
  now: () => Date;
}

/** A read by a person. */
export interface ReadContext extends Services {
  user: SessionUser;
}

/** A write: one person (or none, on public pages), one moment, one transaction. */
export interface WriteContext extends Services {
  user: SessionUser | null;
  at: Date;
  transaction: Transaction;
}

export interface ActorContext extends WriteContext {
  user: SessionUser;
}

/** @throws AppError when nobody is signed in: a route that needs a person was called without one */
export function asActor(context: WriteContext): ActorContext {
  if (!context.user) throw new AppError('unauthenticated', 'Please sign in.');
  return { ...context, user: context.user };
}
