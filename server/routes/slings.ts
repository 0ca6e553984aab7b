import { correctionRequest } from '../../shared/schemas/corrections';
import {
  certificateInputSchema,
  createSlingRequest,
  slingSchema,
  slingsPage,
  slingsQuery,
  updateSlingRequest,
} from '../../shared/schemas/slings';
import { addCertificate, correctSling, updateSling } from '../commands/changeRecord';
import { getSlingId } from '../commands/lockSling';
import { registerSling } from '../commands/registerSling';
import { asActor, type ActorContext } from '../context';
import { getSling } from '../queries/slingDetail';
import { listSlings } from '../queries/slingList';
import { presentSummaries } from '../queries/slingSummary';
import { read, write } from '../routing/define';
import type { Answer } from '../routing/route';
import { idParams } from './params';

/** The record after a write, read in the same transaction. */
export async function answerSling(actor: ActorContext, id: number, status = 200): Promise<Answer> {
  const sling = await getSling(actor, id, actor.transaction);
  return { status, body: sling, version: sling.version };
}

export const slingRoutes = [
  read({
    route: 'GET /api/slings',
    summary: 'The register, a page at a time',
    query: slingsQuery,
    response: slingsPage,
    async handle(context, { query }) {
      const at = context.now();
      const { rows, nextCursor } = await listSlings(context.sequelize, context.user.siteIds, query, at);
      return { body: { items: await presentSummaries(rows, at), nextCursor } };
    },
  }),
  write({
    route: 'POST /api/slings',
    summary: 'Register a sling',
    body: createSlingRequest,
    response: slingSchema,
    async handle(context, { body }) {
      const actor = asActor(context);
      const sling = await registerSling(actor, body);
      return answerSling(actor, sling.id, 201);
    },
  }),
  read({
    route: 'GET /api/slings/:id',
    summary: 'One record, with what may be done with it',
    params: idParams,
    response: slingSchema,
    async handle(context, { params }) {
      const sling = await getSling(context, params.id);
      return { body: sling, version: sling.version };
    },
  }),
  write({
    route: 'PATCH /api/slings/:id',
    summary: 'Change notes, home location, cost; add photos',
    params: idParams,
    body: updateSlingRequest,
    response: slingSchema,
    load: (context, params) => getSlingId(context, params.id),
    async handle(context, { body, loaded, ifMatch }) {
      const actor = asActor(context);
      await updateSling(actor, loaded, body, ifMatch);
      return answerSling(actor, loaded);
    },
  }),
  write({
    route: 'POST /api/slings/:id/corrections',
    summary: 'Correct what identifies or rates a sling, with evidence',
    params: idParams,
    body: correctionRequest,
    response: slingSchema,
    load: (context, params) => getSlingId(context, params.id),
    async handle(context, { body, loaded, ifMatch }) {
      const actor = asActor(context);
      await correctSling(actor, loaded, body, ifMatch);
      return answerSling(actor, loaded);
    },
  }),
  write({
    route: 'POST /api/slings/:id/certificates',
    summary: 'Put a certificate on file',
    params: idParams,
    body: certificateInputSchema,
    response: slingSchema,
    load: (context, params) => getSlingId(context, params.id),
    async handle(context, { body, loaded, ifMatch }) {
      const actor = asActor(context);
      await addCertificate(actor, loaded, body, ifMatch);
      return answerSling(actor, loaded, 201);
    },
  }),
];
