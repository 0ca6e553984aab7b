import type { ReactNode } from 'react';
import type { Finding } from '../../../../shared/domain/inspection/verdict';
import { Button } from '../../../components/ui/Button';
import { Panel } from '../../../components/ui/Panel';
import { answerRestClean, answerRow, rowKey, type InspectionDraft } from '../inspectionDraft';
import type { RowGroup } from '../rowGroups';
import { Question } from './Question';

export interface QuestionGroupProps {
  group: RowGroup;
  draft: InspectionDraft;
  update: (change: (now: InspectionDraft) => InspectionDraft) => void;
  findings: readonly Finding[];
  /** Questions that are missing are marked, once the inspector tried to finish. */
  areMissingMarked: boolean;
  onBusyChange: (key: string, isBusy: boolean) => void;
}

/** The questions about one part. The press at the end sets each of the open ones, visibly, to "not seen". */
export function QuestionGroup(props: QuestionGroupProps): ReactNode {
  const { group, draft, update, findings, areMissingMarked, onBusyChange } = props;
  const keys = group.rows.map(rowKey);
  const open = keys.filter((key) => !draft.rows[key]);
  return (
    <Panel title={group.title} aside={`${keys.length - open.length} of ${keys.length} answered`}>
      {group.rows.map((row) => {
        const key = rowKey(row);
        return (
          <Question
            key={key}
            row={row}
            draft={draft.rows[key]}
            finding={findings.find(
              (each) => rowKey({ id: each.criterionId, fittingId: each.fittingId }) === key,
            )}
            error={areMissingMarked && !draft.rows[key] ? 'Not answered yet.' : undefined}
            onAnswer={(part) => update((now) => answerRow(now, key, part))}
            onBusyChange={(isBusy) => onBusyChange(key, isBusy)}
          />
        );
      })}
      {open.length > 1 && (
        <div className="border-t border-rule pt-3.5 pb-1 md:flex md:justify-end">
          <Button
            tone="quiet"
            className="w-full md:w-80"
            onClick={() => update((now) => answerRestClean(now, open))}
          >
            {open.length === keys.length
              ? `I looked for all ${open.length}: none seen`
              : `I looked for the other ${open.length}: none seen`}
          </Button>
        </div>
      )}
    </Panel>
  );
}
