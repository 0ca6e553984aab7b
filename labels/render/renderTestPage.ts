import { measureText } from '../fonts/faces';
import { layoutTestPages } from '../layout/layoutTestPage';
import { pageSize } from '../layout/placeLabels';
import { chooseMask } from '../qr/chooseMask';
import { buildMatrix } from '../qr/symbol';
import type { LabelStock } from '../stockSchema';
import { mmToPoints } from '../units';
import { createPdf } from './createPdf';
import { drawCode, drawText } from './drawLabel';

const PAGE_CORNER = { xMm: 0, yMm: 0 };

/** Codes of falling size with instructions, to find the smallest that a printer can do with this stock. */
export async function renderTestPage(stock: LabelStock): Promise<Buffer> {
  const size = pageSize(stock);
  return createPdf('Printer test', (doc) => {
    for (const page of layoutTestPages(stock, measureText)) {
      doc.addPage({ size: [mmToPoints(size.widthMm), mmToPoints(size.heightMm)], margin: 0 });
      for (const { qr, payload } of page.codes) {
        drawCode(doc, qr, buildMatrix(payload, chooseMask(payload)), PAGE_CORNER);
      }
      for (const box of page.texts) drawText(doc, box, PAGE_CORNER);
    }
  });
}
