import { KIND_FACTS } from './kinds';
import type { KindAndSpec } from './spec';

const WEB_TYPE_NAMES = {
  triangle_choker: 'triangle and choker',
  triangle_triangle: 'two triangles',
  eye_eye_flat: 'flat eyes',
  eye_eye_twisted: 'twisted eyes',
  endless: 'endless',
  reversed_eye: 'reversed eye',
} as const;

/** One line that tells the sling apart: "2-leg chain sling, grade 80, 10 mm". Sizes stay in mm as on makers' tags. */
export function describeSling(sling: KindAndSpec & { legs: number }): string {
  const legs = sling.legs > 1 ? `${sling.legs}-leg ` : '';
  const name = legs ? KIND_FACTS[sling.kind].name.toLowerCase() : KIND_FACTS[sling.kind].name;
  return `${legs}${name}, ${describeSpec(sling)}`;
}

function describeSpec(sling: KindAndSpec): string {
  switch (sling.kind) {
    case 'alloy-chain':
      return `grade ${sling.spec.grade}, ${sling.spec.chainMm} mm${sling.spec.endless ? ', endless' : ''}`;
    case 'wire-rope':
      return `${sling.spec.className} ${sling.spec.core.toUpperCase()}, ${sling.spec.diameterMm} mm`;
    case 'metal-mesh':
      return `${sling.spec.duty} duty, ${sling.spec.widthMm} mm${sling.spec.coated ? ', coated' : ''}`;
    case 'synthetic-web':
      return `${sling.spec.fibre}, ${sling.spec.widthMm} mm, ${sling.spec.plies}-ply, ${WEB_TYPE_NAMES[sling.spec.type]}`;
    case 'synthetic-round':
      return `${sling.spec.fibre.replace('_', ' ')}${sling.spec.size ? `, size ${sling.spec.size}` : ''}`;
    case 'synthetic-rope':
      return `${sling.spec.fibre}, ${sling.spec.diameterMm} mm`;
  }
}
