import { ACTION_FACTS, SLING_ACTIONS, type SlingAction } from './actions';
import { SLING_STATES, type SlingState } from './states';

/** Ledger rows that record something on a sling without changing its state. */
export const RECORD_EVENTS = [
  'edited',
  'corrected',
  'certificate_added',
  'photo_added',
  'label_printed',
  'label_voided',
  'label_confirmed',
  'inspected',
  'damage_reported',
  'moved',
  'outcome_recorded',
] as const;
export type RecordEvent = (typeof RECORD_EVENTS)[number];
export type LedgerEventType = SlingAction | RecordEvent | 'registered';

export const EVENT_NAMES = {
  registered: 'Registered',
  edited: 'Notes or home changed',
  corrected: 'Record corrected',
  certificate_added: 'Certificate put on file',
  photo_added: 'Photo added',
  label_printed: 'Label printed',
  label_voided: 'Label voided',
  label_confirmed: 'Label confirmed on the sling',
  inspected: 'Inspected',
  damage_reported: 'Damage reported',
  moved: 'Moved',
  outcome_recorded: 'Evaluator’s outcome recorded',
  accept: 'Accepted into service',
  hold: 'Held',
  secure: 'Brought to a cage',
  release: 'Released into service',
  condemn: 'Condemned',
  withdraw_as_error: 'Withdrawn as error',
  send: 'Sent to an evaluator',
  receive_back: 'Received back',
  return_to_service: 'Returned to service',
  destroy: 'Destroyed',
  destroyed_by_evaluator: 'Destroyed by the evaluator',
  report_lost: 'Reported lost',
  found: 'Found',
  depart: 'Left the store',
} as const satisfies Record<LedgerEventType, string>;

export interface LedgerTransition {
  type: LedgerEventType;
  from: SlingState | null;
  fromCondemned: boolean;
  to: SlingState;
  toCondemned: boolean;
}

/** Every (event, from, to) that a ledger row may carry: the database keeps this list and refuses all others. */
export function listLedgerTransitions(): LedgerTransition[] {
  const rows: LedgerTransition[] = [
    { type: 'registered', from: null, fromCondemned: false, to: 'received', toCondemned: false },
    // An outcome that arrives after the sling came back has the effect it would have had then.
    { type: 'outcome_recorded', from: 'held', fromCondemned: false, to: 'returned', toCondemned: false },
  ];
  for (const type of SLING_ACTIONS) {
    for (const transition of ACTION_FACTS[type].transitions) {
      for (const condemned of [false, true]) {
        if (transition.fromCondemned === 'never' && condemned) continue;
        if (transition.fromCondemned === 'only' && !condemned) continue;
        const toCondemned =
          transition.condemnedAfter === 'set' || (transition.condemnedAfter === 'keep' && condemned);
        rows.push({ type, from: transition.from, fromCondemned: condemned, to: transition.to, toCondemned });
      }
    }
  }
  for (const type of RECORD_EVENTS) {
    for (const state of SLING_STATES) {
      for (const condemned of [false, true]) {
        rows.push({ type, from: state, fromCondemned: condemned, to: state, toCondemned: condemned });
      }
    }
  }
  return rows;
}
