import type { ChainSpec, Fitting } from '../../../shared/domain/slings/spec';
import type { ModelLoads, SlingModel } from './model';

interface ChainRow {
  id: string;
  count: number;
  grade: ChainSpec['grade'];
  chainMm: number;
  legs: 1 | 2 | 4;
  unit: 'lb' | 't';
  loads: ModelLoads;
}

/**
 * Rated loads in lb: OSHA Guidance on Safe Sling Use, tables 1 and 2 (trade-facts 4.1, 4.2), bridles at 60° from
 * horizontal. In t: EN 818-4 (trade-facts 4.4), bridles at 45°. Chokers 0.8 of vertical, rounded as tables do.
 */
const ROWS: readonly ChainRow[] = [
  row('chain-8-1', 10, 80, 8, 1, 't', { vertical: 2, choker: 1.6 }),
  row('chain-8-2', 14, 80, 8, 2, 't', { vertical: 2, bridle: { load: 2.8, angleDeg: 45 } }),
  row('chain-10-2', 16, 80, 10, 2, 't', { vertical: 3.15, bridle: { load: 4.25, angleDeg: 45 } }),
  row('chain-10-4', 10, 80, 10, 4, 't', { vertical: 3.15, bridle: { load: 6.7, angleDeg: 45 } }),
  row('chain-13-2', 14, 80, 13, 2, 't', { vertical: 5.3, bridle: { load: 7.5, angleDeg: 45 } }),
  row('chain-13-4', 10, 80, 13, 4, 't', { vertical: 5.3, bridle: { load: 11.2, angleDeg: 45 } }),
  row('chain-16-4', 8, 80, 16, 4, 't', { vertical: 8, bridle: { load: 17, angleDeg: 45 } }),
  row('chain-us80-10-1', 8, 80, 10, 1, 'lb', { vertical: 7100, choker: 5700 }),
  row('chain-us80-13-1', 4, 80, 13, 1, 'lb', { vertical: 12_000, choker: 9600 }),
  row('chain-us80-13-2', 10, 80, 13, 2, 'lb', { vertical: 12_000, bridle: { load: 20_800, angleDeg: 60 } }),
  row('chain-us100-10-2', 10, 100, 10, 2, 'lb', { vertical: 8800, bridle: { load: 15_200, angleDeg: 60 } }),
  row('chain-us100-13-4', 6, 100, 13, 4, 'lb', { vertical: 15_000, bridle: { load: 39_000, angleDeg: 60 } }),
];

function row(
  id: string,
  count: number,
  grade: ChainSpec['grade'],
  chainMm: number,
  legs: ChainRow['legs'],
  unit: ChainRow['unit'],
  loads: ModelLoads,
): ChainRow {
  return { id, count, grade, chainMm, legs, unit, loads };
}

/** Throat openings and master links as invented makers would have them. */
const THROAT_MM: Record<number, number> = { 8: 26, 10: 32, 13: 40, 16: 48 };
const MASTER_MM: Record<number, number> = { 8: 16, 10: 18, 13: 22, 16: 28 };

function chainFittings({ chainMm, legs, grade }: ChainRow): Omit<Fitting, 'id'>[] {
  const hook: Omit<Fitting, 'id'> = {
    position: 'lower',
    type: grade === 100 ? 'self_locking_hook' : 'hook',
    sizeMm: chainMm,
    throatMm: THROAT_MM[chainMm],
    hasLatch: true,
    detachable: true,
  };
  return [
    { position: 'upper', type: 'master_link', sizeMm: MASTER_MM[chainMm], detachable: false },
    ...Array.from({ length: legs }, () => hook),
  ];
}

export const CHAIN_MODELS: readonly SlingModel[] = ROWS.map((chain) => ({
  kind: 'alloy-chain',
  spec: { grade: chain.grade, chainMm: chain.chainMm },
  id: chain.id,
  count: chain.count,
  maker: 'Tarn Forge',
  legs: chain.legs,
  reachesMm: [2000, 3000, 4000, 6000],
  unit: chain.unit,
  loads: chain.loads,
  fittings: chainFittings(chain),
  serialPrefix: 'TF',
  certificate: 'assembly',
  isThin: false,
}));
