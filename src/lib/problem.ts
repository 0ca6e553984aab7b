import { problemSchema, type Problem } from '../../shared/errors';

/** Lenient: a proxy's answer has none of the fields, and still needs its words. */
const problemBody = problemSchema.partial();

/** `offline`: no answer came. `refused`: the server said no. `broken`: an answer that this client can't read. */
export type ProblemKind = 'offline' | 'refused' | 'broken';

/** A refusal or failure of a call, with words fit for the screen (RFC 9457 problem details). */
export class ApiProblem extends Error {
  readonly kind: ProblemKind;
  /** HTTP status; 0 when no answer came. */
  readonly status: number;
  readonly type: string;
  readonly title: string;
  readonly detail: string;
  /** Faults in what was sent; `path` is dotted: `ratedLoads.verticalKg`. */
  readonly errors: readonly { path: string; message: string }[];
  /** What the rules still ask for. */
  readonly unmet: readonly { rule: string; message: string }[];
  /** State that the sling was in, where the state was the obstacle. */
  readonly from: string | undefined;
  /** Actions open from there. */
  readonly allowed: readonly string[];
  /** What happened on the record since the version that the caller knew. */
  readonly changes: NonNullable<Problem['changes']>;
  readonly retryAfterSeconds: number | undefined;

  constructor(kind: ProblemKind, status: number, body: unknown, retryAfter: string | null = null) {
    const parsed = problemBody.safeParse(body);
    const fields = parsed.success ? parsed.data : {};
    super(fields.title || TITLES[status] || 'That did not work');
    this.name = 'ApiProblem';
    this.kind = kind;
    this.status = status;
    this.type = fields.type ?? 'about:blank';
    this.title = this.message;
    this.detail = fields.detail || DETAILS[status] || '';
    this.errors = fields.errors ?? [];
    this.unmet = fields.unmet ?? [];
    this.from = fields.from;
    this.allowed = fields.allowed ?? [];
    this.changes = fields.changes ?? [];
    const seconds = retryAfter === null ? Number.NaN : Number(retryAfter);
    this.retryAfterSeconds = Number.isFinite(seconds) ? seconds : undefined;
  }

  /** The message for one field, by its dotted path, or undefined. */
  errorFor(path: string): string | undefined {
    return this.errors.find((e) => e.path === path)?.message;
  }
}

const TITLES: Record<number, string | undefined> = {
  401: 'Sign in to go on',
  403: 'Not open to you',
  404: 'Not found',
  409: 'Something changed meanwhile',
  412: 'Somebody else changed this meanwhile',
  413: 'Too large',
  429: 'Too many tries',
  503: 'The store is not answering',
};
const DETAILS: Record<number, string | undefined> = {
  412: 'Load the page again to see what changed, then decide.',
  413: 'Use a file of at most 10 MB.',
  429: 'Wait a little, then try again.',
  500: 'The fault is on our side and has been logged. Try again; what you typed is still here.',
  503: 'The database is away for the moment. Try again in a minute; what you typed is still here.',
};

export function makeOfflineProblem(): ApiProblem {
  return new ApiProblem('offline', 0, {
    title: 'No connection',
    detail: 'The store could not be reached. Nothing was saved. Check the network, then try again.',
  });
}

export function makeBrokenProblem(status: number): ApiProblem {
  return new ApiProblem('broken', status, {
    title: 'An answer that could not be read',
    detail: 'The page and the server may be of different ages. Load the page again.',
  });
}

/** Anything thrown, as a problem that a page can show. */
export function toProblem(error: unknown): ApiProblem {
  if (error instanceof ApiProblem) return error;
  return new ApiProblem('broken', 0, {
    title: 'That did not work',
    detail: 'Load the page again, then try once more.',
  });
}
