import { describe, expect, it } from 'vitest';
import { dueState, nextDueOn } from '../../../../shared/domain/inspection/due';

describe('nextDueOn', () => {
  it.each([
    // common practice, no source: calendar months, clamped to the month's end
    ['2026-01-31', 1, '2026-02-28'],
    ['2028-01-31', 1, '2028-02-29'],
    ['2028-02-29', 12, '2029-02-28'],
    ['2025-12-31', 2, '2026-02-28'],
    ['2026-08-31', 6, '2027-02-28'],
    // ex-due-osha-chain, 29 CFR 1910.184(e)(3)(i) [read R4, R5]
    ['2025-03-15', 12, '2026-03-15'],
    // ex-due-loler, LOLER 1998 reg 9(3)(a) [read R16]
    ['2026-01-10', 6, '2026-07-10'],
    // ex-due-asme-severe, quarterly; ex-due-as-web, three-monthly; ex-due-as3775-25, six months
    ['2026-02-01', 3, '2026-05-01'],
    ['2026-04-01', 3, '2026-07-01'],
    ['2026-01-05', 6, '2026-07-05'],
  ])('adds to %s %i months: %s', (from, months, due) => {
    expect(nextDueOn(from, months)).toBe(due);
  });

  it('is twelve months when nothing else is said', () => {
    expect(nextDueOn('2026-06-10')).toBe('2027-06-10');
  });

  it('throws for what is not a date', () => {
    expect(() => nextDueOn('2026-02-30')).toThrow(RangeError);
    expect(() => nextDueOn('10 June 2026')).toThrow(RangeError);
  });
});

describe('dueState', () => {
  it.each([
    // ex-due-osha-chain and -late: not overdue on the day itself, overdue the day after
    ['2026-03-15', '2026-03-15', 'soon'],
    ['2026-03-15', '2026-03-16', 'overdue'],
    ['2026-03-15', '2026-02-13', 'soon'],
    ['2026-03-15', '2026-02-12', 'ok'],
    ['2027-01-10', '2026-12-20', 'soon'],
  ] as const)('for %s seen on %s: %s', (due, today, state) => {
    expect(dueState(due, today)).toBe(state);
  });
});
