import { describe, expect, it } from 'vitest';
import { measureText } from '../../labels/fonts/faces';
import type { LabelLayout } from '../../labels/layout/boxes';
import { layoutLabel } from '../../labels/layout/layoutLabel';
import { layoutTestPages } from '../../labels/layout/layoutTestPage';
import { pageSize, placeLabels } from '../../labels/layout/placeLabels';
import { findStock, LABEL_STOCKS, labelsPerPage, type LabelData, type LabelStock } from '../../labels';
import { buildLabelItem, LONG_TEXTS } from './labelItems';

const QUIET = 4;
const usual = buildLabelItem();
const long = buildLabelItem(LONG_TEXTS);
const odd = buildLabelItem({
  number: '',
  kindName: '  \n\u202e\t',
  loads: [],
  company: 'W'.repeat(500),
});

function getStock(id: string): LabelStock {
  const stock = findStock(id);
  if (!stock) throw new Error(`No stock ${id}`);
  return stock;
}

function dots(mm: number, stock: LabelStock): number {
  return (mm * stock.dpi) / 25.4;
}

function expectWhole(value: number): void {
  expect(Math.abs(value - Math.round(value))).toBeLessThan(1e-6);
}

function textOf(layout: LabelLayout, role: string): string {
  return layout.texts
    .filter((box) => box.role === role)
    .map((box) => box.text)
    .join('');
}

const cases: [string, LabelStock, LabelData][] = LABEL_STOCKS.flatMap((stock) =>
  [usual, long, odd].map((item, i): [string, LabelStock, LabelData] => [
    `${stock.id} ${['usual', 'long', 'odd'][i] ?? ''}`,
    stock,
    item,
  ]),
);

describe.each(cases)('label on %s', (_name, stock, item) => {
  const layout = layoutLabel(item, stock, measureText);
  const { qr } = layout;
  const quietMm = QUIET * qr.moduleMm;

  it('puts every edge of the code on a whole printer dot', () => {
    for (const mm of [qr.xMm, qr.yMm, qr.moduleMm]) expectWhole(dots(mm, stock));
    expect(qr.moduleDots).toBe(stock.moduleDots);
    expectWhole(dots(layout.widthMm, stock));
  });

  it('keeps the code with its quiet zone on the label', () => {
    expect(qr.xMm - quietMm).toBeGreaterThanOrEqual(-1e-6);
    expect(qr.yMm - quietMm).toBeGreaterThanOrEqual(-1e-6);
    expect(qr.yMm + qr.side * qr.moduleMm + quietMm).toBeLessThanOrEqual(layout.heightMm + 1e-6);
    expect(layout.widthMm).toBeLessThanOrEqual(stock.widthMm);
    expect(layout.heightMm).toBeLessThanOrEqual(stock.heightMm);
  });

  it('keeps all text on the label and out of the quiet zone', () => {
    const quietEndsMm = qr.xMm + qr.side * qr.moduleMm + quietMm;
    for (const box of layout.texts) {
      expect(box.xMm).toBeGreaterThan(quietEndsMm);
      expect(box.xMm + box.widthMm).toBeLessThan(layout.widthMm - 0.5);
      expect(box.baselineMm - box.sizeMm).toBeGreaterThan(0);
      expect(box.baselineMm + 0.25 * box.sizeMm).toBeLessThan(layout.heightMm);
      expect(box.sizeMm).toBeGreaterThan(0.9);
    }
  });

  it('sets lines apart', () => {
    for (const [i, box] of layout.texts.entries()) {
      const above = layout.texts[i - 1];
      if (above)
        expect(box.baselineMm - 0.9 * box.sizeMm).toBeGreaterThanOrEqual(
          above.baselineMm + 0.2 * above.sizeMm,
        );
    }
  });

  it('never cuts the number, the rated loads, the code or the notice', () => {
    expect(textOf(layout, 'number')).toBe(item.number);
    expect(textOf(layout, 'code')).toMatch(/^.{4}-.{3}-.{3}$/);
    expect(textOf(layout, 'notice')).toMatch(/^not the maker's tag( · |$)/);
    for (const load of item.loads) {
      expect(textOf(layout, 'load').replaceAll(/[ ·]/g, '')).toContain(
        `${load.label}${load.text}`.replaceAll(' ', ''),
      );
    }
  });
});

describe('text on labels', () => {
  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    'sets the code on %s at least 2.5 mm high, to type from',
    (_id, stock) => {
      const code = layoutLabel(usual, stock, measureText).texts.find((box) => box.role === 'code');
      expect(code?.sizeMm).toBeGreaterThanOrEqual(2.5);
    },
  );

  it('shows letters that the fonts lack as question marks, and counts their width', () => {
    expect(measureText('💥', 'sans')).toBe(measureText('?', 'sans'));
    expect(measureText('ŁΩЖ', 'sansBold')).toBeGreaterThan(1.5);
  });

  it('cuts a long kind with an ellipsis', () => {
    const layout = layoutLabel(long, getStock('roll-203-flat'), measureText);
    expect(textOf(layout, 'kind')).toMatch(/^Double-leg alloy chain sling.*…$/);
  });

  it('refuses a code with a wrong check character', () => {
    const broken = buildLabelItem({
      code: `${usual.code.slice(0, 9)}${usual.code.endsWith('2') ? '3' : '2'}`,
    });
    expect(() => layoutLabel(broken, getStock('roll-203-flat'), measureText)).toThrow('tag code');
  });
});

