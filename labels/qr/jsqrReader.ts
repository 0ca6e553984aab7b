import jsqrModule from 'jsqr';
import type { GrayImage } from '../../shared/reader/grayImage';

type JsQr = typeof jsqrModule;

/** jsQR's CommonJS build hides its function under `default` when Node loads it. */
function hasDefault(value: unknown): value is { default: JsQr } {
  return typeof value === 'object' && value !== null && 'default' in value;
}
const jsqr: JsQr = hasDefault(jsqrModule) ? jsqrModule.default : jsqrModule;

/** Reads a picture with jsQR, the second and independent reader that every label must pass. */
export function readWithJsqr(image: GrayImage): string | null {
  const rgba = new Uint8ClampedArray(image.data.length * 4);
  for (let i = 0; i < image.data.length; i++) {
    const at = i * 4;
    rgba.fill(image.data[i] ?? 0, at, at + 3);
    rgba[at + 3] = 255;
  }
  return jsqr(rgba, image.width, image.height, { inversionAttempts: 'dontInvert' })?.data ?? null;
}
