import type { z } from 'zod';
import { makeIdempotencyKey } from './idempotencyKey';
import { ApiProblem, makeBrokenProblem, makeOfflineProblem } from './problem';

export { ApiProblem } from './problem';

/** For calls that answer 204. */
export { noContent } from '../../shared/schemas/common';

export interface SendOptions {
  /** Version that the change was made from; the server refuses with 412 when it has moved on. */
  ifMatch?: number | string | undefined;
  /** Pass the same key when the same submit is tried again; a new one is made otherwise. */
  idempotencyKey?: string | undefined;
  signal?: AbortSignal | undefined;
}
type Method = 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** JSON calls under `/api`. Paths are given without that prefix: `/slings/12`. @throws ApiProblem */
export const api = {
  get: <T>(
    path: string,
    schema: z.ZodType<T>,
    options: { signal?: AbortSignal | undefined } = {},
  ): Promise<T> => call('GET', path, undefined, schema, {}, options.signal),

  send: <T>(
    method: Method,
    path: string,
    body: unknown,
    schema: z.ZodType<T>,
    options: SendOptions = {},
  ): Promise<T> => {
    const headers: Record<string, string> = {
      'Idempotency-Key': options.idempotencyKey ?? makeIdempotencyKey(),
    };
    if (options.ifMatch !== undefined) headers['If-Match'] = `"${options.ifMatch}"`;
    return call(method, path, body, schema, headers, options.signal);
  },
};

async function call<T>(
  method: string,
  path: string,
  body: unknown,
  schema: z.ZodType<T>,
  headers: Record<string, string>,
  signal: AbortSignal | undefined,
): Promise<T> {
  const response = await reach(`/api${path}`, {
    method,
    credentials: 'same-origin',
    headers: {
      Accept: 'application/json',
      ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
      ...headers,
    },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    ...(signal ? { signal } : {}),
  });
  const answer = await readJson(response);
  if (!response.ok)
    throw new ApiProblem('refused', response.status, answer, response.headers.get('Retry-After'));
  const parsed = schema.safeParse(answer);
  if (!parsed.success) throw makeBrokenProblem(response.status);
  return parsed.data;
}

async function reach(url: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(url, init);
  } catch (error) {
    if (init.signal?.aborted) throw error;
    throw makeOfflineProblem();
  }
}

async function readJson(response: Response): Promise<unknown> {
  if (response.status === 204) return undefined;
  try {
    return await response.json();
  } catch {
    // A proxy's HTML page in place of JSON: the status alone has to speak.
    if (response.ok) throw makeBrokenProblem(response.status);
    return {};
  }
}
