import { FITTING_NAMES } from '../../../shared/domain/slings/spec';
import type { Sling } from '../../../shared/schemas/slings';

export type Fate = 'destroyed' | 'salvaged';

/** A fitting or leg whose fate is asked when the sling is destroyed. */
export interface Part {
  /** Unique within the sling: `fitting12`, `leg2`. */
  key: string;
  name: string;
  about: { fittingId: number } | { leg: number };
  /** False: it cannot be taken off, so it is destroyed with the sling. */
  isDetachable: boolean;
}

const POSITION_WORDS = { upper: 'upper end', lower: 'lower end', other: 'elsewhere' } as const;

/** Every fitting, and each leg of a sling with several; a single leg is the sling itself. */
export function listParts(sling: Pick<Sling, 'fittings' | 'legs'>): Part[] {
  const names = sling.fittings.map(
    ({ type, position, sizeMm }) =>
      `${FITTING_NAMES[type]}${sizeMm === undefined ? '' : `, ${sizeMm} mm`}, ${POSITION_WORDS[position]}`,
  );
  const fittings = sling.fittings.map(({ id, detachable }, i): Part => ({
    key: `fitting${id}`,
    name: tellApart(names, i),
    about: { fittingId: id },
    isDetachable: detachable,
  }));
  const legs = Array.from({ length: sling.legs > 1 ? sling.legs : 0 }, (_, i): Part => ({
    key: `leg${i + 1}`,
    name: `Leg ${i + 1}`,
    about: { leg: i + 1 },
    isDetachable: true,
  }));
  return [...fittings, ...legs];
}

/** Alike fittings by their place in the record: "Hook, lower end (2 of 4)". */
function tellApart(names: readonly string[], index: number): string {
  const name = names[index] ?? '';
  const alike = names.filter((each) => each === name).length;
  if (alike < 2) return name;
  return `${name} (${names.slice(0, index + 1).filter((each) => each === name).length} of ${alike})`;
}

/** The fates as the API takes them; a part that cannot be taken off is destroyed. */
export function toFates(
  parts: readonly Part[],
  chosen: Readonly<Record<string, Fate | null>>,
): { fittings: { fittingId: number; fate: Fate }[]; legs: { leg: number; fate: Fate }[] } {
  const fateOf = (part: Part): Fate =>
    part.isDetachable && chosen[part.key] === 'salvaged' ? 'salvaged' : 'destroyed';
  return {
    fittings: parts.flatMap((p) => ('fittingId' in p.about ? [{ ...p.about, fate: fateOf(p) }] : [])),
    legs: parts.flatMap((p) => ('leg' in p.about ? [{ ...p.about, fate: fateOf(p) }] : [])),
  };
}
