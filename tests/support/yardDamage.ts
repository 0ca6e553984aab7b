import type { GrayImage } from '../../shared/reader/grayImage';
import { blurBox } from '../../shared/reader/transforms';
import {
  createRandom,
  normal,
  photograph,
  repaint,
  straight,
  tiltedBy,
  turnedBy,
  wrappedRound,
  type Random,
  type Shot,
} from './yardScene';

/** 1 (light) to 5 (hardly any reader gets it). */
export type DamageLevel = 1 | 2 | 3 | 4 | 5;
export const DAMAGE_LEVELS: readonly DamageLevel[] = [1, 2, 3, 4, 5];

/** What one level of one family does, on the label before it is photographed, in the shot, or on the photo. */
interface Damage {
  label?: (label: GrayImage) => GrayImage;
  shot?: Partial<Shot>;
  photo?: (photo: GrayImage) => GrayImage;
}
type Family = (level: DamageLevel, random: Random) => Damage;

const PHOTO_PX = 360;
const LABEL_PX = 240;

function addNoise(sigma: number, random: Random): (photo: GrayImage) => GrayImage {
  return (photo) => repaint(photo, (shade) => shade + sigma * normal(random));
}

function defocus(radiusPx: number): (photo: GrayImage) => GrayImage {
  return (photo) => blurBox(blurBox(photo, radiusPx), radiusPx);
}

/** Mean along a line, as from a hand that moves while the shutter is open. */
function smear(lengthPx: number): (photo: GrayImage) => GrayImage {
  return (photo) => {
    const { width, data } = photo;
    let at = 0;
    return repaint(photo, () => {
      let sum = 0;
      for (let step = 0; step < lengthPx; step++) sum += data[Math.max(0, at - step * (width + 2))] ?? 0;
      at++;
      return sum / lengthPx;
    });
  };
}

function shade(strength: number, angle: number): (photo: GrayImage) => GrayImage {
  return (photo) =>
    repaint(photo, (light, x, y) => {
      const across = (x - 0.5) * Math.cos(angle) + (y - 0.5) * Math.sin(angle);
      return across > 0 ? light : light * (1 - strength * Math.min(1, -across * 20));
    });
}

interface Spot {
  x: number;
  y: number;
  radius: number;
}

/** Spots of one shade on the label; sizes in label widths. */
function spots(
  count: number,
  radius: number,
  paint: number,
  random: Random,
): (label: GrayImage) => GrayImage {
  const places: Spot[] = Array.from({ length: count }, () => ({
    x: random(),
    y: random(),
    radius: radius * (0.4 + random()),
  }));
  return (label) =>
    repaint(label, (before, x, y) =>
      places.some((spot) => (spot.x - x) ** 2 + (spot.y - y) ** 2 < spot.radius ** 2) ? paint : before,
    );
}

/** Bright lines where print was scraped off. */
function scratches(count: number, random: Random): (label: GrayImage) => GrayImage {
  const lines = Array.from({ length: count }, () => ({
    angle: random() * Math.PI,
    offset: random() - 0.5,
    halfWidth: 0.003 + 0.005 * random(),
  }));
  return (label) =>
    repaint(label, (before, x, y) =>
      lines.some(
        ({ angle, offset, halfWidth }) =>
          Math.abs((x - 0.5) * Math.cos(angle) + (y - 0.5) * Math.sin(angle) - offset) < halfWidth,
      )
        ? 235
        : before,
    );
}

/** Our own families of what a yard, a printer and a phone do to a code; figures chosen to span easy to hopeless. */
export const DAMAGE_FAMILIES = {
  straight: () => ({}),
  tilt: (level) => ({ shot: { project: tiltedBy(14 * level) } }),
  turn: (level, random) => ({ shot: { project: turnedBy(18 * level + 6 * random()) } }),
  small: (level) => ({ shot: { labelPx: LABEL_PX / (0.8 + 0.45 * level), photoPx: PHOTO_PX / 2 } }),
  blur: (level) => ({ photo: defocus(level) }),
  motion: (level) => ({ photo: smear(1 + 2 * level) }),
  noise: (level, random) => ({ photo: addNoise(16 * level, random) }),
  lowLight: (level, random) => ({
    photo: (photo) => addNoise(2 + level, random)(repaint(photo, (light) => light * (0.55 - 0.1 * level))),
  }),
  shadow: (level, random) => ({ photo: shade(0.25 + 0.14 * level, 2 * Math.PI * random()) }),
  glare: (level, random) => {
    const [atX, atY] = [0.3 + 0.4 * random(), 0.3 + 0.4 * random()];
    return {
      photo: (photo) =>
        repaint(photo, (light, x, y) => {
          const distance = Math.hypot(x - atX, y - atY);
          return light + 420 * Math.exp(-((distance / (0.04 + 0.02 * level)) ** 2));
        }),
    };
  },
  scratches: (level, random) => ({ label: scratches(3 * level, random) }),
  dirt: (level, random) => ({ label: spots(2 * level, 0.035, 50, random) }),
  abrasion: (level, random) => ({ label: spots(90 * level, 0.007, 225, random) }),
  cylinder: (level) => ({ shot: { project: wrappedRound(1.15 / (1 + 0.42 * level)) } }),
  quietZoneCut: (level) => ({
    label: (label) => repaint(label, (before, x) => (x < 0.019 * level ? 60 : before)),
  }),
  faded: (level, random) => {
    const lines = Array.from({ length: level - 1 }, random);
    return {
      label: (label) =>
        repaint(label, (before, x) =>
          lines.some((line) => Math.abs(line - x) < 0.007) ? 230 : before + (230 - before) * (0.16 * level),
        ),
    };
  },
  several: (level, random) => ({
    label: scratches(level, random),
    shot: { project: tiltedBy(8 * level) },
    photo: (photo) =>
      addNoise(
        5 * level,
        random,
      )(shade(0.1 * level, 2 * Math.PI * random())(defocus(Math.ceil(level / 2))(photo))),
  }),
} as const satisfies Record<string, Family>;

export type DamageFamily = keyof typeof DAMAGE_FAMILIES;
export const DAMAGE_FAMILY_NAMES = Object.keys(DAMAGE_FAMILIES) as DamageFamily[];

/** A square photo of the label after damage; the same arguments always give the same picture. */
export function damageLabel(
  label: GrayImage,
  family: DamageFamily,
  level: DamageLevel,
  seed: number,
): GrayImage {
  const make: Family = DAMAGE_FAMILIES[family];
  const damage = make(level, createRandom(seed));
  const shot: Shot = { photoPx: PHOTO_PX, labelPx: LABEL_PX, project: straight, ...damage.shot };
  const photo = photograph(damage.label?.(label) ?? label, shot);
  return damage.photo?.(photo) ?? photo;
}
