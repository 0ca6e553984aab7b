import type { ReactNode } from 'react';
import { useFieldArray, type UseFormReturn } from 'react-hook-form';
import { KIND_FACTS, SLING_KINDS } from '../../../../shared/domain/slings/kinds';
import type { CreateUserRequest } from '../../../../shared/schemas/people';
import { LIMITS } from '../../../../shared/limits';
import { Button } from '../../../components/ui/Button';
import { Checkbox } from '../../../components/ui/Checkbox';
import { DateField, TextField } from '../../../components/ui/inputs';
import { Panel } from '../../../components/ui/Panel';
import { ChoiceTiles } from '../../../components/ui/Tiles';
import { getToday } from '../../../lib/format';
import { emptyToNull } from '../userForm';

type Form = UseFormReturn<CreateUserRequest>;

/** Which kinds this inspector may examine, by whose word, until when. */
export function DesignationFields({ form }: { form: Form }): ReactNode {
  const { fields, append, remove } = useFieldArray({ control: form.control, name: 'designations' });
  return (
    <Panel title="Designations">
      <p className="mb-3 max-w-prose">
        The employer designates inspectors in writing. Without a designation that covers the kind and is in
        date, an inspection can’t accept, release or return that sling. What was once in force stays on
        record.
      </p>
      <div className="flex flex-col gap-6">
        {fields.map((field, i) => (
          <DesignationFieldset key={field.id} form={form} index={i} onRemove={() => remove(i)} />
        ))}
        <Button
          tone="quiet"
          className="self-start"
          onClick={() =>
            append({
              kinds: [...SLING_KINDS],
              designatedBy: '',
              designatedOn: getToday(),
              until: null,
              isQualified: false,
            })
          }
        >
          Add a designation
        </Button>
      </div>
    </Panel>
  );
}

function DesignationFieldset({
  form,
  index,
  onRemove,
}: {
  form: Form;
  index: number;
  onRemove: () => void;
}): ReactNode {
  const { register, watch, setValue, formState } = form;
  const path = `designations.${index}` as const;
  const errors = formState.errors.designations?.[index];
  const kinds = watch(`${path}.kinds`);
  return (
    <fieldset className="border border-rule bg-card p-4">
      <legend className="px-1 font-semibold">Designation {index + 1}</legend>
      <div className="flex flex-col gap-4">
        <ChoiceTiles
          legend="Kinds of sling"
          columns={3}
          options={SLING_KINDS.map((kind) => ({ value: kind, label: KIND_FACTS[kind].name }))}
          error={errors?.kinds?.message}
          selected={kinds}
          input={{
            name: `${path}.kinds`,
            onChange: ({ target }) =>
              setValue(
                `${path}.kinds`,
                SLING_KINDS.filter((kind) => (kind === target.value ? target.checked : kinds.includes(kind))),
                { shouldDirty: true, shouldValidate: formState.isSubmitted },
              ),
          }}
        />
        <TextField
          label="Designated by"
          hint="Name and position, as in the letter."
          maxLength={LIMITS.name}
          error={errors?.designatedBy?.message}
          {...register(`${path}.designatedBy`)}
        />
        <div className="grid gap-4 sm:grid-cols-2">
          <DateField
            label="Designated on"
            max={getToday()}
            error={errors?.designatedOn?.message}
            {...register(`${path}.designatedOn`)}
          />
          <DateField
            label="Until"
            optional
            error={errors?.until?.message}
            {...register(`${path}.until`, { setValueAs: emptyToNull })}
          />
        </div>
        <Checkbox
          label="Qualified person"
          hint="Decides what was referred, and heat or chemicals on chain, wire rope and mesh."
          {...register(`${path}.isQualified`)}
        />
        <Button tone="plain" className="self-start" onClick={onRemove}>
          Withdraw this designation
        </Button>
      </div>
    </fieldset>
  );
}
