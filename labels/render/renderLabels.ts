import { measureText } from '../fonts/faces';
import type { LabelData } from '../labelData';
import { layoutLabel } from '../layout/layoutLabel';
import { pageSize, placeLabels } from '../layout/placeLabels';
import { buildMatrix } from '../qr/symbol';
import type { LabelStock } from '../stockSchema';
import { mmToPoints } from '../units';
import { createPdf } from './createPdf';
import { drawLabel } from './drawLabel';

export interface RenderOptions {
  /** First free place of a part-used sheet, from 1. */
  startAt?: number;
}

/**
 * A run of labels as PDF: one a page for single labels and rolls, many a page for sheets.
 * @throws RangeError when `startAt` isn't on the sheet
 * @throws Error when a code doesn't fit the stock
 */
export async function renderLabels(
  items: readonly LabelData[],
  stock: LabelStock,
  options: RenderOptions = {},
): Promise<Buffer> {
  const places = placeLabels(items.length, stock, options.startAt);
  const size = pageSize(stock);
  return createPdf('Labels', (doc) => {
    let page = -1;
    for (const [i, item] of items.entries()) {
      const place = places[i];
      if (!place) continue;
      if (place.page !== page) {
        doc.addPage({ size: [mmToPoints(size.widthMm), mmToPoints(size.heightMm)], margin: 0 });
        page = place.page;
      }
      drawLabel(doc, layoutLabel(item, stock, measureText), buildMatrix(item.payload, item), place);
    }
  });
}
