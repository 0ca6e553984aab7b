import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Skeleton } from '../../../../components/ui/states';
import { paths } from '../../../../config/paths';
import { cx } from '../../../../lib/cx';
import { useSlingCount } from '../../api/findSlings';
import { toSlingSearch } from '../../api/slingFilters';
import type { Waiting } from '../../home/waiting';

/** How many wait, and what to do: the whole tile leads to the list behind the number. */
export function WaitingTile({ waiting }: { waiting: Waiting }): ReactNode {
  const { data, isError } = useSlingCount(waiting.filters);
  const isNone = data?.count === 0;
  const isUrgent = waiting.isUrgent && data !== undefined && !isNone;
  return (
    <li>
      <Link
        to={paths.slings(toSlingSearch(waiting.filters))}
        className={cx(
          'flex h-full min-h-24 items-center gap-4 border border-l-[6px] bg-card px-4 py-3 hover:bg-wash',
          isUrgent ? 'border-danger' : 'border-rule',
        )}
      >
        <span
          className={cx(
            'min-w-14 text-[2.25rem] leading-none font-bold',
            isNone && 'font-medium text-muted',
            isUrgent && 'text-danger',
          )}
        >
          {data ? (
            `${data.count}${data.isMore ? '+' : ''}`
          ) : isError ? (
            '?'
          ) : (
            <Skeleton className="h-9 w-11" />
          )}
        </span>
        <span className="min-w-0">
          <span className={cx('block font-semibold', isNone && 'font-medium text-muted')}>
            {waiting.title}
          </span>
          <span className="block text-[0.9375rem] text-muted">
            {isError ? 'Could not be counted; open the list' : isNone ? 'None' : waiting.todo}
          </span>
        </span>
      </Link>
    </li>
  );
}
