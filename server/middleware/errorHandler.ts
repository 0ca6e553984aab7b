import type { ErrorRequestHandler, Request, Response } from 'express';
import { MulterError } from 'multer';
import { ConnectionError, DatabaseError, TimeoutError, UniqueConstraintError } from 'sequelize';
import type { ErrorCode, Problem } from '../../shared/errors';
import { AppError } from '../errors';

/** The one place where an error gets its status and title. */
const PROBLEMS = {
  malformed: { status: 400, title: 'Not understood' },
  unauthenticated: { status: 401, title: 'Not signed in' },
  forbidden: { status: 403, title: 'Not yours to do' },
  'same-person': { status: 403, title: 'Needs another person' },
  'foreign-origin': { status: 403, title: 'From another site' },
  'not-found': { status: 404, title: 'Not found' },
  'illegal-transition': { status: 409, title: 'Not possible in this state' },
  conflict: { status: 409, title: 'Something changed meanwhile' },
  duplicate: { status: 409, title: 'Already on the books' },
  stale: { status: 412, title: 'The record has changed' },
  'too-large': { status: 413, title: 'Too large' },
  'unsupported-type': { status: 415, title: 'This kind of content is not taken' },
  invalid: { status: 422, title: 'Refused' },
  unmet: { status: 422, title: 'Something is still missing' },
  'too-many-requests': { status: 429, title: 'Too many tries' },
  unavailable: { status: 503, title: 'Not able to work right now' },
  internal: { status: 500, title: 'Something broke here' },
} as const satisfies Record<ErrorCode, { status: number; title: string }>;

/** The database's own refusals (SIGNAL '45000') and its want of rights. */
const REFUSED_BY_DATABASE = [1644, 1142, 1143];

function toAppError(error: unknown): AppError | null {
  if (error instanceof AppError) return error;
  if (error instanceof MulterError) {
    return error.code === 'LIMIT_FILE_SIZE'
      ? new AppError('too-large', 'The file is larger than 10 MB.')
      : new AppError('malformed', 'Send one file, in the multipart field "file".');
  }
  if (error instanceof UniqueConstraintError) {
    return new AppError('conflict', 'Somebody else did the same at this moment. Please look again.');
  }
  if (error instanceof ConnectionError || error instanceof TimeoutError) return unavailable();
  if (error instanceof DatabaseError) {
    const errno = 'errno' in error.parent ? Number(error.parent.errno) : 0;
    if (REFUSED_BY_DATABASE.includes(errno)) {
      return new AppError('conflict', 'The database refused this change: the record has moved on.');
    }
    if (errno === 1205 || errno === 1213) {
      return new AppError('conflict', 'Others work on this record right now. Please try again.');
    }
    // The connector's own numbers: the connection was lost or could not be made.
    if (errno >= 45_000 && errno < 46_000) return unavailable();
  }
  return null;
}

function unavailable(): AppError {
  return new AppError(
    'unavailable',
    'The database is away for the moment. Nothing was lost; please try again.',
    {},
    5,
  );
}

export function sendProblem(request: Request, response: Response, error: AppError): void {
  const { status, title } = PROBLEMS[error.code];
  const problem: Problem = {
    type: `https://slingward.example/problems/${error.code}`,
    title,
    status,
    detail: error.message,
    ...error.extras,
    ...(typeof request.id === 'string' ? { requestId: request.id } : {}),
  };
  if (error.retryAfterSeconds !== undefined) response.set('Retry-After', String(error.retryAfterSeconds));
  response.status(status).type('application/problem+json').send(JSON.stringify(problem));
}

/** Known errors are answered as they are; anything else is logged and answered without a word of what broke. */
export const errorHandler: ErrorRequestHandler = (error: unknown, request, response, next) => {
  if (response.headersSent) {
    next(error);
    return;
  }
  const known = toAppError(error) ?? fromExpress(error);
  if (!known) request.log.error({ err: error }, 'unexpected error');
  sendProblem(
    request,
    response,
    known ?? new AppError('internal', 'This did not work, and nothing was changed. The log holds the cause.'),
  );
};

/** Express' own: a path that cannot be decoded. */
function fromExpress(error: unknown): AppError | null {
  return error instanceof URIError ? new AppError('malformed', 'The address cannot be read.') : null;
}
