import { idParam } from '../../shared/schemas/common';
import { ledgerPage, ledgerQuery, verifyQuery, verifyResponse } from '../../shared/schemas/ledger';
import { getSlingId } from '../commands/lockSling';
import { listLedger, verifyLedger } from '../queries/ledger';
import { read } from '../routing/define';

export const ledgerRoutes = [
  read({
    route: 'GET /api/ledger',
    summary: 'The ledger of my sites, or of one sling',
    query: ledgerQuery.extend({ cursor: idParam.transform(String).optional() }),
    response: ledgerPage,
    async handle(context, { query }) {
      if (query.slingId !== undefined) await getSlingId(context, query.slingId);
      return { body: await listLedger(context.sequelize, context.user.siteIds, query) };
    },
  }),
  read({
    route: 'GET /api/ledger/verify',
    summary: 'Recompute every hash and name the first row that does not fit',
    query: verifyQuery,
    response: verifyResponse,
    async handle(context, { query }) {
      if (query.slingId !== undefined) await getSlingId(context, query.slingId);
      return { body: await verifyLedger(context.user.siteIds, query.slingId) };
    },
  }),
];
