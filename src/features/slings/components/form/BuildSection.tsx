import type { ReactNode } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { LIMITS } from '../../../../../shared/limits';
import type { SlingFormValues } from '../../form/values';
import { FormMeasure, FormSelect } from './fields';
import { FieldRow, FormSection } from './FormSection';
import { SpecFields } from './SpecFields';

const LEG_OPTIONS = Array.from({ length: LIMITS.legs.max }, (_, i) => ({
  value: String(i + 1),
  label: i === 0 ? '1 leg' : `${i + 1} legs`,
}));

/** How the sling is built: legs, reach and what its kind asks. */
export function BuildSection(): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const kind = useWatch({ control, name: 'kind' });
  return (
    <FormSection
      title="Build"
      about="Type each figure in the unit that you read it in. Fractions such as 5/8 or 1 1/2 are read too."
    >
      <FieldRow>
        <FormSelect
          name="legs"
          label="Legs"
          options={LEG_OPTIONS}
          hint="An endless sling counts as one leg."
        />
        <FormMeasure
          at="reachMm"
          of="length"
          label="Reach"
          hint="From the upper bearing point to the lower one."
        />
      </FieldRow>
      {kind === '' ? (
        <p className="text-muted">Choose the kind above: its own fields appear here.</p>
      ) : (
        <SpecFields kind={kind} />
      )}
    </FormSection>
  );
}
