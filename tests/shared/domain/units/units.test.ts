import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  formatLength,
  formatLoad,
  fromKg,
  fromMm,
  LENGTH_UNITS,
  LOAD_UNITS,
  toKg,
  toMm,
  UNIT_SIGNS,
} from '../../../../shared/domain/units/units';

describe('loads', () => {
  it.each([
    // The international avoirdupois pound is 0.45359237 kg exactly (agreement of 1959).
    [1, 'lb', 0.45359237],
    [2000, 'lb', 907.18474],
    [1, 'short_ton', 907.18474],
    [1, 't', 1000],
    [3.15, 't', 3150],
    [7, 'kg', 7],
  ] as const)('%d %s are %d kg', (value, unit, kg) => {
    expect(toKg(value, unit)).toBeCloseTo(kg, 9);
    expect(fromKg(kg, unit)).toBeCloseTo(value, 9);
  });

  it.each([
    [907.18474, 'lb', '2,000 lb'],
    [907.18474, 'short_ton', '1 short tons'],
    [907.1847, 'lb', '1,999 lb'],
    [2404.03956, 'lb', '5,300 lb'],
    [3150, 't', '3.15 t'],
    [3159.9, 't', '3.15 t'],
    [999.99, 'kg', '999 kg'],
    [1999.999, 'kg', '1,999 kg'],
    [0.4, 'kg', '0 kg'],
  ] as const)('%d kg in %s read %s: rounded down, never up', (kg, unit, words) => {
    expect(formatLoad(kg, unit)).toBe(words);
  });

  it('are never shown as more than the sling may carry', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 1e6, noNaN: true }),
        fc.constantFrom(...LOAD_UNITS),
        (kg, unit) => {
          const shown = Number.parseFloat(formatLoad(kg, unit).replaceAll(',', ''));
          // But for the step to which loads are kept, and binary noise.
          expect(toKg(shown, unit)).toBeLessThanOrEqual(kg + 0.0000101);
        },
      ),
    );
  });

  it('typed as a whole number of a unit read back as that number, after the database', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 200_000 }), (pounds) => {
        const stored = Number(toKg(pounds, 'lb').toFixed(5));
        expect(formatLoad(stored, 'lb')).toBe(`${pounds.toLocaleString('en-GB')} lb`);
      }),
    );
  });
});

describe('lengths', () => {
  it.each([
    // The international inch is 25.4 mm exactly (agreement of 1959).
    [1, 'in', 25.4],
    [12, 'ft', 3657.6],
    [1.5, 'm', 1500],
    [9, 'mm', 9],
  ] as const)('%d %s are %d mm', (value, unit, mm) => {
    expect(toMm(value, unit)).toBeCloseTo(mm, 9);
    expect(fromMm(mm, unit)).toBeCloseTo(value, 9);
  });

  it.each([
    [3657.6, 'ft', '12 ft'],
    [3000, 'm', '3 m'],
    [41.275, 'in', '1.625 in'],
    [0.79375, 'in', '0.031 in'],
    [9.5, 'mm', '9.5 mm'],
  ] as const)('%d mm in %s read %s', (mm, unit, words) => {
    expect(formatLength(mm, unit)).toBe(words);
  });

  it('typed in thirty-seconds of an inch survive the five decimals of the database', () => {
    for (let n = 1; n <= 320; n += 1) {
      const stored = Number(toMm(n / 32, 'in').toFixed(5));
      expect(fromMm(stored, 'in')).toBeCloseTo(n / 32, 10);
    }
  });

  it('have a sign for each unit', () => {
    expect(Object.keys(UNIT_SIGNS).sort()).toEqual([...LOAD_UNITS, ...LENGTH_UNITS].sort());
  });
});
