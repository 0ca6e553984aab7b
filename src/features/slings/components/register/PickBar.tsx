import type { ReactNode } from 'react';
import { LIMITS } from '../../../../../shared/limits';
import { ActionBar } from '../../../../components/ui/ActionBar';
import { Button, LinkButton } from '../../../../components/ui/Button';
import { paths } from '../../../../config/paths';
import { formatCount } from '../../../../lib/format';

/** What is chosen and what can be done with it; stays in sight while choosing. */
export function PickBar({ ids, onClear }: { ids: ReadonlySet<number>; onClear: () => void }): ReactNode {
  if (ids.size === 0) return null;
  const isTooMany = ids.size > LIMITS.labelsPerRun;
  return (
    <div className="lg:sticky lg:bottom-0 lg:z-20 lg:border-t lg:border-rule lg:bg-paper lg:py-3">
      <ActionBar>
        {isTooMany ? (
          <p>{LIMITS.labelsPerRun.toLocaleString('en-GB')} labels are the most for one run.</p>
        ) : (
          <LinkButton to={paths.labelsFor([...ids])}>Print {formatCount(ids.size, 'label')}</LinkButton>
        )}
        <Button tone="quiet" onClick={onClear}>
          Choose none
        </Button>
      </ActionBar>
    </div>
  );
}
