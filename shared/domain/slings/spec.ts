import type { SlingKind } from './kinds';

export const CHAIN_GRADES = [80, 100, 120] as const;
export const ROPE_CONSTRUCTIONS = ['strand_laid', 'cable_laid', 'braided_6', 'braided_8', 'grommet'] as const;
export const ROPE_CORES = ['iwrc', 'fc'] as const;
export const ROPE_GRADES = ['ips', 'eips', 'eeips', '1770', '1960'] as const;
export const ROPE_SPLICES = [
  'turnback',
  'hand_tucked',
  'flemish',
  'swaged_socket',
  'poured_socket',
  'welded_end',
] as const;
export const ROPE_FERRULES = ['aluminium', 'steel'] as const;
export const MESH_DUTIES = ['heavy', 'medium', 'light'] as const;
export const WEB_FIBRES = ['nylon', 'polyester', 'polypropylene'] as const;
export const WEB_TYPES = [
  'triangle_choker',
  'triangle_triangle',
  'eye_eye_flat',
  'eye_eye_twisted',
  'endless',
  'reversed_eye',
] as const;
export const ROUND_FIBRES = ['polyester', 'high_performance'] as const;

export interface ChainSpec {
  grade: (typeof CHAIN_GRADES)[number];
  chainMm: number;
  endless?: boolean | undefined;
}
export interface WireRopeSpec {
  construction: (typeof ROPE_CONSTRUCTIONS)[number];
  /** Rope class such as 6x19 or 6x36. */
  className: string;
  diameterMm: number;
  core: (typeof ROPE_CORES)[number];
  ropeGrade: (typeof ROPE_GRADES)[number];
  splice: (typeof ROPE_SPLICES)[number];
  ferrule?: (typeof ROPE_FERRULES)[number] | undefined;
}
export interface MeshSpec {
  duty: (typeof MESH_DUTIES)[number];
  widthMm: number;
  wireMm: number;
  coated?: boolean | undefined;
}
export interface WebSpec {
  fibre: (typeof WEB_FIBRES)[number];
  widthMm: number;
  plies: number;
  type: (typeof WEB_TYPES)[number];
}
export interface RoundSpec {
  fibre: (typeof ROUND_FIBRES)[number];
  size?: string | undefined;
}
export interface FibreRopeSpec {
  fibre: (typeof WEB_FIBRES)[number];
  diameterMm: number;
}

export interface SpecByKind {
  'alloy-chain': ChainSpec;
  'wire-rope': WireRopeSpec;
  'metal-mesh': MeshSpec;
  'synthetic-web': WebSpec;
  'synthetic-round': RoundSpec;
  'synthetic-rope': FibreRopeSpec;
}

/** A sling's kind with the spec that belongs to it; `kind` decides which. */
export type KindAndSpec = { [K in SlingKind]: { kind: K; spec: SpecByKind[K] } }[SlingKind];

export const FITTING_TYPES = [
  'hook',
  'self_locking_hook',
  'shackle',
  'master_link',
  'coupling_link',
  'ring',
  'thimble',
  'eye',
  'choker_fitting',
  'triangle',
  'other',
] as const;
export type FittingType = (typeof FITTING_TYPES)[number];
export const FITTING_NAMES = {
  hook: 'Hook',
  self_locking_hook: 'Self-locking hook',
  shackle: 'Shackle',
  master_link: 'Master link',
  coupling_link: 'Coupling link',
  ring: 'Ring',
  thimble: 'Thimble',
  eye: 'Eye',
  choker_fitting: 'Choker fitting',
  triangle: 'Triangle',
  other: 'Other fitting',
} as const satisfies Record<FittingType, string>;

export const FITTING_POSITIONS = ['upper', 'lower', 'other'] as const;
export type FittingPosition = (typeof FITTING_POSITIONS)[number];

export interface Fitting {
  id: number;
  position: FittingPosition;
  type: FittingType;
  sizeMm?: number | undefined;
  throatMm?: number | undefined;
  hasLatch?: boolean | undefined;
  detachable: boolean;
}

/** Both hook types count as hooks (agreed API). */
export function isHook(fitting: Pick<Fitting, 'type'>): boolean {
  return fitting.type === 'hook' || fitting.type === 'self_locking_hook';
}

export interface RatedLoads {
  verticalKg: number;
  chokerKg?: number | undefined;
  /** Basket with vertical legs. */
  basketKg?: number | undefined;
  /** Rated load of a bridle at this angle from horizontal. */
  bridle?: { kg: number; angleDeg: number } | undefined;
}
