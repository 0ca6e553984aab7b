import type { Fitting } from '../../../shared/domain/slings/spec';
import type { ModelLoads, SlingModel } from './model';

/** EN 13414-1, ferrule-secured, steel core, t (trade-facts 4.10); a single leg choked 0.8, as a basket 2.0. Bridles at 45°. */
const ROPE_ROWS: readonly { diameterMm: number; legs: 1 | 2 | 4; count: number; loads: ModelLoads }[] = [
  { diameterMm: 12, legs: 1, count: 12, loads: { vertical: 1.7, choker: 1.36, basket: 3.4 } },
  { diameterMm: 16, legs: 1, count: 16, loads: { vertical: 3, choker: 2.4, basket: 6 } },
  { diameterMm: 20, legs: 1, count: 12, loads: { vertical: 4.6, choker: 3.68, basket: 9.2 } },
  { diameterMm: 24, legs: 1, count: 8, loads: { vertical: 6.7, choker: 5.36, basket: 13.4 } },
  { diameterMm: 32, legs: 1, count: 6, loads: { vertical: 11.8, choker: 9.44, basket: 23.6 } },
  { diameterMm: 16, legs: 2, count: 10, loads: { vertical: 3, bridle: { load: 4.2, angleDeg: 45 } } },
  { diameterMm: 20, legs: 2, count: 8, loads: { vertical: 4.6, bridle: { load: 6.5, angleDeg: 45 } } },
  { diameterMm: 20, legs: 4, count: 4, loads: { vertical: 4.6, bridle: { load: 9.8, angleDeg: 45 } } },
  { diameterMm: 24, legs: 4, count: 4, loads: { vertical: 6.7, bridle: { load: 14, angleDeg: 45 } } },
];

function ropeFittings(diameterMm: number, legs: number): Omit<Fitting, 'id'>[] {
  const thimble = (position: 'upper' | 'lower'): Omit<Fitting, 'id'> => ({
    position,
    type: 'thimble',
    sizeMm: diameterMm,
    detachable: false,
  });
  if (legs === 1) return [thimble('upper'), thimble('lower')];
  const hook: Omit<Fitting, 'id'> = {
    position: 'lower',
    type: 'hook',
    sizeMm: diameterMm,
    throatMm: 36,
    hasLatch: true,
    detachable: true,
  };
  return [
    { position: 'upper', type: 'master_link', sizeMm: diameterMm + 6, detachable: false },
    ...Array.from({ length: legs }, () => hook),
  ];
}

export const WIRE_ROPE_MODELS: readonly SlingModel[] = ROPE_ROWS.map(
  ({ diameterMm, legs, count, loads }) => ({
    kind: 'wire-rope',
    spec: {
      construction: 'strand_laid',
      className: diameterMm < 16 ? '6x19' : '6x36',
      diameterMm,
      core: 'iwrc',
      ropeGrade: '1770',
      splice: 'turnback',
      ferrule: diameterMm < 32 ? 'aluminium' : 'steel',
    },
    id: `rope-${diameterMm}-${legs}`,
    count,
    maker: 'Oxbow Rope',
    legs,
    reachesMm: [3000, 4000, 6000, 8000],
    unit: 't',
    loads,
    fittings: ropeFittings(diameterMm, legs),
    serialPrefix: 'OX',
    certificate: 'declaration_of_conformity',
    isThin: true,
  }),
);

/** The former OSHA table of mesh slings, lb; from memory (trade-facts 4.9). Widths 4, 6 and 8 in; wires of 12 and 10 gauge. */
const MESH_ROWS = [
  { id: 'mesh-4', duty: 'medium', widthMm: 101.6, wireMm: 2.7, count: 6, vertical: 2700 },
  { id: 'mesh-6', duty: 'heavy', widthMm: 152.4, wireMm: 3.4, count: 8, vertical: 6000 },
  { id: 'mesh-8', duty: 'heavy', widthMm: 203.2, wireMm: 3.4, count: 6, vertical: 8000 },
] as const;

export const MESH_MODELS: readonly SlingModel[] = MESH_ROWS.map(
  ({ id, duty, widthMm, wireMm, count, vertical }) => ({
    kind: 'metal-mesh',
    spec: { duty, widthMm, wireMm },
    id,
    count,
    maker: 'Lacewing Mesh',
    legs: 1,
    reachesMm: [1500, 2000, 3000],
    unit: 'lb',
    loads: { vertical, choker: vertical, basket: 2 * vertical },
    fittings: [
      { position: 'upper', type: 'choker_fitting', sizeMm: 22, detachable: false },
      { position: 'lower', type: 'triangle', sizeMm: 22, detachable: false },
    ],
    serialPrefix: 'LM',
    certificate: 'assembly',
    isThin: false,
  }),
);
