import { QUIET_ZONE_MODULES, PINNED_VERSION, sideOfVersion } from './qr/symbol';
import { labelStock, type LabelStock, type SheetGeometry } from './stockSchema';
import { dotsToMm } from './units';

/** Modules a side, quiet zone in, that the code of a stock is sized for: 37. */
export const STOCK_MODULES = sideOfVersion(PINNED_VERSION) + 2 * QUIET_ZONE_MODULES;

type StockRow = Omit<LabelStock, 'qrMm' | 'sheet'> & { sheet?: SheetGeometry };

function sheetOf(
  page: SheetGeometry['page'],
  grid: Omit<SheetGeometry, 'page' | 'pageWidthMm' | 'pageHeightMm'>,
): SheetGeometry {
  const [pageWidthMm, pageHeightMm] = page === 'A4' ? [210, 297] : [215.9, 279.4];
  return { page, pageWidthMm, pageHeightMm, ...grid };
}

const A4_FLAT = sheetOf('A4', {
  columns: 3,
  rows: 8,
  marginLeftMm: 6,
  marginTopMm: 12.5,
  gapAcrossMm: 3,
  gapDownMm: 0,
});
const A4_ROUND = sheetOf('A4', {
  columns: 3,
  rows: 15,
  marginLeftMm: 6,
  marginTopMm: 13.5,
  gapAcrossMm: 3,
  gapDownMm: 0,
});
const LETTER_FLAT = sheetOf('Letter', {
  columns: 3,
  rows: 7,
  marginLeftMm: 5.95,
  marginTopMm: 20.7,
  gapAcrossMm: 3,
  gapDownMm: 0,
});
const LETTER_ROUND = sheetOf('Letter', {
  columns: 3,
  rows: 14,
  marginLeftMm: 5.95,
  marginTopMm: 13.7,
  gapAcrossMm: 3,
  gapDownMm: 0,
});

/** Sizes of the code: about 25 mm on flat tags, 12.5 to 16 mm on anything round (labels.md). Blanks: common sizes, no source. */
const ROWS: readonly StockRow[] = [
  {
    id: 'roll-203-flat',
    name: 'Roll 64 × 30 mm for flat tags, 203 dpi',
    use: 'flat',
    kind: 'roll',
    widthMm: 64,
    heightMm: 30,
    dpi: 203,
    moduleDots: 6,
  },
  {
    id: 'roll-300-flat',
    name: 'Roll 64 × 30 mm for flat tags, 300 dpi',
    use: 'flat',
    kind: 'roll',
    widthMm: 64,
    heightMm: 30,
    dpi: 300,
    moduleDots: 8,
  },
  {
    id: 'roll-203-round',
    name: 'Roll 60 × 16 mm for ropes and thin sleeves, 203 dpi',
    use: 'round',
    kind: 'roll',
    widthMm: 60,
    heightMm: 16,
    dpi: 203,
    moduleDots: 3,
  },
  {
    id: 'roll-300-round',
    name: 'Roll 60 × 18 mm for ropes and thin sleeves, 300 dpi',
    use: 'round',
    kind: 'roll',
    widthMm: 60,
    heightMm: 18,
    dpi: 300,
    moduleDots: 5,
  },
  {
    id: 'roll-300-round-small',
    name: 'Roll 50 × 15 mm for the thinnest ropes, 300 dpi',
    use: 'round',
    kind: 'roll',
    widthMm: 50,
    heightMm: 15,
    dpi: 300,
    moduleDots: 4,
  },
  {
    id: 'single-600-flat',
    name: 'Single tag 75 × 40 mm, 600 dpi',
    use: 'flat',
    kind: 'single',
    widthMm: 75,
    heightMm: 40,
    dpi: 600,
    moduleDots: 16,
  },
  {
    id: 'a4-600-flat',
    name: 'A4 sheet, 24 labels 64 × 34 mm for flat tags',
    use: 'flat',
    kind: 'sheet',
    widthMm: 64,
    heightMm: 34,
    dpi: 600,
    moduleDots: 16,
    sheet: A4_FLAT,
  },
  {
    id: 'a4-600-round',
    name: 'A4 sheet, 45 labels 64 × 18 mm for ropes and thin sleeves',
    use: 'round',
    kind: 'sheet',
    widthMm: 64,
    heightMm: 18,
    dpi: 600,
    moduleDots: 10,
    sheet: A4_ROUND,
  },
  {
    id: 'letter-600-flat',
    name: 'US Letter sheet, 21 labels 66 × 34 mm for flat tags',
    use: 'flat',
    kind: 'sheet',
    widthMm: 66,
    heightMm: 34,
    dpi: 600,
    moduleDots: 16,
    sheet: LETTER_FLAT,
  },
  {
    id: 'letter-600-round',
    name: 'US Letter sheet, 42 labels 66 × 18 mm for ropes and thin sleeves',
    use: 'round',
    kind: 'sheet',
    widthMm: 66,
    heightMm: 18,
    dpi: 600,
    moduleDots: 10,
    sheet: LETTER_ROUND,
  },
];

/** Every stock on offer. To add one, add a row above; the tests check it. */
export const LABEL_STOCKS: readonly LabelStock[] = ROWS.map((row) =>
  labelStock.parse({
    ...row,
    qrMm: dotsToMm(STOCK_MODULES * row.moduleDots, row.dpi),
    sheet: row.sheet ?? null,
  }),
);

export function findStock(id: string): LabelStock | null {
  return LABEL_STOCKS.find((stock) => stock.id === id) ?? null;
}

/** How many labels stand on one page: the highest start position. */
export function labelsPerPage(stock: LabelStock): number {
  return stock.sheet ? stock.sheet.columns * stock.sheet.rows : 1;
}
