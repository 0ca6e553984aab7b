import { describe, expect, it } from 'vitest';
import {
  ACTION_FACTS,
  actionsFrom,
  isInTable,
  SLING_ACTIONS,
  type SlingAction,
} from '../../../../shared/domain/lifecycle/actions';
import { hasRoleFor } from '../../../../shared/domain/lifecycle/answer';
import { listLedgerTransitions } from '../../../../shared/domain/lifecycle/events';
import { SLING_STATES, type SlingState } from '../../../../shared/domain/lifecycle/states';
import { ROLES, type Role } from '../../../../shared/domain/access/roles';

/** A sling's place in the table: its state, with + when condemned. */
type Place = SlingState | 'held+' | 'sent_for_evaluation+' | 'lost+';

/**
 * Section 4 of the product design, written down a second time and by hand: from, then every place it may lead to.
 * A hold on a sent or lost sling is rule 1 of section 5 (a report on a sent sling adds a reason, on a lost one finds it).
 */
const TABLE: Record<SlingAction, [Place, ...Place[]][]> = {
  accept: [['received', 'in_service']],
  hold: [
    ['received', 'held'],
    ['in_service', 'held'],
    ['returned', 'held'],
    ['held', 'held'],
    ['held+', 'held+'],
    ['sent_for_evaluation', 'sent_for_evaluation'],
    ['sent_for_evaluation+', 'sent_for_evaluation+'],
    ['lost', 'held'],
    ['lost+', 'held+'],
  ],
  secure: [
    ['held', 'held'],
    ['held+', 'held+'],
  ],
  release: [['held', 'in_service']],
  condemn: [['held', 'held+']],
  withdraw_as_error: [
    ['held', 'held'],
    // A confirmed reason of a condemned sling becomes unconfirmed, or the condemnation ends.
    ['held+', 'held+', 'held'],
  ],
  send: [
    ['held', 'sent_for_evaluation'],
    ['held+', 'sent_for_evaluation+'],
  ],
  receive_back: [
    ['sent_for_evaluation', 'returned', 'held'],
    ['sent_for_evaluation+', 'held+'],
  ],
  return_to_service: [['returned', 'in_service']],
  destroy: [['held+', 'destroyed']],
  destroyed_by_evaluator: [
    ['sent_for_evaluation', 'destroyed'],
    ['sent_for_evaluation+', 'destroyed'],
  ],
  report_lost: [
    ['received', 'lost'],
    ['in_service', 'lost'],
    ['held', 'lost'],
    ['held+', 'lost+'],
    ['sent_for_evaluation', 'lost'],
    ['sent_for_evaluation+', 'lost+'],
    ['returned', 'lost'],
  ],
  found: [
    ['lost', 'held'],
    ['lost+', 'held+'],
  ],
  depart: [
    ['received', 'departed'],
    ['in_service', 'departed'],
    ['returned', 'departed'],
    ['held', 'departed'],
  ],
};

/** Section 4, column "by". */
const BY: Record<SlingAction, Role[]> = {
  accept: ['inspector'],
  hold: ['storekeeper', 'inspector', 'manager'],
  secure: ['storekeeper', 'inspector', 'manager'],
  release: ['inspector'],
  condemn: ['manager'],
  withdraw_as_error: ['manager'],
  send: ['manager'],
  receive_back: ['storekeeper', 'inspector', 'manager'],
  return_to_service: ['inspector'],
  destroy: ['storekeeper', 'inspector', 'manager'],
  destroyed_by_evaluator: ['manager'],
  report_lost: ['manager'],
  found: ['storekeeper', 'inspector', 'manager'],
  depart: ['manager'],
};

const placesOf = (state: SlingState, condemned: boolean): Place => (condemned ? `${state}+` : state) as Place;
const allPlaces = SLING_STATES.flatMap((state) => [false, true].map((condemned) => ({ state, condemned })));
const expectedFrom = (action: SlingAction, from: Place): Place[] =>
  TABLE[action].find(([start]) => start === from)?.slice(1) ?? [];

/** Destroyed after a condemnation stays marked; the mark plays no part any more. */
const withoutEndMark = (place: string): string => place.replace('destroyed+', 'destroyed');

