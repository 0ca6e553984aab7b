import type { Request, Response } from 'express';
import { z } from 'zod';
import { asSignedIn, findUser } from '../middleware/authenticate';
import type { Services } from '../context';
import { AppError } from '../errors';
import { parseBody, parseParams, parseQuery, readJsonBody } from './parse';
import type { Answer, RawRoute, ReadRoute, Route, WriteRoute } from './route';
import { fingerprintOf, transact, type RepeatKey } from './transact';

export function read<P = unknown, Q = unknown>(spec: Omit<ReadRoute<P, Q>, 'kind'>): Route {
  return {
    route: spec.route,
    docs: spec,
    async run(services, request, response) {
      const params = parseParams(spec.params, request.params);
      const query = parseQuery(spec.query, request.query);
      const answer = await spec.handle({ ...services, user: asSignedIn(request) }, { params, query });
      sendAnswer(response, answer);
    },
  };
}

export function write<P = unknown, B = unknown, L = undefined, R = undefined>(
  spec: Omit<WriteRoute<P, B, L, R>, 'kind'>,
): Route {
  return {
    route: spec.route,
    docs: { ...spec, body: spec.bodyDocs ?? (typeof spec.body === 'function' ? undefined : spec.body) },
    async run(services, request, response) {
      const params = parseParams(spec.params, request.params);
      const base = { ...services, user: findUser(request) };
      const loaded = (spec.load ? await spec.load(base, params) : undefined) as L;
      const raw = await readJsonBody(request, response);
      const schema = typeof spec.body === 'function' ? spec.body(params) : spec.body;
      const body = parseBody(schema ?? (z.strictObject({}) as unknown as z.ZodType<B>), raw);
      const ifMatch = readIfMatch(request);
      const prepared = (spec.prepare ? await spec.prepare(base, { params, body }) : undefined) as R;
      const answer = await transact(base, readRepeatKey(request, raw, spec.isSecret), (context) =>
        spec.handle(context, { params, body, loaded, prepared, ifMatch }),
      );
      sendAnswer(response, answer);
    },
  };
}

export function raw<P = unknown, Q = unknown>(spec: Omit<RawRoute<P, Q>, 'kind'>): Route {
  return {
    route: spec.route,
    docs: spec,
    async run(services: Services, request: Request, response: Response) {
      const params = parseParams(spec.params, request.params);
      const query = parseQuery(spec.query, request.query);
      await spec.handle(services, { params, query, request, response });
    },
  };
}

export function sendAnswer(response: Response, answer: Answer): void {
  if (answer.version !== undefined) response.set('ETag', `"${answer.version}"`);
  const status = answer.status ?? 200;
  if (answer.body === undefined) response.status(status === 200 ? 204 : status).end();
  else response.status(status).json(answer.body);
}

/** The version in `If-Match: "12"`; null when none is asked for. */
function readIfMatch(request: Request): number | null {
  const header = request.get('If-Match')?.trim();
  if (!header || header === '*') return null;
  const match = /^(?:W\/)?"?(\d{1,9})"?$/.exec(header);
  if (!match) throw new AppError('malformed', 'If-Match must hold the version of the record, such as "12".');
  return Number(match[1]);
}

/** @param body what makes two requests with the same key the same */
export function readRepeatKey(request: Request, body: unknown, isSecret = false): RepeatKey | null {
  const key = request.get('Idempotency-Key');
  if (key === undefined) return null;
  if (!/^[\x21-\x7e]{1,128}$/.test(key)) {
    throw new AppError('malformed', 'Idempotency-Key must be 1 to 128 printable characters.');
  }
  const user = findUser(request);
  return {
    scope: user ? `user:${user.id}` : `guest:${request.path.slice(0, 50)}`,
    key,
    fingerprint: fingerprintOf(request.method, request.path, body),
    isSecret,
  };
}
