/** An exact fraction: limits are compared without binary noise or rounding (19/32 in is 0.59375, not nearly so). */
export interface Exact {
  n: bigint;
  d: bigint;
}

/** @throws RangeError for a number that is not finite */
export function toExact(value: number): Exact {
  const match = /^(-?)(\d+)(?:\.(\d+))?(?:e([+-]\d+))?$/.exec(String(value));
  if (!match) throw new RangeError(`not a finite number: ${value}`);
  const [, sign, whole = '0', fraction = '', exponent = '0'] = match;
  const n = BigInt(`${sign}${whole}${fraction}`);
  const scale = Number(exponent) - fraction.length;
  return scale >= 0 ? { n: n * 10n ** BigInt(scale), d: 1n } : { n, d: 10n ** BigInt(-scale) };
}

export const multiply = (a: Exact, b: Exact): Exact => ({ n: a.n * b.n, d: a.d * b.d });
export const subtract = (a: Exact, b: Exact): Exact => ({ n: a.n * b.d - b.n * a.d, d: a.d * b.d });
export const add = (a: Exact, b: Exact): Exact => ({ n: a.n * b.d + b.n * a.d, d: a.d * b.d });
/** @throws RangeError when `b` is zero */
export function divide(a: Exact, b: Exact): Exact {
  if (b.n === 0n) throw new RangeError('division by zero');
  const flip = b.n < 0n ? -1n : 1n;
  return { n: a.n * b.d * flip, d: a.d * b.n * flip };
}
/** Negative, zero or positive as `a` is below, at or above `b`. */
export function compare(a: Exact, b: Exact): number {
  const difference = subtract(a, b).n;
  return difference < 0n ? -1 : difference > 0n ? 1 : 0;
}
export const toNumber = (value: Exact): number => Number(value.n) / Number(value.d);
