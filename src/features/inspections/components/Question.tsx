import type { ReactNode } from 'react';
import { FieldError } from '../../../components/ui/Field';
import { rowKey } from '../inspectionDraft';
import { questionId } from '../questionId';
import type { QuestionProps } from '../questionProps';
import { FindingDetails } from './FindingDetails';
import { SeenChoice } from './SeenChoice';

/** One criterion: what to look for, whether it was seen, and the evidence where it was. */
export function Question({ row, draft, finding, error, onAnswer, onBusyChange }: QuestionProps): ReactNode {
  const id = questionId(rowKey(row));
  return (
    <fieldset
      id={id}
      aria-describedby={error ? `${id}-help ${id}-error` : `${id}-help`}
      className="min-w-0 scroll-mt-4 border-t border-rule py-4 first:border-t-0"
    >
      <div className="grid gap-x-8 gap-y-3 md:grid-cols-[1fr_20rem] md:items-center">
        <div>
          <legend className="float-left w-full text-lg leading-snug font-semibold text-pretty">
            {row.question}
          </legend>
          <p id={`${id}-help`} className="clear-both text-[0.9375rem] text-muted">
            {row.help}
          </p>
        </div>
        <div>
          <SeenChoice name={id} choice={draft?.choice} onChoose={(choice) => onAnswer({ choice })} />
          <div className={error ? 'mt-1.5' : ''}>
            <FieldError id={`${id}-error`} message={error} />
          </div>
        </div>
      </div>
      {draft?.choice === 'seen' && (
        <FindingDetails
          row={row}
          draft={draft}
          finding={finding}
          onAnswer={onAnswer}
          onBusyChange={onBusyChange}
        />
      )}
    </fieldset>
  );
}
