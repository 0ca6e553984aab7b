import type { ComponentProps, ReactNode } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { cx } from '../../lib/cx';

export type ButtonTone = 'primary' | 'quiet' | 'danger' | 'plain' | 'signal';

const BASE =
  'inline-flex min-h-target items-center justify-center gap-2 rounded px-4.5 py-2.5 text-center font-semibold leading-tight no-underline select-none disabled:opacity-60';
const TONES: Record<ButtonTone, string> = {
  primary: 'bg-petrol text-petrol-ink hover:brightness-110 active:brightness-95',
  quiet: 'bg-card text-petrol ring-[1.5px] ring-petrol ring-inset hover:bg-petrol-wash',
  danger: 'bg-signal-red text-white hover:brightness-110 active:brightness-95',
  plain: 'bg-transparent text-petrol underline underline-offset-4 hover:bg-petrol-wash px-3',
  // On a band or a scan answer, whose fills are the same in both themes
  signal: 'bg-white text-[#17212b] hover:bg-white/90',
};

interface LookProps {
  tone?: ButtonTone;
  /** Fills the line: the main action at the thumb. */
  wide?: boolean;
}

export interface ButtonProps extends ComponentProps<'button'>, LookProps {
  /** While the act is under way: says so and takes no second press. */
  pending?: boolean;
  pendingText?: string;
}

export function Button({
  tone = 'primary',
  wide,
  pending = false,
  pendingText = 'Working',
  className,
  children,
  disabled,
  type = 'button',
  ...rest
}: ButtonProps): ReactNode {
  return (
    <button
      type={type}
      className={cx(BASE, TONES[tone], wide && 'w-full', className)}
      disabled={disabled === true || pending}
      aria-busy={pending || undefined}
      {...rest}
    >
      {pending ? (
        <>
          <Spinner /> {pendingText}
        </>
      ) : (
        children
      )}
    </button>
  );
}

export function LinkButton({ tone = 'primary', wide, className, ...rest }: LinkProps & LookProps): ReactNode {
  return <Link className={cx(BASE, TONES[tone], wide && 'w-full', className)} {...rest} />;
}

function Spinner(): ReactNode {
  return (
    <svg viewBox="0 0 24 24" className="size-5 animate-spin" aria-hidden="true">
      <circle cx="12" cy="12" r="9" fill="none" stroke="currentColor" strokeWidth="3" opacity=".3" />
      <path d="M21 12a9 9 0 0 0-9-9" fill="none" stroke="currentColor" strokeWidth="3" />
    </svg>
  );
}
