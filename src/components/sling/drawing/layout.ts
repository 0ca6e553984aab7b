import type { Fitting, KindAndSpec } from '../../../../shared/domain/slings/spec';
import { clamp, type Point } from './geometry';

export type DrawnFitting = Pick<Fitting, 'type' | 'position' | 'hasLatch'>;
export type DrawnSling = KindAndSpec & {
  legs: number;
  reachMm: number;
  fittings: readonly DrawnFitting[];
};

export interface LegPlace {
  /** Where the leg hangs, and where it bears the load; reach runs between the crown and `bottom`. */
  top: Point;
  bottom: Point;
  length: number;
  /** Turn of the leg's own frame, in which it hangs straight down. */
  deg: number;
  /** The hook's tip points away from the middle. */
  isMirrored: boolean;
  lower: DrawnFitting | undefined;
}

export interface SlingLayout {
  width: number;
  height: number;
  /** Middle of the drawing: everything hangs below x = middle. */
  middle: number;
  /** The link that takes the crane's hook, if any, with its bearing place. */
  upper: DrawnFitting | undefined;
  crown: Point;
  /** Three and four legs hang in pairs from two smaller links. */
  subLinks: readonly { at: Point; deg: number }[];
  legs: readonly LegPlace[];
}

const MARGIN = 30;
const MASTER_BOTTOM = 62;
const SPREADS: Record<number, readonly number[]> = {
  1: [0],
  2: [-76, 76],
  3: [-96, 0, 96],
  4: [-112, -38, 38, 112],
};

/** Where everything stands. One drawing unit is not a length: long slings are drawn shorter than they are. */
export function layOut(sling: DrawnSling): SlingLayout {
  const count = isLoop(sling) ? 1 : clamp(sling.legs, 1, 4);
  const spreads = SPREADS[count] ?? [0];
  const uppers = sling.fittings.filter((f) => f.position === 'upper' && f.type !== 'thimble');
  const lowers = sling.fittings.filter((f) => f.position === 'lower' && f.type !== 'thimble');
  const upper = isLoop(sling) ? undefined : (uppers[0] ?? inferUpper(sling, count));
  const length = drawnLength(sling.reachMm, count);
  const middle = Math.max(...spreads) + MARGIN + (count === 1 ? 26 : 12);
  const isPaired = count > 2;
  const hang = upper ? MASTER_BOTTOM : 16;
  const legs = spreads.map((dx, i): LegPlace => {
    const side = dx === 0 ? 0 : Math.sign(dx);
    const top = isPaired
      ? { x: middle + side * 13, y: hang + (side === 0 ? 2 : 28) }
      : { x: middle + side * 3, y: hang };
    const own = isPaired && side !== 0 ? length - 28 : length;
    const reachX = dx - (top.x - middle);
    return {
      top,
      bottom: { x: middle + dx, y: top.y + Math.sqrt(own * own - reachX * reachX) },
      length: own,
      deg: (-Math.asin(reachX / own) * 180) / Math.PI,
      isMirrored: dx > 0,
      lower: lowers[i] ?? (lowers.length === 1 ? lowers[0] : undefined),
    };
  });
  return {
    width: middle * 2,
    height: Math.max(...legs.map((leg) => leg.bottom.y)) + 18,
    middle,
    upper,
    crown: { x: middle, y: upper ? 14 : 16 },
    subLinks: isPaired
      ? [
          { at: { x: middle, y: hang - 2 }, deg: 24 },
          { at: { x: middle, y: hang - 2 }, deg: -24 },
        ]
      : [],
    legs,
  };
}

/** Slings that are one closed loop have neither legs nor ends. */
export function isLoop(sling: KindAndSpec & { fittings: readonly DrawnFitting[]; legs: number }): boolean {
  switch (sling.kind) {
    case 'alloy-chain':
      return sling.spec.endless === true;
    case 'wire-rope':
      return sling.spec.construction === 'grommet';
    case 'synthetic-web':
      return sling.spec.type === 'endless' && sling.legs === 1 && sling.fittings.length === 0;
    case 'synthetic-round':
      return sling.legs === 1 && sling.fittings.length === 0;
    case 'metal-mesh':
    case 'synthetic-rope':
      return false;
  }
}

/** Legs have to hang from something, and a chain sling always has an end link. */
function inferUpper(sling: DrawnSling, count: number): DrawnFitting | undefined {
  return count > 1 || sling.kind === 'alloy-chain' ? { type: 'master_link', position: 'upper' } : undefined;
}

/** From half a metre to ten, on a logarithmic scale. */
function drawnLength(reachMm: number, count: number): number {
  const share = clamp(Math.log2(reachMm / 500) / Math.log2(20), 0, 1);
  return (count === 1 ? 210 : 200) + 110 * share;
}

/** The place of a finding: so far from the crown along its leg (legs count from 1). */
export function placeOnLeg(layout: SlingLayout, leg: number, positionMm: number, reachMm: number): Point {
  const found = layout.legs[clamp(leg, 1, layout.legs.length) - 1];
  const share = clamp(positionMm / reachMm, 0, 1);
  const from = layout.crown;
  const to = found?.bottom ?? from;
  const bend = found?.top ?? from;
  // Two straight pieces: crown to hanging place, then down the leg.
  const first = Math.hypot(bend.x - from.x, bend.y - from.y);
  const second = Math.hypot(to.x - bend.x, to.y - bend.y);
  const along = share * (first + second);
  const [a, b, t] = along < first ? [from, bend, along / first] : [bend, to, (along - first) / second];
  return { x: a.x + (b.x - a.x) * t, y: a.y + (b.y - a.y) * t };
}
