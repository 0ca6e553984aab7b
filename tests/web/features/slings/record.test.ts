import { describe, expect, it } from 'vitest';
import { SLING_ACTIONS, type SlingAction } from '../../../../shared/domain/lifecycle/actions';
import type { Sling } from '../../../../shared/schemas/slings';
import { describeState } from '../../../../src/features/slings/record/describeState';
import { findLikelyStep } from '../../../../src/features/slings/record/likelyStep';
import { listActions } from '../../../../src/features/slings/record/listActions';

const CLOCK = { now: new Date('2026-12-01T12:00:00Z'), today: '2026-12-01', timeZone: 'UTC' };

function answer(
  open: SlingAction[],
  closed: Partial<Record<SlingAction, string>> = {},
): Sling['allowedActions'] {
  return SLING_ACTIONS.map((action) => {
    if (open.includes(action)) return { action, open: true, unmet: [] };
    const message = closed[action];
    return {
      action,
      open: false,
      unmet: [{ rule: message ? 'role' : 'state', message: message ?? 'Not possible.' }],
    };
  });
}

const HELD = {
  id: 4,
  state: 'held',
  condemned: false,
  mayUse: false,
  mayNotUse: [{ rule: 'state', message: 'It is held, not in service.' }],
  custody: { kind: 'in_store', locationName: 'Rack B', since: '2026-11-03T08:00:00Z' },
  stateSince: '2026-11-03T08:00:00Z',
  nextDueOn: '2027-02-14',
  due: 'ok',
  tag: { code: '7K3M9QX2TD', status: 'live' },
  openReasons: [
    {
      id: 1,
      code: 'latch',
      confirmed: false,
      placedBy: null,
      placedAt: '2026-11-03T08:00:00Z',
      note: '',
      clearing: { isClearable: true, needsQualified: false, needsEvidence: false, how: 'A note.' },
    },
  ],
  allowedActions: answer(['hold', 'secure'], { condemn: 'Needs a person with the role manager.' }),
} satisfies Partial<Sling>;
const CAGED = { ...HELD, custody: { kind: 'cage' as const, locationName: 'Cage 2', since: HELD.stateSince } };

describe('describeState', () => {
  it('says since when, why and where', () => {
    expect(describeState(CAGED, CLOCK)).toBe('Since 3 Nov, 28 days. Hook latch. In Cage 2.');
  });

  it('says that a held sling is not in a cage', () => {
    expect(describeState(HELD, CLOCK)).toContain('Not in a cage: in Rack B.');
  });

  it('names every reason why a sling in service may not be used', () => {
    const due = {
      ...HELD,
      state: 'in_service' as const,
      mayNotUse: [{ rule: 'x', message: 'Its inspection is due.' }],
    };
    expect(describeState(due, CLOCK)).toBe('Its inspection is due. In Rack B.');
    expect(describeState({ ...due, mayUse: true, mayNotUse: [] }, CLOCK)).toContain(
      '14 Feb 2027, in 75 days',
    );
  });
});

describe('findLikelyStep', () => {
  const label = (
    sling: Parameters<typeof findLikelyStep>[0],
    ...roles: ('storekeeper' | 'inspector' | 'manager' | 'auditor')[]
  ) => findLikelyStep(sling, { roles })?.label;

  it('brings a held sling to a cage before anything else', () => {
    expect(label(HELD, 'manager', 'inspector')).toBe('Bring it to a cage');
  });

  it('leaves the decision in the cage to who may take it', () => {
    const open = { ...CAGED, allowedActions: answer(['hold', 'condemn']) };
    expect(label(open, 'manager')).toBe('Condemn it');
    expect(label(open, 'inspector')).toBe('Make a release inspection');
    expect(label({ ...CAGED, allowedActions: answer(['hold', 'release']) }, 'inspector')).toBe(
      'Release into service',
    );
  });

  it('destroys only what is condemned, and only where that is open', () => {
    const condemned = { ...CAGED, condemned: true };
    expect(label({ ...condemned, allowedActions: answer(['hold', 'destroy']) }, 'storekeeper')).toBe(
      'Record its destruction',
    );
    expect(label({ ...condemned, allowedActions: answer(['hold']) }, 'manager')).toBeUndefined();
  });

  it('leads a received sling to label, first inspection and acceptance', () => {
    const received = {
      ...HELD,
      state: 'received' as const,
      tag: null,
      due: null,
      allowedActions: answer(['hold']),
    };
    expect(label(received, 'storekeeper')).toBe('Print its label');
    expect(label({ ...received, tag: { code: '7K3M9QX2TD', status: 'printed' } }, 'storekeeper')).toBe(
      'Confirm its label by scan',
    );
    expect(label(received, 'inspector')).toBe('Make its first inspection');
    expect(label({ ...received, allowedActions: answer(['hold', 'accept']) }, 'inspector')).toBe(
      'Accept into service',
    );
  });

  it('offers nothing to an auditor', () => {
    expect(label({ ...CAGED, allowedActions: answer([]) }, 'auditor')).toBeUndefined();
  });
});

describe('listActions', () => {
  it('shows what is not open with its reason, and nothing that the state rules out', () => {
    const { open, closed } = listActions(HELD);
    expect(open.map(({ action }) => action)).toEqual(['secure']);
    expect(closed).toEqual([
      { action: 'condemn', open: false, name: 'Condemn', reasons: ['Needs a person with the role manager.'] },
    ]);
  });

  it('never lists hold, so that it can not stand beside destroy', () => {
    const { open } = listActions({ allowedActions: answer(['hold', 'destroy', 'secure']) });
    expect(open.map(({ action }) => action)).toEqual(['secure', 'destroy']);
  });
});
