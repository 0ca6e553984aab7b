import type { ReactNode } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { LIMITS } from '../../../../../shared/limits';
import { Button } from '../../../../components/ui/Button';
import { useUnits } from '../../../../lib/session';
import { FITTING_OPTIONS, FITTING_POSITION_NAMES, toOptions } from '../../form/options';
import { findSizeUnit, makeEmptyFitting, toSizeUnit, type SlingFormValues } from '../../form/values';
import { FormCheckbox, FormMeasure, FormSelect } from './fields';
import { FieldRow, FormSection } from './FormSection';

const POSITION_OPTIONS = toOptions(FITTING_POSITION_NAMES);

/** End fittings, one by one; hooks ask for their throat and latch, because inspections measure them. */
export function FittingsSection(): ReactNode {
  const { control, getValues } = useFormContext<SlingFormValues>();
  const { fields, append, remove } = useFieldArray({ control, name: 'fittings' });
  const { length } = useUnits();
  return (
    <FormSection
      title="End fittings"
      about="Each hook, link and shackle by itself: every one is looked at in an inspection. A web or round sling without fittings has none."
    >
      {fields.length > 0 && (
        <ol className="flex flex-col gap-4">
          {fields.map((field, index) => (
            <FittingRow key={field.id} index={index} onRemove={() => remove(index)} />
          ))}
        </ol>
      )}
      {fields.length < LIMITS.fittings ? (
        <div className="flex flex-wrap gap-3">
          <Button
            tone="quiet"
            onClick={() => append(makeEmptyFitting(findSizeUnit(getValues()) ?? toSizeUnit(length)))}
          >
            Add a fitting
          </Button>
          {fields.length > 0 && (
            <Button tone="plain" onClick={() => append(structuredClone(getValues('fittings').slice(-1)))}>
              One more like the last
            </Button>
          )}
        </div>
      ) : (
        <p className="text-muted">{LIMITS.fittings} fittings are the most for one sling.</p>
      )}
    </FormSection>
  );
}

function FittingRow({ index, onRemove }: { index: number; onRemove: () => void }): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const type = useWatch({ control, name: `fittings.${index}.type` });
  const isHook = type === 'hook' || type === 'self_locking_hook';
  return (
    <li data-group={`Fitting ${index + 1}`} className="border border-rule bg-card p-4">
      <div className="-mt-1 mb-2 flex items-center justify-between gap-4">
        <h3 className="font-semibold">Fitting {index + 1}</h3>
        <Button tone="plain" onClick={onRemove} aria-label={`Remove fitting ${index + 1}`}>
          Remove
        </Button>
      </div>
      <FieldRow columns={3}>
        <FormSelect name={`fittings.${index}.type`} label="Type" options={FITTING_OPTIONS} />
        <FormSelect name={`fittings.${index}.position`} label="Where" options={POSITION_OPTIONS} />
        <FormMeasure at={`fittings.${index}.sizeMm`} of="size" label="Size" optional />
        {isHook && (
          <FormMeasure
            at={`fittings.${index}.throatMm`}
            of="size"
            label="Throat opening"
            optional
            hint="As new; an opened hook is found by it."
          />
        )}
      </FieldRow>
      <div className="mt-2 flex flex-wrap gap-x-8">
        {isHook && <FormCheckbox name={`fittings.${index}.hasLatch`} label="Has a latch" />}
        <FormCheckbox name={`fittings.${index}.detachable`} label="Can be taken off" />
      </div>
    </li>
  );
}
