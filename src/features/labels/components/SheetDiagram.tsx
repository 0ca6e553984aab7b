import type { ReactNode } from 'react';
import type { LabelStockView } from '../../../../shared/schemas/labels';
import { cx } from '../../../lib/cx';
import { formatCount } from '../../../lib/format';
import { countColumns, countSheets, planFirstSheet, type PlaceUse } from '../sheetShape';

const LOOKS: Record<PlaceUse, string> = {
  used: 'border-rule bg-[repeating-linear-gradient(135deg,var(--rule)_0_3px,transparent_3px_8px)] text-muted',
  now: 'border-petrol bg-petrol text-petrol-ink font-semibold',
  free: 'border-edge bg-card text-ink hover:bg-petrol-wash',
};
const WORDS: Record<PlaceUse, string> = { used: 'used', now: 'printed now', free: 'free' };

/** The first sheet, small: a tap on its first free place says where the printing begins. */
export function SheetDiagram({
  stock,
  startAt,
  labels,
  onStartAt,
}: {
  stock: LabelStockView;
  startAt: number;
  labels: number;
  onStartAt: (place: number) => void;
}): ReactNode {
  const sheets = countSheets(stock.perSheet, startAt, labels);
  return (
    <div className="flex flex-col gap-3">
      <p>
        A part-used sheet goes on where it was left: tap its first free place, then lay it in the printer
        first.
      </p>
      <div
        role="group"
        aria-label="Places on the sheet"
        className="grid w-full max-w-sm gap-1 border border-edge bg-card p-2.5"
        style={{ gridTemplateColumns: `repeat(${countColumns(stock)}, minmax(0, 1fr))` }}
      >
        {planFirstSheet(stock.perSheet, startAt, labels).map((use, i) => (
          <button
            key={i}
            type="button"
            aria-pressed={i + 1 === startAt}
            aria-label={`Place ${i + 1}, ${WORDS[use]}`}
            onClick={() => onStartAt(i + 1)}
            className={cx('min-h-7 rounded-sm border text-[0.875rem] tabular-nums', LOOKS[use])}
            style={{ aspectRatio: `${stock.widthMm} / ${stock.heightMm}` }}
          >
            {i + 1}
          </button>
        ))}
      </div>
      <p className="font-medium">
        {labels > 0
          ? `${formatCount(labels, 'label')} from place ${startAt}, ${formatCount(sheets, 'sheet')}.`
          : `Printing begins at place ${startAt}.`}
      </p>
    </div>
  );
}
