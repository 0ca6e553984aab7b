import {
  INSPECTION_TYPE_FACTS,
  type InspectionType,
} from '../../../shared/domain/inspection/inspectionTypes';
import type { VerdictResult } from '../../../shared/domain/inspection/verdict';
import { readCelsius, rowKey, toStricter, type InspectionDraft, type Row } from './inspectionDraft';
import { questionId } from './questionId';

export const FIELD_IDS = {
  inspectedOn: 'inspected-on',
  restClean: 'rest-clean',
  stricter: 'stricter',
} as const;

export interface Faults {
  /** Element of the first fault in the order of the page; null when it can be recorded. */
  first: string | null;
  /** A pass would be said too early: something is neither answered nor said to be clean. */
  areAnswersMissing: boolean;
  /** Each missing answer is a fault of its own (the complete types). */
  areMissingFaults: boolean;
  inspectedOn: string | undefined;
  restClean: string | undefined;
  stricterNote: string | undefined;
}

export interface FaultInput {
  type: InspectionType;
  rows: readonly Row[];
  draft: InspectionDraft;
  result: VerdictResult;
  /** YYYY-MM-DD, both at the site. */
  inspectedOn: string;
  today: string;
}

/** What keeps an inspection from being recorded as it stands. */
export function findFaults({ type, rows, draft, result, inspectedOn, today }: FaultInput): Faults {
  const { isComplete } = INSPECTION_TYPE_FACTS[type];
  const areAnswersMissing = result.missing.length > 0;
  const areMissingFaults = isComplete && areAnswersMissing;
  const badRow = rows.find((row) => {
    const given = draft.rows[rowKey(row)];
    return given ? isUnreadable(row, draft) : areMissingFaults;
  });
  const dateFault = inspectedOn > today ? 'No inspection lies in the future.' : undefined;
  const restClean =
    !isComplete && areAnswersMissing && result.verdict === 'pass'
      ? 'Answer every question, or say that you looked at the rest and saw nothing.'
      : undefined;
  const stricterNote =
    toStricter(draft, result.verdict)?.note === '' ? 'Say why you are stricter.' : undefined;
  const first = dateFault
    ? FIELD_IDS.inspectedOn
    : badRow
      ? questionId(rowKey(badRow))
      : restClean
        ? FIELD_IDS.restClean
        : stricterNote
          ? FIELD_IDS.stricter
          : null;
  return { first, areAnswersMissing, areMissingFaults, inspectedOn: dateFault, restClean, stricterNote };
}

/** A temperature was typed that is none. */
function isUnreadable(row: Row, draft: InspectionDraft): boolean {
  const given = draft.rows[rowKey(row)];
  if (row.answer !== 'temperature' || given?.choice !== 'seen') return false;
  return given.celsius.trim() !== '' && readCelsius(given) === null;
}

/** Scrolls to a fault and puts the focus on its first control. */
export function bringIntoView(elementId: string): void {
  const element = document.getElementById(elementId);
  element?.scrollIntoView({ block: 'center' });
  element?.querySelector<HTMLElement>('input, textarea')?.focus({ preventScroll: true });
}
