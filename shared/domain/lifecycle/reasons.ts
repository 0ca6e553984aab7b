import { KIND_FACTS, type SlingKind } from '../slings/kinds';

export const HOLD_REASONS = [
  'criterion',
  'damage_suspected',
  'referred',
  'makers_tag_missing',
  'makers_tag_illegible',
  'overload_or_shock',
  'heat_or_chemical',
  'unauthorised_repair',
  'latch',
  'makers_notice',
  'evaluation_unfit',
  'found',
  'record_in_doubt',
  'identity_unknown',
  'other',
] as const;
export type HoldReason = (typeof HOLD_REASONS)[number];

/** What clears a reason besides the release inspection (product design, section 4). */
export interface Clearing {
  /** False: never cleared at the counter; the sling is evaluated or destroyed (or matched, for an unknown identity). */
  isClearable: boolean;
  needsQualified: boolean;
  needsEvidence: boolean;
  /** What to do, in words for the person who stands before it. */
  how: string;
}

interface ReasonFacts {
  name: string;
  /** Confirmed from the start: only evaluation, destruction or a withdrawal as error leads out. */
  isConfirmed: boolean;
  /** People may choose it on the hold page; the others come from inspections, notices and the system. */
  isChoosable: boolean;
  needsNote: boolean;
  clearing: Clearing;
}

const byInspection: Clearing = {
  isClearable: true,
  needsQualified: false,
  needsEvidence: false,
  how: 'A passing release inspection and a note.',
};
const never = (how: string): Clearing => ({
  isClearable: false,
  needsQualified: false,
  needsEvidence: false,
  how,
});
const evaluateOrDestroy = never('It is not cleared here: send it for evaluation or destroy it.');
const retagged: Clearing = {
  isClearable: true,
  needsQualified: false,
  needsEvidence: true,
  how: 'Evidence that the maker or a qualified person tagged it again, and a passing release inspection.',
};

export const REASON_FACTS = {
  criterion: reason('Rejected on a criterion', { isConfirmed: true, clearing: evaluateOrDestroy }),
  damage_suspected: reason('Damage suspected', { isChoosable: true }),
  referred: reason('Referred to a qualified person', {
    clearing: {
      isClearable: true,
      needsQualified: true,
      needsEvidence: false,
      how: 'A passing release inspection by a qualified inspector, and a note.',
    },
  }),
  makers_tag_missing: reason('Maker’s tag missing', { isChoosable: true, clearing: retagged }),
  makers_tag_illegible: reason('Maker’s tag cannot be read', { isChoosable: true, clearing: retagged }),
  overload_or_shock: reason('Overload or shock', { isChoosable: true }),
  heat_or_chemical: reason('Heat or chemicals', {
    isChoosable: true,
    clearing: {
      isClearable: true,
      needsQualified: true,
      needsEvidence: true,
      how: 'A passing release inspection by a qualified inspector, with evidence. Never for web, round and rope slings.',
    },
  }),
  unauthorised_repair: reason('Unauthorised repair', {
    isConfirmed: true,
    isChoosable: true,
    clearing: evaluateOrDestroy,
  }),
  latch: reason('Hook latch', {
    isChoosable: true,
    clearing: {
      ...byInspection,
      how: 'A note that the latch was replaced with the maker’s part, and a passing release inspection.',
    },
  }),
  makers_notice: reason('Maker’s notice', {
    clearing: never('It is cleared when the maker’s notice is closed for this sling.'),
  }),
  evaluation_unfit: reason('Found unfit by the evaluator', {
    isConfirmed: true,
    clearing: evaluateOrDestroy,
  }),
  found: reason('Found again after it was lost'),
  record_in_doubt: reason('Record in doubt', { isChoosable: true }),
  identity_unknown: reason('Identity unknown', {
    clearing: never('It is never released. Match it to a record, send it or condemn it.'),
  }),
  other: reason('Something else', { isChoosable: true, needsNote: true }),
} as const satisfies Record<HoldReason, ReasonFacts>;

function reason(name: string, facts: Partial<Omit<ReasonFacts, 'name'>> = {}): ReasonFacts {
  return { name, isConfirmed: false, isChoosable: false, needsNote: false, clearing: byInspection, ...facts };
}

/** Reasons that a person may choose when holding a sling, in the order of the tiles. */
export const CHOOSABLE_REASONS = HOLD_REASONS.filter((code) => REASON_FACTS[code].isChoosable);

const withdrawn: Clearing = {
  ...byInspection,
  how: 'Withdrawn as error: a passing release inspection and a note.',
};

/**
 * What clears this reason on this kind of sling.
 * @param confirmed false for a rejection that was withdrawn as error: then the rules of release apply, as to any other
 */
export function clearingOf(
  code: HoldReason,
  kind: SlingKind,
  confirmed: boolean = REASON_FACTS[code].isConfirmed,
): Clearing {
  if (REASON_FACTS[code].isConfirmed && !confirmed) return withdrawn;
  if (code === 'heat_or_chemical' && KIND_FACTS[kind].isSynthetic) return evaluateOrDestroy;
  return REASON_FACTS[code].clearing;
}
