import type { ReactNode } from 'react';
import { LinkButton } from '../../../components/ui/Button';
import { Panel } from '../../../components/ui/Panel';
import { ErrorState, SkeletonLines } from '../../../components/ui/states';
import { paths } from '../../../config/paths';
import { useLastLedgerRows } from '../api/findLedgerRows';
import { LedgerLines, type LedgerLinesProps } from './LedgerLines';

/** As many as fit under a record without hiding it. */
const SHOWN_ROWS = 5;

/** The last rows of a sling's ledger and the way to all of them. */
export function LastLedgerRows({
  slingId,
  ...look
}: { slingId: number } & Pick<LedgerLinesProps, 'timeZone' | 'locationName'>): ReactNode {
  const query = useLastLedgerRows(slingId, SHOWN_ROWS);
  return (
    <Panel title="Ledger">
      {query.isPending && <SkeletonLines lines={5} />}
      {query.isError && !query.data && (
        <ErrorState error={query.error} onRetry={() => void query.refetch()} />
      )}
      {query.data && <LedgerLines rows={query.data.items} {...look} />}
      <LinkButton to={paths.ledger(slingId)} tone="plain" className="no-print mt-2 -ml-3">
        Open the whole ledger page
      </LinkButton>
    </Panel>
  );
}
