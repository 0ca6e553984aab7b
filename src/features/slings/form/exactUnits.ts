import type { LengthUnit, LoadUnit } from '../../../../shared/domain/units/units';

/** The factors of shared/domain/units as whole numbers over a power of ten: kg and mm per unit, exact by definition. */
const FACTORS: Record<LoadUnit | LengthUnit, { digits: bigint; decimals: number }> = {
  kg: { digits: 1n, decimals: 0 },
  t: { digits: 1000n, decimals: 0 },
  lb: { digits: 45_359_237n, decimals: 8 },
  short_ton: { digits: 90_718_474n, decimals: 5 },
  mm: { digits: 1n, decimals: 0 },
  m: { digits: 1000n, decimals: 0 },
  in: { digits: 254n, decimals: 1 },
  ft: { digits: 3048n, decimals: 1 },
};

/**
 * A figure as typed, in kg or mm, without binary noise: "2.01" t is 2010, not 2009.9999999999998.
 * @param figure plain or with thousands commas, as `parseTypedNumber` takes it, or a fraction such as "5/8"
 * @returns null when it isn't a number
 */
export function convertExactly(figure: string, unit: LoadUnit | LengthUnit): number | null {
  const plain = toPlainDecimal(figure);
  if (plain === null) return null;
  const [whole = '0', fraction = ''] = plain.split('.');
  const factor = FACTORS[unit];
  const digits = (BigInt(whole + fraction) * factor.digits).toString();
  const decimals = fraction.length + factor.decimals;
  const padded = digits.padStart(decimals + 1, '0');
  const point = padded.length - decimals;
  return Number(`${padded.slice(0, point)}.${padded.slice(point)}0`);
}

/** A whole and a fraction as sizes in inches are written: "5/8", "1 1/2", "1-1/2". Halvings only: they end as decimals. */
const FRACTION = /^(?:(\d{1,6})[ -])?(\d{1,3})\/(2|4|8|16|32|64)$/;

/** The same reading of commas as `parseTypedNumber`, kept as digits, and fractions besides. */
function toPlainDecimal(figure: string): string | null {
  const fraction = FRACTION.exec(figure.trim());
  if (fraction) {
    const [, whole = '0', top = '', bottom = ''] = fraction;
    // Exact: halvings of small whole numbers have no binary noise
    return String(Number(whole) + Number(top) / Number(bottom));
  }
  const bare = figure.trim().replace(/[\s\u00a0]/g, '');
  if (/^\d{1,3}(,\d{3})+(\.\d+)?$/.test(bare)) return bare.replaceAll(',', '');
  if (/^\d+([.,]\d+)?$/.test(bare)) return bare.replace(',', '.');
  return null;
}
