import { QUIET_ZONE_MODULES } from '../qr/symbol';
import { STOCK_MODULES } from '../stocks';
import type { LabelStock, PrinterDpi } from '../stockSchema';
import { dotsToMm, mmToDots, snapToDot } from '../units';
import type { LabelFace, MeasureText, QrBox, TextBox } from './boxes';
import { fillLines } from './fitText';
import { pageSize } from './placeLabels';

/** One page of the printer test: codes of falling size with their sizes beside them. */
export interface TestPageLayout {
  codes: { qr: QrBox; payload: string }[];
  texts: TextBox[];
}

/** Modules of so many printer dots are tried, largest first. */
const DOTS_TRIED = [16, 14, 12, 10, 8, 7, 6, 5, 4, 3, 2] as const;
const TEST_SIDE = STOCK_MODULES - 2 * QUIET_ZONE_MODULES;

const TITLE = 'Printer test';
const INSTRUCTIONS =
  'Print at actual size, never fitted to the page. Hold each code a hand’s width before the phone’s camera. The smallest one that reads at once, three times running, is the smallest this printer can do. Choose a stock whose code is that size or larger.';

const MARGIN_MM = 1.5;
const SHEET_MARGIN_MM = 12;
const SHEET_COLUMNS = 4;
const LINE_EM = 1.25;

/** What a test code holds: its own size, so that the phone shows which one was read. */
export function testPayload(dpi: PrinterDpi, dots: number): string {
  return `SLINGWARD TEST ${String(dpi)} DPI ${String(dots)} DOTS`;
}

/** On a sheet all codes stand on one page; on rolls and single labels each has its own label, after one with instructions. */
export function layoutTestPages(stock: LabelStock, measure: MeasureText): TestPageLayout[] {
  return stock.sheet ? [layoutSheet(stock, measure)] : layoutLabels(stock, measure);
}

function layoutSheet(stock: LabelStock, measure: MeasureText): TestPageLayout {
  const { widthMm } = pageSize(stock);
  const roomMm = widthMm - 2 * SHEET_MARGIN_MM;
  const heading = headingLines(
    stock,
    SHEET_MARGIN_MM,
    SHEET_MARGIN_MM,
    roomMm,
    { title: 6, text: 3.6 },
    measure,
  );
  const topMm = heading.bottomMm + 4;
  const cellMm = roomMm / SHEET_COLUMNS;
  const page: TestPageLayout = { codes: [], texts: heading.texts };
  for (const [i, dots] of DOTS_TRIED.entries()) {
    const xMm = SHEET_MARGIN_MM + (i % SHEET_COLUMNS) * cellMm;
    const yMm = topMm + Math.floor(i / SHEET_COLUMNS) * cellMm;
    const code = placeTestCode(stock, dots, xMm, yMm);
    page.codes.push(code);
    const belowMm = yMm + dotsToMm(dots * STOCK_MODULES, stock.dpi);
    page.texts.push(lineAt(sizeText(stock, dots), 'sansBold', 3.2, xMm + 1, belowMm + 3.5, measure));
  }
  return page;
}

function layoutLabels(stock: LabelStock, measure: MeasureText): TestPageLayout[] {
  const { widthMm, heightMm } = pageSize(stock);
  const shortSideDots = Math.floor(mmToDots(heightMm, stock.dpi));
  const sizes = { title: heightMm / 8, text: heightMm / 11 };
  const roomMm = widthMm - 2 * MARGIN_MM;
  const instructions = headingLines(stock, MARGIN_MM, MARGIN_MM, roomMm, sizes, measure);
  // Too much text for a small label is set smaller until it goes in.
  const shrink = Math.min(
    1,
    Math.sqrt((heightMm - 2 * MARGIN_MM) / (instructions.bottomMm - MARGIN_MM)) * 0.95,
  );
  const fitted = headingLines(
    stock,
    MARGIN_MM,
    MARGIN_MM,
    roomMm,
    { title: sizes.title * shrink, text: sizes.text * shrink },
    measure,
  );
  const pages = DOTS_TRIED.filter((dots) => dots * STOCK_MODULES <= shortSideDots).map((dots) => {
    const sideMm = dotsToMm(dots * STOCK_MODULES, stock.dpi);
    const code = placeTestCode(stock, dots, MARGIN_MM, (heightMm - sideMm) / 2);
    const leftMm = MARGIN_MM + sideMm + MARGIN_MM;
    const text = lineAt(sizeText(stock, dots), 'sansBold', 2.4, leftMm, heightMm / 2, measure);
    return { codes: [code], texts: [text] };
  });
  return [{ codes: [], texts: fitted.texts }, ...pages];
}

function placeTestCode(
  stock: LabelStock,
  dots: number,
  xMm: number,
  yMm: number,
): TestPageLayout['codes'][number] {
  const moduleMm = dotsToMm(dots, stock.dpi);
  const qr: QrBox = {
    xMm: snapToDot(xMm + QUIET_ZONE_MODULES * moduleMm, stock.dpi),
    yMm: snapToDot(yMm + QUIET_ZONE_MODULES * moduleMm, stock.dpi),
    moduleMm,
    moduleDots: dots,
    side: TEST_SIDE,
  };
  return { qr, payload: testPayload(stock.dpi, dots) };
}

function sizeText(stock: LabelStock, dots: number): string {
  return `${dotsToMm(dots * STOCK_MODULES, stock.dpi).toFixed(1)} mm · ${String(dots)} dots`;
}

function headingLines(
  stock: LabelStock,
  leftMm: number,
  topMm: number,
  widthMm: number,
  sizes: { title: number; text: number },
  measure: MeasureText,
): { texts: TextBox[]; bottomMm: number } {
  const lines = fillLines(INSTRUCTIONS, widthMm / sizes.text, (text) => measure(text, 'sans'));
  let baselineMm = topMm + sizes.title;
  const title = `${TITLE}, ${String(stock.dpi)} dpi`;
  const texts = [lineAt(title, 'sansBold', sizes.title, leftMm, baselineMm, measure)];
  for (const line of lines) {
    baselineMm += sizes.text * LINE_EM;
    texts.push(lineAt(line, 'sans', sizes.text, leftMm, baselineMm, measure));
  }
  return { texts, bottomMm: baselineMm + sizes.text * 0.3 };
}

function lineAt(
  text: string,
  face: LabelFace,
  sizeMm: number,
  xMm: number,
  baselineMm: number,
  measure: MeasureText,
): TextBox {
  return { role: 'notice', text, face, sizeMm, xMm, baselineMm, widthMm: measure(text, face) * sizeMm };
}
