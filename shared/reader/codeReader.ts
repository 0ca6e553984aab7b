import type { GrayImage } from './grayImage';
import { picturesToTry, READING_PASSES, type ReadingPass } from './passes';
import { decodeWithZxing, type Point } from './zxingDecoder';

/** `live`: one frame of a running camera, a few milliseconds. `still`: one picture, everything is tried. */
export type ReadingEffort = 'live' | 'still';

export interface ReadResult {
  text: string;
  /** Name of the pass that read it. */
  pass: string;
  /** Places in the picture that was handed in, in pixels; empty when the pass changed the picture's geometry. */
  points: Point[];
}

/** What the scan page and `npm run decode` know of a reader, so that a better decoder can take its place. */
export interface CodeReader {
  read(image: GrayImage, effort: ReadingEffort): ReadResult | null;
}

/** Smaller pictures can't hold a code of 21 modules with its quiet zone. */
const LEAST_SIDE_PX = 24;

const [FIRST_PASS, ...LATER_PASSES] = READING_PASSES;
const LIVE_PASSES = LATER_PASSES.filter((pass) => pass.isLive);

/** A reader for one camera or one batch; it remembers whose turn it is among the passes on live frames. */
export function createCodeReader(): CodeReader {
  let frame = 0;
  return {
    read(image, effort) {
      if (Math.min(image.width, image.height) < LEAST_SIDE_PX) return null;
      return effort === 'still' ? readStill(image) : tryPasses(image, passesForFrame(frame++));
    },
  };
}

/** Reads one picture with everything we have; null when nothing reads it. */
export function readQr(image: GrayImage): ReadResult | null {
  return createCodeReader().read(image, 'still');
}

/** The plain picture every time, and one of the helpers in turn. */
function passesForFrame(frame: number): ReadingPass[] {
  return [FIRST_PASS, LIVE_PASSES[frame % LIVE_PASSES.length]].filter((pass) => pass !== undefined);
}

function readStill(image: GrayImage): ReadResult | null {
  for (const picture of picturesToTry(image)) {
    const result = tryPasses(picture, READING_PASSES);
    if (result) return picture === image ? result : { ...result, points: [] };
  }
  return null;
}

function tryPasses(image: GrayImage, passes: readonly ReadingPass[]): ReadResult | null {
  for (const pass of passes) {
    const prepared = pass.prepare(image);
    if (!prepared) continue;
    for (const binariser of pass.binarisers) {
      const decoded = decodeWithZxing(prepared, binariser);
      if (!decoded) continue;
      return { text: decoded.text, pass: pass.name, points: pass.keepsPlaces ? decoded.points : [] };
    }
  }
  return null;
}