describe('the lifecycle table', () => {
  it('has the fourteen actions and eight states of the design', () => {
    expect([...SLING_ACTIONS].sort()).toEqual(Object.keys(TABLE).sort());
    expect([...SLING_STATES].sort()).toEqual(
      [
        'received',
        'in_service',
        'held',
        'sent_for_evaluation',
        'returned',
        'destroyed',
        'lost',
        'departed',
      ].sort(),
    );
  });

  it.each(SLING_ACTIONS)('%s starts from exactly the states of the design', (action) => {
    for (const { state, condemned } of allPlaces) {
      const place = placesOf(state, condemned);
      const isExpected = TABLE[action].some(([from]) => from === place);
      expect([action, place, isInTable(action, state, condemned)]).toEqual([action, place, isExpected]);
    }
  });

  it.each(SLING_ACTIONS)('%s leads exactly where the design says', (action) => {
    for (const { state, condemned } of allPlaces) {
      const leads = listLedgerTransitions()
        .filter((row) => row.type === action && row.from === state && row.fromCondemned === condemned)
        .map((row) => withoutEndMark(placesOf(row.to, row.toCondemned)));
      // Where a condemnation may end the table holds two ways; the server chooses by what is withdrawn or came back.
      expect([action, state, condemned, leads.sort()]).toEqual([
        action,
        state,
        condemned,
        [...expectedFrom(action, placesOf(state, condemned))].sort(),
      ]);
    }
  });

  it('names for each state the actions that the table holds, and none from the two ends', () => {
    for (const { state, condemned } of allPlaces) {
      const place = placesOf(state, condemned);
      const expected = (Object.keys(TABLE) as SlingAction[]).filter((action) =>
        TABLE[action].some(([from]) => from === place),
      );
      expect([place, actionsFrom(state, condemned).sort()]).toEqual([place, expected.sort()]);
    }
    for (const end of ['destroyed', 'departed'] as const) expect(actionsFrom(end, false)).toEqual([]);
  });

  it('leaves a condemned sling hold, secure, report_lost, a shipment, destroy and withdraw_as_error', () => {
    expect(actionsFrom('held', true).sort()).toEqual(
      ['destroy', 'hold', 'report_lost', 'secure', 'send', 'withdraw_as_error'].sort(),
    );
  });
});

describe('who may act', () => {
  it.each(SLING_ACTIONS)('%s is for the roles of the design and no other', (action) => {
    for (const role of ROLES) {
      expect([role, hasRoleFor(action, { roles: [role] })]).toEqual([role, BY[action].includes(role)]);
    }
    expect(hasRoleFor(action, { roles: [] })).toBe(false);
    // One of several roles is enough; administrator and auditor add nothing.
    expect(hasRoleFor(action, { roles: ['admin', 'auditor'] })).toBe(false);
    expect(hasRoleFor(action, { roles: ['admin', ...BY[action].slice(0, 1)] })).toBe(true);
    expect([...ACTION_FACTS[action].by].sort()).toEqual([...BY[action]].sort());
  });
});

describe('the transitions that the database keeps', () => {
  const others = listLedgerTransitions().filter(({ type }) => !(type in TABLE));

  it('begin with a registration as received', () => {
    const starts = listLedgerTransitions().filter(({ from }) => from === null);
    expect(starts).toEqual([
      { type: 'registered', from: null, fromCondemned: false, to: 'received', toCondemned: false },
    ]);
  });

  it('leave state and condemnation alone for every event that is no action, but for a late outcome', () => {
    const moving = others.filter(
      ({ from, to, fromCondemned, toCondemned }) =>
        from !== null && (from !== to || fromCondemned !== toCondemned),
    );
    expect(moving).toEqual([
      { type: 'outcome_recorded', from: 'held', fromCondemned: false, to: 'returned', toCondemned: false },
    ]);
  });

  it('lead into service by accept, release and return_to_service alone, and never for a condemned sling', () => {
    const into = listLedgerTransitions().filter(
      ({ from, to }) => to === 'in_service' && from !== 'in_service',
    );
    expect(into.map(({ type, from, fromCondemned }) => [type, from, fromCondemned])).toEqual([
      ['accept', 'received', false],
      ['release', 'held', false],
      ['return_to_service', 'returned', false],
    ]);
  });

  it('never lead out of destroyed or departed', () => {
    const out = listLedgerTransitions().filter(
      ({ from, to }) => (from === 'destroyed' || from === 'departed') && from !== to,
    );
    expect(out).toEqual([]);
  });
});
