import { useMemo, useState, type FormEvent, type ReactNode } from 'react';
import {
  INSPECTION_TYPE_FACTS,
  type InspectionType,
} from '../../../../shared/domain/inspection/inspectionTypes';
import type { RuleSetId } from '../../../../shared/domain/inspection/ruleSets';
import type { CreateInspectionResponse } from '../../../../shared/schemas/inspection';
import type { Sling } from '../../../../shared/schemas/slings';
import { Checkbox } from '../../../components/ui/Checkbox';
import { DateField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { useLiveDraft } from '../../../lib/useLiveDraft';
import { useCreateInspection } from '../api/createInspection';
import { bringIntoView, FIELD_IDS, findFaults } from '../findFaults';
import { useBusyKeys } from '../hooks/useBusyKeys';
import { useLiveVerdict } from '../hooks/useLiveVerdict';
import { EMPTY_INSPECTION, inspectionDraftSchema, rowKey, toAnswers, toStricter } from '../inspectionDraft';
import { groupRows, type CriterionRowView } from '../rowGroups';
import { DesignationNotice } from './DesignationNotice';
import { DraftNotice } from './DraftNotice';
import { QuestionGroup } from './QuestionGroup';
import { StricterPanel } from './StricterPanel';
import { VerdictBar } from './VerdictBar';

export interface InspectFormProps {
  sling: Sling;
  type: InspectionType;
  rows: readonly CriterionRowView[];
  ruleSets: readonly RuleSetId[];
  /** The site's date, YYYY-MM-DD. */
  today: string;
  onDone: (answer: CreateInspectionResponse) => void;
}

/** One examination: kept on this device question by question until it is recorded. */
export function InspectForm({ sling, type, rows, ruleSets, today, onDone }: InspectFormProps): ReactNode {
  const { values, update, clear, wasRestored } = useLiveDraft(
    `inspect.${type}.${sling.id}`,
    inspectionDraftSchema,
    EMPTY_INSPECTION,
  );
  const record = useCreateInspection(sling.id);
  const [isPressed, setIsPressed] = useState(false);
  const { isBusy, setBusy } = useBusyKeys();
  const groups = useMemo(() => groupRows(rows, sling.fittings), [rows, sling.fittings]);
  const { result, verdict } = useLiveVerdict(sling, type, rows, values, ruleSets);
  const { allowsRestClean } = INSPECTION_TYPE_FACTS[type];
  const inspectedOn = values.inspectedOn || today;
  const shown = groups.flatMap((group) => group.rows);
  const faults = findFaults({ type, rows: shown, draft: values, result, inspectedOn, today });

  function finish(event: FormEvent): void {
    event.preventDefault();
    setIsPressed(true);
    if (faults.first) {
      bringIntoView(faults.first);
      return;
    }
    const stricter = toStricter(values, result.verdict);
    record.mutate(
      {
        type,
        answers: toAnswers(values, rows),
        ...(values.inspectedOn ? { inspectedOn: values.inspectedOn } : {}),
        ...(allowsRestClean && values.restClean ? { restClean: true } : {}),
        ...(stricter ? { stricter } : {}),
      },
      {
        onSuccess: (answer) => {
          clear();
          onDone(answer);
        },
      },
    );
  }

  const answered = rows.filter((row) => values.rows[rowKey(row)]).length;
  return (
    <form onSubmit={finish} noValidate className="flex flex-col gap-7">
      <DesignationNotice kind={sling.kind} inspectedOn={inspectedOn} />
      {wasRestored && answered > 0 && (
        <DraftNotice answered={answered} onRestart={() => update(() => EMPTY_INSPECTION)} />
      )}
      <div id={FIELD_IDS.inspectedOn}>
        <DateField
          label="Inspected on"
          max={today}
          value={inspectedOn}
          onChange={({ target }) => update((now) => ({ ...now, inspectedOn: target.value }))}
          error={isPressed ? faults.inspectedOn : undefined}
        />
      </div>
      {groups.map((group) => (
        <QuestionGroup
          key={group.key}
          group={group}
          draft={values}
          update={update}
          findings={result.findings}
          areMissingMarked={isPressed && faults.areMissingFaults}
          onBusyChange={setBusy}
        />
      ))}
      {allowsRestClean && answered < rows.length && (
        <div id={FIELD_IDS.restClean} className="border-t-2 border-ink pt-1">
          <Checkbox
            label={<span className="text-lg font-semibold">I looked at the rest and saw nothing</span>}
            hint={`Stands for the ${rows.length - answered} questions above that have no answer.`}
            checked={values.restClean}
            onChange={({ target }) => update((now) => ({ ...now, restClean: target.checked }))}
            error={isPressed ? faults.restClean : undefined}
          />
        </div>
      )}
      <div id={FIELD_IDS.stricter}>
        <StricterPanel
          computed={result.verdict}
          draft={values}
          update={update}
          noteError={isPressed ? faults.stricterNote : undefined}
        />
      </div>
      <ProblemNotice problem={record.error} />
      <VerdictBar
        verdict={verdict}
        isComplete={!faults.areAnswersMissing}
        answered={answered}
        total={rows.length}
        isPending={record.isPending}
        isSending={isBusy}
      />
    </form>
  );
}
