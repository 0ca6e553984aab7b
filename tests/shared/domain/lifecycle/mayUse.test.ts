import { describe, expect, it } from 'vitest';
import { listMayNotUse } from '../../../../shared/domain/lifecycle/mayUse';
import { SLING_STATES } from '../../../../shared/domain/lifecycle/states';
import type { LifecycleFacts } from '../../../../shared/domain/lifecycle/facts';
import { received } from './facts';

const TODAY = '2026-03-10';
const usable = (changes: Partial<LifecycleFacts> = {}) =>
  received({
    state: 'in_service',
    nextDueOn: '2026-03-11',
    discardOn: '2026-03-11',
    offHireOn: '2026-03-11',
    ...changes,
  });
const rulesOf = (changes: Partial<LifecycleFacts>): string[] =>
  listMayNotUse(usable(changes), TODAY).map(({ rule }) => rule);

describe('whether a sling may be used (product design, section 3)', () => {
  it('is yes in service with every date in the future, a live label and a legible tag', () => {
    expect(rulesOf({})).toEqual([]);
    expect(rulesOf({ discardOn: null, offHireOn: null })).toEqual([]);
  });

  it.each(SLING_STATES.filter((state) => state !== 'in_service'))('is no while it is %s', (state) => {
    expect(rulesOf({ state })).toEqual(['state']);
  });

  it.each([
    [{ makersTag: 'illegible' }, 'makers_tag'],
    [{ makersTag: 'missing' }, 'makers_tag'],
    [{ hasLiveLabel: false }, 'live_label'],
    [{ nextDueOn: null }, 'never_inspected'],
    [{ nextDueOn: TODAY }, 'inspection_due'],
    [{ nextDueOn: '2026-03-09' }, 'inspection_due'],
    [{ nextDueOn: '2025-12-31' }, 'inspection_due'],
    [{ discardOn: TODAY }, 'discard_date'],
    [{ discardOn: '2024-01-01' }, 'discard_date'],
    [{ offHireOn: TODAY }, 'off_hire'],
    [{ offHireOn: '2026-03-09' }, 'off_hire'],
  ] satisfies [Partial<LifecycleFacts>, string][])('is no for %j, and says that alone', (changes, rule) => {
    expect(rulesOf(changes)).toEqual([rule]);
  });

  it('names everything that stands against it', () => {
    expect(
      rulesOf({
        state: 'held',
        makersTag: 'missing',
        hasLiveLabel: false,
        nextDueOn: TODAY,
        discardOn: TODAY,
        offHireOn: TODAY,
      }),
    ).toEqual(['state', 'makers_tag', 'live_label', 'inspection_due', 'discard_date', 'off_hire']);
  });

  it('says condemned rather than held', () => {
    expect(listMayNotUse(usable({ state: 'held', condemned: true }), TODAY)[0]?.message).toMatch(/condemned/);
  });
});
