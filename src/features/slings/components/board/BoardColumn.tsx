import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../../components/ui/Button';
import { ErrorState, Skeleton } from '../../../../components/ui/states';
import { paths } from '../../../../config/paths';
import { formatAge } from '../../../../lib/format';
import { useSlings } from '../../api/findSlings';
import { toSlingSearch } from '../../api/slingFilters';
import type { BoardSection } from '../../board/sections';
import { BoardCard } from './BoardCard';

/** One stage of quarantine with its slings, the longest waiting first. */
export function BoardColumn({
  section,
  siteId,
}: {
  section: BoardSection;
  siteId: number | undefined;
}): ReactNode {
  const filters = { ...section.filters, siteId };
  const query = useSlings(filters);
  const slings = query.data?.pages.flatMap(({ items }) => items) ?? [];
  const now = new Date();
  const oldest = slings[0];
  return (
    <section
      aria-labelledby={`board-${section.id}`}
      className="min-w-0 xl:border-l xl:border-rule xl:px-3 xl:first:border-l-0 xl:first:pl-0 xl:last:pr-0"
    >
      <h2 id={`board-${section.id}`} className="text-lg leading-tight font-bold">
        {section.title}
      </h2>
      <p className="mb-2 flex min-h-8 items-center text-[0.9375rem] text-muted">
        {query.data && slings.length === 0 && section.empty}
        {oldest && (
          <Link
            to={paths.slings(toSlingSearch(filters))}
            className="inline-flex min-h-target items-center text-petrol underline underline-offset-4"
          >
            {query.hasNextPage ? `More than ${slings.length}` : slings.length}, oldest{' '}
            {formatAge(oldest.stateSince, now)}
          </Link>
        )}
      </p>
      {query.isPending && (
        <div role="status" className="flex flex-col gap-3">
          <span className="sr-only">Loading</span>
          <Skeleton className="h-32" />
          <Skeleton className="h-32" />
        </div>
      )}
      {query.isError && <ErrorState error={query.error} onRetry={() => void query.refetch()} />}
      <ul className="grid gap-3 sm:grid-cols-2 xl:grid-cols-1">
        {slings.map((sling) => (
          <BoardCard key={sling.id} sling={sling} next={section.next(sling)} now={now} />
        ))}
      </ul>
      {query.hasNextPage && (
        <Button
          tone="quiet"
          className="mt-3"
          pending={query.isFetchingNextPage}
          pendingText="Loading"
          onClick={() => void query.fetchNextPage()}
        >
          Show more
        </Button>
      )}
    </section>
  );
}
