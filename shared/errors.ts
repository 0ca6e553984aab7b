import { z } from 'zod';

/** Each code has one status (server/middleware/errorHandler.ts); it ends the problem's `type`. */
export const ERROR_CODES = [
  'malformed',
  'unauthenticated',
  'forbidden',
  'same-person',
  'foreign-origin',
  'not-found',
  'illegal-transition',
  'conflict',
  'duplicate',
  'stale',
  'too-large',
  'unsupported-type',
  'invalid',
  'unmet',
  'too-many-requests',
  'unavailable',
  'internal',
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];

export const unmetSchema = z.object({ rule: z.string(), message: z.string() });
export const fieldErrorSchema = z.object({ path: z.string(), message: z.string() });
export type FieldError = z.infer<typeof fieldErrorSchema>;

/** application/problem+json (RFC 9457) as this API sends it. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string(),
  errors: z.array(fieldErrorSchema).optional(),
  unmet: z.array(unmetSchema).optional(),
  from: z.string().optional(),
  allowed: z.array(z.string()).optional(),
  /** What happened on the record since the version that the caller knew. */
  changes: z
    .array(z.object({ seq: z.number(), type: z.string(), at: z.string(), by: z.string() }))
    .optional(),
  requestId: z.string().optional(),
});
export type Problem = z.infer<typeof problemSchema>;
