import type { ExaminedFitting, ExaminedSling, NominalSource } from './criterion';

/** The nominal of a measured criterion from the record, mm; null where the record has none. */
export function findNominal(
  sling: ExaminedSling,
  fitting: ExaminedFitting | null,
  source: NominalSource,
): number | null {
  switch (source) {
    case 'chainMm':
      return sling.kind === 'alloy-chain' ? sling.spec.chainMm : null;
    case 'diameterMm':
      return sling.kind === 'wire-rope' || sling.kind === 'synthetic-rope' ? sling.spec.diameterMm : null;
    case 'wireMm':
      return sling.kind === 'metal-mesh' ? sling.spec.wireMm : null;
    case 'throatMm':
      return fitting?.throatMm ?? null;
    case 'sizeMm':
      return fitting?.sizeMm ?? null;
  }
}
