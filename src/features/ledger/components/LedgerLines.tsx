import type { ReactNode } from 'react';
import type { LedgerRow } from '../../../../shared/schemas/ledger';
import { LedgerTable } from '../../../components/sling/LedgerTable';
import { describeRow, nameRow } from '../describeRow';
import { listEvidence } from '../listEvidence';
import { RowHash } from './RowHash';

export interface LedgerLinesProps {
  rows: readonly LedgerRow[];
  timeZone: string | undefined;
  locationName: (id: number) => string | undefined;
  /** The ledger page shows hashes, the record page does not. */
  showHashes?: boolean;
}

/** Ledger rows as lines of the ruled page. */
export function LedgerLines({
  rows,
  timeZone,
  locationName,
  showHashes = false,
}: LedgerLinesProps): ReactNode {
  const lines = rows.map((row) => ({
    key: row.id,
    at: row.at,
    who: row.actor.name,
    what: nameRow(row),
    more: (
      <>
        {describeRow(row, locationName).map((line, i) => (
          <p key={i} className="break-words">
            {line}
          </p>
        ))}
        {showHashes && <RowHash row={row} />}
      </>
    ),
    evidenceFileIds: listEvidence(row.data),
  }));
  return <LedgerTable lines={lines} {...(timeZone ? { timeZone } : {})} />;
}
