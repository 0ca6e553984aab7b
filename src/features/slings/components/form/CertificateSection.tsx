import type { ReactNode } from 'react';
import { useFormContext, useWatch, Controller } from 'react-hook-form';
import { KIND_FACTS } from '../../../../../shared/domain/slings/kinds';
import { FilePicker } from '../../../../components/ui/FilePicker';
import { BASIS_OPTIONS } from '../../form/options';
import type { SlingFormValues } from '../../form/values';
import { asksForCertificate } from '../../form/asksForCertificate';
import { FormCheckbox, FormDate, FormMeasure, FormSelect, FormText } from './fields';
import { FieldRow, FormSection } from './FormSection';

/** The proof-test certificate or what stands for it; may be put on file later, but before acceptance. */
export function CertificateSection({ today }: { today: string }): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const values = useWatch({ control });
  const isAskedFor = asksForCertificate(values.kind ?? '', values.specs?.['wire-rope']?.splice ?? '');
  return (
    <FormSection
      title="Certificate"
      about={
        isAskedFor
          ? `${values.kind ? KIND_FACTS[values.kind].name : 'This sling'}: it is accepted only with a certificate on file. You may add it now or later.`
          : 'Not asked for with this sling; put it on file where there is one.'
      }
    >
      <FormCheckbox name="hasCertificate" label="The certificate is at hand" />
      {values.hasCertificate && (
        <>
          <FieldRow>
            <FormSelect name="proofCertificate.basis" label="What it certifies" options={BASIS_OPTIONS} />
            <FormText name="proofCertificate.number" label="Certificate number" />
            <FormDate name="proofCertificate.testedOn" label="Date of the test or declaration" max={today} />
            <FormMeasure at="proofCertificate.loadKg" of="load" label="Proof load" optional />
          </FieldRow>
          <Controller
            control={control}
            name="proofCertificate.fileId"
            render={({ field, fieldState }) => (
              <FilePicker
                label="The paper"
                hint="A PDF or a photo of it, up to 10 MB."
                value={field.value}
                onChange={field.onChange}
                error={fieldState.error?.message}
              />
            )}
          />
        </>
      )}
    </FormSection>
  );
}
