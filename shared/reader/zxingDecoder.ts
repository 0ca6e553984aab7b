// Deep imports: the package's main entry can't be cut to size and brings 120 kB (gzip) of other codes along, these
// five files 29 kB. The CommonJS build, because its ESM build has imports that Node can't resolve.
import * as binaryBitmapModule from '@zxing/library/cjs/core/BinaryBitmap.js';
import * as globalHistogramModule from '@zxing/library/cjs/core/common/GlobalHistogramBinarizer.js';
import * as hybridModule from '@zxing/library/cjs/core/common/HybridBinarizer.js';
import * as luminanceSourceModule from '@zxing/library/cjs/core/LuminanceSource.js';
import * as qrCodeReaderModule from '@zxing/library/cjs/core/qrcode/QRCodeReader.js';
import type { GrayImage } from './grayImage';

export type BinariserName = 'hybrid' | 'global';

export interface Point {
  x: number;
  y: number;
}

export interface DecodedQr {
  text: string;
  /** Middles of the finder patterns (lower left, upper left, upper right), then of the alignment pattern if seen. */
  points: Point[];
}

/** Node and bundlers disagree on where the class of a CommonJS module with a default export is found. */
function unwrapDefault<T>(module: { default: T | { default: T } }): T {
  const outer = module.default;
  return hasDefault<T>(outer) ? outer.default : outer;
}

function hasDefault<T>(value: T | { default: T }): value is { default: T } {
  return typeof value === 'object' && value !== null && 'default' in value;
}

const BinaryBitmap = unwrapDefault(binaryBitmapModule);
const LuminanceSource = unwrapDefault(luminanceSourceModule);
const QRCodeReader = unwrapDefault(qrCodeReaderModule);
const BINARISERS = {
  hybrid: unwrapDefault(hybridModule),
  global: unwrapDefault(globalHistogramModule),
} as const satisfies Record<BinariserName, unknown>;

class GrayLuminanceSource extends LuminanceSource {
  readonly #image: GrayImage;

  constructor(image: GrayImage) {
    super(image.width, image.height);
    this.#image = image;
  }

  override getRow(y: number, row?: Uint8ClampedArray): Uint8ClampedArray {
    const { data, width } = this.#image;
    const line = data.subarray(y * width, (y + 1) * width);
    if (row === undefined || row.length < width) return line.slice();
    row.set(line);
    return row;
  }

  override getMatrix(): Uint8ClampedArray {
    return this.#image.data;
  }

  override invert(): never {
    throw new Error('Labels are black on white; inverted pictures are not read.');
  }
}

/** One attempt at one picture; null when there is no code in it that can be read. */
export function decodeWithZxing(image: GrayImage, binariser: BinariserName): DecodedQr | null {
  const bits = new BinaryBitmap(new BINARISERS[binariser](new GrayLuminanceSource(image)));
  try {
    const result = new QRCodeReader().decode(bits);
    return {
      text: result.getText(),
      points: result.getResultPoints().map((point) => ({ x: point.getX(), y: point.getY() })),
    };
  } catch {
    // The package says "no code here" and "too damaged" with exceptions of many kinds, some of them plain errors.
    return null;
  }
}
