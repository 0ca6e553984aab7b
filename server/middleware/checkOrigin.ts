import type { RequestHandler } from 'express';
import { AppError } from '../errors';

const SAFE_METHODS = ['GET', 'HEAD', 'OPTIONS'];

/**
 * Refuses writes that another site's page makes a browser send. Own is the public address or the host that was
 * asked; programs that are no browser send no origin, and cookies are sameSite besides.
 */
export function checkOrigin(publicUrl: string): RequestHandler {
  const publicHost = new URL(publicUrl).host;
  return (request, _response, next) => {
    if (SAFE_METHODS.includes(request.method)) {
      next();
      return;
    }
    const origin = request.get('Origin') ?? request.get('Referer') ?? null;
    if (origin === null || isOwn(origin, [publicHost, request.get('Host') ?? ''])) {
      next();
      return;
    }
    next(new AppError('foreign-origin', 'This request came from a page of another site.'));
  };
}

function isOwn(origin: string, hosts: readonly string[]): boolean {
  return URL.canParse(origin) && hosts.includes(new URL(origin).host);
}
