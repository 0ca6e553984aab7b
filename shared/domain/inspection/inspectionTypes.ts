import type { AnswerError } from './checkAnswers';
import type { VerdictResult } from './verdict';

export const INSPECTION_TYPES = ['initial', 'frequent', 'periodic', 'release'] as const;
export type InspectionType = (typeof INSPECTION_TYPES)[number];

interface InspectionTypeFacts {
  name: string;
  /** Every criterion that applies to the sling is answered; passed, it sets the next due date. */
  isComplete: boolean;
  /** "The rest is clean" may stand for what was not answered. */
  allowsRestClean: boolean;
}

/** Product design, section 6. */
export const INSPECTION_TYPE_FACTS = {
  initial: { name: 'Initial inspection', isComplete: true, allowsRestClean: false },
  frequent: { name: 'Frequent inspection', isComplete: false, allowsRestClean: true },
  periodic: { name: 'Periodic inspection', isComplete: true, allowsRestClean: false },
  release: { name: 'Release inspection', isComplete: true, allowsRestClean: false },
} as const satisfies Record<InspectionType, InspectionTypeFacts>;

/** Why an inspection cannot be kept as given, empty when it can. A finding needs no more; a pass needs everything looked at. */
export function listInspectionErrors(
  type: InspectionType,
  restClean: boolean,
  result: VerdictResult,
): AnswerError[] {
  const { name, isComplete, allowsRestClean } = INSPECTION_TYPE_FACTS[type];
  const errors = [...result.errors];
  if (restClean && !allowsRestClean) {
    errors.push({ path: 'restClean', message: `${name}: every criterion is answered one by one.` });
  }
  if (isComplete) {
    for (const { criterionId, fittingId } of result.missing) {
      const where = fittingId === undefined ? '' : ` for fitting ${fittingId}`;
      errors.push({ path: 'answers', message: `Not answered yet: ${criterionId}${where}.` });
    }
  } else if (result.verdict === 'pass' && result.missing.length > 0) {
    errors.push({ path: 'restClean', message: 'Answer every criterion, or say that the rest is clean.' });
  }
  return errors;
}
