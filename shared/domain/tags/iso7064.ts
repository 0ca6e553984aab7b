/**
 * ISO/IEC 7064 hybrid system MOD 37,36: one check character out of 0-9 A-Z.
 *
 * Source: facts file section 8 (examples of GRid and ISAN as restated in python-stdnum). It misses no single wrong
 * character, 0.16 % of swaps of two neighbours and 1.90 % of swaps over one character (own enumeration, same section).
 */

const ALPHABET = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ';
const MODULUS = ALPHABET.length;

/** Carries one character through the running state; null when it is outside the alphabet. */
function addCharacter(state: number, character: string): number | null {
  const value = ALPHABET.indexOf(character);
  if (value < 0 || character.length !== 1) return null;
  const sum = (state + value) % MODULUS || MODULUS;
  return (sum * 2) % (MODULUS + 1);
}

function runOver(text: string): number | null {
  let state: number | null = MODULUS;
  for (const character of text) {
    state = addCharacter(state, character);
    if (state === null) return null;
  }
  return state;
}

/**
 * @param payload upper-case letters and figures, at least one
 * @returns the check character
 * @throws RangeError when the payload is empty or holds anything else
 */
export function computeCheckCharacter(payload: string): string {
  const state = payload === '' ? null : runOver(payload);
  if (state === null) throw new RangeError('A check character needs upper-case letters and figures only.');
  return ALPHABET.charAt((MODULUS + 1 - state) % MODULUS);
}

/** @param full payload with its check character at the end, upper case; anything else is simply not valid */
export function hasValidCheckCharacter(full: string): boolean {
  if (full.length < 2) return false;
  const state = runOver(full.slice(0, -1));
  const check = ALPHABET.indexOf(full.charAt(full.length - 1));
  return state !== null && check >= 0 && (state + check) % MODULUS === 1;
}
