import type { Finding } from '../../../shared/domain/inspection/verdict';
import type { RowDraft } from './inspectionDraft';
import type { CriterionRowView } from './rowGroups';

export interface QuestionProps {
  row: CriterionRowView;
  draft: RowDraft | undefined;
  /** What the rules say on the answer so far. */
  finding: Finding | undefined;
  /** Set once the inspector tried to finish without it. */
  error: string | undefined;
  onAnswer: (part: Partial<RowDraft>) => void;
  onBusyChange: (isBusy: boolean) => void;
}
