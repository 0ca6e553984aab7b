import { createGrayImage, type GrayImage } from '../../shared/reader/grayImage';
import { QUIET_ZONE_MODULES, type QrMatrix } from './symbol';

export interface PictureOfCode {
  pixelsPerModule: number;
  /** Degrees, clockwise. */
  turnedDeg: number;
}

/** Points looked at in each pixel, per side: enough that edges become grey, as a camera makes them. */
const SAMPLES = 2;

/** A picture of the code with its quiet zone as a reader would meet it, straight or turned. */
export function rasteriseCode(matrix: QrMatrix, picture: PictureOfCode): GrayImage {
  const angle = (picture.turnedDeg * Math.PI) / 180;
  const modules = matrix.side + 2 * QUIET_ZONE_MODULES;
  const sidePx = Math.ceil(
    modules * picture.pixelsPerModule * (Math.abs(Math.cos(angle)) + Math.abs(Math.sin(angle))),
  );
  const counts = new Uint8Array(sidePx * sidePx);
  const grid = toGrid(matrix);
  // One step to the next point looked at, in modules along and across the code.
  const along = Math.cos(angle) / (picture.pixelsPerModule * SAMPLES);
  const across = Math.sin(angle) / (picture.pixelsPerModule * SAMPLES);
  const points = sidePx * SAMPLES;
  const first = (1 - points) / 2;
  for (let y = 0; y < points; y++) {
    let column = matrix.side / 2 + first * along + (first + y) * across;
    let row = matrix.side / 2 - first * across + (first + y) * along;
    const line = Math.floor(y / SAMPLES) * sidePx;
    for (let x = 0; x < points; x++, column += along, row -= across) {
      const isInside = row >= 0 && column >= 0 && row < matrix.side && column < matrix.side;
      if (isInside && grid[Math.trunc(row) * matrix.side + Math.trunc(column)] === 1) {
        const at = line + Math.floor(x / SAMPLES);
        counts[at] = (counts[at] ?? 0) + 1;
      }
    }
  }
  const image = createGrayImage(sidePx, sidePx);
  for (let i = 0; i < counts.length; i++) image.data[i] = 255 - (255 * (counts[i] ?? 0)) / SAMPLES ** 2;
  return image;
}

function toGrid(matrix: QrMatrix): Uint8Array {
  const grid = new Uint8Array(matrix.side * matrix.side);
  for (let i = 0; i < grid.length; i++) {
    grid[i] = matrix.isDark(Math.floor(i / matrix.side), i % matrix.side) ? 1 : 0;
  }
  return grid;
}
