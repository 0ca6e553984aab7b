import { Mod37_36 } from '@konfirm/iso7064';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { computeCheckCharacter, hasValidCheckCharacter } from '../../../../shared/domain/tags/iso7064';

const ALPHABET = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ';
const payloads = fc.string({ unit: fc.constantFrom(...ALPHABET), minLength: 1, maxLength: 24 });

describe('MOD 37,36 check character', () => {
  // Source: facts/examples.json, cases ex-cc-grid, ex-cc-isan-root, ex-cc-isan-ver (python-stdnum), ex-cc-own-1
  // (two independent implementations).
  it.each([
    ['A12425GABC1234002', 'M'],
    ['000000018CFA0000', 'I'],
    ['000000018CFA000000000000', 'K'],
    ['0000000189470000', '8'],
    ['SLG000001', 'Y'],
  ])('gives %s the published %s', (payload, check) => {
    expect(computeCheckCharacter(payload)).toBe(check);
    expect(hasValidCheckCharacter(payload + check)).toBe(true);
  });

  // Source: facts/examples.json, cases ex-cv-isan-bad, ex-cv-single-sub, ex-cv-undetected-transposition.
  it.each([
    ['000000018CFA0000A', false],
    ['A12425GABC1234003M', false],
    ['SL000012X', true],
    ['SL000021X', true],
  ])('says of %s: valid is %s', (full, isValid) => {
    expect(hasValidCheckCharacter(full)).toBe(isValid);
  });

  it('agrees with the package @konfirm/iso7064 on any payload', () => {
    fc.assert(
      fc.property(payloads, (payload) => {
        const check = computeCheckCharacter(payload);
        expect(check).toBe(Mod37_36.checksum(payload));
        expect(hasValidCheckCharacter(payload + check)).toBe(true);
      }),
    );
  });

  it.each(['', 'a1', 'A-1', 'É', 'A 1'])('refuses the payload %j', (payload) => {
    expect(() => computeCheckCharacter(payload)).toThrow(RangeError);
    expect(hasValidCheckCharacter(`${payload}0`)).toBe(false);
  });
});

/** Runs over every state the calculation can be in (one for each first character and more) as the facts file did. */
function* everyPayloadOf(length: number): Generator<string> {
  if (length === 0) {
    yield '';
    return;
  }
  for (const head of everyPayloadOf(length - 1)) for (const character of ALPHABET) yield head + character;
}

function isMissed(full: string): boolean {
  return hasValidCheckCharacter(full);
}

describe('what MOD 37,36 finds', () => {
  const prefixes = [...ALPHABET];

  it('finds every single wrong character', () => {
    let missed = 0;
    for (const payload of everyPayloadOf(2)) {
      const full = `${payload}7${computeCheckCharacter(`${payload}7`)}`;
      for (let at = 0; at < full.length; at++) {
        for (const wrong of ALPHABET) {
          if (wrong !== full[at] && isMissed(full.slice(0, at) + wrong + full.slice(at + 1))) missed++;
        }
      }
    }
    expect(missed).toBe(0);
  });

  // Source: facts file section 8, own enumeration over all running states: 72 of 45,360 (0.16 %).
  it('misses 72 of 45,360 swaps of neighbours', () => {
    let tried = 0;
    let missed = 0;
    for (const prefix of prefixes) {
      for (const a of ALPHABET) {
        for (const b of ALPHABET) {
          if (a === b) continue;
          tried++;
          if (isMissed(prefix + b + a + computeCheckCharacter(prefix + a + b))) missed++;
        }
      }
    }
    expect({ tried, missed }).toEqual({ tried: 45_360, missed: 72 });
  });

  // Source: same: 31,032 of 1,632,960 (1.90 %).
  it('misses 31,032 of 1,632,960 swaps over one character', () => {
    let tried = 0;
    let missed = 0;
    for (const prefix of prefixes) {
      for (const a of ALPHABET) {
        for (const b of ALPHABET) {
          if (a === b) continue;
          for (const middle of ALPHABET) {
            tried++;
            if (isMissed(prefix + b + middle + a + computeCheckCharacter(prefix + a + middle + b))) missed++;
          }
        }
      }
    }
    expect({ tried, missed }).toEqual({ tried: 1_632_960, missed: 31_032 });
  });
});
