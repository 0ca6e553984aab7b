import { ACTION_FACTS, isInTable, SLING_ACTIONS, type SlingAction } from './actions';
import type { Actor, LifecycleFacts, Unmet } from './facts';
import {
  acceptNeeds,
  departNeeds,
  destroyedElsewhereNeeds,
  listUnmet,
  releaseNeeds,
  returnNeeds,
  sendAloneNeeds,
} from './needs';
import { STATE_FACTS } from './states';

export interface ActionAnswer {
  action: SlingAction;
  /** True when nothing but the act's own input is missing. */
  open: boolean;
  unmet: Unmet[];
}

export function hasRoleFor(action: SlingAction, actor: Pick<Actor, 'roles'>): boolean {
  return ACTION_FACTS[action].by.some((role) => actor.roles.includes(role));
}

/** Two people: whoever placed a reason doesn't release it, whoever condemned a sling doesn't destroy it (rule 3). */
export function findSamePerson(action: SlingAction, facts: LifecycleFacts, actor: Actor): Unmet | null {
  if (action === 'release' && facts.openReasons.some((reason) => reason.placedBy === actor.id)) {
    return {
      rule: 'same_person',
      message: 'You placed a reason of this hold, so another inspector has to release it.',
    };
  }
  if (action === 'destroy' && facts.condemnedBy === actor.id) {
    return { rule: 'same_person', message: 'You condemned this sling, so another person has to destroy it.' };
  }
  return null;
}

/** What the facts still lack for this action, the act's own input left aside. */
export function listUnmetNeeds(action: SlingAction, facts: LifecycleFacts, actor: Actor): Unmet[] {
  switch (action) {
    case 'accept':
      return listUnmet(acceptNeeds, facts, actor);
    case 'release':
      return listUnmet(releaseNeeds(facts), facts, actor);
    case 'return_to_service':
      return listUnmet(returnNeeds, facts, actor);
    case 'send':
      return listUnmet(sendAloneNeeds, facts, actor);
    case 'destroyed_by_evaluator':
      return listUnmet(destroyedElsewhereNeeds, facts, actor);
    case 'depart':
      return listUnmet(departNeeds, facts, actor);
    case 'hold':
    case 'secure':
    case 'condemn':
    case 'withdraw_as_error':
    case 'receive_back':
    case 'destroy':
    case 'report_lost':
    case 'found':
      return [];
  }
}

/** Is the action open to this person on this sling and, if not, why not: state, role, same person, needs. */
export function answerAction(action: SlingAction, facts: LifecycleFacts, actor: Actor): ActionAnswer {
  if (!isInTable(action, facts.state, facts.condemned)) {
    const state =
      facts.condemned && facts.state === 'held' ? 'condemned' : STATE_FACTS[facts.state].word.toLowerCase();
    return {
      action,
      open: false,
      unmet: [{ rule: 'state', message: `Not possible while the sling is ${state}.` }],
    };
  }
  const unmet: Unmet[] = [];
  if (!hasRoleFor(action, actor)) {
    unmet.push({ rule: 'role', message: `Needs a person with the role ${listRoles(action)}.` });
  }
  const samePerson = findSamePerson(action, facts, actor);
  if (samePerson) unmet.push(samePerson);
  unmet.push(...listUnmetNeeds(action, facts, actor));
  return { action, open: unmet.length === 0, unmet };
}

function listRoles(action: SlingAction): string {
  const roles: readonly string[] = ACTION_FACTS[action].by;
  return roles.length === 1 ? (roles[0] ?? '') : `${roles.slice(0, -1).join(', ')} or ${roles.at(-1) ?? ''}`;
}

/** The answer for every action of the table, in its order. */
export function answerActions(facts: LifecycleFacts, actor: Actor): ActionAnswer[] {
  return SLING_ACTIONS.map((action) => answerAction(action, facts, actor));
}
