import type { RoundSpec, WebSpec } from '../../../shared/domain/slings/spec';
import type { ModelLoads, SlingModel } from './model';

/** Straight, choked 0.8, basket with parallel legs 2.0 (EN 1492 mode factors, trade-facts 4.5). */
const textileLoads = (vertical: number): ModelLoads => ({
  vertical,
  choker: Number((vertical * 0.8).toFixed(3)),
  basket: vertical * 2,
});

/** EN 1492-1 rated loads, kg, in the usual 30 mm of duplex web a tonne (common practice, no source). */
const WEB_ROWS: readonly {
  id: string;
  widthMm: number;
  verticalKg: number;
  count: number;
  type: WebSpec['type'];
}[] = [
  { id: 'web-30', widthMm: 30, verticalKg: 1000, count: 18, type: 'eye_eye_flat' },
  { id: 'web-60', widthMm: 60, verticalKg: 2000, count: 30, type: 'eye_eye_flat' },
  { id: 'web-60-choker', widthMm: 60, verticalKg: 2000, count: 6, type: 'triangle_choker' },
  { id: 'web-90', widthMm: 90, verticalKg: 3000, count: 20, type: 'eye_eye_flat' },
  { id: 'web-120', widthMm: 120, verticalKg: 4000, count: 10, type: 'eye_eye_twisted' },
  { id: 'web-150', widthMm: 150, verticalKg: 5000, count: 6, type: 'eye_eye_flat' },
];

export const WEB_MODELS: readonly SlingModel[] = WEB_ROWS.map(({ id, widthMm, verticalKg, count, type }) => ({
  kind: 'synthetic-web',
  spec: { fibre: 'polyester', widthMm, plies: 2, type },
  id,
  count,
  maker: 'Brightweave',
  legs: 1,
  reachesMm: [2000, 3000, 4000, 6000],
  unit: 'kg',
  loads: textileLoads(verticalKg),
  fittings:
    type === 'triangle_choker'
      ? [
          { position: 'upper', type: 'triangle', sizeMm: 14, detachable: false },
          { position: 'lower', type: 'choker_fitting', sizeMm: 14, detachable: false },
        ]
      : [],
  serialPrefix: null,
  certificate: 'declaration_of_conformity',
  isThin: false,
}));

/** EN 1492-2 rated loads, t (trade-facts 4.5). */
const ROUND_ROWS: readonly { id: string; loadT: number; count: number; fibre: RoundSpec['fibre'] }[] = [
  { id: 'round-1', loadT: 1, count: 16, fibre: 'polyester' },
  { id: 'round-2', loadT: 2, count: 24, fibre: 'polyester' },
  { id: 'round-3', loadT: 3, count: 16, fibre: 'polyester' },
  { id: 'round-5', loadT: 5, count: 12, fibre: 'polyester' },
  { id: 'round-10', loadT: 10, count: 8, fibre: 'polyester' },
  { id: 'round-20', loadT: 20, count: 4, fibre: 'high_performance' },
];

export const ROUND_MODELS: readonly SlingModel[] = ROUND_ROWS.map(({ id, loadT, count, fibre }) => ({
  kind: 'synthetic-round',
  spec: { fibre, size: `${loadT} t` },
  id,
  count,
  maker: 'Brightweave',
  legs: 1,
  reachesMm: [1000, 2000, 3000, 5000],
  unit: 't',
  loads: textileLoads(loadT),
  fittings: [],
  serialPrefix: loadT >= 10 ? 'BW' : null,
  certificate: 'declaration_of_conformity',
  isThin: false,
}));

/** No published table on file: about a seventh of a usual breaking strength (from memory, no source). */
const ROPE_ROWS = [
  { id: 'fibre-16', fibre: 'polyester', diameterMm: 16, verticalKg: 500, count: 10 },
  { id: 'fibre-24', fibre: 'nylon', diameterMm: 24, verticalKg: 1200, count: 12 },
  { id: 'fibre-32', fibre: 'polyester', diameterMm: 32, verticalKg: 2000, count: 8 },
] as const;

export const FIBRE_ROPE_MODELS: readonly SlingModel[] = ROPE_ROWS.map(
  ({ id, fibre, diameterMm, verticalKg, count }) => ({
    kind: 'synthetic-rope',
    spec: { fibre, diameterMm },
    id,
    count,
    maker: 'Oxbow Rope',
    legs: 1,
    reachesMm: [2000, 4000, 6000],
    unit: 'kg',
    loads: textileLoads(verticalKg),
    fittings: [
      { position: 'upper', type: 'thimble', sizeMm: diameterMm, detachable: false },
      { position: 'lower', type: 'thimble', sizeMm: diameterMm, detachable: false },
    ],
    serialPrefix: null,
    certificate: null,
    isThin: true,
  }),
);
