import type { SlingKind } from '../slings/kinds';
import { listCriteria } from './catalogue';
import type {
  Answer,
  AnswerType,
  Criterion,
  CriterionPart,
  ExaminedFitting,
  ExaminedSling,
  FittingTarget,
  LimitUnit,
  NominalSource,
  Outcome,
  Source,
  SourceMark,
} from './criterion';
import { findBound, isLimitFor } from './evaluate';
import { findNominal } from './nominal';
import type { RuleSetId } from './ruleSets';
import { appliesToSling, listAskedOf } from './targets';

/** A limit as shown: `value` is absent for what is only seen and for a table without a sling to look it up for. */
export interface RowLimit {
  ruleSet: RuleSetId;
  edition: string;
  op: 'seen' | 'over' | 'at_least' | 'under';
  value?: number;
  unit?: LimitUnit;
  outcome: Outcome;
}
export interface RowSource {
  ruleSet: RuleSetId;
  document: string;
  clause: string;
  mark: SourceMark;
}

/** One question to answer, as the examination shows it (agreed API, GET /api/criteria). */
export interface CriterionRow {
  id: string;
  part: CriterionPart;
  name: string;
  question: string;
  help: string;
  answer: AnswerType;
  unit?: LimitUnit;
  perFitting: FittingTarget | null;
  fittingId?: number | string;
  nominalFrom?: NominalSource;
  nominal?: number;
  limits: RowLimit[];
  sources: RowSource[];
  /** Finds nothing; ready to send. */
  clean: Answer;
}

/** The questions of one sling: what applies to it, one row per fitting where a criterion is asked per fitting. */
export function criteriaFor(sling: ExaminedSling): CriterionRow[] {
  return listCriteria(sling.kind)
    .filter((criterion) => appliesToSling(criterion, sling))
    .flatMap((criterion) =>
      listAskedOf(criterion, sling).map((fitting) => rowFor(criterion, sling, fitting)),
    );
}

/** The whole catalogue of a kind, with no sling at hand: one row per criterion. */
export function criteriaOfKind(kind: SlingKind): CriterionRow[] {
  return listCriteria(kind).map((criterion) => ({
    ...describe(criterion, kind),
    limits: criterion.limits
      .filter(({ kinds }) => kinds?.includes(kind) ?? true)
      .map((limit) => {
        const { ruleSet, edition, op, outcome } = limit;
        if (limit.op === 'seen') return { ruleSet, edition, op, outcome };
        const value = 'value' in limit.bound ? { value: limit.bound.value } : {};
        return { ruleSet, edition, op, ...value, unit: limit.unit, outcome };
      }),
    clean: cleanAnswer(criterion, null, null),
  }));
}

function rowFor(criterion: Criterion, sling: ExaminedSling, fitting: ExaminedFitting | null): CriterionRow {
  const nominal = criterion.nominalFrom ? findNominal(sling, fitting, criterion.nominalFrom) : null;
  return {
    ...describe(criterion, sling.kind),
    part: fitting?.type === 'master_link' ? 'master_link' : criterion.part,
    ...(fitting && { fittingId: fitting.id }),
    ...(nominal !== null && { nominal }),
    limits: criterion.limits
      .filter((limit) => isLimitFor(limit, sling, fitting))
      .flatMap((limit): RowLimit[] => {
        const { ruleSet, edition, op, outcome } = limit;
        if (limit.op === 'seen') return [{ ruleSet, edition, op, outcome }];
        const value = findBound(limit, sling, fitting);
        return value === null ? [] : [{ ruleSet, edition, op, value, unit: limit.unit, outcome }];
      }),
    clean: cleanAnswer(criterion, nominal, fitting),
  };
}

function describe(criterion: Criterion, kind: SlingKind): Omit<CriterionRow, 'limits' | 'clean'> {
  const { id, part, name, question, help, answer, unit, nominalFrom } = criterion;
  return {
    id,
    part,
    name,
    question,
    help,
    answer,
    ...(unit && { unit }),
    perFitting: criterion.perFitting ?? null,
    ...(nominalFrom && { nominalFrom }),
    sources: sourcesFor(criterion.sources, kind),
  };
}

/** Sources that hold for the kind, without the field that says so. */
export function sourcesFor(sources: readonly Source[], kind: SlingKind): RowSource[] {
  return sources
    .filter(({ kinds }) => kinds?.includes(kind) ?? true)
    .map(({ ruleSet, document, clause, mark }) => ({ ruleSet, document, clause, mark }));
}

/** An unworn measure is its nominal; an angle or a gain without one is zero. */
function cleanAnswer(criterion: Criterion, nominal: number | null, fitting: ExaminedFitting | null): Answer {
  const about = { criterionId: criterion.id, ...(fitting && { fittingId: fitting.id }) };
  switch (criterion.answer) {
    case 'seen':
    case 'temperature':
      return { ...about, seen: false };
    case 'count':
      return { ...about, count: 0 };
    case 'measure':
      return nominal === null ? { ...about, measured: 0 } : { ...about, nominal, measured: nominal };
  }
}
