import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './Field';

export interface CheckboxProps extends Omit<ComponentProps<'input'>, 'type' | 'className'> {
  label: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
}

/** A statement to tick; the whole line is the target. */
export function Checkbox({ label, hint, error, ...input }: CheckboxProps): ReactNode {
  const id = useId();
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <div>
      <label htmlFor={id} className="flex min-h-target items-start gap-3 py-2.5">
        <input
          type="checkbox"
          {...input}
          id={id}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy || undefined}
          className="mt-px size-6 shrink-0 accent-petrol"
        />
        <span>
          {label}
          {hint && (
            <span id={`${id}-hint`} className="block text-[0.9375rem] text-muted">
              {hint}
            </span>
          )}
        </span>
      </label>
      <FieldError id={`${id}-error`} message={error} />
    </div>
  );
}
