import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { LabelStockView } from '../../../../shared/schemas/labels';
import { DataTable, type Column } from '../../../components/ui/DataTable';
import { Panel } from '../../../components/ui/Panel';
import { ErrorState, SkeletonLines } from '../../../components/ui/states';
import { labelStocksQuery } from '../api/getLabelStocks';
import { testPageUrl } from '../api/getLabelRun';
import { PaperLink } from './PaperLink';

const COLUMNS: Column<LabelStockView>[] = [
  { id: 'name', header: 'Label stock', cell: (stock) => stock.name },
  { id: 'dpi', header: 'Printer', isFigure: true, isWideOnly: true, cell: (stock) => `${stock.dpi} dpi` },
  {
    id: 'code',
    header: 'Code',
    isFigure: true,
    isWideOnly: true,
    cell: (stock) => `${stock.qrMm.toLocaleString('en-GB', { maximumFractionDigits: 1 })} mm`,
  },
  {
    id: 'page',
    header: <span className="sr-only">Test page</span>,
    className: 'text-right',
    cell: (stock) => (
      <PaperLink tone="quiet" to={testPageUrl(stock.id)}>
        Test page
      </PaperLink>
    ),
  },
];

/** A test page for each stock, and how to read it. */
export function PrinterTest(): ReactNode {
  const { data: stocks, error, isPending, refetch } = useQuery(labelStocksQuery);
  return (
    <div className="grid gap-8 lg:grid-cols-[2fr_3fr]">
      <Panel title="How to read it">
        <ol className="flex list-decimal flex-col gap-2.5 pl-6">
          <li>
            Print it on the stock itself, at actual size (100 %), as dark and as fast as labels are printed.
          </li>
          <li>
            Measure the largest code: its size stands beside it. If they differ, the printer scales: switch
            “fit to page” off and print again.
          </li>
          <li>
            Scan the codes from the largest down, each a hand’s width before the phone that will be used,
            three times running.
          </li>
          <li>
            The smallest one that reads at once three times is the smallest this printer can do. Take a stock
            whose code is that size or, better, larger: dirt and wear take the rest.
          </li>
          <li>
            If none reads, or only the largest: the black runs (print lighter or slower), or the head is dirty
            (clean it as its maker says).
          </li>
        </ol>
        <p className="mt-3 text-muted">
          Flat tags take a code of 25 mm. On ropes and thin sleeves 12.5 to 16 mm read best: a larger one
          wraps out of sight.
        </p>
      </Panel>
      <Panel title="Test pages">
        {isPending && <SkeletonLines lines={6} />}
        {error && <ErrorState error={error} onRetry={() => void refetch()} />}
        {stocks && (
          <DataTable
            caption="Test pages by label stock"
            columns={COLUMNS}
            rows={stocks}
            rowKey={(s) => s.id}
          />
        )}
      </Panel>
    </div>
  );
}
