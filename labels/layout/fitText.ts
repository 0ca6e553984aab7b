import type { LabelFace, MeasureText } from './boxes';

/** Parts of a block of text that is set in lines: what can't be cut is shrunk. */
export interface TextBlock {
  text: string;
  face: LabelFace;
  idealMm: number;
  /** Below this the text is wrapped, or cut where that is allowed. */
  leastMm: number;
  maxLines: number;
  /** What may be cut with an ellipsis. Identity, code and rated loads may not: they shrink further instead. */
  isCuttable: boolean;
  /** Where lines may break; a text without such places breaks anywhere. */
  breakAfter: RegExp;
}

export interface FittedText {
  lines: string[];
  sizeMm: number;
}

const ELLIPSIS = '…';

/** Control characters, line ends and marks that turn the writing direction would upset the line. */
export function cleanText(text: string): string {
  return text.replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}\s]+/gu, ' ').trim();
}

/** Sets the text in as few lines as its least size allows. */
export function fitText(block: TextBlock, widthMm: number, measure: MeasureText): FittedText {
  const widthEm = (text: string): number => measure(text, block.face);
  const sizeFor = (lines: string[]): number =>
    Math.min(block.idealMm, ...lines.map((line) => widthMm / Math.max(widthEm(line), Number.EPSILON)));

  let lines = [block.text];
  for (let count = 2; count <= block.maxLines && sizeFor(lines) < block.leastMm; count++) {
    lines = splitEvenly(block.text, count, block.breakAfter, widthEm);
  }
  const sizeMm = sizeFor(lines);
  if (sizeMm >= block.leastMm || !block.isCuttable) return { lines, sizeMm };
  const filled = fillLines(block.text, widthMm / block.leastMm, widthEm);
  return {
    lines: cutToLines(filled, block.maxLines, widthMm / block.leastMm, widthEm),
    sizeMm: block.leastMm,
  };
}

type WidthEm = (text: string) => number;

/** Signs that only part things have no place at the end of a line. */
function trimLine(line: string): string {
  return line.replace(/^[ ·]+|[ ·]+$/g, '');
}

function splitEvenly(text: string, count: number, breakAfter: RegExp, widthEm: WidthEm): string[] {
  const words = text.split(breakAfter).filter((word) => word !== '');
  const pieces = words.length >= count ? words : [...text];
  const targetEm = widthEm(text) / count;
  const lines: string[] = [];
  let line = '';
  for (const piece of pieces) {
    const isFull = line !== '' && widthEm(line) + widthEm(piece) / 2 > targetEm;
    if (isFull && lines.length < count - 1) {
      lines.push(trimLine(line));
      line = '';
    }
    line += piece;
  }
  return [...lines, trimLine(line)];
}

/** Words line by line, as many as go in; a single word may still be too long. */
export function fillLines(text: string, mostEm: number, widthEm: WidthEm): string[] {
  const lines: string[] = [];
  let line = '';
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && widthEm(longer) > mostEm) {
      lines.push(line);
      line = word;
    } else line = longer;
  }
  return [...lines, line];
}

/** The last line that is left takes the rest of the text and is cut. */
function cutToLines(lines: string[], maxLines: number, mostEm: number, widthEm: WidthEm): string[] {
  const rest = lines.slice(maxLines - 1).join(' ');
  return [...lines.slice(0, maxLines - 1), rest]
    .filter((line) => line !== '')
    .map((line) => cutToWidth(line, mostEm, widthEm));
}

function cutToWidth(line: string, mostEm: number, widthEm: WidthEm): string {
  if (widthEm(line) <= mostEm) return line;
  const characters = [...line];
  while (characters.length > 1 && widthEm(characters.join('').trimEnd() + ELLIPSIS) > mostEm)
    characters.pop();
  return characters.join('').trimEnd() + ELLIPSIS;
}
