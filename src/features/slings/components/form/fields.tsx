import type { ReactNode } from 'react';
import { useFormContext, type FieldPath, type UseFormRegisterReturn } from 'react-hook-form';
import { Checkbox } from '../../../../components/ui/Checkbox';
import {
  DateField,
  MeasureField,
  NumberField,
  SelectField,
  TextArea,
  TextField,
} from '../../../../components/ui/inputs';
import { LENGTH_UNIT_OPTIONS, LOAD_UNIT_OPTIONS, SIZE_UNIT_OPTIONS, type Option } from '../../form/options';
import type { SlingFormValues } from '../../form/values';

export type FormPath = FieldPath<SlingFormValues>;
/** Where a figure with its unit stands. */
export type MeasurePath = FormPath extends infer P ? (P extends `${infer At}.figure` ? At : never) : never;

interface Look {
  label: string;
  hint?: ReactNode;
  optional?: boolean;
  className?: string;
}
interface Named extends Look {
  name: FormPath;
}

function useField(name: FormPath): { error: string | undefined; input: UseFormRegisterReturn } {
  const { register, getFieldState, formState } = useFormContext<SlingFormValues>();
  return { error: getFieldState(name, formState).error?.message, input: register(name) };
}

export function FormText({ name, mono, ...look }: Named & { mono?: boolean }): ReactNode {
  const { error, input } = useField(name);
  return <TextField {...look} {...input} {...(mono ? { mono } : {})} error={error} />;
}

export function FormNumber({ name, suffix, ...look }: Named & { suffix?: string }): ReactNode {
  const { error, input } = useField(name);
  return <NumberField {...look} {...input} {...(suffix ? { suffix } : {})} error={error} />;
}

export function FormSelect({
  name,
  options,
  placeholder,
  ...look
}: Named & { options: readonly Option[]; placeholder?: string }): ReactNode {
  const { error, input } = useField(name);
  return (
    <SelectField
      {...look}
      {...input}
      options={options}
      error={error}
      {...(placeholder === undefined ? {} : { placeholder })}
    />
  );
}

export function FormDate({ name, min, max, ...look }: Named & { min?: string; max?: string }): ReactNode {
  const { error, input } = useField(name);
  return <DateField {...look} {...input} min={min} max={max} error={error} />;
}

export function FormTextArea({ name, ...look }: Named): ReactNode {
  const { error, input } = useField(name);
  return <TextArea {...look} {...input} error={error} />;
}

export function FormCheckbox({ name, label, hint }: Pick<Named, 'name' | 'label' | 'hint'>): ReactNode {
  const { error, input } = useField(name);
  return <Checkbox label={label} hint={hint} {...input} error={error} />;
}

const UNIT_OPTIONS = { load: LOAD_UNIT_OPTIONS, length: LENGTH_UNIT_OPTIONS, size: SIZE_UNIT_OPTIONS };

/** A figure in the unit that it was read in; `of` decides which units there are. */
export function FormMeasure({
  at,
  of,
  ...look
}: Look & { at: MeasurePath; of: keyof typeof UNIT_OPTIONS }): ReactNode {
  const { register } = useFormContext<SlingFormValues>();
  const { error, input } = useField(`${at}.figure`);
  return (
    <MeasureField
      {...look}
      units={UNIT_OPTIONS[of]}
      figure={input}
      unit={register(`${at}.unit`)}
      error={error}
    />
  );
}
