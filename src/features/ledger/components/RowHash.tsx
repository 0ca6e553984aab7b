import type { ReactNode } from 'react';
import type { LedgerRow } from '../../../../shared/schemas/ledger';

const SHORT_CHARS = 8;

/** The row's place in the chain and its hash: short, with the whole of it on demand. */
export function RowHash({ row }: { row: LedgerRow }): ReactNode {
  return (
    <details className="mt-1 print:hidden">
      <summary className="flex min-h-8 w-fit items-center gap-2 text-[0.875rem] text-muted pointer-coarse:min-h-target">
        Row {row.slingSeq}, <code className="font-mono">{row.hash.slice(0, SHORT_CHARS)}</code>
        <span className="underline underline-offset-4">in full</span>
      </summary>
      <dl className="pb-2 text-[0.875rem]">
        <dt className="font-medium">Hash of this row</dt>
        <dd className="font-mono break-all">{row.hash}</dd>
        <dt className="mt-1 font-medium">Hash of the row before</dt>
        <dd className="font-mono break-all">{row.prevHash}</dd>
        <dt className="mt-1 font-medium">What the row keeps</dt>
        <dd>
          <pre className="overflow-x-auto font-mono whitespace-pre-wrap break-all">
            {JSON.stringify(row.data, null, 2)}
          </pre>
        </dd>
      </dl>
    </details>
  );
}
