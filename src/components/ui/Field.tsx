import { useId, type ReactNode } from 'react';
import { cx } from '../../lib/cx';

export interface FieldLook {
  label: string;
  /** What to type and where to find it; stays visible. */
  hint?: ReactNode;
  /** What is wrong and how to put it right. */
  error?: string | undefined;
  /** Says "(may stay empty)" behind the label. */
  optional?: boolean;
  className?: string;
}

export interface FieldA11y {
  id: string;
  'aria-invalid': true | undefined;
  'aria-describedby': string | undefined;
}

/** Label, hint and error around one control; the child gets what ties them together. */
export function Field({
  label,
  hint,
  error,
  optional,
  className,
  children,
}: FieldLook & { children: (a11y: FieldA11y) => ReactNode }): ReactNode {
  const id = useId();
  const describedBy = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <div className={cx('flex flex-col gap-1.5', className)}>
      <label htmlFor={id} className="font-semibold">
        {label}
        {optional && <span className="font-normal text-muted"> (may stay empty)</span>}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="-mt-1 text-[0.9375rem] text-muted">
          {hint}
        </p>
      )}
      {children({
        id,
        'aria-invalid': error ? true : undefined,
        'aria-describedby': describedBy || undefined,
      })}
      <FieldError id={`${id}-error`} message={error} />
    </div>
  );
}

export function FieldError({ id, message }: { id: string; message?: string | undefined }): ReactNode {
  if (!message) return null;
  return (
    <p id={id} className="flex items-start gap-1.5 font-medium text-danger">
      <svg viewBox="0 0 20 20" className="mt-0.5 size-4.5 shrink-0" aria-hidden="true">
        <path d="M10 2 19 18H1Z" fill="currentColor" />
        <path d="M10 8v4.4M10 14.2v1.6" stroke="var(--paper)" strokeWidth="1.8" />
      </svg>
      {message}
    </p>
  );
}

/** The look of every typed control; width is the caller's. */
export const CONTROL =
  'min-h-target min-w-0 rounded border border-edge bg-card px-3.5 py-2.5 text-base text-ink aria-invalid:border-2 aria-invalid:border-danger disabled:opacity-60';
