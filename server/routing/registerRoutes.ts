import type { Express, RequestHandler } from 'express';
import { mayCall, type RouteKey } from '../../shared/domain/access/routes';
import type { Services } from '../context';
import { AppError } from '../errors';
import { findUser } from '../middleware/authenticate';
import { readJsonBody } from './parse';
import type { LimitName, Route } from './route';

/** 401 before 403, and both before anything is looked up or read. */
function allow(route: RouteKey): RequestHandler {
  return (request, _response, next) => {
    const user = findUser(request);
    if (mayCall(route, user?.roles ?? null)) next();
    else if (user) next(new AppError('forbidden', 'Your roles do not include this.'));
    else next(new AppError('unauthenticated', 'Please sign in.'));
  };
}

/** Guesses are counted by account, so the body is read first. */
const readBodyFirst: RequestHandler = async (request, response, next) => {
  await readJsonBody(request, response);
  next();
};

/** Ties each route to its access rule, its limits and its handler; Express passes a rejected promise to the error handler. */
export function registerRoutes(
  app: Express,
  routes: readonly Route[],
  services: Services,
  limits: Record<LimitName, RequestHandler[]>,
): void {
  for (const route of routes) {
    const [method = '', path = ''] = route.route.split(' ');
    const { limit } = route.docs;
    const chain: RequestHandler[] = [
      allow(route.route),
      ...(limit === 'guess' ? [readBodyFirst] : []),
      ...(limit ? limits[limit] : []),
      (request, response) => route.run(services, request, response),
    ];
    app.route(path)[method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete'](...chain);
  }
}