describe('codes larger than the pinned version', () => {
  it('get fewer dots a module, still whole and inside', () => {
    const stock = getStock('roll-203-flat');
    const { qr } = layoutLabel({ ...usual, version: 6 }, stock, measureText);
    expect(qr.moduleDots).toBe(4);
    expect((qr.side + 2 * QUIET) * qr.moduleMm).toBeLessThanOrEqual(stock.qrMm + 1e-9);
  });

  it('are refused where modules would be under two dots', () => {
    expect(() => layoutLabel({ ...usual, version: 12 }, getStock('roll-203-round'), measureText)).toThrow(
      'too dense',
    );
  });
});

describe('stocks', () => {
  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    '%s has the measured size of code',
    (_id, stock) => {
      // Source: design file labels.md: flat tags 25 mm, rope tags and thin sleeves 12.5 to 16 mm, by dpi and whole dots.
      const sizes: Record<LabelStock['use'], Record<LabelStock['dpi'], number[]>> = {
        flat: { 203: [27.8], 300: [25.1], 600: [25.1] },
        round: { 203: [13.9], 300: [12.5, 15.7], 600: [12.5, 15.7] },
      };
      expect(sizes[stock.use][stock.dpi]).toContain(Math.round(stock.qrMm * 10) / 10);
    },
  );

  it('have ids of their own', () => {
    expect(new Set(LABEL_STOCKS.map((stock) => stock.id)).size).toBe(LABEL_STOCKS.length);
    expect(findStock('nothing')).toBeNull();
  });

  it.each(LABEL_STOCKS.filter((stock) => stock.sheet).map((stock) => [stock.id, stock] as const))(
    '%s: all labels of a sheet lie on it, apart, on the printer’s grid',
    (_id, stock) => {
      const places = placeLabels(labelsPerPage(stock), stock);
      const page = pageSize(stock);
      for (const [i, place] of places.entries()) {
        expect(place.page).toBe(0);
        expectWhole(dots(place.xMm, stock));
        expectWhole(dots(place.yMm, stock));
        expect(place.xMm + stock.widthMm).toBeLessThanOrEqual(page.widthMm);
        expect(place.yMm + stock.heightMm).toBeLessThanOrEqual(page.heightMm);
        for (const other of places.slice(i + 1)) {
          const isApart =
            Math.abs(other.xMm - place.xMm) > stock.widthMm - 0.05 ||
            Math.abs(other.yMm - place.yMm) > stock.heightMm - 0.05;
          expect(isApart).toBe(true);
        }
      }
    },
  );

  it('start a run at the given place of a part-used sheet and go on with the next', () => {
    const stock = getStock('a4-600-flat');
    const places = placeLabels(3, stock, 23);
    expect(places.map((place) => place.page)).toEqual([0, 0, 1]);
    expect(places[0]?.xMm).toBeCloseTo(6 + 67, 1);
    expect(places[2]?.xMm).toBeCloseTo(6, 1);
  });

  it.each([0, 25, 1.5, Number.NaN])('refuse to start at %s of 24', (startAt) => {
    expect(() => placeLabels(1, getStock('a4-600-flat'), startAt)).toThrow('from 1 to 24');
  });
});

describe('printer test pages', () => {
  it.each(LABEL_STOCKS.map((stock) => [stock.id, stock] as const))(
    '%s: codes fall in size and stay on the page',
    (_id, stock) => {
      const pages = layoutTestPages(stock, measureText);
      const page = pageSize(stock);
      const codes = pages.flatMap((each) => each.codes);
      const tried = codes.map((code) => code.qr.moduleDots);
      expect(tried).toEqual([...tried].sort((a, b) => b - a));
      expect(tried.at(-1)).toBe(2);
      for (const { qr, payload } of codes) {
        expectWhole(dots(qr.xMm, stock));
        expectWhole(dots(qr.yMm, stock));
        expect(qr.yMm + (qr.side + QUIET) * qr.moduleMm).toBeLessThanOrEqual(page.heightMm + 0.1);
        expect(payload).toBe(`SLINGWARD TEST ${String(stock.dpi)} DPI ${String(qr.moduleDots)} DOTS`);
      }
      for (const box of pages.flatMap((each) => each.texts)) {
        expect(box.xMm + box.widthMm).toBeLessThanOrEqual(page.widthMm);
        expect(box.baselineMm).toBeLessThan(page.heightMm);
      }
    },
  );
});
