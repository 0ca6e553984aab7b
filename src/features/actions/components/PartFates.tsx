import type { ReactNode } from 'react';
import type { UseFormReturn } from 'react-hook-form';
import { Button } from '../../../components/ui/Button';
import { Panel } from '../../../components/ui/Panel';
import { RadioTiles } from '../../../components/ui/Tiles';
import type { DestroyValues } from '../destroyValues';
import type { Part } from '../parts';

const FATES = [
  { value: 'destroyed', label: 'Destroyed' },
  { value: 'salvaged', label: 'Salvaged' },
] as const;

/** What became of each fitting and leg; one press says that nothing was kept. */
export function PartFates({
  parts,
  form,
}: {
  parts: readonly Part[];
  form: UseFormReturn<DestroyValues>;
}): ReactNode {
  if (parts.length === 0) return null;
  const loose = parts.filter(({ isDetachable }) => isDetachable);
  const fixed = parts.filter(({ isDetachable }) => !isDetachable);
  const setAll = (): void => {
    for (const { key } of loose) form.setValue(`fates.${key}`, 'destroyed', { shouldDirty: true });
    form.clearErrors('fates');
  };
  return (
    <Panel title="What became of its parts">
      <div className="flex flex-col gap-4">
        <p className="text-muted">
          A salvaged fitting may be used again only after a proof test with a certificate.
        </p>
        {loose.length > 1 && (
          <Button tone="quiet" className="self-start" onClick={setAll}>
            All {loose.length} were destroyed
          </Button>
        )}
        <div className="grid gap-4 lg:grid-cols-2">
          {loose.map(({ key, name }) => (
            <RadioTiles
              key={key}
              legend={name}
              options={FATES}
              error={form.formState.errors.fates?.[key]?.message}
              input={form.register(`fates.${key}`)}
            />
          ))}
        </div>
        {fixed.length > 0 && (
          <p>
            <b className="font-semibold">Destroyed with the sling, as they can’t be taken off:</b>{' '}
            {fixed.map(({ name }) => name).join('; ')}.
          </p>
        )}
      </div>
    </Panel>
  );
}
