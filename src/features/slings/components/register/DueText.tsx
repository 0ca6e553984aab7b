import type { ReactNode } from 'react';
import type { SlingSummary } from '../../../../../shared/schemas/slings';
import { cx } from '../../../../lib/cx';
import { useToday } from '../../hooks/useToday';
import { describeDue } from '../describe';

/** The next due date in words; one that has come stands out. */
export function DueText({ sling }: { sling: Pick<SlingSummary, 'nextDueOn' | 'due' | 'siteId'> }): ReactNode {
  const today = useToday(sling.siteId);
  return (
    <span
      className={cx(
        sling.due === 'overdue' && 'font-semibold text-danger',
        sling.due === 'soon' && 'font-semibold text-warn',
      )}
    >
      {describeDue(sling, today)}
    </span>
  );
}
