import { DESTROY_METHODS, type ActionBodies } from '../../../shared/schemas/actions';
import { clearingOf } from '../../../shared/domain/lifecycle/reasons';
import { KIND_FACTS } from '../../../shared/domain/slings/kinds';
import type { SlingAction } from '../../../shared/domain/lifecycle/actions';
import { performAction } from '../../commands/actions/performAction';
import { getTagCode } from '../../commands/handleTags';
import { reportDamage } from '../../commands/reportDamage';
import type { ActorContext } from '../../context';
import { HoldReasonRow } from '../../models/HoldReasonRow';
import { DEMO_PASSWORD } from '../people';
import type { Cause } from '../plan/causes';
import type { DemoSling } from '../plan/fleet';
import { inspect } from './inspect';
import { getPicture, getTrace, type World } from './world';

export async function act<A extends SlingAction>(
  context: ActorContext,
  world: World,
  sling: DemoSling,
  action: A,
  body: ActionBodies[A],
): Promise<void> {
  await performAction(context, getTrace(world, sling).id, action, body, null);
}

/** The sling is held: by hand, by an inspection's verdict or by somebody's report. */
export async function doubt(
  context: ActorContext,
  world: World,
  sling: DemoSling,
  cause: Cause,
): Promise<void> {
  const photoId = cause.picture === null ? null : getPicture(world, cause.picture);
  const photoIds = photoId === null ? [] : [photoId];
  switch (cause.how) {
    case 'hold':
      return act(context, world, sling, 'hold', {
        reasons: [{ code: cause.reason, note: cause.note }],
        photoIds,
      });
    case 'inspection':
      return inspect(context, world, sling, cause.type, {
        criterionId: cause.criterionId,
        note: cause.note,
        photoId,
      });
    case 'report': {
      const { code } = getTrace(world, sling);
      await reportDamage(context, getTagCode(code ?? ''), { name: cause.name, note: cause.note, photoIds });
    }
  }
}

export function secure(context: ActorContext, world: World, sling: DemoSling): Promise<void> {
  const { cages } = world.places[sling.lot.site];
  const locationId = cages[getTrace(world, sling).id % cages.length];
  if (locationId === undefined) throw new Error('Each site has a cage.');
  return act(context, world, sling, 'secure', { locationId });
}

/** Clears every open reason with the same note, and evidence where the reason asks for it. */
export async function release(
  context: ActorContext,
  world: World,
  sling: DemoSling,
  note: string,
): Promise<void> {
  const open = await HoldReasonRow.findAll({
    where: { slingId: getTrace(world, sling).id, clearedAt: null },
    order: [['id', 'ASC']],
    transaction: context.transaction,
  });
  const clear = open.map(({ id, code }) => ({
    reasonId: id,
    note,
    ...(clearingOf(code, sling.lot.model.kind).needsEvidence
      ? { evidenceFileId: getPicture(world, 'newTag') }
      : {}),
  }));
  await act(context, world, sling, 'release', { clear });
}

export async function destroy(context: ActorContext, world: World, sling: DemoSling): Promise<void> {
  const { isSynthetic } = KIND_FACTS[sling.lot.model.kind];
  await act(context, world, sling, 'destroy', {
    method: DESTROY_METHODS[0],
    photoIds: [getPicture(world, isSynthetic ? 'destroyedTextile' : 'destroyedMetal')],
    fittings: getTrace(world, sling).fittings.map(({ id }) => ({ fittingId: id, fate: 'destroyed' })),
    password: DEMO_PASSWORD,
  });
}
