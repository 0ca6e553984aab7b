import { zodResolver } from '@hookform/resolvers/zod';
import type { ReactNode } from 'react';
import { z } from 'zod';
import { text } from '../../../../shared/schemas/common';
import { LIMITS } from '../../../../shared/limits';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { SelectField, TextArea } from '../../../components/ui/inputs';
import { useFormDraft } from '../../../lib/useFormDraft';
import { ACTION_WORDS } from '../actionWords';
import { useAct } from '../api/actOnSling';
import type { ActFormProps } from '../actFormProps';
import { ActProblem } from './ActProblem';

const foundForm = z.object({ locationId: z.string(), note: text(LIMITS.note) });

/** A lost sling turned up: it comes back as held, wherever it lies. */
export function FoundForm({ sling, locations, onDone, onReload }: ActFormProps): ReactNode {
  const act = useAct(sling, 'found');
  const form = useFormDraft(`act.found.${sling.id}`, {
    defaultValues: { locationId: '', note: '' },
    resolver: zodResolver(foundForm),
  });
  const places = locations.filter(({ siteId }) => siteId === sling.siteId);
  const submit = form.handleSubmit(({ locationId, note }) =>
    act.mutate(
      { ...(locationId ? { locationId: Number(locationId) } : {}), ...(note ? { note } : {}) },
      {
        onSuccess: (answer) => {
          form.clearDraft();
          onDone(answer);
        },
      },
    ),
  );
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-4">
      <SelectField
        label="Where it lies now"
        optional
        placeholder="Not in a place of ours yet"
        options={places.map(({ id, name }) => ({ value: id, label: name }))}
        {...form.register('locationId')}
      />
      <TextArea
        label="Where and by whom it was found"
        optional
        error={form.formState.errors.note?.message ?? undefined}
        {...form.register('note')}
      />
      <ActProblem problem={act.error} onReload={onReload} onDismiss={act.reset} />
      <ActionBar>
        <Button type="submit" pending={act.isPending} pendingText={ACTION_WORDS.found.pending}>
          {ACTION_WORDS.found.button}
        </Button>
      </ActionBar>
    </form>
  );
}
