import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button } from '../../../components/ui/Button';
import { ProblemNotice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { paths } from '../../../config/paths';
import { ApiProblem } from '../../../lib/apiClient';
import { formatCount } from '../../../lib/format';
import { useCreateLabelRun } from '../api/createLabelRun';
import { choosableQuery } from '../api/findChoosable';
import { labelStocksQuery } from '../api/getLabelStocks';
import { useChosenSlings } from '../hooks/useChosenSlings';
import { useLabelChoice } from '../hooks/useLabelChoice';
import { keepLastRun, keepStock, readKeptStock } from '../labelMemory';
import { ChosenList } from './ChosenList';
import { ReprintReasonPanel } from './ReprintReason';
import { SheetDiagram } from './SheetDiagram';
import { SlingChooser } from './SlingChooser';
import { findChosenStock, StockChooser } from './StockChooser';

/** Choose slings, choose stock, make the run; what was chosen stands in the address. */
export function LabelRunForm(): ReactNode {
  const choice = useLabelChoice();
  const { slingIds, reason } = choice;
  const navigate = useNavigate();
  const list = useInfiniteQuery(choosableQuery(choice.view, choice.search));
  const stocks = useQuery(labelStocksQuery).data ?? [];
  const chosen = useChosenSlings(slingIds, list.data?.pages.flatMap((page) => page.items) ?? []);
  const [stockId, setStockId] = useState(readKeptStock);
  const [startAt, setStartAt] = useState(1);
  const create = useCreateLabelRun();

  const stock = findChosenStock(stocks, stockId);
  const labelled = chosen.known.filter(({ tag }) => tag !== null && tag.status !== 'void');
  // The server knows of labels on slings that were not looked at here
  const isReasonAsked = labelled.length > 0 || reason !== null || isReasonMissing(create.error);
  const missing = listMissing({
    count: slingIds.length,
    hasStock: stock !== null,
    needsReason: isReasonAsked && !reason,
  });

  const handleMake = (): void => {
    if (!stock) return;
    keepStock(stock.id);
    create.mutate(
      {
        slingIds: [...slingIds],
        stock: stock.id,
        ...(stock.perSheet > 1 ? { startAt } : {}),
        ...(isReasonAsked && reason ? { reason } : {}),
      },
      {
        onSuccess: (run) => {
          keepLastRun(run.id);
          void navigate(paths.labelRun(run.id));
        },
      },
    );
  };

  return (
    <div className="lg:grid lg:grid-cols-[3fr_2fr] lg:items-start lg:gap-10">
      <SlingChooser choice={choice} />
      <div className="mt-8 flex flex-col gap-8 lg:mt-0">
        {slingIds.length > 0 && (
          <ChosenList
            chosen={chosen}
            onRemove={(id) => choice.setSlingIds(slingIds.filter((other) => other !== id))}
            onClear={() => choice.setSlingIds([])}
          />
        )}
        {isReasonAsked && (
          <ReprintReasonPanel labelled={labelled} reason={reason} onChoose={choice.setReason} />
        )}
        <StockChooser
          stockId={stock?.id ?? null}
          onChoose={(id) => {
            setStockId(id);
            setStartAt(1);
          }}
        />
        {stock && stock.perSheet > 1 && (
          <Panel title="3. Where the sheet begins">
            <SheetDiagram stock={stock} startAt={startAt} labels={slingIds.length} onStartAt={setStartAt} />
          </Panel>
        )}
        <ProblemNotice problem={create.error} />
        <ActionBar>
          {missing ? (
            <p className="py-3 font-medium text-muted">{missing}</p>
          ) : (
            <Button onClick={handleMake} pending={create.isPending} pendingText="Making the labels">
              Make {formatCount(slingIds.length, 'label')}
            </Button>
          )}
        </ActionBar>
      </div>
    </div>
  );
}

function isReasonMissing(error: Error | null): boolean {
  return error instanceof ApiProblem && error.status === 422 && error.errorFor('reason') !== undefined;
}

/** What is still to do before labels can be made, or null. */
function listMissing(done: { count: number; hasStock: boolean; needsReason: boolean }): string | null {
  if (done.count === 0) return 'Choose at least one sling.';
  if (done.needsReason) return 'Choose why it is printed again.';
  return done.hasStock ? null : 'Choose the label stock.';
}
