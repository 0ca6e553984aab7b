import { formatTagCode, parseTagCode } from '../../shared/domain/tags/tagCode';
import { NOT_THE_MAKERS_TAG, type LabelData } from '../labelData';
import { QUIET_ZONE_MODULES, sideOfVersion } from '../qr/symbol';
import type { LabelStock } from '../stockSchema';
import { dotsToMm, mmToDots, snapToDot } from '../units';
import type { LabelLayout, MeasureText, QrBox, TextBox } from './boxes';
import { cleanText, fitText, type TextBlock } from './fitText';

const LARGEST_MARGIN_MM = 3;
const GAP_BESIDE_CODE_MM = 0.8;
const LEAST_TEXT_MARGIN_MM = 1;
/** Distance of baselines, and how far a line reaches above and below its baseline, in em (IBM Plex). */
const LINE_EM = 1.16;
const ASCENT_EM = 0.9;
/** Room for rounding between our sums of letter widths and the renderer's. */
const WIDTH_RESERVE = 0.985;
const MOST_GAP_MM = 1.2;
const LEAST_MODULE_DOTS = 2;

/**
 * Printer dots a module of a larger code gets in the room that the stock has for the pinned version.
 * @returns null when modules would be smaller than two dots: no reader can be relied on then
 */
export function findModuleDots(stock: LabelStock, version: number): number | null {
  const roomDots = Math.round(mmToDots(stock.qrMm, stock.dpi));
  const dots = Math.floor(roomDots / (sideOfVersion(version) + 2 * QUIET_ZONE_MODULES));
  return dots < LEAST_MODULE_DOTS ? null : Math.min(dots, stock.moduleDots);
}

/**
 * Places everything on one label: the code on the left, all text right of its quiet zone, nothing outside the label.
 * @throws Error when the tag code is malformed or the code doesn't fit the stock (see `findModuleDots`)
 */
export function layoutLabel(data: LabelData, stock: LabelStock, measure: MeasureText): LabelLayout {
  const widthMm = dotsToMm(Math.floor(mmToDots(stock.widthMm, stock.dpi)), stock.dpi);
  const heightMm = dotsToMm(Math.floor(mmToDots(stock.heightMm, stock.dpi)), stock.dpi);
  const marginMm = Math.min((heightMm - stock.qrMm) / 2, LARGEST_MARGIN_MM);
  const qr = placeCode(data.version, stock, marginMm, heightMm);
  const leftMm = marginMm + stock.qrMm + GAP_BESIDE_CODE_MM;
  const textMarginMm = Math.max(marginMm, LEAST_TEXT_MARGIN_MM);
  const room = {
    leftMm,
    topMm: textMarginMm,
    widthMm: widthMm - leftMm - textMarginMm,
    heightMm: heightMm - 2 * textMarginMm,
  };
  return { widthMm, heightMm, qr, texts: stackBlocks(blocksOf(data, stock), room, measure) };
}

function placeCode(version: number, stock: LabelStock, marginMm: number, heightMm: number): QrBox {
  const moduleDots = findModuleDots(stock, version);
  if (moduleDots === null) throw new Error(`The code is too dense for the stock ${stock.id}.`);
  const side = sideOfVersion(version);
  const moduleMm = dotsToMm(moduleDots, stock.dpi);
  const insetMm = (stock.qrMm - side * moduleMm) / 2;
  return {
    xMm: snapToDot(marginMm + insetMm, stock.dpi),
    yMm: snapToDot((heightMm - stock.qrMm) / 2 + insetMm, stock.dpi),
    moduleMm,
    moduleDots,
    side,
  };
}

type RoledBlock = TextBlock & { role: TextBox['role'] };

const ANY_SPACE = /(?<= )/;
const AFTER_SIGN = /(?<=[ \-/.])/;
/** Smaller than this share of its ideal size, a text is wrapped or cut instead. */
const LEAST_SHARE = 0.8;
const PARTING = ' · ';
const BETWEEN_LOADS = /(?<= · )/;

/** Ideal sizes in mm, from trying out: the code is typed from, the number is read from a step away. */
const SIZES = {
  flat: { number: 4.4, kind: 2.5, load: 2.6, code: 4.1, company: 2, notice: 2.2 },
  round: { number: 3, kind: 1.9, load: 2, code: 3.6, company: 1.6, notice: 1.7 },
} as const;

