import { randomBytes } from 'node:crypto';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  drawTagCode,
  formatTagCode,
  parseScan,
  parseTagCode,
  TAG_ALPHABET,
  tagPayload,
  type TagCode,
} from '../../../../shared/domain/tags/tagCode';
import { hasValidCheckCharacter } from '../../../../shared/domain/tags/iso7064';

function codeFrom(seed: number): TagCode {
  let state = seed >>> 0;
  return drawTagCode((n) =>
    Uint8Array.from({ length: n }, () => {
      state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
      return state >>> 24;
    }),
  );
}
const codes = fc.integer({ min: 1 }).map(codeFrom);

describe('drawTagCode', () => {
  it('gives ten characters of Crockford’s alphabet with a valid check character', () => {
    for (let i = 0; i < 500; i++) {
      const code = drawTagCode(randomBytes);
      expect(code).toMatch(/^[0-9A-HJKMNP-TV-Z]{10}$/);
      expect(hasValidCheckCharacter(code)).toBe(true);
    }
  });

  it('draws again when the check character is I, L, O or U', () => {
    let draws = 0;
    const seen = new Set<string>();
    for (let i = 0; i < 2000; i++) {
      const code = drawTagCode((n) => (draws++, randomBytes(n)));
      seen.add(code.charAt(9));
    }
    expect(draws).toBeGreaterThan(2000);
    expect([...seen].sort().join('')).toBe(TAG_ALPHABET);
  });

  it('takes all 32 characters equally: each byte value leads to one, eight bytes to each', () => {
    const counts = new Map<string, number>();
    for (let byte = 0; byte < 256; byte++) {
      let call = 0;
      // The first eight stay fixed; the last byte is varied until the draw has a usable check character.
      const code = drawTagCode((n) =>
        Uint8Array.from({ length: n }, (_, i) => (i === 0 ? byte : call++ % 256)),
      );
      counts.set(code.charAt(0), (counts.get(code.charAt(0)) ?? 0) + 1);
    }
    expect([...counts.keys()].sort().join('')).toBe(TAG_ALPHABET);
    expect(new Set(counts.values())).toEqual(new Set([8]));
  });

  it('says so when the source of random bytes is broken', () => {
    expect(() => drawTagCode(() => new Uint8Array(3))).toThrow('too few');
  });
});

describe('parseTagCode', () => {
  it('reads back what formatTagCode prints, in any case and with any dashes and spaces', () => {
    fc.assert(
      fc.property(codes, fc.constantFrom('-', ' ', '', '–', ' - '), fc.boolean(), (code, gap, isLower) => {
        const printed = formatTagCode(code).replaceAll('-', gap);
        expect(formatTagCode(code)).toMatch(/^.{4}-.{3}-.{3}$/);
        expect(parseTagCode(isLower ? printed.toLowerCase() : printed)).toEqual({ ok: true, code });
      }),
    );
  });

  it('reads O as 0, I and L as 1', () => {
    fc.assert(
      fc.property(codes, fc.constantFrom('I', 'L', 'i', 'l'), (code, one) => {
        expect(parseTagCode(code.replaceAll('0', 'o').replaceAll('1', one))).toEqual({ ok: true, code });
      }),
    );
  });

  it('names what is wrong', () => {
    expect(parseTagCode('')).toEqual({ ok: false, reason: 'length' });
    expect(parseTagCode('7Q4K')).toEqual({ ok: false, reason: 'length' });
    expect(parseTagCode('UUUUUUUUUU')).toEqual({ ok: false, reason: 'alphabet' });
    expect(parseTagCode('💥💥💥💥💥')).toEqual({ ok: false, reason: 'alphabet' });
    const code = codeFrom(7);
    const wrong = code.slice(0, 9) + (code.endsWith('2') ? '3' : '2');
    expect(parseTagCode(wrong)).toEqual({ ok: false, reason: 'check' });
  });

  it('finds every single wrong character', () => {
    fc.assert(
      fc.property(codes, fc.nat(9), fc.constantFrom(...TAG_ALPHABET), (code, at, wrong) => {
        fc.pre(code[at] !== wrong);
        const parsed = parseTagCode(code.slice(0, at) + wrong + code.slice(at + 1));
        expect(parsed).toEqual({ ok: false, reason: 'check' });
      }),
    );
  });
});

describe('tagPayload', () => {
  const code = codeFrom(1);

  it('is upper case throughout, with the origin alone', () => {
    expect(tagPayload('https://slings.example.com', code)).toBe(`HTTPS://SLINGS.EXAMPLE.COM/T/${code}`);
    expect(tagPayload('http://192.168.1.20:4173/', code)).toBe(`HTTP://192.168.1.20:4173/T/${code}`);
  });

  it('refuses what is no web address', () => {
    expect(() => tagPayload('slings.example.com', code)).toThrow(TypeError);
    expect(() => tagPayload('javascript:alert(1)', code)).toThrow(TypeError);
  });
});

describe('parseScan', () => {
  const own = 'https://slings.example.com';
  const code = codeFrom(42);
  const wrong = code.slice(0, 9) + (code.endsWith('2') ? '3' : '2');

  it.each([
    ['a bare code', code],
    ['a code as printed', formatTagCode(code)],
    ['the label’s own text', tagPayload(own, code)],
    ['a lower-case link', `${own}/t/${code.toLowerCase()}`],
    ['a link with a line end from a handheld scanner', `${own}/t/${code}\r\n`],
  ])('takes %s', (_name, text) => {
    expect(parseScan(text, own)).toEqual({ kind: 'tag', code });
    expect(parseScan(text)).toEqual({ kind: 'tag', code });
  });

  it('takes links at any of several own addresses', () => {
    expect(parseScan(`http://127.0.0.1:4173/t/${code}`, [own, 'http://127.0.0.1:4173'])).toEqual({
      kind: 'tag',
      code,
    });
  });

  it('names a link like ours at another address as foreign, with its host', () => {
    const text = `HTTPS://OTHER.EXAMPLE/T/${code}`;
    expect(parseScan(text, own)).toEqual({
      kind: 'foreign',
      text,
      otherHost: { host: 'other.example', code },
    });
  });

  it('says when a character of ours is wrong', () => {
    expect(parseScan(wrong, own)).toEqual({ kind: 'wrong_check', text: wrong });
    expect(parseScan(`${own}/t/${wrong}`, own)).toEqual({ kind: 'wrong_check', text: wrong });
  });

  it.each([
    'hello',
    '',
    'https://slings.example.com/slings',
    'https://slings.example.com/t/',
    `https://slings.example.com/x/t/${code}`,
    `javascript:alert('${code}')`,
    'http://',
    '{"a":1}',
    `https://other.example/t/${wrong}`,
  ])('names %j as foreign', (text) => {
    expect(parseScan(text, own)).toEqual({ kind: 'foreign', text, otherHost: null });
  });

  it('never throws and never makes a code of free text', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const reading = parseScan(text, own);
        if (reading.kind === 'tag') expect(parseTagCode(text).ok).toBe(true);
      }),
    );
  });
});
