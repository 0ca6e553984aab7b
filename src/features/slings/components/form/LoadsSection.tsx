import type { ReactNode } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import type { SlingFormValues } from '../../form/values';
import { FormMeasure, FormNumber } from './fields';
import { FieldRow, FormSection } from './FormSection';

/** The rated loads of the maker's tag; a bridle's with its angle where more than one leg carries. */
export function LoadsSection(): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const legs = Number(useWatch({ control, name: 'legs' }));
  return (
    <FormSection
      title="Rated loads"
      about="From the maker’s tag, never from a colour. Leave empty what the tag does not give."
    >
      <FieldRow columns={3}>
        <FormMeasure
          at="ratedLoads.verticalKg"
          of="load"
          label={legs > 1 ? 'Vertical, one leg' : 'Vertical'}
        />
        <FormMeasure at="ratedLoads.chokerKg" of="load" label="Choker" optional />
        <FormMeasure at="ratedLoads.basketKg" of="load" label="Basket, legs vertical" optional />
      </FieldRow>
      {legs > 1 && (
        <FieldRow>
          <FormMeasure
            at="ratedLoads.bridle.kg"
            of="load"
            label={`Bridle, ${legs} legs`}
            optional
            hint="All legs carrying, as the tag gives it."
          />
          <FormNumber
            name="ratedLoads.bridle.angleDeg"
            label="At an angle from horizontal of"
            suffix="°"
            hint="Tags that count from the vertical: 90° less their figure."
          />
        </FieldRow>
      )}
    </FormSection>
  );
}
