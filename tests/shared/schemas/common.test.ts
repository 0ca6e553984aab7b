import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  dateSchema,
  idParam,
  lengthMmSchema,
  loadKgSchema,
  pageQuery,
  requiredText,
  text,
} from '../../../shared/schemas/common';

describe('a text', () => {
  it('is trimmed, and otherwise what was typed, in any script', () => {
    const words = fc
      .string({ unit: 'grapheme', maxLength: 30 })
      // Control characters are refused on purpose.
      .filter((value) => !/\p{Cc}/u.test(value));
    fc.assert(
      fc.property(words, (value) => {
        expect(text(500).parse(value)).toBe(value.trim());
      }),
    );
    expect(text(80).parse('  حبل 🪝 <b>\n\tx ')).toBe('حبل 🪝 <b>\n\tx');
  });

  it.each(['\u0000', 'a\u0007', '\u001b[0m', '\u007f', '\ud83e', 'x\udc00y'])('refuses %j', (value) => {
    expect(text(80).safeParse(value).success).toBe(false);
  });

  it('has an end, and where it is required a beginning', () => {
    expect(text(3).safeParse('abcd').success).toBe(false);
    expect(text(3).safeParse('').success).toBe(true);
    for (const empty of ['', '  ', '\n']) expect(requiredText(3).safeParse(empty).success).toBe(false);
  });
});

describe('a date', () => {
  it.each(['2026-02-28', '2024-02-29', '1999-12-31', '9999-12-31'])('may be %s', (value) => {
    expect(dateSchema.parse(value)).toBe(value);
  });
  it.each([
    '2026-02-29',
    '2026-13-01',
    '2026-00-10',
    '26-01-01',
    '2026-1-1',
    '2026-01-01T00:00:00Z',
    '0000-01-01',
    '',
  ])('is never %o', (value) => {
    expect(dateSchema.safeParse(value).success).toBe(false);
  });
});

describe('an id in a path', () => {
  it.each(['1', '42', '999999999999999'])('may be %s', (value) => {
    expect(idParam.parse(value)).toBe(Number(value));
  });
  it.each(['0', '-1', '1.5', '1e3', ' 1', '0x10', '01', '', 'abc', '9'.repeat(16)])(
    'is never %o',
    (value) => {
      expect(idParam.safeParse(value).success).toBe(false);
    },
  );
});

describe('a load and a length', () => {
  it.each([0.01, 1, 907.18474, 999_999])('may be %d', (value) => {
    expect(loadKgSchema.parse(value)).toBe(value);
    expect(lengthMmSchema.parse(value)).toBe(value);
  });
  it.each([0, -1, 1e-9, 1e9, Number.NaN, Number.POSITIVE_INFINITY, '5'])('is never %o', (value) => {
    expect(loadKgSchema.safeParse(value).success).toBe(false);
    expect(lengthMmSchema.safeParse(value).success).toBe(false);
  });
});

describe('a page', () => {
  it('holds fifty unless asked, one to two hundred when asked, and nothing unknown', () => {
    expect(pageQuery.parse({})).toEqual({ limit: 50 });
    expect(pageQuery.parse({ limit: '200', cursor: 'x' })).toEqual({ limit: 200, cursor: 'x' });
    for (const query of [
      { limit: '0' },
      { limit: '201' },
      { limit: 'x' },
      { limit: '1.5' },
      { offset: '1' },
    ]) {
      expect(pageQuery.safeParse(query).success).toBe(false);
    }
  });
});
