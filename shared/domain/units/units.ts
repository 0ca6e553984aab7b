/** Exact by definition: international avoirdupois pound and inch (1959). */
export const KG_PER_LB = 0.45359237;
export const MM_PER_INCH = 25.4;

export const LOAD_UNITS = ['kg', 't', 'lb', 'short_ton'] as const;
export type LoadUnit = (typeof LOAD_UNITS)[number];
export const LENGTH_UNITS = ['mm', 'm', 'in', 'ft'] as const;
export type LengthUnit = (typeof LENGTH_UNITS)[number];

const KG_PER: Record<LoadUnit, number> = { kg: 1, t: 1000, lb: KG_PER_LB, short_ton: 2000 * KG_PER_LB };
const MM_PER: Record<LengthUnit, number> = { mm: 1, m: 1000, in: MM_PER_INCH, ft: 12 * MM_PER_INCH };
export const UNIT_SIGNS: Record<LoadUnit | LengthUnit, string> = {
  kg: 'kg',
  t: 't',
  lb: 'lb',
  short_ton: 'short tons',
  mm: 'mm',
  m: 'm',
  in: 'in',
  ft: 'ft',
};

export const toKg = (value: number, unit: LoadUnit): number => value * KG_PER[unit];
export const fromKg = (kg: number, unit: LoadUnit): number => kg / KG_PER[unit];
export const toMm = (value: number, unit: LengthUnit): number => value * MM_PER[unit];
export const fromMm = (mm: number, unit: LengthUnit): number => mm / MM_PER[unit];

const LOAD_DECIMALS: Record<LoadUnit, number> = { kg: 0, t: 2, lb: 0, short_ton: 2 };
const LENGTH_DECIMALS: Record<LengthUnit, number> = { mm: 1, m: 2, in: 3, ft: 2 };

/** Loads are kept to so much: without it, 5300 lb would come back as 5299. */
const KEPT_STEP_KG = 0.00001;

/** A load as read: rounded down always, so that nothing shown is ever more than what the sling may carry. */
export function formatLoad(kg: number, unit: LoadUnit): string {
  const scale = 10 ** LOAD_DECIMALS[unit];
  const down = Math.floor(fromKg(kg + KEPT_STEP_KG, unit) * scale) / scale;
  return `${group(down, LOAD_DECIMALS[unit])} ${UNIT_SIGNS[unit]}`;
}

/** A length as read, at most the unit's useful decimals, trailing zeros dropped. */
export function formatLength(mm: number, unit: LengthUnit): string {
  return `${group(Number(fromMm(mm, unit).toFixed(LENGTH_DECIMALS[unit])), LENGTH_DECIMALS[unit])} ${UNIT_SIGNS[unit]}`;
}

function group(value: number, maximumFractionDigits: number): string {
  return value.toLocaleString('en-GB', { maximumFractionDigits });
}

/** What a person chose to read loads and lengths in. */
export interface UnitChoice {
  load: LoadUnit;
  length: LengthUnit;
}
