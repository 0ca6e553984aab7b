import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { z } from 'zod';
import { requiredText, text } from '../../../../shared/schemas/common';
import { LIMITS } from '../../../../shared/limits';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { TextArea } from '../../../components/ui/inputs';
import { useFormDraft } from '../../../lib/useFormDraft';
import { ACTION_WORDS } from '../actionWords';
import { useAct } from '../api/actOnSling';
import type { ActFormProps } from '../actFormProps';
import { ActProblem } from './ActProblem';

export interface NoteFormProps extends ActFormProps {
  action: 'accept' | 'condemn' | 'report_lost' | 'return_to_service';
  label: string;
  hint?: string;
  isRequired: boolean;
  tone?: 'primary' | 'danger';
}

const requiredNote = z.object({ note: requiredText(LIMITS.note) });
const freeNote = z.object({ note: text(LIMITS.note) });

/** Acts that ask for a note and nothing else. */
export function NoteForm(props: NoteFormProps): ReactNode {
  const { sling, action, label, hint, isRequired, tone = 'primary', onDone, onReload } = props;
  const act = useAct(sling, action);
  const form = useFormDraft(`act.${action}.${sling.id}`, {
    defaultValues: { note: '' },
    resolver: zodResolver(isRequired ? requiredNote : freeNote),
  });
  const { errors } = form.formState;
  const words = ACTION_WORDS[action];

  const submit = form.handleSubmit(({ note }) =>
    act.mutate(note ? { note } : {}, {
      onSuccess: (answer) => {
        form.clearDraft();
        onDone(answer);
      },
    }),
  );

  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-4">
      <TextArea
        label={label}
        hint={hint}
        optional={!isRequired}
        error={errors.note?.message ?? undefined}
        {...form.register('note')}
      />
      <ActProblem problem={act.error} onReload={onReload} onDismiss={act.reset} />
      <ActionBar>
        <Button type="submit" tone={tone} pending={act.isPending} pendingText={words.pending}>
          {words.button}
        </Button>
      </ActionBar>
    </form>
  );
}
