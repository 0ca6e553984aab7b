import sharp from 'sharp';
import { describe, expect, it } from 'vitest';
import { measureText } from '../../labels/fonts/faces';
import { layoutLabel } from '../../labels/layout/layoutLabel';
import { readWithJsqr } from '../../labels/qr/jsqrReader';
import { findStock, LABEL_STOCKS, renderLabelPng, renderTestPage } from '../../labels';
import { readQr } from '../../shared/reader/codeReader';
import { extractPdfText, rasterisePdf } from '../support/labelPictures';
import { buildLabelItem } from './labelItems';

const item = buildLabelItem();

describe('a label as PNG', () => {
  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    'for %s: one bit a dot at the printer’s dpi, read by our reader',
    async (_id, stock) => {
      const png = await renderLabelPng(item, stock);
      // Bit depth stands in byte 24 of a PNG.
      expect(png[24]).toBe(1);
      const { density } = await sharp(png).metadata();
      expect(density).toBe(stock.dpi);
      const { data, info } = await sharp(png).greyscale().raw().toBuffer({ resolveWithObject: true });
      expect(new Set(data)).toEqual(new Set([0, 255]));
      const image = { data: new Uint8ClampedArray(data), width: info.width, height: info.height };
      expect(image.width).toBe(Math.floor((stock.widthMm * stock.dpi) / 25.4));
      expect(readQr(image)?.text).toBe(item.payload);
      // Text is there: some dots right of the code are black.
      const { qr } = layoutLabel(item, stock, measureText);
      const textFrom = Math.ceil(((qr.xMm + (qr.side + 4) * qr.moduleMm) * stock.dpi) / 25.4);
      const inkRows = Array.from({ length: info.height }, (_, y) =>
        data.subarray(y * info.width + textFrom, (y + 1) * info.width).includes(0),
      );
      expect(inkRows.filter(Boolean).length).toBeGreaterThan(info.height / 3);
    },
  );
});

describe('the printer test page', () => {
  it('has codes that say their size, readable down to the smallest at the printer’s dpi', async () => {
    const stock = findStock('roll-203-flat');
    if (!stock) throw new Error('No such stock.');
    const pdf = await renderTestPage(stock);
    const [instructions, ...pages] = await rasterisePdf(pdf, stock.dpi);
    expect(instructions && readQr(instructions)).toBeNull();
    expect(pages.map((page) => readQr(page)?.text)).toEqual(
      [6, 5, 4, 3, 2].map((dots) => `SLINGWARD TEST 203 DPI ${String(dots)} DOTS`),
    );
    expect(pages.slice(0, 4).map((page) => readWithJsqr(page) !== null)).toEqual([true, true, true, true]);
    expect((await extractPdfText(pdf))[0]).toContain('Printer test, 203 dpi');
  });
});
