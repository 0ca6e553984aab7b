import {
  CERTIFICATE_BASIS_NAMES,
  type MakersTag,
  type ServiceClass,
} from '../../../../shared/domain/slings/kinds';
import {
  CHAIN_GRADES,
  FITTING_NAMES,
  type FibreRopeSpec,
  type FittingPosition,
  type MeshSpec,
  type RoundSpec,
  type WebSpec,
  type WireRopeSpec,
} from '../../../../shared/domain/slings/spec';
import { LENGTH_UNITS, LOAD_UNITS, UNIT_SIGNS } from '../../../../shared/domain/units/units';

export interface Option {
  value: string;
  label: string;
}

export function toOptions(names: Record<string, string>): Option[] {
  return Object.entries(names).map(([value, label]) => ({ value, label }));
}

export const LOAD_UNIT_OPTIONS = LOAD_UNITS.map((unit) => ({ value: unit, label: UNIT_SIGNS[unit] }));
export const LENGTH_UNIT_OPTIONS = LENGTH_UNITS.map((unit) => ({ value: unit, label: UNIT_SIGNS[unit] }));
export const SIZE_UNIT_OPTIONS = LENGTH_UNIT_OPTIONS.filter(({ value }) => value === 'mm' || value === 'in');

export const SERVICE_CLASS_NAMES = {
  normal: 'Normal',
  severe: 'Severe',
  special: 'Special',
} as const satisfies Record<ServiceClass, string>;
export const MAKERS_TAG_NAMES = {
  legible: 'There and legible',
  illegible: 'There, cannot be read',
  missing: 'Missing',
} as const satisfies Record<MakersTag, string>;
export const FITTING_POSITION_NAMES = {
  upper: 'Upper end',
  lower: 'Lower end',
  other: 'Elsewhere',
} as const satisfies Record<FittingPosition, string>;

export const CONSTRUCTION_NAMES = {
  strand_laid: 'Strand laid',
  cable_laid: 'Cable laid',
  braided_6: 'Braided, six parts',
  braided_8: 'Braided, eight parts',
  grommet: 'Grommet',
} as const satisfies Record<WireRopeSpec['construction'], string>;
export const CORE_NAMES = {
  iwrc: 'IWRC, wire rope core',
  fc: 'FC, fibre core',
} as const satisfies Record<WireRopeSpec['core'], string>;
export const ROPE_GRADE_NAMES = {
  ips: 'IPS',
  eips: 'EIPS',
  eeips: 'EEIPS',
  '1770': '1770',
  '1960': '1960',
} as const satisfies Record<WireRopeSpec['ropeGrade'], string>;
export const SPLICE_NAMES = {
  turnback: 'Turnback, swaged ferrule',
  hand_tucked: 'Hand tucked',
  flemish: 'Flemish eye, swaged',
  swaged_socket: 'Swaged socket',
  poured_socket: 'Poured socket',
  welded_end: 'Welded end',
} as const satisfies Record<WireRopeSpec['splice'], string>;
export const FERRULE_NAMES = {
  aluminium: 'Aluminium',
  steel: 'Steel',
} as const satisfies Record<NonNullable<WireRopeSpec['ferrule']>, string>;
export const DUTY_NAMES = {
  heavy: 'Heavy duty',
  medium: 'Medium duty',
  light: 'Light duty',
} as const satisfies Record<MeshSpec['duty'], string>;
export const FIBRE_NAMES = {
  nylon: 'Nylon',
  polyester: 'Polyester',
  polypropylene: 'Polypropylene',
} as const satisfies Record<(WebSpec | FibreRopeSpec)['fibre'], string>;
export const ROUND_FIBRE_NAMES = {
  polyester: 'Polyester',
  high_performance: 'High-performance fibre',
} as const satisfies Record<RoundSpec['fibre'], string>;
export const WEB_TYPE_NAMES = {
  eye_eye_flat: 'Flat eyes',
  eye_eye_twisted: 'Twisted eyes',
  triangle_choker: 'Triangle and choker',
  triangle_triangle: 'Two triangles',
  endless: 'Endless',
  reversed_eye: 'Reversed eye',
} as const satisfies Record<WebSpec['type'], string>;

export const GRADE_OPTIONS = CHAIN_GRADES.map((grade) => ({ value: String(grade), label: `Grade ${grade}` }));
export const FITTING_OPTIONS = toOptions(FITTING_NAMES);
export const BASIS_OPTIONS = toOptions(CERTIFICATE_BASIS_NAMES);
/** Classes that ropes commonly come in (common practice); any other may be typed. */
export const COMMON_ROPE_CLASSES = ['6x19', '6x25', '6x36', '6x37', '7x7', '7x19', '8x19'] as const;
