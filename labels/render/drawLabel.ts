import { splitIntoRuns } from '../fonts/faces';
import type { LabelLayout, QrBox, TextBox } from '../layout/boxes';
import type { QrMatrix } from '../qr/symbol';
import { mmToPoints } from '../units';

/** Each run of modules is drawn this much smaller on every side, in dots: rasterisers blacken every dot they touch. */
const INSET_DOTS = 0.1;

/** One row of dark modules that touch, counted from the code's upper left module. */
export interface ModuleRun {
  row: number;
  column: number;
  length: number;
}

export function findRuns(matrix: QrMatrix): ModuleRun[] {
  const runs: ModuleRun[] = [];
  for (let row = 0; row < matrix.side; row++) {
    let length = 0;
    for (let column = 0; column <= matrix.side; column++) {
      if (column < matrix.side && matrix.isDark(row, column)) length++;
      else if (length > 0) {
        runs.push({ row, column: column - length, length });
        length = 0;
      }
    }
  }
  return runs;
}

/** Draws a label whose upper left corner stands at the given place of the current page. */
export function drawLabel(
  doc: PDFKit.PDFDocument,
  layout: LabelLayout,
  matrix: QrMatrix,
  at: { xMm: number; yMm: number },
): void {
  drawCode(doc, layout.qr, matrix, at);
  for (const box of layout.texts) drawText(doc, box, at);
}

export function drawCode(
  doc: PDFKit.PDFDocument,
  qr: QrBox,
  matrix: QrMatrix,
  at: { xMm: number; yMm: number },
): void {
  const insetMm = (INSET_DOTS * qr.moduleMm) / qr.moduleDots;
  for (const run of findRuns(matrix)) {
    doc.rect(
      mmToPoints(at.xMm + qr.xMm + run.column * qr.moduleMm + insetMm),
      mmToPoints(at.yMm + qr.yMm + run.row * qr.moduleMm + insetMm),
      mmToPoints(run.length * qr.moduleMm - 2 * insetMm),
      mmToPoints(qr.moduleMm - 2 * insetMm),
    );
  }
  doc.fill('black');
}

export function drawText(doc: PDFKit.PDFDocument, box: TextBox, at: { xMm: number; yMm: number }): void {
  let xPoints = mmToPoints(at.xMm + box.xMm);
  const baselinePoints = mmToPoints(at.yMm + box.baselineMm);
  doc.fillColor('black');
  for (const { part, text } of splitIntoRuns(box.text, box.face)) {
    doc.registerFont(part.name, part.file).font(part.name).fontSize(mmToPoints(box.sizeMm));
    doc.text(text, xPoints, baselinePoints, { lineBreak: false, baseline: 'alphabetic' });
    xPoints += doc.widthOfString(text);
  }
}
