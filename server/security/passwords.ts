import { hash, verify } from '@node-rs/argon2';
import type { ActorContext } from '../context';
import { AppError } from '../errors';
import { User } from '../models/User';

/** Argon2id, 19 MiB, two passes: the least that OWASP's password storage sheet names. */
const SETTINGS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

/** Hash of a password that nobody has: a guess at an unknown address takes as long as one at a known one. */
const nobody = hash('nobody-has-this-password', SETTINGS);

export function hashPassword(password: string): Promise<string> {
  return hash(password, SETTINGS);
}

export async function isPassword(passwordHash: string | null, password: string): Promise<boolean> {
  const matches = await verify(passwordHash ?? (await nobody), password);
  return matches && passwordHash !== null;
}

const MAX_WRONG = 5;
const PAUSE_MS = 5 * 60_000;
const wrongTries = new Map<number, { count: number; until: number }>();

/**
 * Checks the signed-in person's own password again, for an act that can't be taken back.
 * @throws AppError 429 after five wrong ones, for five minutes: a session left open is no place to guess
 */
export async function verifyOwnPassword(context: ActorContext, password: string): Promise<boolean> {
  const { id } = context.user;
  const now = Date.now();
  const tries = wrongTries.get(id);
  if (tries && tries.count >= MAX_WRONG && tries.until > now) {
    throw new AppError(
      'too-many-requests',
      'Too many wrong passwords. Wait a few minutes and try again.',
      {},
      Math.ceil((tries.until - now) / 1000),
    );
  }
  const user = await User.findByPk(id, { attributes: ['passwordHash'], transaction: context.transaction });
  if (await isPassword(user?.passwordHash ?? null, password)) {
    wrongTries.delete(id);
    return true;
  }
  const count = tries && tries.until > now ? tries.count + 1 : 1;
  wrongTries.set(id, { count, until: now + PAUSE_MS });
  return false;
}
