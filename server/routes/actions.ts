import { z } from 'zod';
import { hasRoleFor } from '../../shared/domain/lifecycle/answer';
import { isSlingAction, SLING_ACTIONS, type SlingAction } from '../../shared/domain/lifecycle/actions';
import { idParam } from '../../shared/schemas/common';
import { actionBodies, actionResponse, type ActionBodies } from '../../shared/schemas/actions';
import { performAction } from '../commands/actions/performAction';
import { getSlingId } from '../commands/lockSling';
import { asActor } from '../context';
import { AppError } from '../errors';
import { presentLedgerRow } from '../queries/ledger';
import { getSling } from '../queries/slingDetail';
import { write } from '../routing/define';

const actionParams = z.object({ id: idParam, action: z.enum(SLING_ACTIONS) });
type Body = ActionBodies[SlingAction];

export const actionRoutes = [
  write<z.infer<typeof actionParams>, Body, number>({
    route: 'POST /api/slings/:id/actions/:action',
    summary: 'Do one action of the lifecycle; the only way a state ever changes',
    params: actionParams,
    body: ({ action }) => actionBodies[action] as z.ZodType<Body>,
    bodyDocs: z.union([...Object.values(actionBodies)]),
    response: actionResponse,
    load(context, { id, action }) {
      if (isSlingAction(action) && !hasRoleFor(action, { roles: context.user?.roles ?? [] })) {
        throw new AppError('forbidden', 'Your roles do not include this.');
      }
      return getSlingId(context, id);
    },
    async handle(context, { params, body, loaded, ifMatch }) {
      const actor = asActor(context);
      const { event } = await performAction(actor, loaded, params.action, body as never, ifMatch);
      const sling = await getSling(actor, loaded, actor.transaction);
      return { body: { sling, event: presentLedgerRow(event) }, version: sling.version };
    },
  }),
];
