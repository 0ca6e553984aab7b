import type { SlingKind } from '../../../shared/domain/slings/kinds';
import type { EvaluationOutcome, ShipmentPurpose } from '../../../shared/domain/lifecycle/facts';
import type { DemoSite } from './staff';

interface DemoEvaluator {
  name: string;
  email: string;
  isMaker: boolean;
  mayRepair: readonly SlingKind[];
}

export const EVALUATORS = {
  fennel: {
    name: 'Fennel & Stroud Rigging Repair',
    email: 'bench@fennel-stroud.example',
    isMaker: false,
    mayRepair: ['alloy-chain', 'metal-mesh'],
  },
  tarn: {
    name: 'Tarn Forge Service',
    email: 'service@tarn-forge.example',
    isMaker: true,
    mayRepair: ['alloy-chain'],
  },
} as const satisfies Record<string, DemoEvaluator>;

export const SHIPMENT_IDS = [
  'spring',
  'scrap',
  'back-chain',
  'back-rope',
  'late',
  'out-repair',
  'out-blade',
] as const;
export type ShipmentId = (typeof SHIPMENT_IDS)[number];

/** What came of a sling on a shipment, in the order in which the cases name it. */
export interface ShipmentFate {
  purpose: ShipmentPurpose;
  outcome?: EvaluationOutcome;
  /** What the store does with it once it is back. */
  next?: 'returns_to_service' | 'destroyed';
}

export interface DemoShipment {
  evaluator: keyof typeof EVALUATORS;
  site: DemoSite;
  sentAgo: number;
  /** Days ahead are negative. */
  expectedAgo: number;
  /** When the outcomes arrived and the slings came back. */
  backAgo?: number;
  fates: readonly ShipmentFate[];
}

export const SHIPMENTS: Record<ShipmentId, DemoShipment> = {
  spring: {
    evaluator: 'tarn',
    site: 'slipStore',
    sentAgo: 260,
    expectedAgo: 232,
    backAgo: 230,
    fates: [
      { purpose: 'repair', outcome: 'repaired', next: 'returns_to_service' },
      { purpose: 'evaluate', outcome: 'fit', next: 'returns_to_service' },
      { purpose: 'repair', outcome: 'unfit', next: 'destroyed' },
    ],
  },
  scrap: {
    evaluator: 'fennel',
    site: 'slipStore',
    sentAgo: 152,
    expectedAgo: 140,
    backAgo: 141,
    fates: [
      { purpose: 'destroy', outcome: 'destroyed' },
      { purpose: 'destroy', outcome: 'destroyed' },
    ],
  },
  'back-chain': {
    evaluator: 'tarn',
    site: 'slipStore',
    sentAgo: 33,
    expectedAgo: 5,
    backAgo: 4,
    fates: [
      { purpose: 'repair', outcome: 'repaired' },
      { purpose: 'evaluate', outcome: 'fit' },
    ],
  },
  'back-rope': {
    evaluator: 'fennel',
    site: 'slipStore',
    sentAgo: 31,
    expectedAgo: 10,
    backAgo: 6,
    fates: [{ purpose: 'evaluate', outcome: 'fit' }],
  },
  late: {
    evaluator: 'fennel',
    site: 'slipStore',
    sentAgo: 40,
    expectedAgo: 9,
    fates: [{ purpose: 'evaluate' }],
  },
  'out-repair': {
    evaluator: 'tarn',
    site: 'slipStore',
    sentAgo: 12,
    expectedAgo: -16,
    fates: [{ purpose: 'repair' }, { purpose: 'repair' }],
  },
  'out-blade': {
    evaluator: 'fennel',
    site: 'bladeHall',
    sentAgo: 4,
    expectedAgo: -20,
    fates: [{ purpose: 'repair' }, { purpose: 'evaluate' }],
  },
};
