import { labelsPerPage } from '../stocks';
import type { LabelStock } from '../stockSchema';
import { dotsToMm, mmToDots, snapToDot } from '../units';

/** Upper left corner of one label on its page, on the printer's grid. */
export interface LabelPlace {
  /** Counted from 0. */
  page: number;
  xMm: number;
  yMm: number;
}

/**
 * Where each label of a run goes, left to right and down.
 * @param startAt first free place of a part-used sheet, from 1; stocks with one label a page know only 1
 * @throws RangeError when the page has no such place
 */
export function placeLabels(count: number, stock: LabelStock, startAt = 1): LabelPlace[] {
  const perPage = labelsPerPage(stock);
  if (!Number.isInteger(startAt) || startAt < 1 || startAt > perPage) {
    throw new RangeError(`Start at a place from 1 to ${String(perPage)}.`);
  }
  return Array.from({ length: count }, (_, i) => {
    const place = i + startAt - 1;
    return { page: Math.floor(place / perPage), ...cornerOf(place % perPage, stock) };
  });
}

function cornerOf(place: number, stock: LabelStock): { xMm: number; yMm: number } {
  if (!stock.sheet) return { xMm: 0, yMm: 0 };
  const { columns, marginLeftMm, marginTopMm, gapAcrossMm, gapDownMm } = stock.sheet;
  return {
    xMm: snapToDot(marginLeftMm + (place % columns) * (stock.widthMm + gapAcrossMm), stock.dpi),
    yMm: snapToDot(marginTopMm + Math.floor(place / columns) * (stock.heightMm + gapDownMm), stock.dpi),
  };
}

/** A sheet's page is the paper's; a single label's is the label, down to whole dots so that it never runs over. */
export function pageSize(stock: LabelStock): { widthMm: number; heightMm: number } {
  if (stock.sheet) return { widthMm: stock.sheet.pageWidthMm, heightMm: stock.sheet.pageHeightMm };
  return {
    widthMm: dotsToMm(Math.floor(mmToDots(stock.widthMm, stock.dpi)), stock.dpi),
    heightMm: dotsToMm(Math.floor(mmToDots(stock.heightMm, stock.dpi)), stock.dpi),
  };
}
