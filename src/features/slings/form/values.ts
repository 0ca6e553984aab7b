import type { SlingKind } from '../../../../shared/domain/slings/kinds';
import type { LengthUnit, LoadUnit, UnitChoice } from '../../../../shared/domain/units/units';

/** A figure as it was typed, with the unit that it was read in. */
export interface Measure<Unit extends LoadUnit | LengthUnit = LoadUnit | LengthUnit> {
  figure: string;
  unit: Unit;
}
export type LoadMeasure = Measure<LoadUnit>;
export type LengthMeasure = Measure<LengthUnit>;

export interface FittingValues {
  position: string;
  type: string;
  sizeMm: LengthMeasure;
  throatMm: LengthMeasure;
  hasLatch: boolean;
  detachable: boolean;
}

export interface CertificateValues {
  basis: string;
  loadKg: LoadMeasure;
  testedOn: string;
  number: string;
  fileId: string | null;
}

export interface MakerLimitValues {
  criterionId: string;
  limit: string;
  source: string;
}

export interface LoadsValues {
  verticalKg: LoadMeasure;
  chokerKg: LoadMeasure;
  basketKg: LoadMeasure;
  bridle: { kg: LoadMeasure; angleDeg: string };
}

/** What each kind asks beside the common fields; all are kept, so that a change of kind loses nothing. */
export interface SpecValues {
  'alloy-chain': { grade: string; chainMm: LengthMeasure; endless: boolean };
  'wire-rope': {
    construction: string;
    className: string;
    diameterMm: LengthMeasure;
    core: string;
    ropeGrade: string;
    splice: string;
    ferrule: string;
  };
  'metal-mesh': { duty: string; widthMm: LengthMeasure; wireMm: LengthMeasure; coated: boolean };
  'synthetic-web': { fibre: string; widthMm: LengthMeasure; plies: string; type: string };
  'synthetic-round': { fibre: string; size: string };
  'synthetic-rope': { fibre: string; diameterMm: LengthMeasure };
}

/** The registration form: text as typed, named like the request so that faults find their field. */
export interface SlingFormValues {
  kind: SlingKind | '';
  number: string;
  maker: string;
  makerSerial: string;
  stockNumber: string;
  lot: string;
  makersTag: string;
  madeOn: string;
  receivedOn: string;
  firstUseOn: string;
  siteId: string;
  homeLocationId: string;
  serviceClass: string;
  owner: { kind: 'own' | 'hired'; name: string; offHireOn: string };
  legs: string;
  reachMm: LengthMeasure;
  specs: SpecValues;
  ratedLoads: LoadsValues;
  fittings: FittingValues[];
  hasCertificate: boolean;
  proofCertificate: CertificateValues;
  makerLimits: MakerLimitValues[];
  discardOn: string;
  cost: string;
  notes: string;
  photoIds: string[];
}

/** Small lengths (diameters, widths, throats) are read in mm, or in inches by those who think in feet. */
export const toSizeUnit = (length: LengthUnit): LengthUnit =>
  length === 'in' || length === 'ft' ? 'in' : 'mm';

/** The unit in which this sling's sizes are being typed: its kind's first one. */
export function findSizeUnit({ kind, specs }: SlingFormValues): LengthUnit | null {
  if (kind === '') return null;
  for (const value of Object.values(specs[kind])) {
    if (typeof value === 'object') return value.unit;
  }
  return null;
}

export function makeEmptyFitting(sizeUnit: LengthUnit): FittingValues {
  return {
    position: 'lower',
    type: 'hook',
    sizeMm: { figure: '', unit: sizeUnit },
    throatMm: { figure: '', unit: sizeUnit },
    hasLatch: true,
    detachable: false,
  };
}

export function makeEmptyCertificate(load: LoadUnit): CertificateValues {
  return { basis: 'assembly', loadKg: { figure: '', unit: load }, testedOn: '', number: '', fileId: null };
}

/** An empty form in the units that the person reads. */
export function makeEmptyForm(units: UnitChoice, today: string): SlingFormValues {
  const load = (): LoadMeasure => ({ figure: '', unit: units.load });
  const size = (): LengthMeasure => ({ figure: '', unit: toSizeUnit(units.length) });
  return {
    kind: '',
    number: '',
    maker: '',
    makerSerial: '',
    stockNumber: '',
    lot: '',
    makersTag: 'legible',
    madeOn: '',
    receivedOn: today,
    firstUseOn: '',
    siteId: '',
    homeLocationId: '',
    serviceClass: 'normal',
    owner: { kind: 'own', name: '', offHireOn: '' },
    legs: '1',
    reachMm: { figure: '', unit: units.length },
    specs: {
      'alloy-chain': { grade: '', chainMm: size(), endless: false },
      'wire-rope': {
        construction: 'strand_laid',
        className: '',
        diameterMm: size(),
        core: '',
        ropeGrade: '',
        splice: '',
        ferrule: '',
      },
      'metal-mesh': { duty: '', widthMm: size(), wireMm: size(), coated: false },
      'synthetic-web': { fibre: '', widthMm: size(), plies: '', type: '' },
      'synthetic-round': { fibre: '', size: '' },
      'synthetic-rope': { fibre: '', diameterMm: size() },
    },
    ratedLoads: {
      verticalKg: load(),
      chokerKg: load(),
      basketKg: load(),
      bridle: { kg: load(), angleDeg: '60' },
    },
    fittings: [],
    hasCertificate: false,
    proofCertificate: makeEmptyCertificate(units.load),
    makerLimits: [],
    discardOn: '',
    cost: '',
    notes: '',
    photoIds: [],
  };
}
