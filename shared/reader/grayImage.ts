/** A picture in shades of grey, one byte a pixel (0 black, 255 white), row by row. Never changed in place. */
export interface GrayImage {
  readonly data: Uint8ClampedArray;
  readonly width: number;
  readonly height: number;
}

const WHITE = 255;

/** @param data four bytes a pixel, as a canvas gives them; see-through parts count as on white */
export function grayFromRgba(image: { data: ArrayLike<number>; width: number; height: number }): GrayImage {
  const { data: rgba, width, height } = image;
  const data = new Uint8ClampedArray(width * height);
  for (let i = 0, at = 0; i < data.length; i++, at += 4) {
    // Rec. 601 luma in 1/256.
    const luma = (77 * (rgba[at] ?? 0) + 150 * (rgba[at + 1] ?? 0) + 29 * (rgba[at + 2] ?? 0)) >> 8;
    const alpha = rgba[at + 3] ?? WHITE;
    data[i] = alpha === WHITE ? luma : WHITE + ((luma - WHITE) * alpha) / WHITE;
  }
  return { data, width, height };
}

export function createGrayImage(width: number, height: number, shade = WHITE): GrayImage {
  return { data: new Uint8ClampedArray(width * height).fill(shade), width, height };
}
