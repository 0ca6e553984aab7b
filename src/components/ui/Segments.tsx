import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { cx } from '../../lib/cx';

export interface Segment {
  to: string;
  label: string;
  isCurrent: boolean;
  count?: number;
}

/** Views of one page as links, so that each has its address. */
export function Segments({ label, segments }: { label: string; segments: readonly Segment[] }): ReactNode {
  return (
    <nav aria-label={label} className="-mx-4 overflow-x-auto px-4 [scrollbar-width:none]">
      <ul className="flex w-max min-w-full gap-1 border-b border-rule">
        {segments.map((s) => (
          <li key={s.to}>
            <Link
              to={s.to}
              replace
              aria-current={s.isCurrent ? 'page' : undefined}
              className={cx(
                'inline-flex min-h-12 items-center gap-2 px-3 whitespace-nowrap',
                s.isCurrent
                  ? 'font-semibold text-petrol shadow-[inset_0_-3px_0_var(--petrol)]'
                  : 'font-medium text-muted hover:text-ink',
              )}
            >
              {s.label}
              {s.count !== undefined && (
                <span className="text-[0.9375rem] font-normal text-muted">{s.count}</span>
              )}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
