import { useEffect, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { cx } from '../../lib/cx';

/** Sets the window's title: "Cage · Slingward". */
export function usePageTitle(title: string): void {
  useEffect(() => {
    document.title = title ? `${title} · Slingward` : 'Slingward';
  }, [title]);
}

export interface PageHeaderProps {
  title: string;
  /** Where this page belongs, with its name: shown as a way back. */
  back?: { to: string; label: string };
  /** Site or place, at the right. */
  site?: string;
  /** One line under the title. */
  sub?: ReactNode;
  /** Buttons at the right on wide screens, below on a phone. */
  actions?: ReactNode;
  /** The title is for screen readers only (a plate shows it already). */
  quiet?: boolean;
}

export function PageHeader({ title, back, site, sub, actions, quiet }: PageHeaderProps): ReactNode {
  usePageTitle(title);
  return (
    <header className="mb-4">
      {(back || site) && (
        <div className="-mt-1 flex min-h-12 items-center justify-between gap-4">
          {back ? (
            <Link
              to={back.to}
              className="-ml-2 inline-flex min-h-12 items-center gap-1.5 rounded px-2 font-semibold hover:bg-wash"
            >
              <svg viewBox="0 0 12 20" className="h-4 w-2.5" aria-hidden="true">
                <path d="M10 2 2.5 10 10 18" fill="none" stroke="currentColor" strokeWidth="2.6" />
              </svg>
              {back.label}
            </Link>
          ) : (
            <span />
          )}
          {site && <span className="text-[0.9375rem] font-medium text-muted">{site}</span>}
        </div>
      )}
      <div
        className={cx(
          'flex flex-wrap items-end justify-between gap-x-6 gap-y-3',
          quiet && !actions && 'sr-only',
        )}
      >
        <div className="min-w-0">
          <h1 className={quiet ? 'sr-only' : 'text-[1.75rem] leading-tight font-bold text-balance'}>
            {title}
          </h1>
          {sub && <p className="mt-0.5 text-muted">{sub}</p>}
        </div>
        {actions && <div className="no-print flex flex-wrap gap-3">{actions}</div>}
      </div>
    </header>
  );
}
