import type { EnteredUnits } from '../../../../shared/schemas/spec';
import { parseTypedNumber } from '../../../lib/format';
import { convertExactly } from './exactUnits';
import type { LoadsValues, Measure } from './values';

/** Not a number: the schema then says so at the field, where leaving it out would pass silently. */
const UNREADABLE = Number.NaN;

/** kg or mm of what was typed; undefined when nothing was, NaN when it can't be read. */
export function readMeasure(measure: Measure): number | undefined {
  if (measure.figure.trim() === '') return undefined;
  return convertExactly(measure.figure, measure.unit) ?? UNREADABLE;
}

/** A plain number; undefined when nothing was typed, NaN when it can't be read. */
export function readNumber(text: string): number | undefined {
  if (text.trim() === '') return undefined;
  return parseTypedNumber(text) ?? UNREADABLE;
}

export const readText = (text: string): string | undefined => text.trim() || undefined;

/** Rated loads as the API takes them; a bridle is rated only where more than one leg carries. */
export function readLoads(loads: LoadsValues, legs: number): unknown {
  const bridleKg = readMeasure(loads.bridle.kg);
  return {
    verticalKg: readMeasure(loads.verticalKg),
    chokerKg: readMeasure(loads.chokerKg),
    basketKg: readMeasure(loads.basketKg),
    ...(legs > 1 && bridleKg !== undefined
      ? { bridle: { kg: bridleKg, angleDeg: readNumber(loads.bridle.angleDeg) } }
      : {}),
  };
}

/** Remembers the unit of each figure that was typed, under its path in the request. */
export function listUnits(measures: readonly (readonly [path: string, measure: Measure])[]): EnteredUnits {
  return Object.fromEntries(
    measures.filter(([, { figure }]) => figure.trim() !== '').map(([path, { unit }]) => [path, unit]),
  );
}
