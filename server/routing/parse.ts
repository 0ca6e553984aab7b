import express, { type Request, type Response } from 'express';
import { z } from 'zod';
import type { FieldError } from '../../shared/errors';
import { LIMITS } from '../../shared/limits';
import { AppError, InvalidError, NotFoundError } from '../errors';

const parseJson = express.json({ limit: LIMITS.jsonBytes, strict: true, type: ['application/json'] });

/**
 * Reads and parses the JSON body, after sign-in, role and record were checked.
 * @throws AppError 400 malformed, 413 too large, 415 when it is not JSON
 */
export async function readJsonBody(request: Request, response: Response): Promise<unknown> {
  const hasBody =
    Number(request.headers['content-length'] ?? 0) > 0 || 'transfer-encoding' in request.headers;
  if (hasBody && !request.is('application/json')) {
    throw new AppError('unsupported-type', 'The body must be JSON (Content-Type: application/json).');
  }
  await new Promise<void>((resolve, reject) => {
    parseJson(request, response, (error?: unknown) => {
      if (error) reject(asAppError(error));
      else resolve();
    });
  });
  const body = (request.body as unknown) ?? {};
  if (isTooDeep(body)) throw new AppError('malformed', 'The body is nested too deeply.');
  return body;
}

/** Far deeper than any body that is asked for: what walks it later must not run out of stack. */
const MOST_NESTING = 32;

function isTooDeep(value: unknown, left = MOST_NESTING): boolean {
  if (typeof value !== 'object' || value === null) return false;
  return left === 0 || Object.values(value).some((inner) => isTooDeep(inner, left - 1));
}

function asAppError(error: unknown): Error {
  const type = error instanceof Error && 'type' in error ? error.type : null;
  if (type === 'entity.too.large') return new AppError('too-large', 'The body is too large.');
  if (type === 'encoding.unsupported' || type === 'charset.unsupported') {
    return new AppError('unsupported-type', 'The encoding of the body is not supported.');
  }
  return new AppError('malformed', 'The body is not well-formed JSON.');
}

/** A path that no id can have names nothing. */
export function parseParams<T>(schema: z.ZodType<T> | undefined, params: unknown): T {
  const result = (schema ?? z.unknown()).safeParse(params);
  if (!result.success) throw new NotFoundError('record');
  return result.data as T;
}

/** @throws AppError 400: a query that is not understood is never half obeyed */
export function parseQuery<T>(schema: z.ZodType<T> | undefined, query: unknown): T {
  const result = (schema ?? z.strictObject({})).safeParse(query);
  if (!result.success) {
    throw new AppError('malformed', 'The query is not understood.', { errors: listIssues(result.error) });
  }
  return result.data as T;
}

/** @throws AppError 400 for the wrong types, InvalidError 422 for values that are refused; all faults at once */
export function parseBody<T>(schema: z.ZodType<T>, body: unknown): T {
  const result = schema.safeParse(body);
  if (result.success) return result.data;
  const errors = listIssues(result.error);
  if (result.error.issues.some(isMalformed)) {
    throw new AppError('malformed', 'The body does not have the form that is asked for.', { errors });
  }
  throw new InvalidError(errors);
}

/** Wrong shape, as against a missing or refused value. */
function isMalformed(issue: z.core.$ZodIssue): boolean {
  if (issue.code === 'unrecognized_keys') return true;
  return issue.code === 'invalid_type' && !issue.message.endsWith('received undefined');
}

export function listIssues(error: z.ZodError): FieldError[] {
  return error.issues.map((issue) => ({
    path: issue.path.join('.'),
    message:
      issue.code === 'invalid_type' && issue.message.endsWith('received undefined')
        ? 'Please fill this in.'
        : issue.message,
  }));
}
