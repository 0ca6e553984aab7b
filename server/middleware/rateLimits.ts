import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit, type Options } from 'express-rate-limit';
import { slowDown } from 'express-slow-down';
import { parseTagCode } from '../../shared/domain/tags/tagCode';
import { AppError } from '../errors';
import type { LimitName } from '../routing/route';
import { findUser } from './authenticate';

const MINUTE = 60_000;
const addressOf = (request: Request): string => ipKeyGenerator(request.ip ?? 'unknown');
/** Guesses are counted for one account from one place, so that a store behind one address isn't locked out by one person. */
const accountOf = (request: Request): string => {
  const body: unknown = request.body;
  const email = typeof body === 'object' && body !== null && 'email' in body ? body.email : '';
  const account = typeof email === 'string' ? email.trim().toLowerCase().slice(0, 254) : '';
  return `${addressOf(request)}|${account}`;
};
/** One label is one, however its code is written. */
const codeOf = (request: Request): string => {
  const written = String(request.params.code);
  const parsed = parseTagCode(written);
  return `code:${parsed.ok ? parsed.code : written.slice(0, 20)}`;
};
const personOf = (request: Request): string => {
  const user = findUser(request);
  return user ? `user:${user.id}` : addressOf(request);
};

function refuseWith(message: string): Partial<Options> {
  return {
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (request, response, next, options) => {
      const info = 'rateLimit' in request ? (request.rateLimit as { resetTime?: Date }) : {};
      const wait = info.resetTime ? info.resetTime.getTime() - Date.now() : options.windowMs;
      next(new AppError('too-many-requests', message, {}, Math.max(1, Math.ceil(wait / 1000))));
      void response;
    },
  };
}

/** One set for each server: counts live in this process. */
export function createLimits(): { general: RequestHandler; named: Record<LimitName, RequestHandler[]> } {
  return {
    // A signed-in person may make at least 1,200 requests a minute (agreed API).
    general: rateLimit({
      windowMs: MINUTE,
      limit: (request: Request) => (findUser(request) ? 3000 : 600),
      keyGenerator: personOf,
      ...refuseWith('Too many requests. Wait a minute.'),
    }),
    named: {
      guess: [
        slowDown({
          windowMs: 15 * MINUTE,
          delayAfter: 4,
          delayMs: (hits) => Math.min(4000, (hits - 4) * 500),
          skipSuccessfulRequests: true,
          keyGenerator: accountOf,
        }),
        rateLimit({
          windowMs: 15 * MINUTE,
          limit: 10,
          skipSuccessfulRequests: true,
          keyGenerator: accountOf,
          ...refuseWith('Too many wrong tries. Wait a quarter of an hour and try again.'),
        }),
        rateLimit({
          windowMs: 15 * MINUTE,
          limit: 100,
          skipSuccessfulRequests: true,
          keyGenerator: addressOf,
          ...refuseWith('Too many wrong tries. Wait a quarter of an hour and try again.'),
        }),
      ],
      publicRead: [
        rateLimit({
          windowMs: MINUTE,
          limit: 120,
          keyGenerator: addressOf,
          ...refuseWith('Too many scans from here. Wait a minute. Until then: do not use the sling.'),
        }),
      ],
      publicWrite: [
        rateLimit({
          windowMs: 15 * MINUTE,
          limit: 20,
          keyGenerator: addressOf,
          ...refuseWith('Too many reports from here. Tell the store directly, and do not use the sling.'),
        }),
        rateLimit({
          windowMs: 15 * MINUTE,
          limit: 10,
          keyGenerator: codeOf,
          ...refuseWith('This label was reported several times already. Tell the store directly.'),
        }),
      ],
      upload: [
        rateLimit({
          windowMs: MINUTE,
          limit: 120,
          keyGenerator: personOf,
          ...refuseWith('Too many files at once. Wait a minute.'),
        }),
      ],
    },
  };
}
