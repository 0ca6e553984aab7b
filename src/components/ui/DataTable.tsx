import type { Key, ReactNode } from 'react';
import { cx } from '../../lib/cx';

export interface Column<Row> {
  /** Unique within the table. */
  id: string;
  header: ReactNode;
  cell: (row: Row) => ReactNode;
  /** Figures stand at the right. */
  isFigure?: boolean;
  /** Left out on a phone. */
  isWideOnly?: boolean;
  className?: string;
}

export interface DataTableProps<Row> {
  /** What the table holds; read out, shown only where `showCaption`. */
  caption: string;
  showCaption?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => Key;
  rowClass?: (row: Row) => string | undefined;
}

/** A ruled table. The first column is each row's heading. */
export function DataTable<Row>({
  caption,
  showCaption,
  columns,
  rows,
  rowKey,
  rowClass,
}: DataTableProps<Row>): ReactNode {
  return (
    <div className="overflow-x-auto" tabIndex={-1}>
      <table className="w-full border-collapse border-t-2 border-ink text-left">
        <caption className={cx(showCaption ? 'pb-2 text-left font-bold' : 'sr-only')}>{caption}</caption>
        <thead>
          <tr>
            {columns.map((c) => (
              <th
                key={c.id}
                scope="col"
                className={cx('py-2 pr-4 text-[0.9375rem] font-semibold text-muted', cellClass(c))}
              >
                {c.header}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className={cx('border-t border-rule align-top', rowClass?.(row))}>
              {columns.map((c, i) => {
                const Cell = i === 0 ? 'th' : 'td';
                return (
                  <Cell
                    key={c.id}
                    {...(i === 0 ? { scope: 'row' as const } : {})}
                    className={cx('py-2.5 pr-4', i === 0 ? 'font-semibold' : 'font-normal', cellClass(c))}
                  >
                    {c.cell(row)}
                  </Cell>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function cellClass<Row>(column: Column<Row>): string {
  return cx(column.isFigure && 'text-right', column.isWideOnly && 'max-md:hidden', column.className);
}
