import type passport from 'passport';
import type { Route } from '../routing/route';
import { actionRoutes } from './actions';
import { administrationRoutes } from './administration';
import { fileRoutes } from './files';
import { healthRoutes } from './health';
import { inspectionRoutes } from './inspections';
import { labelRoutes } from './labels';
import { ledgerRoutes } from './ledger';
import { publicRoutes } from './publicPages';
import { sessionRoutes } from './session';
import { shipmentRoutes } from './shipments';
import { slingRoutes } from './slings';

/** Every route of the API. */
export function listRoutes(authenticator: passport.Authenticator): Route[] {
  const routes: Route[] = [
    ...sessionRoutes(authenticator),
    ...administrationRoutes,
    ...slingRoutes,
    ...actionRoutes,
    ...inspectionRoutes,
    ...labelRoutes,
    ...publicRoutes,
    ...fileRoutes,
    ...shipmentRoutes,
    ...ledgerRoutes,
  ];
  // The description lists itself too: it is made when first asked for.
  routes.push(...healthRoutes(routes));
  return routes;
}
