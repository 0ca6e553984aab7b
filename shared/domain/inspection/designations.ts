import type { SlingKind } from '../slings/kinds';

/** The employer's designation of an inspector; dates are YYYY-MM-DD. */
export interface Designation {
  kinds: readonly SlingKind[];
  designatedBy: string;
  designatedOn: string;
  /** Last day it holds; null: until withdrawn. */
  until: string | null;
  isQualified: boolean;
}

/**
 * The designation that lets its holder inspect this kind on that day, a qualified one first.
 * Null where none covers the kind, none has begun or all have lapsed.
 */
export function findDesignation<D extends Designation>(
  designations: readonly D[],
  kind: SlingKind,
  onDate: string,
): D | null {
  const valid = designations.filter(
    ({ kinds, designatedOn, until }) =>
      kinds.includes(kind) && designatedOn <= onDate && (until === null || onDate <= until),
  );
  return valid.find(({ isQualified }) => isQualified) ?? valid[0] ?? null;
}
