import { describe, expect, it } from 'vitest';
import { buildMatrix } from '../../../labels/qr/symbol';
import { rasteriseCode } from '../../../labels/qr/rasterise';
import { createCodeReader, readQr } from '../../../shared/reader/codeReader';
import { createGrayImage } from '../../../shared/reader/grayImage';
import { decodeWithZxing } from '../../../shared/reader/zxingDecoder';
import { resize } from '../../../shared/reader/transforms';
import { buildLabelItems } from '../../labels/labelItems';
import {
  DAMAGE_FAMILY_NAMES,
  DAMAGE_LEVELS,
  damageLabel,
  type DamageFamily,
  type DamageLevel,
} from '../../support/yardDamage';

const labels = buildLabelItems(2, 11).map((item) => ({
  payload: item.payload,
  picture: rasteriseCode(buildMatrix(item.payload, item), { pixelsPerModule: 8, turnedDeg: 0 }),
}));
const [first] = labels;
if (!first) throw new Error('No label was built.');

/** What one damaged picture gave. */
interface Outcome {
  family: DamageFamily;
  isPlainRead: boolean;
  isRead: boolean;
  isWrong: boolean;
}

function readDamaged(
  family: DamageFamily,
  level: DamageLevel,
  label: (typeof labels)[number],
  seed: number,
): Outcome {
  const picture = damageLabel(label.picture, family, level, seed);
  const plain = decodeWithZxing(picture, 'hybrid')?.text;
  const ours = readQr(picture)?.text;
  return {
    family,
    isPlainRead: plain === label.payload,
    isRead: ours === label.payload,
    isWrong: ours !== undefined && ours !== label.payload,
  };
}

function count(outcomes: Outcome[], has: (outcome: Outcome) => boolean): number {
  return outcomes.filter(has).length;
}

describe('reading what a yard does to a label', () => {
  const outcomes = DAMAGE_FAMILY_NAMES.flatMap((family) =>
    DAMAGE_LEVELS.flatMap((level) =>
      labels.map((label, i) => readDamaged(family, level, label, 100 * i + level)),
    ),
  );
  const plainReads = count(outcomes, (outcome) => outcome.isPlainRead);
  const ourReads = count(outcomes, (outcome) => outcome.isRead);

  it('never gives a wrong text', () => {
    expect(count(outcomes, (outcome) => outcome.isWrong)).toBe(0);
  });

  it('reads at least a quarter more than the plain decoder', () => {
    expect(ourReads).toBeGreaterThanOrEqual(Math.ceil(plainReads * 1.25));
  });

  it.each(['straight', 'turn', 'small', 'noise', 'quietZoneCut'])('reads every level of %s', (family) => {
    const ofFamily = outcomes.filter((outcome) => outcome.family === family);
    expect(count(ofFamily, (outcome) => outcome.isRead)).toBe(ofFamily.length);
  });

  it.each(DAMAGE_FAMILY_NAMES)('reads %s wherever the plain decoder does, and at least once', (family) => {
    const ofFamily = outcomes.filter((outcome) => outcome.family === family);
    expect(count(ofFamily, (outcome) => outcome.isPlainRead && !outcome.isRead)).toBe(0);
    expect(count(ofFamily, (outcome) => outcome.isRead)).toBeGreaterThan(0);
  });

  it('makes the same picture from the same seed, another from another', () => {
    const make = (seed: number) => damageLabel(first.picture, 'scratches', 3, seed).data;
    expect(Buffer.from(make(5)).equals(Buffer.from(make(5)))).toBe(true);
    expect(Buffer.from(make(5)).equals(Buffer.from(make(6)))).toBe(false);
  });
});

describe('createCodeReader', () => {
  it('reads a clean label in the first live frame and says where it stands', () => {
    const result = createCodeReader().read(first.picture, 'live');
    expect(result?.text).toBe(first.payload);
    expect(result?.pass).toBe('plain');
    // Finder patterns' middles: 4 quiet modules + 3.5, at 8 pixels a module.
    const [lowerLeft, upperLeft, upperRight] = result?.points ?? [];
    for (const value of [upperLeft?.x, upperLeft?.y, lowerLeft?.x, upperRight?.y]) {
      expect(Math.abs((value ?? 0) - 60)).toBeLessThan(4);
    }
    expect(Math.abs((upperRight?.x ?? 0) - 236)).toBeLessThan(4);
  });

  it('gives each helper its turn on live frames: a noisy picture is read within one round', () => {
    const noisy = damageLabel(first.picture, 'noise', 4, 3);
    const reader = createCodeReader();
    const reads = Array.from({ length: 5 }, () => reader.read(noisy, 'live')?.text);
    expect(decodeWithZxing(noisy, 'hybrid')).toBeNull();
    expect(reads).toContain(first.payload);
  });

  it('reads a large photo', () => {
    expect(readQr(resize(first.picture, 7))?.text).toBe(first.payload);
  });

  it.each([
    ['nothing', createGrayImage(200, 200)],
    ['a picture of one pixel', createGrayImage(1, 1)],
    ['a sliver', createGrayImage(500, 2)],
    [
      'stripes',
      { ...createGrayImage(90, 90), data: Uint8ClampedArray.from({ length: 8100 }, (_, i) => (i % 7) * 40) },
    ],
  ])('finds nothing in %s', (_name, image) => {
    expect(readQr(image)).toBeNull();
    expect(createCodeReader().read(image, 'live')).toBeNull();
  });
});
