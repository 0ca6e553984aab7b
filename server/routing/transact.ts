import { DatabaseError, UniqueConstraintError, type Transaction } from 'sequelize';
import type { WriteContext } from '../context';
import { AppError } from '../errors';
import { IdempotencyKey } from '../models/IdempotencyKey';
import { sha256 } from '../security/sha256';
import type { Answer } from './route';

/** MariaDB: the transaction was rolled back to end a deadlock; a wait for a lock took too long. */
const RETRIED_ERRORS = [1213, 1205];
const ATTEMPTS = 6;

export interface RepeatKey {
  /** Who: keys of two people never meet. */
  scope: string;
  key: string;
  fingerprint: string;
  isSecret: boolean;
}

/** What makes two requests the same: route, path and body. A password in it is no part: its hash would be kept for months. */
export function fingerprintOf(method: string, path: string, body: unknown): string {
  const withoutSecrets = (field: string, value: unknown): unknown =>
    /password/i.test(field) ? undefined : value;
  return sha256(`${method} ${path}\n${JSON.stringify(body, withoutSecrets)}`);
}

/**
 * Runs one write in one transaction, again after a deadlock, and keeps its answer under the repeat key in that
 * same transaction: the same key acts once, whatever breaks in between.
 */
export async function transact(
  base: Omit<WriteContext, 'transaction' | 'at'>,
  repeat: RepeatKey | null,
  handle: (context: WriteContext) => Promise<Answer>,
): Promise<Answer> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await base.sequelize.transaction(async (transaction) => {
        const at = base.now();
        const known = repeat && (await claimKey(repeat, at, transaction));
        if (known) return known;
        const answer = await handle({ ...base, at, transaction });
        if (repeat) await keepAnswer(repeat, answer, transaction);
        return answer;
      });
    } catch (error) {
      if (attempt >= ATTEMPTS || !isRetried(error)) throw error;
      await new Promise((resolve) => setTimeout(resolve, attempt * 15 * Math.random()));
    }
  }
}

function isRetried(error: unknown): boolean {
  if (!(error instanceof DatabaseError)) return false;
  const { parent } = error;
  return 'errno' in parent && RETRIED_ERRORS.includes(Number(parent.errno));
}

/** Claims the key for this transaction, or answers what it answered before. Waits while another one holds it. */
async function claimKey(repeat: RepeatKey, at: Date, transaction: Transaction): Promise<Answer | null> {
  const { scope, key: idempotencyKey, fingerprint } = repeat;
  try {
    await IdempotencyKey.create(
      { scope, idempotencyKey, fingerprint, status: 0, createdAt: at },
      { transaction },
    );
    return null;
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
  }
  const kept = await IdempotencyKey.findOne({ where: { scope, idempotencyKey }, transaction });
  if (!kept) throw new AppError('conflict', 'The same request is being worked on. Please ask again.');
  if (kept.fingerprint !== fingerprint) {
    throw new AppError('invalid', 'This Idempotency-Key was used for another request.');
  }
  return { status: kept.status, body: kept.body === null ? undefined : (JSON.parse(kept.body) as unknown) };
}

async function keepAnswer(repeat: RepeatKey, answer: Answer, transaction: Transaction): Promise<void> {
  const { scope, key: idempotencyKey } = repeat;
  const body = answer.body === undefined || repeat.isSecret ? null : JSON.stringify(answer.body);
  await IdempotencyKey.update(
    { status: answer.status ?? 200, body },
    { where: { scope, idempotencyKey }, transaction },
  );
}
