import { zodResolver } from '@hookform/resolvers/zod';
import { useMemo, useState, type ReactNode } from 'react';
import { Controller } from 'react-hook-form';
import { DESTROY_METHODS } from '../../../../shared/schemas/actions';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { TextField } from '../../../components/ui/inputs';
import { PhotoPicker } from '../../../components/ui/PhotoPicker';
import { RadioTiles } from '../../../components/ui/Tiles';
import { useFormDraft } from '../../../lib/useFormDraft';
import { buildDestroySchema, OTHER_METHOD, type DestroyValues } from '../destroyValues';
import { listParts } from '../parts';
import type { ActFormProps } from '../actFormProps';
import { DestroySummary } from './DestroySummary';
import { PartFates } from './PartFates';

/** What can't be taken back: filled in first, then looked over and signed. */
export function DestroyForm(props: ActFormProps): ReactNode {
  const { sling } = props;
  const parts = useMemo(() => listParts(sling), [sling]);
  const schema = useMemo(() => buildDestroySchema(parts), [parts]);
  const [isLookedOver, setIsLookedOver] = useState(false);
  const [isSending, setIsSending] = useState(false);
  const form = useFormDraft<DestroyValues>(`act.destroy.${sling.id}`, {
    defaultValues: { method: '', otherMethod: '', photoIds: [], fates: {} },
    resolver: zodResolver(schema),
  });
  const { errors } = form.formState;

  if (isLookedOver) {
    return (
      <DestroySummary
        {...props}
        parts={parts}
        values={form.getValues()}
        onBack={() => setIsLookedOver(false)}
        onDone={(answer) => {
          form.clearDraft();
          props.onDone(answer);
        }}
      />
    );
  }
  const submit = form.handleSubmit(() => {
    setIsLookedOver(true);
    window.scrollTo({ top: 0 });
  });
  const method = form.watch('method');
  return (
    <form onSubmit={(event) => void submit(event)} noValidate className="flex flex-col gap-6">
      <RadioTiles
        legend="How was it destroyed?"
        columns={1}
        error={errors.method?.message}
        options={[
          ...DESTROY_METHODS.map((value) => ({ value, label: value })),
          { value: OTHER_METHOD, label: 'Another way' },
        ]}
        input={form.register('method')}
      />
      {method === OTHER_METHOD && (
        <TextField
          label="In which way"
          error={errors.otherMethod?.message}
          {...form.register('otherMethod')}
        />
      )}
      <PartFates parts={parts} form={form} />
      <Controller
        control={form.control}
        name="photoIds"
        render={({ field }) => (
          <PhotoPicker
            label="Photo of the destroyed sling"
            hint="So that anybody can see that it can’t be used again."
            value={field.value}
            onChange={field.onChange}
            onBusyChange={setIsSending}
            error={errors.photoIds?.message}
          />
        )}
      />
      <ActionBar>
        <Button type="submit" pending={isSending} pendingText="The photo is being sent">
          Look it over
        </Button>
      </ActionBar>
    </form>
  );
}
