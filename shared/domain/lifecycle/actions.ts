import type { Role } from '../access/roles';
import type { SlingState } from './states';

export const SLING_ACTIONS = [
  'accept',
  'hold',
  'secure',
  'release',
  'condemn',
  'withdraw_as_error',
  'send',
  'receive_back',
  'return_to_service',
  'destroy',
  'destroyed_by_evaluator',
  'report_lost',
  'found',
  'depart',
] as const;
export type SlingAction = (typeof SLING_ACTIONS)[number];

export interface Transition {
  from: SlingState;
  to: SlingState;
  /** May it start from a condemned sling? */
  fromCondemned: 'never' | 'also' | 'only';
  /** Is the sling condemned afterwards? `keep`: as it was. */
  condemnedAfter: 'keep' | 'set' | 'end';
}

export interface ActionFacts {
  name: string;
  by: readonly Role[];
  transitions: readonly Transition[];
}

const store = ['storekeeper', 'inspector', 'manager'] as const;

/** Every way a state ever changes (product design, section 4). The server enforces it, the database repeats it, the client shows it. */
export const ACTION_FACTS = {
  accept: { name: 'Accept into service', by: ['inspector'], transitions: [go('received', 'in_service')] },
  hold: {
    name: 'Hold',
    by: store,
    transitions: [
      go('received', 'held'),
      go('in_service', 'held'),
      go('returned', 'held'),
      stay('held'),
      // Removing from service is possible whatever the state (rule 1): away it adds a reason, lost it is found.
      stay('sent_for_evaluation'),
      { from: 'lost', to: 'held', fromCondemned: 'also', condemnedAfter: 'keep' },
    ],
  },
  secure: { name: 'Bring to a cage', by: store, transitions: [stay('held')] },
  release: { name: 'Release into service', by: ['inspector'], transitions: [go('held', 'in_service')] },
  condemn: {
    name: 'Condemn',
    by: ['manager'],
    transitions: [{ from: 'held', to: 'held', fromCondemned: 'never', condemnedAfter: 'set' }],
  },
  withdraw_as_error: {
    name: 'Withdraw as error',
    by: ['manager'],
    transitions: [stay('held'), { from: 'held', to: 'held', fromCondemned: 'only', condemnedAfter: 'end' }],
  },
  send: {
    name: 'Send to an evaluator',
    by: ['manager'],
    transitions: [carry('held', 'sent_for_evaluation')],
  },
  receive_back: {
    name: 'Receive back',
    by: store,
    transitions: [go('sent_for_evaluation', 'returned'), carry('sent_for_evaluation', 'held')],
  },
  return_to_service: {
    name: 'Return to service',
    by: ['inspector'],
    transitions: [go('returned', 'in_service')],
  },
  destroy: {
    name: 'Destroy',
    by: store,
    transitions: [{ from: 'held', to: 'destroyed', fromCondemned: 'only', condemnedAfter: 'keep' }],
  },
  destroyed_by_evaluator: {
    name: 'Destroyed by the evaluator',
    by: ['manager'],
    transitions: [carry('sent_for_evaluation', 'destroyed')],
  },
  report_lost: {
    name: 'Report lost',
    by: ['manager'],
    transitions: [
      go('received', 'lost'),
      go('in_service', 'lost'),
      carry('held', 'lost'),
      carry('sent_for_evaluation', 'lost'),
      go('returned', 'lost'),
    ],
  },
  found: { name: 'Found', by: store, transitions: [carry('lost', 'held')] },
  depart: {
    name: 'Leave the store',
    by: ['manager'],
    transitions: [
      go('received', 'departed'),
      go('in_service', 'departed'),
      go('returned', 'departed'),
      go('held', 'departed'),
    ],
  },
} as const satisfies Record<SlingAction, ActionFacts>;

function go(from: SlingState, to: SlingState): Transition {
  return { from, to, fromCondemned: 'never', condemnedAfter: 'keep' };
}
function carry(from: SlingState, to: SlingState): Transition {
  return { from, to, fromCondemned: 'also', condemnedAfter: 'keep' };
}
function stay(state: SlingState): Transition {
  return carry(state, state);
}

/** Does this transition start from a sling in this state? */
export function startsFrom(transition: Transition, state: SlingState, condemned: boolean): boolean {
  if (transition.from !== state) return false;
  if (transition.fromCondemned === 'never') return !condemned;
  return transition.fromCondemned === 'also' || condemned;
}

/** Is the action in the table at all for a sling in this state, whoever asks? */
export function isInTable(action: SlingAction, state: SlingState, condemned: boolean): boolean {
  return ACTION_FACTS[action].transitions.some((transition) => startsFrom(transition, state, condemned));
}

/** The actions that the table holds for this state, for a refusal's `allowed`. */
export function actionsFrom(state: SlingState, condemned: boolean): SlingAction[] {
  return SLING_ACTIONS.filter((action) => isInTable(action, state, condemned));
}

export function isSlingAction(value: string): value is SlingAction {
  return (SLING_ACTIONS as readonly string[]).includes(value);
}
