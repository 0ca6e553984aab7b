import { describe, expect, it } from 'vitest';
import { KG_PER_LB, LENGTH_UNITS, LOAD_UNITS, toKg, toMm } from '../../../../shared/domain/units/units';
import { convertExactly } from '../../../../src/features/slings/form/exactUnits';

describe('convertExactly', () => {
  it('gives the decimal product where binary floating point does not', () => {
    expect(2.01 * 1000).not.toBe(2010);
    expect(convertExactly('2.01', 't')).toBe(2010);
    expect(convertExactly('1.005', 'm')).toBe(1005);
  });

  it('takes the pound and the inch of 1959 exactly', () => {
    expect(convertExactly('1', 'lb')).toBe(KG_PER_LB);
    expect(convertExactly('2000', 'lb')).toBe(907.18474);
    expect(convertExactly('1', 'short_ton')).toBe(907.18474);
    expect(convertExactly('1', 'in')).toBe(25.4);
    expect(convertExactly('10', 'ft')).toBe(3048);
  });

  it('agrees with the shared factors in every unit', () => {
    for (const unit of LOAD_UNITS) expect(convertExactly('3.75', unit)).toBeCloseTo(toKg(3.75, unit), 9);
    for (const unit of LENGTH_UNITS) expect(convertExactly('3.75', unit)).toBeCloseTo(toMm(3.75, unit), 9);
  });

  it('reads thousands and decimal commas as people type them', () => {
    expect(convertExactly('7,000', 'kg')).toBe(7000);
    expect(convertExactly('3,5', 't')).toBe(3500);
    expect(convertExactly(' 12 500 ', 'kg')).toBe(12_500);
  });

  it('reads fractions of an inch as they stand on tags', () => {
    expect(convertExactly('5/8', 'in')).toBe(15.875);
    expect(convertExactly('1 1/2', 'in')).toBe(38.1);
    expect(convertExactly('1-1/2', 'in')).toBe(38.1);
    expect(convertExactly('1/64', 'in')).toBe(0.396875);
  });

  it('keeps nothing that is no number', () => {
    for (const text of ['', 'abc', '1e3', '-5', '1.2.3', '1,00,0', '∞', '1/0', '1/3', '5/8/2', '/8'])
      expect(convertExactly(text, 'kg')).toBeNull();
  });
});
