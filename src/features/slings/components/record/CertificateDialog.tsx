import { useId, type ReactNode } from 'react';
import { Controller, type Resolver } from 'react-hook-form';
import { toNestErrors } from '@hookform/resolvers';
import { certificateInputSchema, type Sling } from '../../../../../shared/schemas/slings';
import { Button } from '../../../../components/ui/Button';
import { Dialog } from '../../../../components/ui/Dialog';
import { FilePicker } from '../../../../components/ui/FilePicker';
import { DateField, MeasureField, SelectField, TextField } from '../../../../components/ui/inputs';
import { ProblemNotice } from '../../../../components/ui/Notice';
import { showToast } from '../../../../components/ui/Toast';
import { useUnits } from '../../../../lib/session';
import { useFormDraft } from '../../../../lib/useFormDraft';
import { useAddCertificate } from '../../api/addCertificate';
import { buildCertificate } from '../../form/buildRequest';
import { toFlatErrors } from '../../form/faults';
import { BASIS_OPTIONS, LOAD_UNIT_OPTIONS } from '../../form/options';
import { makeEmptyCertificate, type CertificateValues } from '../../form/values';
import { useToday } from '../../hooks/useToday';

const NOTHING_OMITTED: readonly string[] = [];

const resolver: Resolver<CertificateValues> = (values, _context, options) => {
  const parsed = certificateInputSchema.safeParse(buildCertificate(values), { reportInput: true });
  return parsed.success
    ? { values, errors: {} }
    : { values: {}, errors: toNestErrors(toFlatErrors(parsed.error.issues), options) };
};

export function CertificateDialog({
  sling,
  isOpen,
  onClose,
}: {
  sling: Sling;
  isOpen: boolean;
  onClose: () => void;
}): ReactNode {
  const id = useId();
  const add = useAddCertificate(sling);
  return (
    <Dialog
      open={isOpen}
      onClose={onClose}
      title="Add a certificate"
      footer={
        <>
          <Button tone="quiet" onClick={onClose}>
            Not now
          </Button>
          <Button type="submit" form={id} pending={add.isPending} pendingText="Saving">
            Put it on file
          </Button>
        </>
      }
    >
      <CertificateForm id={id} sling={sling} add={add} onDone={onClose} />
    </Dialog>
  );
}

function CertificateForm({
  id,
  sling,
  add,
  onDone,
}: {
  id: string;
  sling: Sling;
  add: ReturnType<typeof useAddCertificate>;
  onDone: () => void;
}): ReactNode {
  const units = useUnits();
  const today = useToday(sling.siteId);
  const { register, control, handleSubmit, formState, clearDraft } = useFormDraft<CertificateValues>(
    `slings.certificate.${sling.id}`,
    { defaultValues: makeEmptyCertificate(units.load), resolver },
    NOTHING_OMITTED,
  );
  const { errors } = formState;
  const submit = (values: CertificateValues): void => {
    const parsed = certificateInputSchema.safeParse(buildCertificate(values));
    if (!parsed.success) return;
    add.mutate(parsed.data, {
      onSuccess: () => {
        clearDraft();
        showToast('The certificate is on file.');
        onDone();
      },
    });
  };
  return (
    <form
      id={id}
      noValidate
      className="flex flex-col gap-5"
      onSubmit={(event) => void handleSubmit(submit)(event)}
    >
      <SelectField
        label="What it certifies"
        options={BASIS_OPTIONS}
        {...register('basis')}
        error={errors.basis?.message}
      />
      <TextField label="Certificate number" {...register('number')} error={errors.number?.message} />
      <DateField
        label="Date of the test or declaration"
        max={today}
        {...register('testedOn')}
        error={errors.testedOn?.message}
      />
      <MeasureField
        label="Proof load"
        optional
        units={LOAD_UNIT_OPTIONS}
        figure={register('loadKg.figure')}
        unit={register('loadKg.unit')}
        error={errors.loadKg?.figure?.message}
      />
      <Controller
        control={control}
        name="fileId"
        render={({ field }) => (
          <FilePicker
            label="The paper"
            hint="A PDF or a photo of it, up to 10 MB."
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      <ProblemNotice problem={add.error} />
    </form>
  );
}
