import type { ReactNode } from 'react';
import { cx } from '../../lib/cx';
import { Button } from './Button';
import { ProblemNotice } from './Notice';

/** A grey stand-in of the final size; give it height and width by class. */
export function Skeleton({ className }: { className?: string }): ReactNode {
  return <div aria-hidden="true" className={cx('skeleton rounded', className ?? 'h-5 w-full')} />;
}

/** Several lines in place of text that is still coming; says so to a screen reader. */
export function SkeletonLines({ lines = 4 }: { lines?: number }): ReactNode {
  return (
    <div role="status" className="flex flex-col gap-3">
      <span className="sr-only">Loading</span>
      {Array.from({ length: lines }, (_, i) => (
        <Skeleton key={i} className={cx('h-5', i % 3 === 2 ? 'w-2/3' : 'w-full')} />
      ))}
    </div>
  );
}

/** What this page will show, and the first step towards it. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children?: ReactNode;
  action?: ReactNode;
}): ReactNode {
  return (
    <div className="flex flex-col items-start gap-3 border-y border-rule py-8">
      <svg viewBox="0 0 64 40" className="h-10 w-16 text-edge" aria-hidden="true">
        <rect
          x="1.5"
          y="6"
          width="61"
          height="33"
          rx="6"
          fill="none"
          stroke="currentColor"
          strokeWidth="2"
          strokeDasharray="5 4"
        />
        <circle cx="13" cy="16" r="4" fill="none" stroke="currentColor" strokeWidth="2" />
        <path d="M24 16h28M24 26h18" stroke="currentColor" strokeWidth="2.4" />
      </svg>
      <h2 className="text-lg font-semibold">{title}</h2>
      {children && <div className="max-w-prose text-muted">{children}</div>}
      {action}
    </div>
  );
}

/** In place of what could not be loaded. */
export function ErrorState({ error, onRetry }: { error: unknown; onRetry?: () => void }): ReactNode {
  return (
    <ProblemNotice
      problem={error}
      action={
        onRetry && (
          <Button tone="quiet" onClick={onRetry}>
            Try again
          </Button>
        )
      }
    />
  );
}
