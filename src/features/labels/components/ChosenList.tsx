import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { formatCount } from '../../../lib/format';
import type { ChosenSlings } from '../hooks/useChosenSlings';

/** The slings that the run is for, each with a way to take it back. */
export function ChosenList({
  chosen,
  onRemove,
  onClear,
}: {
  chosen: ChosenSlings;
  onRemove: (id: number) => void;
  onClear: () => void;
}): ReactNode {
  const { known, unknownCount, isPending, error } = chosen;
  return (
    <Panel
      title={`Chosen: ${formatCount(known.length + unknownCount, 'sling')}`}
      aside={
        <Button tone="plain" onClick={onClear}>
          Take all back
        </Button>
      }
    >
      <ProblemNotice problem={error} className="mb-3" />
      <ul className="flex max-h-60 flex-wrap gap-2 overflow-y-auto">
        {known.map(({ id, number }) => (
          <li key={id}>
            <button
              type="button"
              onClick={() => onRemove(id)}
              aria-label={`Take back ${number}`}
              className="inline-flex min-h-target items-center gap-2 rounded border border-edge bg-card px-3 font-medium hover:bg-wash"
            >
              {number}
              <svg viewBox="0 0 24 24" className="size-4" aria-hidden="true">
                <path d="M6 6 18 18M18 6 6 18" stroke="currentColor" strokeWidth="2.4" />
              </svg>
            </button>
          </li>
        ))}
        {unknownCount > 0 && (
          <li className="inline-flex min-h-target items-center text-muted">
            {isPending ? 'Loading the rest' : `and ${unknownCount} more`}
          </li>
        )}
      </ul>
    </Panel>
  );
}
