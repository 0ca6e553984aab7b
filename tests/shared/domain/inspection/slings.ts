import type { ExaminedFitting, ExaminedSling } from '../../../../shared/domain/inspection/criterion';
import type { SlingKind } from '../../../../shared/domain/slings/kinds';

export const HOOK: ExaminedFitting = { id: 2, type: 'hook', hasLatch: true, throatMm: 50.8 };
export const MASTER_LINK: ExaminedFitting = { id: 1, type: 'master_link' };
export const SHACKLE: ExaminedFitting = { id: 3, type: 'shackle' };

/** One sling of each kind, all with the same fittings. */
export function slingOf(
  kind: SlingKind,
  fittings: ExaminedFitting[] = [MASTER_LINK, HOOK, SHACKLE],
): ExaminedSling {
  switch (kind) {
    case 'alloy-chain':
      return { kind, spec: { grade: 80, chainMm: 13 }, fittings, legs: 2 };
    case 'wire-rope':
      return {
        kind,
        spec: {
          construction: 'strand_laid',
          className: '6x19',
          diameterMm: 12,
          core: 'iwrc',
          ropeGrade: 'eips',
          splice: 'turnback',
        },
        fittings,
        legs: 2,
      };
    case 'metal-mesh':
      return { kind, spec: { duty: 'heavy', widthMm: 150, wireMm: 3 }, fittings, legs: 1 };
    case 'synthetic-web':
      return {
        kind,
        spec: { fibre: 'polyester', widthMm: 60, plies: 2, type: 'eye_eye_flat' },
        fittings,
        legs: 1,
      };
    case 'synthetic-round':
      return { kind, spec: { fibre: 'polyester' }, fittings, legs: 1 };
    case 'synthetic-rope':
      return { kind, spec: { fibre: 'nylon', diameterMm: 24 }, fittings, legs: 1 };
  }
}
