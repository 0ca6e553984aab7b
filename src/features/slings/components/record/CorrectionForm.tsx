import { useState, type ReactNode } from 'react';
import { Controller, type FieldPath } from 'react-hook-form';
import { LIMITS } from '../../../../../shared/limits';
import { correctionRequest } from '../../../../../shared/schemas/corrections';
import type { Sling } from '../../../../../shared/schemas/slings';
import { FilePicker } from '../../../../components/ui/FilePicker';
import {
  MeasureField,
  NumberField,
  SelectField,
  TextArea,
  TextField,
} from '../../../../components/ui/inputs';
import { Notice, ProblemNotice } from '../../../../components/ui/Notice';
import { PhotoPicker } from '../../../../components/ui/PhotoPicker';
import { showToast } from '../../../../components/ui/Toast';
import { toProblem } from '../../../../lib/problem';
import { useUnits } from '../../../../lib/session';
import { useFormDraft } from '../../../../lib/useFormDraft';
import type { useCorrectSling } from '../../api/correctSling';
import { useSites } from '../../../../lib/places';
import {
  buildCorrection,
  makeCorrectionResolver,
  toCorrectionPath,
  toCorrectionValues,
  type CorrectionValues,
} from '../../form/correction';
import { toFormPath } from '../../form/faults';
import {
  LENGTH_UNIT_OPTIONS,
  LOAD_UNIT_OPTIONS,
  MAKERS_TAG_NAMES,
  SERVICE_CLASS_NAMES,
  toOptions,
} from '../../form/options';

const NOTHING_OMITTED: readonly string[] = [];

export interface CorrectionFormProps {
  id: string;
  sling: Sling;
  correct: ReturnType<typeof useCorrectSling>;
  onDone: () => void;
}

export function CorrectionForm({ id, sling, correct, onDone }: CorrectionFormProps): ReactNode {
  const units = useUnits();
  const sites = useSites().data?.items ?? [];
  // Against the record as it was opened: a refetch meanwhile must not turn old figures into changes
  const [before] = useState(() => toCorrectionValues(sling, units));
  const { register, control, handleSubmit, formState, setError, clearDraft } = useFormDraft<CorrectionValues>(
    `slings.correction.${sling.id}.${sling.version}`,
    { defaultValues: before, resolver: makeCorrectionResolver(before, sling.legs) },
    NOTHING_OMITTED,
  );
  const { errors } = formState;
  const loads = errors.ratedLoads;

  const submit = (values: CorrectionValues): void => {
    const parsed = correctionRequest.safeParse(buildCorrection(values, before, sling.legs));
    if (!parsed.success) return;
    correct.mutate(parsed.data, {
      onSuccess: (after) => {
        clearDraft();
        showToast(
          after.state === 'held' && sling.state !== 'held'
            ? 'Corrected. The sling is now held.'
            : 'Corrected.',
        );
        onDone();
      },
      onError: (thrown) => {
        for (const { path, message } of toProblem(thrown).errors) {
          const at = toFormPath(toCorrectionPath(path), sling.kind) as FieldPath<CorrectionValues>;
          setError(at, { type: 'server', message });
        }
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
      {sling.state === 'in_service' && (
        <Notice tone="warn" title="It may be held by this">
          A sling in service is held while its record is in doubt, unless the correction is only stricter.
        </Notice>
      )}
      <p className="text-muted">Overtype what is wrong and leave the rest.</p>
      <TextField label="Number" {...register('number')} error={errors.number?.message} />
      <TextField label="Maker" {...register('maker')} error={errors.maker?.message} />
      <TextField label="Maker’s serial" {...register('makerSerial')} error={errors.makerSerial?.message} />
      <SelectField
        label="Maker’s tag"
        options={toOptions(MAKERS_TAG_NAMES)}
        {...register('makersTag')}
        error={errors.makersTag?.message}
      />
      <MeasureField
        label="Reach"
        units={LENGTH_UNIT_OPTIONS}
        figure={register('reachMm.figure')}
        unit={register('reachMm.unit')}
        error={errors.reachMm?.figure?.message}
      />
      <MeasureField
        label="Rated load, vertical"
        units={LOAD_UNIT_OPTIONS}
        figure={register('ratedLoads.verticalKg.figure')}
        unit={register('ratedLoads.verticalKg.unit')}
        error={loads?.verticalKg?.figure?.message}
      />
      <MeasureField
        label="Rated load, choker"
        optional
        units={LOAD_UNIT_OPTIONS}
        figure={register('ratedLoads.chokerKg.figure')}
        unit={register('ratedLoads.chokerKg.unit')}
        error={loads?.chokerKg?.figure?.message}
      />
      <MeasureField
        label="Rated load, basket"
        optional
        units={LOAD_UNIT_OPTIONS}
        figure={register('ratedLoads.basketKg.figure')}
        unit={register('ratedLoads.basketKg.unit')}
        error={loads?.basketKg?.figure?.message}
      />
      {sling.legs > 1 && (
        <>
          <MeasureField
            label="Rated load, bridle"
            optional
            units={LOAD_UNIT_OPTIONS}
            figure={register('ratedLoads.bridle.kg.figure')}
            unit={register('ratedLoads.bridle.kg.unit')}
            error={loads?.bridle?.kg?.figure?.message}
          />
          <NumberField
            label="Bridle angle from horizontal"
            suffix="°"
            {...register('ratedLoads.bridle.angleDeg')}
            error={loads?.bridle?.angleDeg?.message}
          />
        </>
      )}
      <SelectField
        label="Service class"
        options={toOptions(SERVICE_CLASS_NAMES)}
        {...register('serviceClass')}
        error={errors.serviceClass?.message}
      />
      <SelectField
        label="Site"
        options={sites.map(({ id: siteId, name }) => ({ value: siteId, label: name }))}
        {...register('siteId')}
        error={errors.siteId?.message}
      />
      <TextArea
        label="Why the record was wrong"
        maxLength={LIMITS.note}
        {...register('reason')}
        error={errors.reason?.message}
      />
      <Controller
        control={control}
        name="photoIds"
        render={({ field, fieldState }) => (
          <PhotoPicker
            label="Evidence: photos"
            hint="The maker’s tag, the serial as it stands on the sling."
            value={field.value}
            onChange={field.onChange}
            max={LIMITS.photosPerAct - 1}
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={control}
        name="paperId"
        render={({ field }) => (
          <FilePicker
            label="Evidence: a paper"
            hint="In place of photos, or beside them."
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      <ProblemNotice problem={correct.error} />
    </form>
  );
}
