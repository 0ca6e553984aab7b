import type { SlingKind } from '../../shared/domain/slings/kinds';
import type { CreateSlingInput } from '../../shared/schemas/slings';

const SPECS = {
  'alloy-chain': { kind: 'alloy-chain', spec: { grade: 80, chainMm: 10 } },
  'wire-rope': {
    kind: 'wire-rope',
    spec: {
      construction: 'strand_laid',
      className: '6x36',
      diameterMm: 16,
      core: 'iwrc',
      ropeGrade: 'eips',
      splice: 'flemish',
    },
  },
  'metal-mesh': { kind: 'metal-mesh', spec: { duty: 'heavy', widthMm: 150, wireMm: 3.4 } },
  'synthetic-web': {
    kind: 'synthetic-web',
    spec: { fibre: 'polyester', widthMm: 60, plies: 2, type: 'eye_eye_flat' },
  },
  'synthetic-round': { kind: 'synthetic-round', spec: { fibre: 'polyester', size: '3' } },
  'synthetic-rope': { kind: 'synthetic-rope', spec: { fibre: 'nylon', diameterMm: 24 } },
} as const satisfies { [K in SlingKind]: { kind: K; spec: object } };

let serial = 0;

/** A sling as a storekeeper would register it; each call gives another number and serial. */
export function buildSlingRequest(
  siteId: number,
  overrides: Partial<CreateSlingInput> & { kind?: SlingKind } = {},
): CreateSlingInput {
  serial += 1;
  const { kind = 'alloy-chain', ...others } = overrides;
  const isChain = kind === 'alloy-chain';
  return {
    ...SPECS[kind],
    number: `TS-${String(serial).padStart(4, '0')}`,
    maker: 'Tarn Forge',
    makerSerial: `TF${String(10_000 + serial)}`,
    siteId,
    serviceClass: 'normal',
    legs: isChain ? 2 : 1,
    reachMm: 3000,
    ratedLoads: isChain
      ? { verticalKg: 3150, chokerKg: 2520, bridle: { kg: 5450, angleDeg: 60 } }
      : { verticalKg: 2000, chokerKg: 1600, basketKg: 4000 },
    fittings: isChain
      ? [
          { position: 'upper', type: 'master_link', sizeMm: 18, detachable: false },
          { position: 'lower', type: 'hook', throatMm: 30, hasLatch: true, detachable: true },
          { position: 'lower', type: 'hook', throatMm: 30, hasLatch: true, detachable: true },
        ]
      : [],
    receivedOn: new Date(Date.now() - 86_400_000).toISOString().slice(0, 10),
    makersTag: 'legible',
    proofCertificate: {
      basis: 'assembly',
      loadKg: 6300,
      testedOn: '2026-01-15',
      number: `TF-C-${serial}`,
    },
    ...others,
  } as CreateSlingInput;
}