function blocksOf(data: LabelData, stock: LabelStock): RoledBlock[] {
  const ideal = SIZES[stock.use];
  const parsed = parseTagCode(data.code, { isStrict: true });
  if (!parsed.ok) throw new Error('A label needs a well-formed tag code.');
  const loads = data.loads.map(({ label, text }) => cleanText(`${label} ${text}`));
  const company = cleanText(data.company);
  const whole = { maxLines: 1, isCuttable: false, leastMm: 0, breakAfter: ANY_SPACE } as const;
  const number: RoledBlock = {
    ...whole,
    role: 'number',
    text: cleanText(data.number),
    face: 'sansBold',
    idealMm: ideal.number,
    leastMm: ideal.number * LEAST_SHARE,
    maxLines: 2,
    breakAfter: AFTER_SIGN,
  };
  const kind: RoledBlock = {
    ...whole,
    role: 'kind',
    text: cleanText(data.kindName),
    face: 'sans',
    idealMm: ideal.kind,
    leastMm: ideal.kind * LEAST_SHARE,
    maxLines: stock.use === 'flat' ? 2 : 1,
    isCuttable: true,
  };
  const load: Omit<RoledBlock, 'text'> = {
    ...whole,
    role: 'load',
    face: 'sansBold',
    idealMm: ideal.load,
    leastMm: ideal.load * LEAST_SHARE,
    maxLines: 2,
  };
  const code: RoledBlock = {
    ...whole,
    role: 'code',
    text: formatTagCode(parsed.code),
    face: 'mono',
    idealMm: ideal.code,
  };
  const notice: RoledBlock = {
    ...whole,
    role: 'notice',
    text: NOT_THE_MAKERS_TAG,
    face: 'sansBold',
    idealMm: ideal.notice,
  };
  const companyLine: RoledBlock = {
    ...whole,
    role: 'company',
    text: company,
    face: 'sans',
    idealMm: ideal.company,
    leastMm: ideal.company * LEAST_SHARE,
    isCuttable: true,
  };
  // A low label has no height to spare: loads share a line, and so do the notice and the company, which may be cut.
  const blocks =
    stock.use === 'flat'
      ? [number, kind, ...loads.map((text) => ({ ...load, text })), code, notice, companyLine]
      : [
          number,
          kind,
          { ...load, text: loads.join(PARTING), breakAfter: BETWEEN_LOADS },
          code,
          {
            ...notice,
            text: [NOT_THE_MAKERS_TAG, company].filter((text) => text !== '').join(PARTING),
            leastMm: ideal.notice * LEAST_SHARE,
            isCuttable: true,
          },
        ];
  return blocks.filter((block) => block.text !== '');
}

interface Room {
  leftMm: number;
  topMm: number;
  widthMm: number;
  heightMm: number;
}

/** Sets the blocks one under the other; too high a stack is scaled down as a whole, spare height goes between blocks. */
function stackBlocks(blocks: RoledBlock[], room: Room, measure: MeasureText): TextBox[] {
  const widthMm = room.widthMm * WIDTH_RESERVE;
  const fitted = blocks.map((block) => ({ block, ...fitText(block, widthMm, measure) }));
  const neededMm = fitted.reduce((sum, { lines, sizeMm }) => sum + lines.length * sizeMm * LINE_EM, 0);
  const scale = Math.min(1, room.heightMm / neededMm);
  const spareMm = (room.heightMm - neededMm * scale) / Math.max(1, fitted.length - 1);
  const gapMm = Math.min(spareMm, MOST_GAP_MM);
  const texts: TextBox[] = [];
  let topMm = room.topMm + ((spareMm - gapMm) * (fitted.length - 1)) / 2;
  for (const { block, lines, sizeMm } of fitted) {
    for (const text of lines) {
      texts.push({
        role: block.role,
        text,
        face: block.face,
        sizeMm: sizeMm * scale,
        xMm: room.leftMm,
        baselineMm: topMm + ASCENT_EM * sizeMm * scale,
        widthMm: measure(text, block.face) * sizeMm * scale,
      });
      topMm += sizeMm * scale * LINE_EM;
    }
    topMm += gapMm;
  }
  return texts;
}
