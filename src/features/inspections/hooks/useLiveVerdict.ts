import { useMemo } from 'react';
import {
  INSPECTION_TYPE_FACTS,
  type InspectionType,
} from '../../../../shared/domain/inspection/inspectionTypes';
import type { RuleSetId } from '../../../../shared/domain/inspection/ruleSets';
import {
  applyStricter,
  computeVerdict,
  type VerdictResult,
} from '../../../../shared/domain/inspection/verdict';
import type { Verdict } from '../../../../shared/domain/inspection/severity';
import type { Sling } from '../../../../shared/schemas/slings';
import { toAnswers, toStricter, type InspectionDraft } from '../inspectionDraft';
import type { CriterionRowView } from '../rowGroups';

export interface LiveVerdict {
  result: VerdictResult;
  /** With the inspector's stricter one, where it goes further. */
  verdict: Verdict;
}

/** The verdict so far, by the same rules as the server's; the server's own is what counts. */
export function useLiveVerdict(
  sling: Sling,
  type: InspectionType,
  rows: readonly CriterionRowView[],
  draft: InspectionDraft,
  ruleSets: readonly RuleSetId[],
): LiveVerdict {
  return useMemo(() => {
    const result = computeVerdict({
      sling,
      answers: toAnswers(draft, rows),
      ruleSets,
      complete: INSPECTION_TYPE_FACTS[type].isComplete,
      restClean: draft.restClean,
    });
    const { verdict } = applyStricter(result.verdict, toStricter(draft, result.verdict));
    return { result, verdict };
  }, [sling, type, rows, draft, ruleSets]);
}
