import type { ReactNode } from 'react';
import { Controller, useFormContext } from 'react-hook-form';
import { LIMITS } from '../../../../../shared/limits';
import { PhotoPicker } from '../../../../components/ui/PhotoPicker';
import type { SlingFormValues } from '../../form/values';
import { FormDate, FormNumber, FormTextArea } from './fields';
import { FieldRow, FormSection } from './FormSection';
import { MakerLimitsFields } from './MakerLimitsFields';

/** Everything that may stay empty: the maker's limits, cost, notes, photos. */
export function MoreSection({
  today,
  onPhotosBusy,
}: {
  today: string;
  onPhotosBusy: (isBusy: boolean) => void;
}): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  return (
    <FormSection title="Limits, notes, photos" about="All of this may stay empty.">
      <FieldRow>
        <FormDate
          name="discardOn"
          label="Discard date"
          optional
          min={today}
          hint="The maker’s end of life. From that day on it is not used."
        />
        <FormNumber name="cost" label="Cost" optional hint="In the currency of your books." />
      </FieldRow>
      <MakerLimitsFields />
      <FormTextArea name="notes" label="Notes" optional />
      <Controller
        control={control}
        name="photoIds"
        render={({ field, fieldState }) => (
          <PhotoPicker
            label="Photos"
            hint="The whole sling, and its maker’s tag."
            value={field.value}
            onChange={field.onChange}
            onBusyChange={onPhotosBusy}
            max={LIMITS.photosPerAct}
            error={fieldState.error?.message}
          />
        )}
      />
    </FormSection>
  );
}
