import { describe, expect, it } from 'vitest';
import { createGrayImage, grayFromRgba, type GrayImage } from '../../../shared/reader/grayImage';
import { addWhiteBorder, blurBox, evenOutContrast, resize, turn } from '../../../shared/reader/transforms';

function imageOf(rows: number[][]): GrayImage {
  return { data: new Uint8ClampedArray(rows.flat()), width: rows[0]?.length ?? 0, height: rows.length };
}

function rowsOf(image: GrayImage): number[][] {
  return Array.from({ length: image.height }, (_, y) => [
    ...image.data.subarray(y * image.width, (y + 1) * image.width),
  ]);
}

describe('grayFromRgba', () => {
  it('weighs the colours as Rec. 601 does', () => {
    const rgba = [255, 255, 255, 255, 255, 0, 0, 255, 0, 255, 0, 255, 0, 0, 255, 255];
    expect([...grayFromRgba({ data: rgba, width: 4, height: 1 }).data]).toEqual([255, 76, 149, 28]);
  });

  it('takes see-through parts as on white', () => {
    expect([...grayFromRgba({ data: [0, 0, 0, 0], width: 1, height: 1 }).data]).toEqual([255]);
  });
});

describe('blurBox', () => {
  it('takes the mean of the neighbours, repeating the edge', () => {
    const image = imageOf([
      [0, 0, 90],
      [0, 0, 0],
      [0, 0, 0],
    ]);
    expect(rowsOf(blurBox(image, 1))).toEqual([
      [0, 20, 40],
      [0, 10, 20],
      [0, 0, 0],
    ]);
  });

  it('leaves an even picture alone', () => {
    expect(new Set(blurBox(createGrayImage(9, 7, 93), 3).data)).toEqual(new Set([93]));
  });
});

describe('evenOutContrast', () => {
  it('gives a dim half the same shades as a bright one', () => {
    const stripes = createGrayImage(120, 20);
    for (let i = 0; i < stripes.data.length; i++) {
      const x = i % 120;
      const dark = Math.floor(x / 3) % 2 === 0;
      stripes.data[i] = x < 60 ? (dark ? 5 : 60) : dark ? 120 : 250;
    }
    const even = evenOutContrast(stripes, 8);
    const darkest = (from: number) => Math.min(...even.data.subarray(from, from + 20));
    expect(Math.abs(darkest(20) - darkest(80))).toBeLessThan(20);
    expect(Math.max(...even.data.subarray(20, 40))).toBeGreaterThan(150);
  });
});

describe('geometry', () => {
  it('doubles and halves', () => {
    const image = imageOf([
      [0, 100],
      [0, 100],
    ]);
    const doubled = resize(image, 2);
    expect([doubled.width, doubled.height]).toEqual([4, 4]);
    expect(rowsOf(doubled)[0]).toEqual([0, 25, 75, 100]);
    expect([resize(doubled, 0.5).width, resize(doubled, 0.5).height]).toEqual([2, 2]);
  });

  it('puts a white border around', () => {
    expect(rowsOf(addWhiteBorder(imageOf([[7]]), 1))).toEqual([
      [255, 255, 255],
      [255, 7, 255],
      [255, 255, 255],
    ]);
  });

  it('turns about the middle', () => {
    const image = createGrayImage(5, 5);
    image.data[2 * 5 + 4] = 0;
    const turned = turn(image, 90);
    expect(turned.data[4 * 5 + 2] ?? 255).toBeLessThan(255);
    expect(turned.data[2 * 5 + 4]).toBe(255);
  });
});
