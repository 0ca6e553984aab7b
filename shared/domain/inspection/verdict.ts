import { checkAnswers, type AnswerError, type CheckedAnswer } from './checkAnswers';
import type { Answer, ExaminedSling, FindingHoldReason, Outcome, Speech } from './criterion';
import { evaluateRuleSet, type Spoken } from './evaluate';
import { criteriaFor, sourcesFor, type RowSource } from './rows';
import { activeRuleSets, RULE_SET_IDS, RULE_SETS, type RuleSetId } from './ruleSets';
import { isStricterSpeech, isWorseVerdict, verdictOf, type Verdict } from './severity';

/** One answer that is past a limit. `limit` and `value` are figures in `unit`, null for what is only seen. */
export interface Finding {
  criterionId: string;
  fittingId?: number | string;
  outcome: Outcome;
  ruleSet: RuleSetId;
  edition: string;
  limit: number | null;
  value: number | null;
  unit: string | null;
  message: string;
  /** Sources of the rule set that spoke. */
  sources: RowSource[];
  /** What every other rule set says on the same answer. */
  others: { ruleSet: RuleSetId; outcome: Speech }[];
  /** Every rule set that was chosen is silent here, so that another one spoke. */
  isFromOtherSet: boolean;
  /** What it holds the sling with; null for a note. */
  holdReason: FindingHoldReason | null;
}

export interface VerdictInput {
  sling: ExaminedSling;
  answers: readonly Answer[];
  ruleSets: readonly RuleSetId[];
  /** Every criterion that applies must be answered: `restClean` then counts for nothing. */
  complete: boolean;
  restClean: boolean;
}
export interface CriterionRef {
  criterionId: string;
  fittingId?: number | string;
}
export interface VerdictResult {
  verdict: Verdict;
  findings: Finding[];
  ruleSets: { id: RuleSetId; edition: string }[];
  /** Asked of this sling and neither answered nor said to be clean. */
  missing: CriterionRef[];
  /** Measurements that "the rest is clean" stands for without having been taken. */
  notTaken: CriterionRef[];
  /** Answers that could not be judged; the verdict is then of no use. */
  errors: AnswerError[];
}

/** The verdict on a sling's answers: every rule set is asked, the strictest of the chosen ones wins. */
export function computeVerdict(input: VerdictInput): VerdictResult {
  const { sling, answers, complete, restClean } = input;
  const active = activeRuleSets(input.ruleSets);
  const { checked, errors } = checkAnswers(sling, answers);
  const findings = checked.flatMap((answer) => findingFor(answer, sling, active) ?? []);
  const unanswered = listUnanswered(sling, answers);
  const isRestClean = restClean && !complete;
  return {
    verdict: verdictOf(findings.map(({ outcome }) => outcome)),
    findings,
    ruleSets: active.map((id) => ({ id, edition: RULE_SETS[id].edition })),
    missing: isRestClean ? [] : unanswered.map(({ ref }) => ref),
    notTaken: isRestClean ? unanswered.filter(({ isFigure }) => isFigure).map(({ ref }) => ref) : [],
    errors,
  };
}

function listUnanswered(
  sling: ExaminedSling,
  answers: readonly Answer[],
): { ref: CriterionRef; isFigure: boolean }[] {
  const key = (criterionId: string, fittingId?: number | string): string =>
    JSON.stringify([criterionId, fittingId]);
  const answered = new Set(answers.map(({ criterionId, fittingId }) => key(criterionId, fittingId)));
  return criteriaFor(sling)
    .filter(({ id, fittingId }) => !answered.has(key(id, fittingId)))
    .map(({ id, fittingId, answer }) => ({
      ref: { criterionId: id, ...(fittingId !== undefined && { fittingId }) },
      isFigure: answer === 'count' || answer === 'measure',
    }));
}

