import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { z } from 'zod';
import { actionBodies, DEPART_CAUSE_NAMES, DEPART_CAUSES } from '../../../../shared/schemas/actions';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { TextArea } from '../../../components/ui/inputs';
import { RadioTiles } from '../../../components/ui/Tiles';
import { useFormDraft } from '../../../lib/useFormDraft';
import { ACTION_WORDS } from '../actionWords';
import { useAct } from '../api/actOnSling';
import type { ActFormProps } from '../actFormProps';
import { ActProblem } from './ActProblem';

const departForm = z.object({
  cause: z.string().refine(isCause, 'Choose why it leaves.'),
  note: actionBodies.depart.shape.note,
});

function isCause(value: string): value is (typeof DEPART_CAUSES)[number] {
  return DEPART_CAUSES.some((cause) => cause === value);
}

/** The sling leaves the books of this store for good. */
export function DepartForm({ sling, onDone, onReload }: ActFormProps): ReactNode {
  const act = useAct(sling, 'depart');
  const form = useFormDraft(`act.depart.${sling.id}`, {
    defaultValues: { cause: '', note: '' },
    resolver: zodResolver(departForm),
  });
  const { errors } = form.formState;
  const submit = form.handleSubmit(({ cause, note }) => {
    if (!isCause(cause)) return;
    act.mutate(
      { cause, note },
      {
        onSuccess: (answer) => {
          form.clearDraft();
          onDone(answer);
        },
      },
    );
  });
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-5">
      <RadioTiles
        legend="Why it leaves"
        error={errors.cause?.message ?? undefined}
        options={DEPART_CAUSES.map((value) => ({ value, label: DEPART_CAUSE_NAMES[value] }))}
        input={form.register('cause')}
      />
      <TextArea
        label="Where it goes"
        hint="Who takes it over, and the number of the paper that goes with it."
        error={errors.note?.message ?? undefined}
        {...form.register('note')}
      />
      <ActProblem problem={act.error} onReload={onReload} onDismiss={act.reset} />
      <ActionBar>
        <Button type="submit" tone="danger" pending={act.isPending} pendingText={ACTION_WORDS.depart.pending}>
          {ACTION_WORDS.depart.button}
        </Button>
      </ActionBar>
    </form>
  );
}
