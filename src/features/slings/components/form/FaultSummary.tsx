import type { ReactNode } from 'react';
import { Notice } from '../../../../components/ui/Notice';
import { formatCount } from '../../../../lib/format';
import type { LocatedFault } from './locateFault';

/** What is still wrong, each line leading to its field. */
export function FaultSummary({
  faults,
  onGoTo,
}: {
  faults: readonly LocatedFault[];
  onGoTo: (path: string) => void;
}): ReactNode {
  if (faults.length === 0) return null;
  return (
    <Notice tone="error" title={`${formatCount(faults.length, 'thing')} to put right`}>
      <ul>
        {faults.map(({ path, label, message }) => (
          <li key={path}>
            <button
              type="button"
              onClick={() => onGoTo(path)}
              className="min-h-8 text-left font-medium underline underline-offset-4 pointer-coarse:min-h-target"
            >
              {label}
            </button>
            : {message}
          </li>
        ))}
      </ul>
    </Notice>
  );
}
