import type { ReactNode } from 'react';
import { TextArea, NumberField } from '../../../components/ui/inputs';
import { PhotoPicker } from '../../../components/ui/PhotoPicker';
import { LIMITS } from '../../../../shared/limits';
import { cx } from '../../../lib/cx';
import { readCelsius, type RowDraft } from '../inspectionDraft';
import type { QuestionProps } from '../questionProps';
import { VERDICT_TONES } from '../verdictWords';

/** What was seen, in words and pictures, and what the rules make of it. */
export function FindingDetails({
  row,
  draft,
  finding,
  onAnswer,
  onBusyChange,
}: Pick<QuestionProps, 'row' | 'finding' | 'onAnswer' | 'onBusyChange'> & { draft: RowDraft }): ReactNode {
  const isUnreadable = draft.celsius.trim() !== '' && readCelsius(draft) === null;
  return (
    <div className="mt-3 flex flex-col gap-4 border-l-4 border-danger bg-card p-4">
      {finding && (
        <p
          role="status"
          className={cx(
            'border-l-4 px-3 py-2 [&]:text-ink',
            VERDICT_TONES[finding.outcome === 'note' ? 'pass' : finding.outcome],
          )}
        >
          {finding.message}
        </p>
      )}
      {row.answer === 'temperature' && (
        <NumberField
          label="Temperature reached"
          suffix="°C"
          optional
          hint="Leave it empty where nobody knows."
          className="max-w-xs"
          value={draft.celsius}
          onChange={({ target }) => onAnswer({ celsius: target.value })}
          error={isUnreadable ? 'A number of degrees, such as 210.' : undefined}
        />
      )}
      <TextArea
        label="Where and what"
        optional
        rows={2}
        maxLength={LIMITS.note}
        value={draft.note}
        onChange={({ target }) => onAnswer({ note: target.value })}
      />
      <PhotoPicker
        label="Photos of it"
        value={draft.photoIds}
        onChange={(photoIds) => onAnswer({ photoIds })}
        onBusyChange={onBusyChange}
      />
    </div>
  );
}
