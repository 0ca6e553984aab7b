import type { CertificateBasis } from '../../../shared/domain/slings/kinds';
import type { Fitting, KindAndSpec } from '../../../shared/domain/slings/spec';
import type { LoadUnit } from '../../../shared/domain/units/units';

export interface ModelLoads {
  vertical: number;
  choker?: number;
  basket?: number;
  bridle?: { load: number; angleDeg: number };
}

interface ModelFacts {
  id: string;
  /** How many of the 420 slings are of this model. */
  count: number;
  maker: 'Tarn Forge' | 'Oxbow Rope' | 'Lacewing Mesh' | 'Brightweave';
  legs: number;
  reachesMm: readonly number[];
  /** The unit of the maker's tag, in which `loads` are. */
  unit: LoadUnit;
  loads: ModelLoads;
  fittings: readonly Omit<Fitting, 'id'>[];
  /** What the serial begins with; null where the maker gives a stock number instead. */
  serialPrefix: string | null;
  certificate: CertificateBasis | null;
  /** Whether its labels go round something thin. */
  isThin: boolean;
}

/** A sling as a maker sells it. Makers and models are invented. */
export type SlingModel = ModelFacts & KindAndSpec;
