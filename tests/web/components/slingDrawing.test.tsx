import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import {
  MESH_DUTIES,
  ROPE_CONSTRUCTIONS,
  ROPE_SPLICES,
  WEB_TYPES,
  type FittingType,
  FITTING_TYPES,
} from '../../../shared/domain/slings/spec';
import { layOut, placeOnLeg, type DrawnSling } from '../../../src/components/sling/drawing/layout';
import { SlingDrawing } from '../../../src/components/sling/SlingDrawing';

const chain = (legs: number, lower: FittingType[] = []): DrawnSling => ({
  kind: 'alloy-chain',
  spec: { grade: 80, chainMm: 10 },
  legs,
  reachMm: 3000,
  fittings: lower.map((type) => ({ type, position: 'lower', hasLatch: true })),
});
const base = { legs: 1, reachMm: 2000, fittings: [] } as const;

const everySling: DrawnSling[] = [
  ...[1, 2, 3, 4].map((legs) => chain(legs)),
  ...FITTING_TYPES.map((type) => chain(2, [type])),
  { ...base, kind: 'alloy-chain', spec: { grade: 100, chainMm: 45, endless: true } },
  ...ROPE_SPLICES.flatMap((splice) =>
    ROPE_CONSTRUCTIONS.map((construction): DrawnSling => ({
      ...base,
      kind: 'wire-rope',
      spec: { construction, className: '6x19', diameterMm: 20, core: 'iwrc', ropeGrade: 'eips', splice },
    })),
  ),
  ...MESH_DUTIES.map((duty): DrawnSling => ({
    ...base,
    kind: 'metal-mesh',
    spec: { duty, widthMm: 200, wireMm: 2, coated: true },
  })),
  ...WEB_TYPES.map((type): DrawnSling => ({
    ...base,
    kind: 'synthetic-web',
    spec: { fibre: 'nylon', widthMm: 2000, plies: 4, type },
  })),
  { ...base, kind: 'synthetic-round', spec: { fibre: 'polyester' } },
  { ...base, kind: 'synthetic-round', spec: { fibre: 'high_performance' }, legs: 3, reachMm: 1 },
  { ...base, kind: 'synthetic-rope', spec: { fibre: 'polyester', diameterMm: 300 }, reachMm: 1_000_000 },
];

describe('the drawing', () => {
  it.each(everySling.map((sling) => [JSON.stringify(sling), sling] as const))(
    'draws %s with a title and real numbers',
    (_, sling) => {
      const svg = renderToStaticMarkup(<SlingDrawing sling={sling} />);
      expect(svg).toMatch(/role="img"/);
      expect(svg).toMatch(/<title[^>]*>Drawing: .+<\/title>/);
      expect(svg).not.toMatch(/NaN|Infinity|undefined/);
    },
  );

  it('shows as many legs and hooks as the sling has', () => {
    for (const legs of [1, 2, 3, 4]) {
      const layout = layOut(
        chain(
          legs,
          Array.from({ length: legs }, () => 'hook'),
        ),
      );
      expect(layout.legs).toHaveLength(legs);
      expect(layout.legs.every((leg) => leg.lower?.type === 'hook')).toBe(true);
    }
  });

  it('draws no lower fitting that is not on record', () => {
    expect(layOut(chain(2)).legs.map((leg) => leg.lower)).toEqual([undefined, undefined]);
  });

  it('points hooks outwards', () => {
    const [left, right] = layOut(chain(2, ['hook', 'hook'])).legs;
    expect([left?.isMirrored, right?.isMirrored]).toEqual([false, true]);
  });

  it('makes all legs of a pair equally long', () => {
    const lengths = layOut(chain(4)).legs.map((leg) =>
      Math.hypot(leg.bottom.x - leg.top.x, leg.bottom.y - leg.top.y),
    );
    for (const length of lengths) expect(length).toBeCloseTo(lengths[0] ?? 0, 6);
  });

  it('stays inside its frame', () => {
    for (const sling of everySling) {
      const layout = layOut(sling);
      for (const { bottom } of layout.legs) {
        expect(bottom.x).toBeGreaterThan(0);
        expect(bottom.x).toBeLessThan(layout.width);
        expect(bottom.y).toBeLessThan(layout.height);
      }
    }
  });
});

describe('a pin', () => {
  const layout = layOut(chain(2, ['hook', 'hook']));

  it('stands where the finding is along its leg', () => {
    const right = layout.legs[1];
    expect(placeOnLeg(layout, 2, 3000, 3000)).toEqual(right?.bottom);
    expect(placeOnLeg(layout, 2, 0, 3000)).toEqual(layout.crown);
    const middle = placeOnLeg(layout, 2, 1500, 3000);
    expect(middle.x).toBeGreaterThan(layout.middle);
    expect(middle.y).toBeLessThan(right?.bottom.y ?? 0);
  });

  it('stays on the sling for a place beyond its end', () => {
    expect(placeOnLeg(layout, 9, 99_999, 3000)).toEqual(layout.legs[1]?.bottom);
  });

  it('is named in the title', () => {
    const svg = renderToStaticMarkup(
      <SlingDrawing sling={chain(2)} pins={[{ n: 1, leg: 1, positionMm: 100 }]} />,
    );
    expect(svg).toContain('with 1 finding marked');
  });
});
