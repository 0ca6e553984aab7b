import { MM_PER_INCH } from '../units/units';
import type {
  Answer,
  BoundLimit,
  Criterion,
  ExaminedFitting,
  ExaminedSling,
  Limit,
  Speech,
} from './criterion';
import { add, compare, divide, multiply, subtract, toExact, toNumber, type Exact } from './exact';
import { findNominal } from './nominal';
import { RULE_SETS, type RuleSetId } from './ruleSets';
import { isStricterSpeech } from './severity';

/** One rule set's word on one answer; limit and value in `unit` where a figure was compared. */
export interface Spoken {
  speech: Speech;
  edition: string;
  limit: number | null;
  value: number | null;
  unit: string | null;
}

interface Asked {
  criterion: Criterion;
  answer: Answer;
  sling: ExaminedSling;
  fitting: ExaminedFitting | null;
}

/** What the rule set says on the answer: the strictest of its limits that speak, or silence. */
export function evaluateRuleSet(ruleSet: RuleSetId, asked: Asked): Spoken {
  const silence: Spoken = {
    speech: 'silent',
    edition: RULE_SETS[ruleSet].edition,
    limit: null,
    value: null,
    unit: null,
  };
  return asked.criterion.limits
    .filter((limit) => limit.ruleSet === ruleSet)
    .map((limit) => evaluateLimit(limit, asked))
    .reduce(
      (strictest, spoken) => (isStricterSpeech(spoken.speech, strictest.speech) ? spoken : strictest),
      silence,
    );
}

function evaluateLimit(limit: Limit, asked: Asked): Spoken {
  const nothing = { edition: limit.edition, limit: null, value: null, unit: null };
  if (!isLimitFor(limit, asked.sling, asked.fitting)) return { ...nothing, speech: 'silent' };
  if (limit.op === 'seen') {
    const { seen } = asked.answer;
    return { ...nothing, speech: seen === undefined ? 'silent' : seen ? limit.outcome : 'pass' };
  }
  const bound = findBound(limit, asked.sling, asked.fitting);
  const quantity = findQuantity(limit, asked);
  if (bound === null || quantity === null) return { ...nothing, speech: 'silent' };
  return {
    speech: isPast(limit.op, compare(quantity, toExact(bound))) ? limit.outcome : 'pass',
    edition: limit.edition,
    limit: bound,
    value: toNumber(quantity),
    unit: limit.unit,
  };
}

/** Does the limit hold for this kind, spec and fitting? */
export function isLimitFor(limit: Limit, sling: ExaminedSling, fitting: ExaminedFitting | null): boolean {
  return (limit.kinds?.includes(sling.kind) ?? true) && (limit.when?.(sling, fitting) ?? true);
}

/** The figure of a limit for this sling, in the limit's own unit; null for a size that its table lacks. */
export function findBound(
  { bound }: BoundLimit,
  sling: ExaminedSling,
  fitting: ExaminedFitting | null,
): number | null {
  if ('value' in bound) return bound.value;
  const sizeMm = findNominal(sling, fitting, bound.sizeFrom);
  return bound.table.find((row) => row.sizeMm === sizeMm)?.value ?? null;
}

function isPast(op: BoundLimit['op'], order: number): boolean {
  switch (op) {
    case 'over':
      return order > 0;
    case 'at_least':
      return order >= 0;
    case 'under':
      return order < 0;
  }
}

const HUNDRED = toExact(100);

/** The answer's figure in the unit of the limit, exact; null where the answer lacks what it is made of. */
function findQuantity(limit: BoundLimit, { criterion, answer, sling, fitting }: Asked): Exact | null {
  if (limit.of === 'count') return answer.count === undefined ? null : toExact(answer.count);
  if (limit.of === 'share_percent') {
    if (answer.count === undefined || !answer.total) return null;
    return multiply(divide(toExact(answer.count), toExact(answer.total)), HUNDRED);
  }
  const measured = findReading(limit.ruleSet, answer);
  if (measured === null) return null;
  if (limit.of === 'measured') return toUnit(measured, limit.unit);
  const recorded = criterion.nominalFrom ? findNominal(sling, fitting, criterion.nominalFrom) : null;
  const nominal = answer.nominal ?? recorded;
  if (!nominal) return null;
  const gain = subtract(measured, toExact(nominal));
  switch (limit.of) {
    case 'gain':
      return toUnit(gain, limit.unit);
    case 'gain_percent':
      return multiply(divide(gain, toExact(nominal)), HUNDRED);
    case 'loss_percent':
      return multiply(divide(gain, toExact(-nominal)), HUNDRED);
    case 'percent_of_nominal':
      return multiply(divide(measured, toExact(nominal)), HUNDRED);
  }
}

/** Two readings at 90°: the smaller or the mean, as the rule set wants; one reading counts as both. */
function findReading(ruleSet: RuleSetId, { measured, measured2 }: Answer): Exact | null {
  if (measured === undefined) return null;
  const first = toExact(measured);
  const second = toExact(measured2 ?? measured);
  if (RULE_SETS[ruleSet].twoReadings === 'mean') return divide(add(first, second), toExact(2));
  return compare(first, second) <= 0 ? first : second;
}

/** Answers are in mm; a limit in inches is compared in inches. */
function toUnit(value: Exact, unit: BoundLimit['unit']): Exact {
  return unit === 'in' ? divide(value, toExact(MM_PER_INCH)) : value;
}
