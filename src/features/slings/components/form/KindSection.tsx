import type { ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { KIND_FACTS, SLING_KINDS } from '../../../../../shared/domain/slings/kinds';
import { KindIcon } from '../../../../components/sling/KindIcon';
import { RadioTiles } from '../../../../components/ui/Tiles';
import type { SlingFormValues } from '../../form/values';
import { FormSection } from './FormSection';

const TILES = SLING_KINDS.map((kind) => ({
  value: kind,
  label: KIND_FACTS[kind].name,
  drawing: <KindIcon kind={kind} />,
}));

/** Which of the six kinds; the rest of the form follows it. */
export function KindSection(): ReactNode {
  const { register, formState } = useFormContext<SlingFormValues>();
  return (
    <FormSection
      title="Kind"
      about="The rest of the form follows it. What you typed stays when you change it."
    >
      <RadioTiles
        legend="Kind of sling"
        hideLegend
        columns={3}
        options={TILES}
        input={register('kind')}
        error={formState.errors.kind?.message}
      />
    </FormSection>
  );
}
