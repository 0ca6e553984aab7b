export interface Point {
  x: number;
  y: number;
}
/** A place on a curve and the direction there, degrees clockwise from the x axis (SVG's sense). */
export interface CurvePoint extends Point {
  deg: number;
}

export interface Curve {
  /** SVG path data. */
  d: string;
  length: number;
  /** The point at this arc length from the start. */
  at: (length: number) => CurvePoint;
}

const round = (value: number): number => Math.round(value * 10) / 10;

/** A curve through sampled points; links and strands are then laid along it by arc length. */
export function makeCurve(points: readonly Point[], isClosed = false): Curve {
  const first = points[0];
  if (!first || points.length < 2) throw new Error('A curve needs two points');
  const all = isClosed ? [...points, first] : points;
  const lengths = [0];
  for (let i = 1; i < all.length; i++) {
    const [a, b] = [all[i - 1] ?? first, all[i] ?? first];
    lengths.push((lengths[i - 1] ?? 0) + Math.hypot(b.x - a.x, b.y - a.y));
  }
  const length = lengths.at(-1) ?? 0;
  const d = `M${all.map((p) => `${round(p.x)} ${round(p.y)}`).join('L')}${isClosed ? 'Z' : ''}`;
  return {
    d,
    length,
    at(along) {
      const s = Math.min(Math.max(along, 0), length);
      const next = Math.max(
        1,
        lengths.findIndex((l) => l >= s),
      );
      const [a, b] = [all[next - 1] ?? first, all[next] ?? first];
      const [from, to] = [lengths[next - 1] ?? 0, lengths[next] ?? 0];
      const t = to > from ? (s - from) / (to - from) : 0;
      return {
        x: a.x + (b.x - a.x) * t,
        y: a.y + (b.y - a.y) * t,
        deg: (Math.atan2(b.y - a.y, b.x - a.x) * 180) / Math.PI,
      };
    },
  };
}

/** `count` places along the curve, each in the middle of its share. */
export function spread(curve: Curve, count: number): CurvePoint[] {
  return Array.from({ length: count }, (_, i) => curve.at(((i + 0.5) / count) * curve.length));
}

export const lineDown = (x: number, top: number, bottom: number): Curve =>
  makeCurve([
    { x, y: top },
    { x, y: bottom },
  ]);

/** A closed loop, round at both ends, standing upright around x = 0. */
export function loop(top: number, bottom: number, halfWidth: number): Curve {
  const points: Point[] = [];
  const half = (centreY: number, fromDeg: number): void => {
    for (let i = 0; i <= 24; i++) {
      const a = ((fromDeg + i * 7.5) * Math.PI) / 180;
      points.push({ x: halfWidth * Math.cos(a), y: centreY + halfWidth * Math.sin(a) });
    }
  };
  half(top + halfWidth, 180);
  half(bottom - halfWidth, 0);
  return makeCurve(points, true);
}

/** A drop-shaped eye from its throat at (x, throat) to its far end at (x, tip). */
export function drop(throat: number, tip: number, halfWidth: number, x = 0): Curve {
  const h = tip - throat;
  const side = (sign: 1 | -1): Point[] =>
    sampleCubic(
      { x, y: throat },
      { x: x + sign * halfWidth * 0.35, y: throat + h * 0.28 },
      { x: x + sign * halfWidth * 1.75, y: tip },
      { x, y: tip },
    );
  return makeCurve([...side(-1), ...side(1).reverse().slice(1)]);
}

function sampleCubic(a: Point, b: Point, c: Point, d: Point): Point[] {
  return Array.from({ length: 25 }, (_, i) => {
    const t = i / 24;
    const u = 1 - t;
    const mix = (k: 'x' | 'y'): number =>
      u ** 3 * a[k] + 3 * u * u * t * b[k] + 3 * u * t * t * c[k] + t ** 3 * d[k];
    return { x: mix('x'), y: mix('y') };
  });
}

export const clamp = (value: number, low: number, high: number): number =>
  Math.min(Math.max(value, low), high);
