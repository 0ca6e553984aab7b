import { useState, type FormEvent, type ReactNode } from 'react';
import {
  CHOOSABLE_REASONS,
  REASON_FACTS,
  type HoldReason,
} from '../../../../shared/domain/lifecycle/reasons';
import { LIMITS } from '../../../../shared/limits';
import type { ActionResponse } from '../../../../shared/schemas/actions';
import type { Sling } from '../../../../shared/schemas/slings';
import { ReasonDrawing } from '../../../components/sling/ReasonDrawing';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { ProblemNotice } from '../../../components/ui/Notice';
import { PhotoPicker } from '../../../components/ui/PhotoPicker';
import { ChoiceTiles } from '../../../components/ui/Tiles';
import { formatCount } from '../../../lib/format';
import { useLiveDraft } from '../../../lib/useLiveDraft';
import { ACTION_WORDS } from '../actionWords';
import { useAct } from '../api/actOnSling';
import { EMPTY_HOLD, holdDraftSchema, isChoosable, needsNote, toggleReason, toHoldBody } from '../holdDraft';

export interface HoldFormProps {
  sling: Sling;
  /** A reason that the page before already asked for. */
  armedReason: HoldReason | null;
  onHeld: (answer: ActionResponse) => void;
}

/** Several reasons, words for one that says nothing by itself, a photo before the hold. */
export function HoldForm({ sling, armedReason, onHeld }: HoldFormProps): ReactNode {
  const act = useAct(sling, 'hold');
  const { values, update, clear } = useLiveDraft(`hold.${sling.id}`, holdDraftSchema, {
    ...EMPTY_HOLD,
    codes: armedReason ? [armedReason] : [],
  });
  const [isPressed, setIsPressed] = useState(false);
  const [isSending, setIsSending] = useState(false);
  const isNoteMissing = needsNote(values) && values.note.trim() === '';
  const hasReason = values.codes.length > 0;

  function hold(event: FormEvent): void {
    event.preventDefault();
    setIsPressed(true);
    if (!hasReason || isNoteMissing) return;
    act.mutate(toHoldBody(values), {
      onSuccess: (answer) => {
        clear();
        onHeld(answer);
      },
    });
  }

  return (
    <form
      onSubmit={hold}
      noValidate
      className="grid gap-5 lg:grid-cols-[minmax(0,1fr)_20rem] lg:items-start lg:gap-8"
    >
      <div className="flex flex-col gap-5">
        <ChoiceTiles
          legend="Why?"
          columns={3}
          hint="Tap one or more, then Hold."
          error={isPressed && !hasReason ? 'Tap at least one reason.' : undefined}
          selected={values.codes}
          options={CHOOSABLE_REASONS.map((code) => ({
            value: code,
            label: REASON_FACTS[code].name,
            drawing: <ReasonDrawing code={code} />,
          }))}
          input={{
            name: 'reasons',
            onChange: ({ target }) => {
              const code = target.value;
              if (isChoosable(code)) update((now) => toggleReason(now, code));
            },
          }}
        />
        {needsNote(values) && (
          <TextField
            label="What is it?"
            maxLength={LIMITS.note}
            value={values.note}
            onChange={({ target }) => update((now) => ({ ...now, note: target.value }))}
            error={isPressed && isNoteMissing ? 'Say what it is.' : undefined}
          />
        )}
      </div>
      <div className="contents lg:flex lg:flex-col lg:gap-5">
        <PhotoPicker
          label="Photo"
          hint="You may leave it out, or add it after the hold."
          value={values.photoIds}
          onChange={(photoIds) => update((now) => ({ ...now, photoIds }))}
          onBusyChange={setIsSending}
        />
        <ProblemNotice problem={act.error} />
        {act.error && (
          <p className="font-medium">
            The hold is not recorded yet. Keep the sling out of use; what you chose is kept here.
          </p>
        )}
        <ActionBar>
          <Button
            type="submit"
            tone="danger"
            className="min-h-16 text-xl lg:w-full"
            pending={act.isPending}
            pendingText={ACTION_WORDS.hold.pending}
          >
            {values.codes.length > 1 ? `Hold it: ${formatCount(values.codes.length, 'reason')}` : 'Hold it'}
          </Button>
          {isSending && (
            <p role="status" className="self-center text-[0.9375rem] text-muted">
              A photo is still being sent. You may hold without it and add it after.
            </p>
          )}
        </ActionBar>
      </div>
    </form>
  );
}
