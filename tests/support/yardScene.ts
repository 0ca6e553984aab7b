import { createGrayImage, type GrayImage } from '../../shared/reader/grayImage';
import { sampleBetween } from '../../shared/reader/transforms';

/** Numbers in [0, 1). */
export type Random = () => number;

/** Mulberry32: the same seed gives the same pictures on every machine. */
export function createRandom(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** Roughly normal, mean 0, standard deviation 1. */
export function normal(random: Random): number {
  let sum = 0;
  for (let i = 0; i < 6; i++) sum += random();
  return (sum - 3) * Math.SQRT2;
}

/** From a place in the photo, in label widths from the label's middle, to a place on the label (±0.5); null: beside it. */
export type Projection = (x: number, y: number) => { u: number; v: number } | null;

export interface Shot {
  /** Side of the square photo. */
  photoPx: number;
  /** Width of the label in it. */
  labelPx: number;
  project: Projection;
}

const BACKGROUND = 118;
const SAMPLES = 2;

/** Takes a photo of the label on a grey ground. */
export function photograph(label: GrayImage, shot: Shot): GrayImage {
  const photo = createGrayImage(shot.photoPx, shot.photoPx);
  for (let y = 0; y < shot.photoPx; y++) {
    for (let x = 0; x < shot.photoPx; x++) {
      let sum = 0;
      for (let sample = 0; sample < SAMPLES ** 2; sample++) {
        const offX = (x + ((sample % SAMPLES) + 0.5) / SAMPLES - shot.photoPx / 2) / shot.labelPx;
        const offY = (y + (Math.floor(sample / SAMPLES) + 0.5) / SAMPLES - shot.photoPx / 2) / shot.labelPx;
        sum += shadeAt(label, shot.project(offX, offY));
      }
      photo.data[y * shot.photoPx + x] = sum / SAMPLES ** 2;
    }
  }
  return photo;
}

function shadeAt(label: GrayImage, place: { u: number; v: number } | null): number {
  if (!place) return BACKGROUND;
  const x = (place.u + 0.5) * label.width;
  const y = place.v * label.width + label.height / 2;
  if (x < 0 || y < 0 || x >= label.width || y >= label.height) return BACKGROUND;
  return sampleBetween(label, x - 0.5, y - 0.5);
}

export const straight: Projection = (x, y) => ({ u: x, v: y });

export function turnedBy(degrees: number): Projection {
  const cos = Math.cos((degrees * Math.PI) / 180);
  const sin = Math.sin((degrees * Math.PI) / 180);
  return (x, y) => ({ u: cos * x + sin * y, v: cos * y - sin * x });
}

/** The label leans away about its vertical axis, seen from three label widths. */
export function tiltedBy(degrees: number): Projection {
  const distance = 3;
  const cos = Math.cos((degrees * Math.PI) / 180);
  const sin = Math.sin((degrees * Math.PI) / 180);
  return (x, y) => {
    const u = (x * distance) / (distance * cos - x * sin);
    return { u, v: y * (1 + (u * sin) / distance) };
  };
}

/** @param radius of the rope the label is wrapped round, in label widths */
export function wrappedRound(radius: number): Projection {
  return (x, y) => (Math.abs(x) >= radius ? null : { u: Math.asin(x / radius) * radius, v: y });
}

/** A new picture, each pixel from its shade and place (0 to 1 across and down). */
export function repaint(image: GrayImage, paint: (shade: number, x: number, y: number) => number): GrayImage {
  const painted = createGrayImage(image.width, image.height);
  for (let i = 0; i < painted.data.length; i++) {
    const x = (i % image.width) / image.width;
    const y = Math.floor(i / image.width) / image.height;
    painted.data[i] = paint(image.data[i] ?? 0, x, y);
  }
  return painted;
}
