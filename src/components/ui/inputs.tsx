import type { ComponentProps, ReactNode } from 'react';
import { cx } from '../../lib/cx';
import { CONTROL, Field, type FieldLook } from './Field';

type Control<Tag extends 'input' | 'select' | 'textarea'> = Omit<ComponentProps<Tag>, 'className'>;

export interface TextFieldProps extends FieldLook, Control<'input'> {
  /** Tag codes, hashes: mono with slashed zero. */
  mono?: boolean;
}

/** One line of text. Spread `register('name')` into it. */
export function TextField({
  label,
  hint,
  error,
  optional,
  className,
  mono,
  ...input
}: TextFieldProps): ReactNode {
  return (
    <Field {...{ label, hint, error, className }} {...(optional ? { optional } : {})}>
      {(a11y) => (
        <input
          type="text"
          autoComplete="off"
          {...input}
          {...a11y}
          className={cx(CONTROL, 'w-full read-only:bg-wash', mono && 'font-mono')}
        />
      )}
    </Field>
  );
}

/** A figure without a unit to choose; `suffix` names a fixed one. Read it with `parseTypedNumber`. */
export function NumberField({
  label,
  hint,
  error,
  optional,
  className,
  suffix,
  ...input
}: FieldLook & Control<'input'> & { suffix?: string }): ReactNode {
  return (
    <Field {...{ label, hint, error, className }} {...(optional ? { optional } : {})}>
      {(a11y) => (
        <div className="flex items-center gap-2.5">
          <input
            type="text"
            inputMode="decimal"
            autoComplete="off"
            {...input}
            {...a11y}
            className={cx(CONTROL, 'w-full')}
          />
          {suffix && <span className="shrink-0 text-muted">{suffix}</span>}
        </div>
      )}
    </Field>
  );
}

export interface MeasureFieldProps extends FieldLook {
  units: readonly { value: string; label: string }[];
  /** Props of the figure: `register('reach.value')`. */
  figure: Control<'input'>;
  /** Props of the unit: `register('reach.unit')`. */
  unit: Control<'select'>;
}

/** A figure with the unit that it was read in; both are kept as typed. */
export function MeasureField({
  label,
  hint,
  error,
  optional,
  className,
  units,
  figure,
  unit,
}: MeasureFieldProps): ReactNode {
  return (
    <Field {...{ label, hint, error, className }} {...(optional ? { optional } : {})}>
      {(a11y) => (
        <div className="flex">
          <input
            type="text"
            inputMode="decimal"
            autoComplete="off"
            {...figure}
            {...a11y}
            className={cx(CONTROL, 'w-full rounded-r-none')}
          />
          <select
            aria-label={`${label}: unit`}
            {...unit}
            className={cx(CONTROL, '-ml-px shrink-0 rounded-l-none font-medium')}
          >
            {units.map((u) => (
              <option key={u.value} value={u.value}>
                {u.label}
              </option>
            ))}
          </select>
        </div>
      )}
    </Field>
  );
}

export interface SelectFieldProps extends FieldLook, Control<'select'> {
  options: readonly { value: string | number; label: string; disabled?: boolean }[];
  /** First line with an empty value, such as "Choose a maker". */
  placeholder?: string;
}

export function SelectField({
  label,
  hint,
  error,
  optional,
  className,
  options,
  placeholder,
  ...select
}: SelectFieldProps): ReactNode {
  return (
    <Field {...{ label, hint, error, className }} {...(optional ? { optional } : {})}>
      {(a11y) => (
        <select {...select} {...a11y} className={cx(CONTROL, 'w-full')}>
          {placeholder !== undefined && <option value="">{placeholder}</option>}
          {options.map((o) => (
            <option key={o.value} value={o.value} disabled={o.disabled}>
              {o.label}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}

/** A calendar day, `YYYY-MM-DD`. Give `max` for acts: none lies in the future. */
export function DateField({
  label,
  hint,
  error,
  optional,
  className,
  ...input
}: FieldLook & Control<'input'>): ReactNode {
  return (
    <Field {...{ label, hint, error, className }} {...(optional ? { optional } : {})}>
      {(a11y) => <input type="date" {...input} {...a11y} className={cx(CONTROL, 'w-full max-w-60')} />}
    </Field>
  );
}

export function TextArea({
  label,
  hint,
  error,
  optional,
  className,
  rows = 3,
  ...area
}: FieldLook & Control<'textarea'>): ReactNode {
  return (
    <Field {...{ label, hint, error, className }} {...(optional ? { optional } : {})}>
      {(a11y) => <textarea rows={rows} {...area} {...a11y} className={cx(CONTROL, 'w-full')} />}
    </Field>
  );
}
