import { findCriterion } from './catalogue';
import type { Answer, AnswerType, Criterion, ExaminedFitting, ExaminedSling } from './criterion';
import { appliesToSling, isAnswerableFor, targetWords } from './targets';

/** What is wrong with a request, by the path of the field (agreed API). */
export interface AnswerError {
  path: string;
  message: string;
}
/** An answer with the criterion and fitting that it is about. */
export interface CheckedAnswer {
  answer: Answer;
  criterion: Criterion;
  fitting: ExaminedFitting | null;
}

type Figure = 'seen' | 'count' | 'total' | 'nominal' | 'measured' | 'measured2';
const FIGURES: readonly Figure[] = ['seen', 'count', 'total', 'nominal', 'measured', 'measured2'];

/** Exactly one of `oneOf` is given; `also` may come with it. */
const SHAPES = {
  seen: { oneOf: ['seen'], also: [], words: 'Say whether it was seen: true or false.' },
  count: { oneOf: ['count'], also: ['total'], words: 'Give the count.' },
  measure: { oneOf: ['measured'], also: ['nominal', 'measured2'], words: 'Give the measured figure.' },
  temperature: {
    oneOf: ['seen', 'measured'],
    also: [],
    words: 'Say whether it was exposed to heat, or give the temperature reached, in °C.',
  },
} as const satisfies Record<AnswerType, { oneOf: readonly Figure[]; also: readonly Figure[]; words: string }>;

/** Sorts answers into those that can be judged and what is wrong with the others. */
export function checkAnswers(
  sling: ExaminedSling,
  answers: readonly Answer[],
): { checked: CheckedAnswer[]; errors: AnswerError[] } {
  const checked: CheckedAnswer[] = [];
  const errors: AnswerError[] = [];
  const places = new Set<string>();
  answers.forEach((answer, index) => {
    const result = checkAnswer(sling, answer);
    const place = JSON.stringify([
      answer.criterionId,
      answer.fittingId,
      answer.at?.leg,
      answer.at?.positionMm,
    ]);
    if ('error' in result) {
      const { field, message } = result.error;
      errors.push({ path: `answers.${index}.${field}`, message });
    } else if (places.has(place)) {
      errors.push({
        path: `answers.${index}.criterionId`,
        message: 'This criterion is answered twice for the same place. Keep one answer.',
      });
    } else checked.push(result);
    places.add(place);
  });
  return { checked, errors };
}

type Checked = CheckedAnswer | { error: { field: string; message: string } };
const fail = (field: string, message: string): Checked => ({ error: { field, message } });

function checkAnswer(sling: ExaminedSling, answer: Answer): Checked {
  const criterion = findCriterion(answer.criterionId);
  if (!criterion) return fail('criterionId', 'There is no such criterion.');
  if (!appliesToSling(criterion, sling))
    return fail('criterionId', 'This criterion does not apply to this sling.');
  const shape = checkShape(criterion, answer);
  if (shape) return fail(shape.field, shape.message);
  if (!criterion.perFitting) {
    if (answer.fittingId !== undefined)
      return fail('fittingId', 'This criterion is about the whole sling, not a fitting.');
    return { answer, criterion, fitting: null };
  }
  const words = targetWords(criterion.perFitting);
  if (answer.fittingId === undefined)
    return fail('fittingId', `Say which fitting: this criterion is about ${words}.`);
  const fitting = sling.fittings.find(({ id }) => id === answer.fittingId);
  if (!fitting) return fail('fittingId', 'This sling has no such fitting.');
  if (!isAnswerableFor(criterion.perFitting, fitting)) {
    return fail('fittingId', `This criterion is about ${words}; this fitting is not one.`);
  }
  return { answer, criterion, fitting };
}

function checkShape({ answer: type }: Criterion, answer: Answer): { field: string; message: string } | null {
  const { oneOf, also, words } = SHAPES[type];
  const main: readonly Figure[] = oneOf;
  const allowed: readonly Figure[] = [...oneOf, ...also];
  const given = FIGURES.filter((figure) => answer[figure] !== undefined);
  if (given.filter((figure) => main.includes(figure)).length !== 1)
    return { field: oneOf[0], message: words };
  const stray = given.find((figure) => !allowed.includes(figure));
  return stray ? { field: stray, message: `This criterion does not take “${stray}”. ${words}` } : null;
}
