import { decodeWithZxing } from '../../shared/reader/zxingDecoder';
import { readWithJsqr } from './jsqrReader';
import { rasteriseCode, type PictureOfCode } from './rasterise';
import { buildMatrix, findStandardMask, pickVersion, type QrSymbol } from './symbol';

/**
 * Where mask trouble showed: straight, at many scales, between whole pixels, a little turned. Large pictures are left
 * out for jsQR: it is slow on them and hardly ever failed (1 of 2,160 tries).
 */
const PICTURES: readonly (PictureOfCode & { isForBoth: boolean })[] = [
  { pixelsPerModule: 3, turnedDeg: 0, isForBoth: true },
  { pixelsPerModule: 4, turnedDeg: 3, isForBoth: true },
  { pixelsPerModule: 5.3, turnedDeg: 0, isForBoth: true },
  { pixelsPerModule: 5, turnedDeg: 0, isForBoth: false },
  { pixelsPerModule: 6, turnedDeg: 0, isForBoth: false },
  { pixelsPerModule: 6.5, turnedDeg: 0, isForBoth: false },
  { pixelsPerModule: 7, turnedDeg: 0, isForBoth: false },
  { pixelsPerModule: 8, turnedDeg: 0, isForBoth: false },
  { pixelsPerModule: 8, turnedDeg: 4, isForBoth: false },
];
const MOST_READS = PICTURES.reduce((sum, picture) => sum + (picture.isForBoth ? 2 : 1), 0);

const MASK_COUNT = 8;

/**
 * Version, level and mask for a new tag. With the standard mask some codes can't be read by the JavaScript reader,
 * straight and still, because their data looks like finder patterns: one in fourteen in labels.md, one to six in a
 * hundred in our own runs at version 3, level H. So the mask is chosen by reading:
 * the first (the standard one, then 0 to 7) that our reader's plain pass and jsQR both read in every picture they get, else
 * the one they read most often. The same payload always gives the same symbol.
 */
export function chooseMask(payload: string): QrSymbol {
  const { level, version } = pickVersion(payload);
  const standard = findStandardMask(payload, level, version);
  const others = Array.from({ length: MASK_COUNT }, (_, mask) => mask).filter((mask) => mask !== standard);
  let best: QrSymbol = { level, version, mask: standard };
  let bestReads = -1;
  for (const mask of [standard, ...others]) {
    const symbol = { level, version, mask };
    const reads = countReads(payload, symbol);
    if (reads > bestReads) [best, bestReads] = [symbol, reads];
    if (bestReads === MOST_READS) break;
  }
  return best;
}

/** For a run of labels: the same for each payload, letting other requests through in between. */
export async function chooseMasks(payloads: readonly string[]): Promise<QrSymbol[]> {
  const symbols: QrSymbol[] = [];
  for (const payload of payloads) {
    symbols.push(chooseMask(payload));
    await new Promise(setImmediate);
  }
  return symbols;
}

function countReads(payload: string, symbol: QrSymbol): number {
  const matrix = buildMatrix(payload, symbol);
  let reads = 0;
  for (const picture of PICTURES) {
    const image = rasteriseCode(matrix, picture);
    if (decodeWithZxing(image, 'hybrid')?.text === payload) reads++;
    if (picture.isForBoth && readWithJsqr(image) === payload) reads++;
  }
  return reads;
}
