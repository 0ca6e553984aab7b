import { describe, expect, it } from 'vitest';
import { chooseMask, chooseMasks, pickVersion } from '../../labels';
import { rasteriseCode } from '../../labels/qr/rasterise';
import { buildMatrix, findStandardMask } from '../../labels/qr/symbol';
import { decodeWithZxing } from '../../shared/reader/zxingDecoder';
import { buildLabelItems } from './labelItems';

const payloadOf = (length: number) => 'HTTPS://S.EXAMPLE/T/'.padEnd(length, 'A');

describe('pickVersion', () => {
  // Source: capacities of ISO/IEC 18004 as in the facts file, section 9: version 3 holds 35 at H, 47 at Q; 4-Q 67, 5-Q 87.
  it.each([
    [30, 'H', 3, false],
    [35, 'H', 3, false],
    [36, 'Q', 3, false],
    [47, 'Q', 3, false],
    [48, 'Q', 4, true],
    [67, 'Q', 4, true],
    [68, 'Q', 5, true],
  ])('takes for %i characters level %s, version %i, warning: %s', (length, level, version, warns) => {
    const picked = pickVersion(payloadOf(length));
    expect([picked.level, picked.version]).toEqual([level, version]);
    expect(picked.warning !== null).toBe(warns);
  });

  it('still finds a version for what can’t pack as alphanumeric, such as an IPv6 address', () => {
    const picked = pickVersion('HTTP://[FE80::1]:4173/T/AJ5RVGDQGC');
    expect(picked.version).toBeGreaterThan(3);
    expect(picked.warning).not.toBeNull();
  });

  it('throws for a payload that no code holds', () => {
    expect(() => pickVersion(payloadOf(5000))).toThrow();
  });
});

describe('chooseMask', () => {
  const items = buildLabelItems(60, 3);

  it('gives the same symbol each time', () => {
    for (const { payload, level, version, mask } of items.slice(0, 5)) {
      expect(chooseMask(payload)).toEqual({ level, version, mask });
    }
  });

  it('leaves the standard mask where that one can’t be read, and what it takes instead reads', () => {
    const scales = [3, 5, 5.3, 6, 6.5, 7, 8];
    const readsAll = (payload: string, mask: number, level: 'Q' | 'H', version: number) =>
      scales.every((pixelsPerModule) => {
        const image = rasteriseCode(buildMatrix(payload, { level, version, mask }), {
          pixelsPerModule,
          turnedDeg: 0,
        });
        return decodeWithZxing(image, 'hybrid')?.text === payload;
      });
    const changed = items.filter(
      (item) => item.mask !== findStandardMask(item.payload, item.level, item.version),
    );
    expect(changed.length).toBeGreaterThan(0);
    for (const { payload, level, version, mask } of changed)
      expect(readsAll(payload, mask, level, version)).toBe(true);
  });

  it('chooses for a whole run in order', async () => {
    const payloads = items.slice(0, 3).map((item) => item.payload);
    const symbols = await chooseMasks(payloads);
    expect(symbols.map((symbol) => symbol.mask)).toEqual(items.slice(0, 3).map((item) => item.mask));
  });

  it('refuses a mask that doesn’t exist', () => {
    expect(() => buildMatrix('A', { level: 'H', version: 3, mask: 8 })).toThrow(RangeError);
  });
});
