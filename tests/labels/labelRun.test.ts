import { describe, expect, it } from 'vitest';
import { measureText } from '../../labels/fonts/faces';
import { layoutLabel } from '../../labels/layout/layoutLabel';
import { placeLabels } from '../../labels/layout/placeLabels';
import { readWithJsqr } from '../../labels/qr/jsqrReader';
import { findStock, LABEL_STOCKS, renderLabels, type LabelData, type LabelStock } from '../../labels';
import { readQr } from '../../shared/reader/codeReader';
import type { GrayImage } from '../../shared/reader/grayImage';
import { cropImage, extractPdfText, rasterisePdf } from '../support/labelPictures';
import { buildLabelItem, buildLabelItems, LONG_TEXTS } from './labelItems';

const LONG_RUN = 200;
const SHORT_RUN = 20;
const LONG_RUN_STOCK = 'roll-203-flat';
const items = buildLabelItems(LONG_RUN);

interface PrintedCode {
  item: LabelData;
  /** The code with its quiet zone, as printed. */
  picture: GrayImage;
}

/** Renders at the printer's own dpi and cuts out each code with its quiet zone. */
async function printCodes(run: LabelData[], stock: LabelStock, startAt = 1): Promise<PrintedCode[]> {
  const pages = await rasterisePdf(await renderLabels(run, stock, { startAt }), stock.dpi);
  const places = placeLabels(run.length, stock, startAt);
  return run.map((item, i) => {
    const place = places[i];
    const page = pages[place?.page ?? -1];
    if (!place || !page) throw new Error('A label has no page.');
    const { qr } = layoutLabel(item, stock, measureText);
    const toDots = (mm: number) => Math.round((mm * stock.dpi) / 25.4);
    const sideDots = (qr.side + 8) * qr.moduleDots;
    const left = toDots(place.xMm + qr.xMm) - 4 * qr.moduleDots;
    const top = toDots(place.yMm + qr.yMm) - 4 * qr.moduleDots;
    return { item, picture: cropImage(page, left, top, sideDots, sideDots) };
  });
}

const printed = new Map<string, Promise<PrintedCode[]>>();

/** The same print serves several tests. */
function printOnce(stock: LabelStock): Promise<PrintedCode[]> {
  const run = items.slice(0, stock.id === LONG_RUN_STOCK ? LONG_RUN : SHORT_RUN);
  const codes = printed.get(stock.id) ?? printCodes(run, stock, stock.sheet ? 2 : 1);
  printed.set(stock.id, codes);
  return codes;
}

describe('a printed run', () => {
  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    'on %s: jsQR and our own reader read every label, as stored',
    async (id, stock) => {
      const codes = await printOnce(stock);
      const unread = codes.filter(
        ({ item, picture }) =>
          readWithJsqr(picture) !== item.payload || readQr(picture)?.text !== item.payload,
      );
      expect(unread.map(({ item }) => item.code)).toEqual([]);
      expect(codes).toHaveLength(id === LONG_RUN_STOCK ? LONG_RUN : SHORT_RUN);
    },
    60_000,
  );

  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    'on %s: modules are whole dots and the quiet zone is empty',
    async (_id, stock) => {
      const [first] = await printOnce(stock);
      if (!first) throw new Error('Nothing was printed.');
      const { data, width } = first.picture;
      const quietDots = 4 * stock.moduleDots;
      const at = (x: number, y: number) => data[y * width + x] ?? 0;
      for (let y = 0; y < width; y++) {
        for (let x = 0; x < width; x++) {
          const isQuiet = Math.min(x, y, width - 1 - x, width - 1 - y) < quietDots;
          if (isQuiet && at(x, y) !== 255)
            throw new Error(`Something is in the quiet zone at ${String(x)}, ${String(y)}.`);
        }
      }
      // The upper edge of the upper left finder pattern: seven dark modules, then a light one, dot by dot.
      const row = Array.from(
        { length: 8 * stock.moduleDots },
        (_, x) => at(quietDots + x, quietDots + 1) < 128,
      );
      expect(row).toEqual(row.map((_, x) => x < 7 * stock.moduleDots));
    },
    30_000,
  );

  it('makes the same bytes each time', async () => {
    const stock = findStock('a4-600-flat');
    if (!stock) throw new Error('No such stock.');
    const [first, second] = [
      await renderLabels(items.slice(0, 3), stock),
      await renderLabels(items.slice(0, 3), stock),
    ];
    expect(first.equals(second)).toBe(true);
  });

  it('gives one page a label on rolls and starts sheets where told', async () => {
    const roll = findStock('roll-203-flat');
    const sheet = findStock('a4-600-flat');
    if (!roll || !sheet) throw new Error('No such stock.');
    expect(await extractPdfText(await renderLabels(items.slice(0, 3), roll))).toHaveLength(3);
    expect(await extractPdfText(await renderLabels(items.slice(0, 3), sheet, { startAt: 23 }))).toHaveLength(
      2,
    );
    await expect(renderLabels(items.slice(0, 1), sheet, { startAt: 25 })).rejects.toThrow(RangeError);
  });
});

describe('text on the printed label', () => {
  const long = buildLabelItem(LONG_TEXTS);
  const foreign = buildLabelItem({ number: 'Łódź-7 💥 العربية', company: '<b>Ωmega & Жук</b>' });

  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    'on %s: says all it must',
    async (_id, stock) => {
      const pages = await extractPdfText(await renderLabels([items[0] ?? long], stock));
      const text = pages.join('\n');
      const { code } = items[0] ?? long;
      expect(text).toContain(`${code.slice(0, 4)}-${code.slice(4, 7)}-${code.slice(7)}`);
      for (const each of ['CH-0001', 'Alloy chain sling', "not the maker's tag", 'Northyard Lifting'])
        expect(text).toContain(each);
      for (const load of ['Vertical 2,000 kg', 'Choker 1,600 kg', 'Basket 4,000 kg'])
        expect(text).toContain(load);
    },
  );

  it('prints Polish, Greek and Cyrillic letters, and a question mark for what it has no letter for', async () => {
    const stock = findStock('roll-203-flat');
    if (!stock) throw new Error('No such stock.');
    const text = (await extractPdfText(await renderLabels([foreign, long], stock))).join('\n');
    expect(text).toContain('Łódź-7 ?');
    expect(text).toContain('<b>Ωmega & Жук</b>');
  });
});
