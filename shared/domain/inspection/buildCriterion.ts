import type { SlingKind } from '../slings/kinds';
import type { Criterion, Limit, Outcome, Source, SourceMark } from './criterion';
import { RULE_SETS, type RuleSetId } from './ruleSets';

/** One rule set's word on something that is seen, with its source. */
interface SeenRule {
  source: Source;
  outcome: Outcome;
}
interface RuleOptions {
  outcome?: Outcome;
  kinds?: readonly SlingKind[];
}

const rule = (
  ruleSet: RuleSetId,
  document: string,
  clause: string,
  mark: SourceMark,
  { outcome = 'reject', kinds }: RuleOptions,
): SeenRule => ({ source: { ruleSet, document, clause, mark, ...(kinds && { kinds }) }, outcome });

export const osha = (clause: string, mark: SourceMark, options: RuleOptions = {}): SeenRule =>
  rule('osha', '29 CFR 1910.184', clause, mark, options);
export const construction = (clause: string, mark: SourceMark, options: RuleOptions = {}): SeenRule =>
  rule('osha_construction', '29 CFR 1926.251', clause, mark, options);
/** Removal criteria are 9-x.9.5 in later restatements, 9-x.9.4 in the edition of 2010 (trade-facts, section 2). */
export const b309 = (clause: string, mark: SourceMark, options: RuleOptions = {}): SeenRule =>
  rule('asme', 'ASME B30.9', clause, mark, options);
export const b3010 = (clause: string, mark: SourceMark, options: RuleOptions = {}): SeenRule =>
  rule('asme', 'ASME B30.10', clause, mark, options);
export const b3026 = (clause: string, mark: SourceMark, options: RuleOptions = {}): SeenRule =>
  rule('asme', 'ASME B30.26', clause, mark, options);
export const en = (document: string, clause: string, mark: SourceMark, options: RuleOptions = {}): SeenRule =>
  rule('en', document, clause, mark, options);
export const australian = (
  document: string,
  clause: string,
  mark: SourceMark,
  options: RuleOptions = {},
): SeenRule => rule('as', document, clause, mark, options);
export const practice = (what: string, options: RuleOptions = {}): SeenRule =>
  rule('practice', 'trade practice', what, 'common_practice', options);

type SeenDefinition = Omit<Criterion, 'answer' | 'limits' | 'sources' | 'holdReason'> &
  Partial<Pick<Criterion, 'answer' | 'unit' | 'holdReason'>> & { rules: readonly SeenRule[] };

/** A criterion answered seen or not seen, from one line per rule set that speaks on it. */
export function seenCriterion({
  rules,
  answer = 'seen',
  holdReason = 'criterion',
  ...definition
}: SeenDefinition): Criterion {
  const limits = rules.map(({ source: { ruleSet, kinds }, outcome }): Limit => ({
    op: 'seen',
    ruleSet,
    edition: RULE_SETS[ruleSet].edition,
    outcome,
    ...(kinds && { kinds }),
  }));
  return { ...definition, answer, holdReason, limits, sources: rules.map(({ source }) => source) };
}
