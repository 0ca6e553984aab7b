import { actionsFrom, isInTable, type SlingAction } from '../../../shared/domain/lifecycle/actions';
import { findSamePerson, hasRoleFor, listUnmetNeeds } from '../../../shared/domain/lifecycle/answer';
import { STATE_FACTS, type SlingState } from '../../../shared/domain/lifecycle/states';
import type { ActionBodies } from '../../../shared/schemas/actions';
import type { ActorContext } from '../../context';
import { AppError, UnmetError } from '../../errors';
import type { LedgerEntry } from '../../models/LedgerEntry';
import type { SlingRecord } from '../../models/SlingRecord';
import { loadSlingParts, toFacts } from '../../queries/lifecycleFacts';
import { findToday } from '../../queries/siteDay';
import { toActor } from '../../../shared/domain/lifecycle/actor';
import { checkVersion, lockSling } from '../lockSling';
import { EFFECTS } from './effects';
import type { ActionEffect } from './actionInput';

export interface Performed {
  sling: SlingRecord;
  event: LedgerEntry;
}

/**
 * Does one action of the lifecycle table on one sling: lock, version, table, same person, needs, effect, in that
 * order, all in the caller's transaction.
 * @throws AppError 403, 404, 409, 412, 422 as the agreed API says
 */
export async function performAction<A extends SlingAction>(
  context: ActorContext,
  slingId: number,
  action: A,
  body: ActionBodies[A],
  ifMatch: number | null,
): Promise<Performed> {
  const sling = await lockSling(context, slingId);
  // Holds never fail on a version: all of them count.
  if (action !== 'hold') await checkVersion(context, sling, ifMatch);
  checkTable(action, sling);
  const parts = await loadSlingParts(sling, context.transaction);
  const facts = toFacts(sling, parts);
  const today = await findToday(sling.siteId, context.at, context.transaction);
  const actor = toActor(context.user, sling.kind, today);
  if (!hasRoleFor(action, actor)) throw new AppError('forbidden', 'Your roles do not include this.');
  const samePerson = findSamePerson(action, facts, actor);
  if (samePerson) throw new AppError('same-person', samePerson.message, { unmet: [samePerson] });
  const unmet = listUnmetNeeds(action, facts, actor);
  if (unmet.length > 0) throw new UnmetError(unmet);
  const effect: ActionEffect<A> = EFFECTS[action];
  const event = await effect({ context, sling, facts, parts, actor, today, body });
  return { sling, event };
}

/** @throws AppError 409 with the state and what the table allows from it */
function checkTable(action: SlingAction, sling: SlingRecord): void {
  const condemned = Boolean(sling.condemned);
  if (isInTable(action, sling.state, condemned)) return;
  const state: SlingState = sling.state;
  const word = condemned && sling.state === 'held' ? 'condemned' : STATE_FACTS[state].word.toLowerCase();
  throw new AppError('illegal-transition', `This is not possible: the sling is ${word}.`, {
    from: sling.state,
    allowed: actionsFrom(sling.state, condemned),
  });
}
