import type { GrayImage } from './grayImage';
import { addWhiteBorder, blurBox, evenOutContrast, resize, turn } from './transforms';
import type { BinariserName } from './zxingDecoder';

/** One way to prepare a picture before decoding. The order is the order of trying: cheap and fruitful first. */
export interface ReadingPass {
  name: string;
  /** Null when the pass makes no sense for a picture of that size. */
  prepare: (image: GrayImage) => GrayImage | null;
  binarisers: readonly BinariserName[];
  /** Cheap enough to take its turn on a running camera. */
  isLive: boolean;
  /** What is found stands at the same pixels as in the picture handed in. */
  keepsPlaces: boolean;
}

const BOTH = ['hybrid', 'global'] as const;

/** Pictures beyond this are reduced first: more pixels a module only cost time and show the noise. */
const COMFORTABLE_SIDE_PX = 1200;
/** Enlarging helps small codes in small pictures; beyond this it only costs time. */
const LARGEST_TO_ENLARGE_PX = 800;
const BORDER_PX = 24;
const AWAY_FROM_45_DEG = 30;
const LEAST_NEIGHBOURHOOD_PX = 10;

function longSide(image: GrayImage): number {
  return Math.max(image.width, image.height);
}

function evenOut(image: GrayImage): GrayImage {
  return evenOutContrast(image, Math.max(LEAST_NEIGHBOURHOOD_PX, Math.round(longSide(image) / 16)));
}

const LIVE = { isLive: true, keepsPlaces: true };
const STILL = { isLive: false, keepsPlaces: true };

/** What helped, from the design file labels.md ("What helps", 1), measured on synthetic pictures. */
export const READING_PASSES: readonly ReadingPass[] = [
  { ...LIVE, name: 'plain', prepare: (image) => image, binarisers: ['hybrid'] },
  { ...LIVE, name: 'blur 1', prepare: (image) => blurBox(image, 1), binarisers: BOTH },
  { ...LIVE, name: 'even contrast', prepare: evenOut, binarisers: ['hybrid'] },
  {
    ...LIVE,
    name: 'half size',
    prepare: (image) => resize(image, 0.5),
    binarisers: BOTH,
    keepsPlaces: false,
  },
  { ...LIVE, name: 'blur 2', prepare: (image) => blurBox(image, 2), binarisers: BOTH },
  {
    // The decoder takes modules for the wrong size when the code stands near 45 degrees.
    ...LIVE,
    name: 'turned',
    prepare: (image) => blurBox(turn(image, AWAY_FROM_45_DEG), 1),
    binarisers: BOTH,
    keepsPlaces: false,
  },
  { ...STILL, name: 'plain, one threshold', prepare: (image) => image, binarisers: ['global'] },
  {
    ...STILL,
    name: 'even contrast, blur 2',
    prepare: (image) => blurBox(evenOut(image), 2),
    binarisers: BOTH,
  },
  {
    ...STILL,
    name: 'double size, blur 2',
    prepare: (image) => (longSide(image) > LARGEST_TO_ENLARGE_PX ? null : blurBox(resize(image, 2), 2)),
    binarisers: BOTH,
    keepsPlaces: false,
  },
  {
    ...STILL,
    name: 'white border, blur 1',
    prepare: (image) => blurBox(addWhiteBorder(image, BORDER_PX), 1),
    binarisers: BOTH,
    keepsPlaces: false,
  },
];

/** A large photo is looked at in a comfortable size first, then as it is. */
export function picturesToTry(image: GrayImage): GrayImage[] {
  const factor = COMFORTABLE_SIDE_PX / longSide(image);
  return factor < 1 ? [resize(image, factor), image] : [image];
}
