import type { ReactNode } from 'react';
import { VERDICTS, isWorseVerdict, type Verdict } from '../../../../shared/domain/inspection/severity';
import { LIMITS } from '../../../../shared/limits';
import { TextArea } from '../../../components/ui/inputs';
import { RadioTiles } from '../../../components/ui/Tiles';
import type { InspectionDraft } from '../inspectionDraft';
import { VERDICT_WORDS } from '../verdictWords';

export interface StricterPanelProps {
  computed: Verdict;
  draft: InspectionDraft;
  update: (change: (now: InspectionDraft) => InspectionDraft) => void;
  noteError: string | undefined;
}

/** The inspector may go further than the answers do, never less far. */
export function StricterPanel({ computed, draft, update, noteError }: StricterPanelProps): ReactNode {
  const worse = VERDICTS.filter((verdict) => isWorseVerdict(verdict, computed));
  if (worse.length === 0) return null;
  const chosen = worse.find((verdict) => verdict === draft.stricter) ?? '';
  return (
    <details className="border-t-2 border-ink pt-1" open={chosen !== ''}>
      <summary className="flex min-h-target items-center text-lg font-bold">
        Be stricter than the answers
      </summary>
      <div className="flex flex-col gap-4 pt-1 pb-2">
        <RadioTiles
          legend="Your verdict"
          hideLegend
          columns={3}
          selected={[chosen]}
          options={[
            { value: '', label: `As the answers give it: ${VERDICT_WORDS[computed].word}` },
            ...worse.map((value) => ({
              value,
              label: VERDICT_WORDS[value].word,
              hint: VERDICT_WORDS[value].means,
            })),
          ]}
          input={{
            name: 'stricter',
            onChange: ({ target }) => {
              const stricter = worse.find((verdict) => verdict === target.value) ?? '';
              update((now) => ({ ...now, stricter }));
            },
          }}
        />
        {chosen !== '' && (
          <TextArea
            label="Why you are stricter"
            maxLength={LIMITS.note}
            value={draft.stricterNote}
            onChange={({ target }) => update((now) => ({ ...now, stricterNote: target.value }))}
            error={noteError}
          />
        )}
      </div>
    </details>
  );
}
