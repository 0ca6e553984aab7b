import { useState, type ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import { Button, LinkButton } from '../../../../components/ui/Button';
import { EmptyState, ErrorState, Skeleton } from '../../../../components/ui/states';
import { paths } from '../../../../config/paths';
import { cx } from '../../../../lib/cx';
import { formatCount } from '../../../../lib/format';
import { useUser } from '../../../../lib/session';
import { useSlings } from '../../api/findSlings';
import type { RegisterFilters } from '../../hooks/useRegisterFilters';
import { useWideScreen } from '../../hooks/useWideScreen';
import { PickBar } from './PickBar';
import { SlingCards } from './SlingCards';
import { SlingTable } from './SlingTable';

/** The slings that the filters leave, page by page; some may be chosen for a label run. */
export function SlingList({ register }: { register: RegisterFilters }): ReactNode {
  const user = useUser();
  const isWide = useWideScreen();
  const query = useSlings(register.filters);
  const [picked, setPicked] = useState<ReadonlySet<number>>(new Set());
  if (query.isPending) return <ListSkeleton />;
  if (query.isError && !query.data)
    return <ErrorState error={query.error} onRetry={() => void query.refetch()} />;
  const slings = query.data.pages.flatMap(({ items }) => items);
  if (slings.length === 0) return <NothingFound register={register} />;
  const picking = mayCall('POST /api/label-runs', user.roles)
    ? { ids: picked, toggle: (id: number) => setPicked(toggle(picked, id)) }
    : null;
  const List = isWide ? SlingTable : SlingCards;
  return (
    <>
      <div className="mb-2 flex flex-wrap items-center justify-between gap-x-4">
        <p role="status" className="text-muted">
          {query.hasNextPage ? `The first ${slings.length} slings` : formatCount(slings.length, 'sling')}
          {picked.size > 0 && `, ${picked.size} chosen`}
        </p>
        {picking && (
          <Button tone="plain" onClick={() => setPicked(new Set([...picked, ...slings.map(({ id }) => id)]))}>
            Choose all shown
          </Button>
        )}
      </div>
      <div className={cx(query.isPlaceholderData && 'opacity-60')} aria-busy={query.isPlaceholderData}>
        <List slings={slings} picking={picking} />
      </div>
      {query.isFetchNextPageError && (
        <div className="mt-4">
          <ErrorState error={query.error} onRetry={() => void query.fetchNextPage()} />
        </div>
      )}
      {query.hasNextPage && !query.isFetchNextPageError && (
        <Button
          tone="quiet"
          className="mt-4"
          pending={query.isFetchingNextPage}
          pendingText="Loading"
          onClick={() => void query.fetchNextPage()}
        >
          Show more
        </Button>
      )}
      <PickBar ids={picked} onClear={() => setPicked(new Set())} />
    </>
  );
}

function toggle(ids: ReadonlySet<number>, id: number): ReadonlySet<number> {
  const next = new Set(ids);
  if (!next.delete(id)) next.add(id);
  return next;
}

function NothingFound({ register }: { register: RegisterFilters }): ReactNode {
  const user = useUser();
  if (register.activeCount > 0 || register.filters.q) {
    return (
      <EmptyState
        title="No sling fits"
        action={
          <Button tone="quiet" onClick={register.clear}>
            Show all slings
          </Button>
        }
      >
        {register.filters.q
          ? `Nothing with “${register.filters.q}” among what the filters leave.`
          : 'Nothing fits all the filters.'}
      </EmptyState>
    );
  }
  return (
    <EmptyState
      title="No slings on the books yet"
      action={
        mayCall('POST /api/slings', user.roles) && (
          <LinkButton to={paths.newSling}>Register the first sling</LinkButton>
        )
      }
    >
      Every sling of your sites will stand here with its state, its place and when it is due.
    </EmptyState>
  );
}

function ListSkeleton(): ReactNode {
  return (
    <div role="status" className="flex flex-col border-t-2 border-rule">
      <span className="sr-only">Loading</span>
      {Array.from({ length: 8 }, (_, i) => (
        <div key={i} className="flex h-20 items-center gap-6 border-b border-rule lg:h-[4.25rem]">
          <Skeleton className="h-6 w-28" />
          <Skeleton className="h-5 w-24 max-sm:hidden" />
          <Skeleton className="h-5 flex-1" />
          <Skeleton className="h-5 w-28 max-lg:hidden" />
        </div>
      ))}
    </div>
  );
}
