import type { ReactNode } from 'react';
import { LIMITS } from '../../../../../shared/limits';
import { Button, LinkButton } from '../../../../components/ui/Button';
import { paths } from '../../../../config/paths';
import { formatCount } from '../../../../lib/format';

/** What is chosen and what can be done with it; stays in sight while choosing. */
export function PickBar({ ids, onClear }: { ids: ReadonlySet<number>; onClear: () => void }): ReactNode {
  if (ids.size === 0) return null;
  const isTooMany = ids.size > LIMITS.labelsPerRun;
  return (
    <div className="no-print sticky bottom-24 z-20 -mx-4 mt-4 flex flex-wrap items-center gap-3 border-y border-rule bg-paper px-4 py-3 *:flex-1 sm:-mx-6 sm:px-6 lg:bottom-0 lg:mx-0 lg:px-0 lg:*:flex-none">
      {isTooMany ? (
        <p>{LIMITS.labelsPerRun.toLocaleString('en-GB')} labels are the most for one run.</p>
      ) : (
        <LinkButton to={paths.labelsFor([...ids])}>Print {formatCount(ids.size, 'label')}</LinkButton>
      )}
      <Button tone="quiet" onClick={onClear}>
        Choose none
      </Button>
    </div>
  );
}