function findingFor(
  { answer, criterion, fitting }: CheckedAnswer,
  sling: ExaminedSling,
  active: RuleSetId[],
): Finding | null {
  if (answer.seen === false) return null;
  const spoken = new Map(
    RULE_SET_IDS.map((id) => [id, evaluateRuleSet(id, { criterion, answer, sling, fitting })] as const),
  );
  const chosen = strictestOf(active, spoken);
  const isFromOtherSet = chosen === null;
  const speaker = chosen ?? strictestOf(RULE_SET_IDS, spoken) ?? noRuleSpeaks;
  const { speech, edition, limit, value, unit } = speaker.spoken;
  if (speech === 'pass' || speech === 'silent') return null;
  const sources = sourcesFor(criterion.sources, sling.kind).filter(
    ({ ruleSet }) => ruleSet === speaker.ruleSet,
  );
  const figures = value === null || limit === null ? '' : ` ${value} ${unit}, limit ${limit} ${unit}`;
  return {
    criterionId: criterion.id,
    ...(fitting && { fittingId: fitting.id }),
    outcome: speech,
    ruleSet: speaker.ruleSet,
    edition,
    limit,
    value,
    unit,
    message: `${criterion.name}${figures}: ${OUTCOME_WORDS[speech]}. ${saySource(speaker.ruleSet, sources, isFromOtherSet)}`,
    sources,
    others: listOthers(speaker.ruleSet, spoken),
    isFromOtherSet,
    holdReason: speech === 'reject' ? criterion.holdReason : speech === 'refer' ? 'referred' : null,
  };
}

const OUTCOME_WORDS = {
  note: 'keep a note of it',
  refer: 'a qualified person decides',
  reject: 'remove from service',
} as const satisfies Record<Outcome, string>;

type Speaker = { ruleSet: RuleSetId; spoken: Spoken };

/** Not even another set speaks: then a person has to (criteria.md, no silence). */
const noRuleSpeaks: Speaker = {
  ruleSet: 'practice',
  spoken: { speech: 'refer', edition: RULE_SETS.practice.edition, limit: null, value: null, unit: null },
};

/** The strictest of these sets that is not silent; the earlier one where several say the same. */
function strictestOf(ids: readonly RuleSetId[], spoken: ReadonlyMap<RuleSetId, Spoken>): Speaker | null {
  return ids.reduce<Speaker | null>((strictest, ruleSet) => {
    const word = spoken.get(ruleSet);
    if (!word || !isStricterSpeech(word.speech, strictest?.spoken.speech ?? 'silent')) return strictest;
    return { ruleSet, spoken: word };
  }, null);
}

function listOthers(speaker: RuleSetId, spoken: ReadonlyMap<RuleSetId, Spoken>): Finding['others'] {
  return [...spoken]
    .filter(
      ([id, { speech }]) => id !== speaker && !(speech === 'silent' && (id === 'maker' || id === 'practice')),
    )
    .map(([ruleSet, { speech }]) => ({ ruleSet, outcome: speech }));
}

function saySource(ruleSet: RuleSetId, sources: readonly RowSource[], isFromOtherSet: boolean): string {
  if (ruleSet === 'practice') return 'No published rule speaks on it; this is common practice.';
  const clauses = sources.map(({ document, clause }) => `${document} ${clause}`).join('; ');
  const source = `Source: ${clauses || RULE_SETS[ruleSet].document}.`;
  return isFromOtherSet
    ? `The rule sets in use here say nothing on it, so another one counts. ${source}`
    : source;
}

export interface Stricter {
  verdict: Verdict;
  note: string;
}
export interface FinalVerdict {
  verdict: Verdict;
  /** The inspector went further than the rules; nothing in the findings then says why, only the note. */
  isStricter: boolean;
  /** What the stricter verdict holds the sling with, besides what the findings do; null where it adds nothing. */
  holdReason: Extract<FindingHoldReason, 'criterion' | 'referred'> | null;
}

/** The inspector's own verdict counts only where it is stricter than the computed one. */
export function applyStricter(computed: Verdict, stricter: Stricter | undefined): FinalVerdict {
  if (!stricter || !isWorseVerdict(stricter.verdict, computed)) {
    return { verdict: computed, isStricter: false, holdReason: null };
  }
  return {
    verdict: stricter.verdict,
    isStricter: true,
    holdReason: stricter.verdict === 'reject' ? 'criterion' : 'referred',
  };
}
