import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import type { LabelStockView } from '../../../../shared/schemas/labels';
import { Panel } from '../../../components/ui/Panel';
import { ErrorState, SkeletonLines } from '../../../components/ui/states';
import { RadioTiles } from '../../../components/ui/Tiles';
import { labelStocksQuery } from '../api/getLabelStocks';
import { StockDrawing } from './StockDrawing';

/** Step 2: on what the labels are printed. */
export function StockChooser({
  stockId,
  onChoose,
}: {
  stockId: string | null;
  onChoose: (id: string) => void;
}): ReactNode {
  const { data: stocks, error, isPending, refetch } = useQuery(labelStocksQuery);
  return (
    <Panel title="2. Choose the label stock">
      {isPending && <SkeletonLines lines={4} />}
      {error && <ErrorState error={error} onRetry={() => void refetch()} />}
      {stocks && (
        <RadioTiles
          legend="Label stock"
          hideLegend
          options={stocks.map((stock) => ({
            value: stock.id,
            label: stock.name,
            hint: `Code ${formatMm(stock.qrMm)} mm`,
            drawing: <StockDrawing stock={stock} />,
          }))}
          input={{ name: 'stock', onChange: (event) => onChoose(event.target.value) }}
          selected={stockId ? [stockId] : []}
        />
      )}
    </Panel>
  );
}

const formatMm = (mm: number): string => mm.toLocaleString('en-GB', { maximumFractionDigits: 1 });

/** The kept stock where it is still on offer, else none: a wrong size wastes a roll. */
export const findChosenStock = (
  stocks: readonly LabelStockView[],
  id: string | null,
): LabelStockView | null => stocks.find((stock) => stock.id === id) ?? null;
