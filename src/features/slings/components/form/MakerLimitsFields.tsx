import type { ReactNode } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { listCriteria } from '../../../../../shared/domain/inspection/catalogue';
import type { SlingKind } from '../../../../../shared/domain/slings/kinds';
import { Button } from '../../../../components/ui/Button';
import type { SlingFormValues } from '../../form/values';
import { FormNumber, FormSelect, FormText } from './fields';
import { FieldRow } from './FormSection';

/** Limits that the maker sets stricter than the rules; inspections then hold to them. */
export function MakerLimitsFields(): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const kind = useWatch({ control, name: 'kind' });
  const { fields, append, remove } = useFieldArray({ control, name: 'makerLimits' });
  const options = kind === '' ? [] : listMeasured(kind);
  return (
    <div className="flex flex-col gap-4">
      <div>
        <h3 className="font-semibold">
          The maker’s own limits <span className="font-normal text-muted">(may stay empty)</span>
        </h3>
        <p className="text-[0.9375rem] text-muted">
          Where the maker’s instructions are stricter than the rules. Inspections hold to them.
        </p>
      </div>
      {fields.map((field, index) => (
        <div key={field.id} data-group={`Limit ${index + 1}`} className="border border-rule bg-card p-4">
          <div className="-mt-1 mb-2 flex items-center justify-between gap-4">
            <h4 className="font-semibold">Limit {index + 1}</h4>
            <Button tone="plain" onClick={() => remove(index)} aria-label={`Remove limit ${index + 1}`}>
              Remove
            </Button>
          </div>
          <FieldRow columns={3}>
            <FormSelect
              name={`makerLimits.${index}.criterionId`}
              label="What is measured"
              placeholder="Choose"
              options={options}
            />
            <FormNumber name={`makerLimits.${index}.limit`} label="Limit" />
            <FormText
              name={`makerLimits.${index}.source`}
              label="Where it stands"
              hint="Title and page of the maker’s instructions."
            />
          </FieldRow>
        </div>
      ))}
      {options.length > 0 ? (
        <Button
          tone="quiet"
          className="self-start"
          onClick={() => append({ criterionId: '', limit: '', source: '' })}
        >
          Add a limit
        </Button>
      ) : (
        <p className="text-muted">
          {kind === '' ? 'Choose the kind first.' : 'Nothing of this kind is measured against a figure.'}
        </p>
      )}
    </div>
  );
}

/** Criteria answered with a figure; a maker has no other limit on "seen". */
function listMeasured(kind: SlingKind): { value: string; label: string }[] {
  return listCriteria(kind)
    .filter(({ answer }) => answer !== 'seen')
    .map(({ id, name, unit }) => ({ value: id, label: unit ? `${name} (${unit})` : name }));
}
