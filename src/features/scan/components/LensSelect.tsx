import type { ReactNode } from 'react';
import { SelectField } from '../../../components/ui/inputs';
import type { Lens } from '../reader/labelReader';

/** Phones with several lenses often start with one that can't focus near enough; the choice is remembered. */
export function LensSelect({
  lenses,
  lensId,
  onChoose,
}: {
  lenses: readonly Lens[];
  lensId: string | null;
  onChoose: (id: string) => void;
}): ReactNode {
  return (
    <SelectField
      label="Lens"
      options={lenses.map(({ id, name }) => ({ value: id, label: name }))}
      value={lensId ?? ''}
      onChange={(event) => onChoose(event.target.value)}
      {...(lensId === null ? { placeholder: 'Choose a lens' } : {})}
    />
  );
}
