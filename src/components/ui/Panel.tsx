import { useId, type ReactNode } from 'react';
import { cx } from '../../lib/cx';

export interface PanelProps {
  title?: string;
  /** Small things at the right of the title. */
  aside?: ReactNode;
  children: ReactNode;
  className?: string;
  /** On white card (forms), else ruled on the page. */
  card?: boolean;
}

/** A part of a page under its own heading. */
export function Panel({ title, aside, children, className, card }: PanelProps): ReactNode {
  const id = useId();
  return (
    <section
      aria-labelledby={title ? id : undefined}
      className={cx(
        card ? 'border border-rule bg-card p-4 sm:p-5' : 'border-t-2 border-ink pt-2.5',
        className,
      )}
    >
      {title && (
        <div className="mb-2.5 flex flex-wrap items-baseline justify-between gap-x-4">
          <h2 id={id} className="text-lg font-bold">
            {title}
          </h2>
          {aside && <div className="text-[0.9375rem] text-muted">{aside}</div>}
        </div>
      )}
      {children}
    </section>
  );
}

/** Facts as term and value, two columns where there is room. */
export function FactList({ facts }: { facts: readonly { term: string; value: ReactNode }[] }): ReactNode {
  return (
    <dl className="grid grid-cols-1 gap-x-8 sm:grid-cols-2">
      {facts.map(({ term, value }) => (
        <div key={term} className="flex justify-between gap-4 border-b border-rule py-2">
          <dt className="text-muted">{term}</dt>
          <dd className="text-right font-medium break-words">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
