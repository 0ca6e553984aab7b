import type { ReactNode } from 'react';
import type { Verdict } from '../../../../shared/domain/inspection/severity';

const SHAPES: Record<Verdict, ReactNode> = {
  pass: <path d="M4.500 12.500 10 18 19.500 6.500" />,
  refer: <path d="M12 3.500V14M12 18.500v1.500" />,
  reject: <path d="M5.500 5.500 18.500 18.500M18.500 5.500 5.500 18.500" />,
};

/** Tick, exclamation or cross in currentColor; always beside its word. */
export function VerdictMark({ verdict, className }: { verdict: Verdict; className?: string }): ReactNode {
  return (
    <svg
      viewBox="0 0 24 24"
      className={className ?? 'size-6'}
      fill="none"
      stroke="currentColor"
      strokeWidth="3.400"
      aria-hidden="true"
    >
      {SHAPES[verdict]}
    </svg>
  );
}
