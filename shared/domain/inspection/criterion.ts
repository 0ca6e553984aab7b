import type { HoldReason } from '../lifecycle/reasons';
import type { SlingKind } from '../slings/kinds';
import type { Fitting, KindAndSpec } from '../slings/spec';
import type { RuleSetId } from './ruleSets';

export const CRITERION_PARTS = ['body', 'fitting', 'hook', 'master_link', 'makers_tag', 'any'] as const;
export type CriterionPart = (typeof CRITERION_PARTS)[number];

export const ANSWER_TYPES = ['seen', 'count', 'measure', 'temperature'] as const;
export type AnswerType = (typeof ANSWER_TYPES)[number];

export const OUTCOMES = ['note', 'refer', 'reject'] as const;
export type Outcome = (typeof OUTCOMES)[number];
/** What one rule set says on one answer. */
export type Speech = Outcome | 'pass' | 'silent';

export const LIMIT_UNITS = ['mm', 'in', 'mm2', 'deg', 'C', '%', 'wires'] as const;
export type LimitUnit = (typeof LIMIT_UNITS)[number];

/** How far the text of a source was seen (trade-facts, "How to read this file"). */
export const SOURCE_MARKS = ['read', 'read_2', 'from_memory', 'common_practice'] as const;
export type SourceMark = (typeof SOURCE_MARKS)[number];
export const SOURCE_MARK_WORDS = {
  read: 'read',
  read_2: 'read in a restatement',
  from_memory: 'from memory',
  common_practice: 'common practice, no source',
} as const satisfies Record<SourceMark, string>;

export interface Source {
  ruleSet: RuleSetId;
  document: string;
  clause: string;
  mark: SourceMark;
  /** Only for these kinds of sling; absent: for all that the criterion covers. */
  kinds?: readonly SlingKind[];
}

/** Verdicts may be asked for with less than a full record, so only what rules look at is required. */
export type ExaminedFitting = { id: number | string } & Pick<Fitting, 'type'> &
  Partial<Pick<Fitting, 'position' | 'sizeMm' | 'throatMm' | 'hasLatch' | 'detachable'>>;
/** A sling as far as the rules look at it; `legs` is absent where only a kind and spec are judged. */
export type ExaminedSling = KindAndSpec & { fittings: readonly ExaminedFitting[]; legs?: number | undefined };

/** Where a nominal is read from: the spec, or for throat and size the fitting. */
export const NOMINAL_SOURCES = ['chainMm', 'diameterMm', 'wireMm', 'throatMm', 'sizeMm'] as const;
export type NominalSource = (typeof NOMINAL_SOURCES)[number];

/** What is compared with a limit; `nominal` figures need the nominal, `share_percent` the total. */
export type Quantity =
  'measured' | 'count' | 'share_percent' | 'percent_of_nominal' | 'gain' | 'gain_percent' | 'loss_percent';

interface LimitBase {
  ruleSet: RuleSetId;
  edition: string;
  outcome: Outcome;
  /** Silent for other kinds, and where `when` says no. */
  kinds?: readonly SlingKind[];
  when?: (sling: ExaminedSling, fitting: ExaminedFitting | null) => boolean;
}
/** Speaks when the thing looked for is seen. */
export interface SeenLimit extends LimitBase {
  op: 'seen';
}
/** Boundary words decide: "more than 10 %" is over, "25 %" is at_least, "less than the table" is under. */
export interface BoundLimit extends LimitBase {
  op: 'over' | 'at_least' | 'under';
  of: Quantity;
  unit: LimitUnit;
  /** One figure, or a table by nominal size in mm; a size that the table lacks is silence. */
  bound: { value: number } | { table: readonly { sizeMm: number; value: number }[]; sizeFrom: NominalSource };
}
export type Limit = SeenLimit | BoundLimit;

/** Which fittings a criterion is asked of. */
export const FITTING_TARGETS = ['fitting', 'hook', 'latched_hook', 'shackle'] as const;
export type FittingTarget = (typeof FITTING_TARGETS)[number];

/** The reasons that a finding can hold a sling with. */
export type FindingHoldReason = Extract<
  HoldReason,
  'criterion' | 'referred' | 'latch' | 'makers_tag_missing' | 'unauthorised_repair'
>;

export interface Criterion {
  /** `part.name`, unique in the catalogue. */
  id: string;
  kinds: readonly SlingKind[];
  part: CriterionPart;
  /** What was found, as a short phrase for messages and lists. */
  name: string;
  /** Plain words; "yes" or a figure past its limit is the finding. */
  question: string;
  /** One sentence on how and where to look. */
  help: string;
  answer: AnswerType;
  unit?: LimitUnit;
  perFitting?: FittingTarget;
  nominalFrom?: NominalSource;
  /** Narrower than the kind: asked and answerable only where this is true. */
  appliesTo?: (sling: ExaminedSling) => boolean;
  limits: readonly Limit[];
  sources: readonly Source[];
  /** What a reject on it holds the sling with; a refer always holds with `referred`. */
  holdReason: Exclude<FindingHoldReason, 'referred'>;
}

/** An answer as the inspector gives it (agreed API). Lengths in mm, temperatures in °C. */
export interface Answer {
  criterionId: string;
  seen?: boolean | undefined;
  count?: number | undefined;
  total?: number | undefined;
  nominal?: number | undefined;
  measured?: number | undefined;
  /** Second reading at 90° of the same place. */
  measured2?: number | undefined;
  fittingId?: number | string | undefined;
  note?: string | undefined;
  photoIds?: readonly string[] | undefined;
  at?: { leg: number; positionMm: number } | undefined;
}
