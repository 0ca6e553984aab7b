import { createGrayImage, type GrayImage } from './grayImage';

/** Mean over a square of `2 * radiusPx + 1` pixels; at the edge the nearest pixel is repeated. */
export function blurBox(image: GrayImage, radiusPx: number): GrayImage {
  const { width, height } = image;
  const across = new Uint16Array(width * height);
  for (let y = 0; y < height; y++) sumLine(image.data, across, y * width, 1, width, radiusPx);
  const sums = new Uint32Array(width * height);
  for (let x = 0; x < width; x++) sumLine(across, sums, x, width, height, radiusPx);
  const area = (2 * radiusPx + 1) ** 2;
  const blurred = createGrayImage(width, height);
  for (let i = 0; i < sums.length; i++) blurred.data[i] = (sums[i] ?? 0) / area;
  return blurred;
}

type Samples = Uint8ClampedArray | Uint16Array | Uint32Array;

/** A running sum along one line of `length` samples that stand `step` apart, starting at `start`. */
function sumLine(
  from: Samples,
  to: Samples,
  start: number,
  step: number,
  length: number,
  radius: number,
): void {
  const last = length - 1;
  const at = (i: number): number => from[start + Math.min(Math.max(i, 0), last) * step] ?? 0;
  let sum = 0;
  for (let i = -radius; i <= radius; i++) sum += at(i);
  for (let i = 0; i < length; i++) {
    to[start + i * step] = sum;
    sum += at(i + radius + 1) - at(i - radius);
  }
}

/** Spread of shades that an even area is taken to have, so that plain paper isn't blown up to noise. */
const LEAST_SPREAD = 12;

/**
 * Gives every neighbourhood the same mean and spread of shades: takes out shadow, glare and fading.
 * @param radiusPx half the side of the neighbourhood; a few modules of the code
 */
export function evenOutContrast(image: GrayImage, radiusPx: number): GrayImage {
  const { width, height, data } = image;
  const { sums, squares } = sumTables(image);
  const even = createGrayImage(width, height);
  const stride = width + 1;
  for (let y = 0; y < height; y++) {
    const top = Math.max(0, y - radiusPx) * stride;
    const bottom = Math.min(height, y + radiusPx + 1) * stride;
    for (let x = 0; x < width; x++) {
      const left = Math.max(0, x - radiusPx);
      const right = Math.min(width, x + radiusPx + 1);
      const area = ((bottom - top) / stride) * (right - left);
      const mean = windowSum(sums, top, bottom, left, right) / area;
      const variance = windowSum(squares, top, bottom, left, right) / area - mean * mean;
      const spread = Math.sqrt(Math.max(0, variance)) + LEAST_SPREAD;
      even.data[y * width + x] = 128 + (64 * ((data[y * width + x] ?? 0) - mean)) / spread;
    }
  }
  return even;
}

function windowSum(table: Float64Array, top: number, bottom: number, left: number, right: number): number {
  const sum = (table[bottom + right] ?? 0) - (table[bottom + left] ?? 0);
  return sum - (table[top + right] ?? 0) + (table[top + left] ?? 0);
}

/** Summed-area tables of shades and of their squares, one row and column larger than the picture. */
function sumTables({ data, width, height }: GrayImage): { sums: Float64Array; squares: Float64Array } {
  const stride = width + 1;
  const sums = new Float64Array(stride * (height + 1));
  const squares = new Float64Array(stride * (height + 1));
  for (let y = 0; y < height; y++) {
    let rowSum = 0;
    let rowSquares = 0;
    for (let x = 0; x < width; x++) {
      const shade = data[y * width + x] ?? 0;
      rowSum += shade;
      rowSquares += shade * shade;
      const at = (y + 1) * stride + x + 1;
      sums[at] = (sums[at - stride] ?? 0) + rowSum;
      squares[at] = (squares[at - stride] ?? 0) + rowSquares;
    }
  }
  return { sums, squares };
}

/** Changes the size: between the pixels when enlarging, over the area that a new pixel covers when reducing. */
export function resize(image: GrayImage, factor: number): GrayImage {
  const width = Math.max(1, Math.round(image.width * factor));
  const height = Math.max(1, Math.round(image.height * factor));
  const resized = createGrayImage(width, height);
  // Reducing without taking the mean first would drop whole lines of thin modules.
  const source = factor < 1 ? blurBox(image, Math.max(0, Math.round((1 / factor - 1) / 2))) : image;
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      resized.data[y * width + x] = sampleBetween(source, (x + 0.5) / factor - 0.5, (y + 0.5) / factor - 0.5);
    }
  }
  return resized;
}

/** The shade at a place between pixels; the edge goes on outside. */
export function sampleBetween({ data, width, height }: GrayImage, x: number, y: number): number {
  const left = Math.min(Math.max(Math.floor(x), 0), width - 1);
  const top = Math.min(Math.max(Math.floor(y), 0), height - 1);
  const right = Math.min(left + 1, width - 1);
  const bottom = Math.min(top + 1, height - 1);
  const dx = Math.min(Math.max(x - left, 0), 1);
  const dy = Math.min(Math.max(y - top, 0), 1);
  const upper = (data[top * width + left] ?? 0) * (1 - dx) + (data[top * width + right] ?? 0) * dx;
  const lower = (data[bottom * width + left] ?? 0) * (1 - dx) + (data[bottom * width + right] ?? 0) * dx;
  return upper * (1 - dy) + lower * dy;
}

/** Puts white around the picture, for codes whose quiet zone was cut off with the picture's edge. */
export function addWhiteBorder(image: GrayImage, borderPx: number): GrayImage {
  const framed = createGrayImage(image.width + 2 * borderPx, image.height + 2 * borderPx);
  for (let y = 0; y < image.height; y++) {
    const row = image.data.subarray(y * image.width, (y + 1) * image.width);
    framed.data.set(row, (y + borderPx) * framed.width + borderPx);
  }
  return framed;
}

/** Turns the picture about its middle on a canvas of its own size; what falls outside is lost, what is new is white. */
export function turn(image: GrayImage, clockwiseDeg: number): GrayImage {
  const { width, height } = image;
  const angle = (clockwiseDeg * Math.PI) / 180;
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const turned = createGrayImage(width, height);
  for (let y = 0; y < height; y++) {
    for (let x = 0; x < width; x++) {
      const dx = x - (width - 1) / 2;
      const dy = y - (height - 1) / 2;
      const fromX = cos * dx + sin * dy + (width - 1) / 2;
      const fromY = cos * dy - sin * dx + (height - 1) / 2;
      const isInside = fromX > -0.5 && fromY > -0.5 && fromX < width - 0.5 && fromY < height - 0.5;
      if (isInside) turned.data[y * width + x] = sampleBetween(image, fromX, fromY);
    }
  }
  return turned;
}
