import sharp from 'sharp';
import { measureText } from '../fonts/faces';
import { outlineText } from '../fonts/outlines';
import type { LabelData } from '../labelData';
import type { LabelLayout } from '../layout/boxes';
import { layoutLabel } from '../layout/layoutLabel';
import { buildMatrix, type QrMatrix } from '../qr/symbol';
import type { LabelStock } from '../stockSchema';
import { mmToDots } from '../units';
import { findRuns } from './drawLabel';

const BLACK = 0;
const HALF_COVERED = 128;

/**
 * One label as a black-and-white PNG, one pixel a printer dot, for printers whose software would resample a PDF.
 * @throws Error when the code doesn't fit the stock
 */
export async function renderLabelPng(item: LabelData, stock: LabelStock): Promise<Buffer> {
  const layout = layoutLabel(item, stock, measureText);
  const widthPx = Math.round(mmToDots(layout.widthMm, stock.dpi));
  const heightPx = Math.round(mmToDots(layout.heightMm, stock.dpi));
  const pixels = await rasteriseTexts(layout, widthPx, heightPx, stock.dpi);
  paintCode(pixels, widthPx, layout, buildMatrix(item.payload, item), stock.dpi);
  return sharp(pixels, { raw: { width: widthPx, height: heightPx, channels: 1 } })
    .png({ palette: true, colours: 2, dither: 0 })
    .withMetadata({ density: stock.dpi })
    .toBuffer();
}

/** Letters as outlines, so that no font of the machine is used, then every dot black or white. */
async function rasteriseTexts(
  layout: LabelLayout,
  widthPx: number,
  heightPx: number,
  dpi: number,
): Promise<Buffer> {
  const paths = layout.texts.map((box) =>
    outlineText(box.text, box.face, {
      x: mmToDots(box.xMm, dpi),
      baseline: mmToDots(box.baselineMm, dpi),
      size: mmToDots(box.sizeMm, dpi),
    }),
  );
  const svg = `<svg xmlns="http://www.w3.org/2000/svg" width="${String(widthPx)}" height="${String(heightPx)}"><path d="${paths.join('')}"/></svg>`;
  return sharp(Buffer.from(svg))
    .flatten({ background: 'white' })
    .greyscale()
    .threshold(HALF_COVERED)
    .raw()
    .toBuffer();
}

function paintCode(
  pixels: Buffer,
  widthPx: number,
  layout: LabelLayout,
  matrix: QrMatrix,
  dpi: number,
): void {
  const { qr } = layout;
  const left = Math.round(mmToDots(qr.xMm, dpi));
  const top = Math.round(mmToDots(qr.yMm, dpi));
  for (const run of findRuns(matrix)) {
    for (let dot = 0; dot < qr.moduleDots; dot++) {
      const start = (top + run.row * qr.moduleDots + dot) * widthPx + left + run.column * qr.moduleDots;
      pixels.fill(BLACK, start, start + run.length * qr.moduleDots);
    }
  }
}
