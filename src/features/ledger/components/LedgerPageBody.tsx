import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { EmptyState, ErrorState, SkeletonLines } from '../../../components/ui/states';
import { useLedgerRows } from '../api/findLedgerRows';
import { LedgerLines, type LedgerLinesProps } from './LedgerLines';
import { VerifyPanel } from './VerifyPanel';

/** Everything that ever happened to one sling, newest first. */
export function LedgerPageBody({
  slingId,
  ...look
}: { slingId: number } & Pick<LedgerLinesProps, 'timeZone' | 'locationName'>): ReactNode {
  const query = useLedgerRows(slingId);
  if (query.isPending) return <SkeletonLines lines={12} />;
  if (query.isError && !query.data)
    return <ErrorState error={query.error} onRetry={() => void query.refetch()} />;
  const rows = query.data.pages.flatMap(({ items }) => items);
  if (rows.length === 0) {
    return (
      <EmptyState title="No rows">
        Every act on this sling will stand here, from its registration on.
      </EmptyState>
    );
  }
  return (
    <>
      <VerifyPanel slingId={slingId} />
      <LedgerLines rows={rows} showHashes {...look} />
      {query.isFetchNextPageError && (
        <div className="mt-4">
          <ErrorState error={query.error} onRetry={() => void query.fetchNextPage()} />
        </div>
      )}
      {query.hasNextPage && !query.isFetchNextPageError && (
        <Button
          tone="quiet"
          className="no-print mt-4"
          pending={query.isFetchingNextPage}
          pendingText="Loading"
          onClick={() => void query.fetchNextPage()}
        >
          Show older rows
        </Button>
      )}
    </>
  );
}
