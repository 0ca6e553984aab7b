import type { ErrorCode, FieldError, Problem } from '../shared/errors';
import type { Unmet } from '../shared/domain/lifecycle/facts';

type Extras = Partial<Pick<Problem, 'errors' | 'unmet' | 'from' | 'allowed' | 'changes'>>;

/** A refusal that a person may read. The status follows from the code in one place, the error handler. */
export class AppError extends Error {
  override readonly name: string = 'AppError';

  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly extras: Extras = {},
    readonly retryAfterSeconds?: number,
  ) {
    super(message);
  }
}

export class NotFoundError extends AppError {
  override readonly name = 'NotFoundError';
  constructor(what: string) {
    super('not-found', `There is no such ${what}, or you do not work where it is.`);
  }
}

export class InvalidError extends AppError {
  override readonly name = 'InvalidError';
  constructor(errors: FieldError[], message = 'Some of what was sent cannot be taken. Each field says why.') {
    super('invalid', message, { errors });
  }
}

export class UnmetError extends AppError {
  override readonly name = 'UnmetError';
  constructor(unmet: Unmet[]) {
    super('unmet', unmet.map((need) => need.message).join(' '), { unmet });
  }
}

/** Refuses one field. */
export function invalidField(path: string, message: string): InvalidError {
  return new InvalidError([{ path, message }], message);
}
