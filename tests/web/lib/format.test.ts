import { describe, expect, it } from 'vitest';
import {
  countDays,
  formatAge,
  formatDate,
  formatDateTime,
  formatDateWithDistance,
  formatShortTime,
  formatTagCode,
  getToday,
  parseTypedNumber,
} from '../../../src/lib/format';

describe('dates', () => {
  it('writes a date out, with how far it is', () => {
    expect(formatDateWithDistance('2026-03-12', '2026-03-03')).toBe('12 Mar 2026, in 9 days');
    expect(formatDateWithDistance('2026-03-12', '2026-03-12')).toBe('12 Mar 2026, today');
    expect(formatDateWithDistance('2026-03-12', '2026-03-11')).toBe('12 Mar 2026, tomorrow');
    expect(formatDateWithDistance('2026-03-12', '2026-03-15')).toBe('12 Mar 2026, 3 days ago');
  });

  it('says Sep, whatever the browser would', () => {
    expect(formatDate('2026-09-01')).toBe('1 Sep 2026');
  });

  it('counts whole days over a change of the clocks and a leap day', () => {
    expect(countDays('2026-03-28', '2026-03-30')).toBe(2);
    expect(countDays('2028-02-28', '2028-03-01')).toBe(2);
  });

  it('shows an instant in the site’s zone', () => {
    expect(formatDateTime('2026-11-03T23:30:00Z', 'Europe/Berlin')).toBe('4 Nov 2026, 00:30');
    expect(getToday(new Date('2026-11-03T23:30:00Z'), 'Europe/Berlin')).toBe('2026-11-04');
  });

  it('names the year only when it is another one', () => {
    const now = new Date('2026-12-01T00:00:00Z');
    expect(formatShortTime('2026-11-03T13:55:00Z', now, 'UTC')).toBe('3 Nov, 13:55');
    expect(formatShortTime('2025-11-03T13:55:00Z', now, 'UTC')).toBe('3 Nov 2025, 13:55');
  });

  it('gives an age in the unit that a person would use', () => {
    const now = new Date('2026-12-01T12:00:00Z');
    expect(formatAge('2026-12-01T11:48:00Z', now)).toBe('12 min');
    expect(formatAge('2026-12-01T07:00:00Z', now)).toBe('5 h');
    expect(formatAge('2026-11-03T12:00:00Z', now)).toBe('28 days');
    expect(formatAge('2026-12-02T12:00:00Z', now)).toBe('0 min');
  });
});

describe('typed numbers', () => {
  it.each([
    ['3', 3],
    ['3.5', 3.5],
    ['3,5', 3.5],
    ['3,150', 3150],
    ['12,345,678.5', 12345678.5],
    [' 1 000 ', 1000],
  ])('reads %j as %d', (text, value) => expect(parseTypedNumber(text)).toBe(value));

  it.each(['', 'abc', '3.', '-3', '3,15,0', '1.2.3', '1e3', '3 t'])('refuses %j', (text) =>
    expect(parseTypedNumber(text)).toBeNull(),
  );
});

it('groups a tag code and leaves anything else alone', () => {
  expect(formatTagCode('7k3m9qw2xa')).toBe('7K3M-9QW-2XA');
  expect(formatTagCode('7K3M-9QW-2XA')).toBe('7K3M-9QW-2XA');
  expect(formatTagCode('short')).toBe('short');
});
