import type { Request } from 'express';
import type { SessionUser } from '../../shared/schemas/people';
import { AppError } from '../errors';

export function findUser(request: Request): SessionUser | null {
  return request.user ?? null;
}

/** @throws AppError 401 */
export function asSignedIn(request: Request): SessionUser {
  if (!request.user) throw new AppError('unauthenticated', 'Please sign in.');
  return request.user;
}
