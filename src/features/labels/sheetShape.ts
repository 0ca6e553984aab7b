import type { LabelStockView } from '../../../shared/schemas/labels';

/** US Letter is the wider of the two papers. */
const WIDEST_PAPER_MM = 215.9;

/** Labels side by side on a sheet: the most that the paper holds and that divides the sheet evenly. */
export function countColumns({ perSheet, widthMm }: Pick<LabelStockView, 'perSheet' | 'widthMm'>): number {
  for (let columns = Math.floor(WIDEST_PAPER_MM / widthMm); columns > 1; columns--) {
    if (perSheet % columns === 0) return columns;
  }
  return 1;
}

export type PlaceUse = 'used' | 'now' | 'free';

/** What becomes of each place of the first sheet: used before, printed on now, left for later. */
export function planFirstSheet(perSheet: number, startAt: number, labels: number): PlaceUse[] {
  return Array.from({ length: perSheet }, (_, i) => {
    if (i + 1 < startAt) return 'used';
    return i + 1 < startAt + labels ? 'now' : 'free';
  });
}

/** Sheets that a run takes, the part-used first one among them. */
export const countSheets = (perSheet: number, startAt: number, labels: number): number =>
  Math.ceil((startAt - 1 + labels) / perSheet);
