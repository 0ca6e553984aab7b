import type { Role } from '../access/roles';
import type { CertificateBasis, MakersTag } from '../slings/kinds';
import type { KindAndSpec, RatedLoads } from '../slings/spec';
import type { HoldReason } from './reasons';
import type { CustodyKind, SlingState } from './states';

/** What may be wrong, in words for a person; `rule` is stable for programs. */
export interface Unmet {
  rule: string;
  message: string;
}

export interface OpenReason {
  id: number;
  code: HoldReason;
  confirmed: boolean;
  /** Null when the system placed it. */
  placedBy: number | null;
  /** Place in the sling's own ledger: "after" means ledger order. */
  placedSeq: number;
}

export interface InspectionFact {
  id: number;
  type: 'initial' | 'frequent' | 'periodic' | 'release';
  inspectorId: number;
  seq: number;
  verdict: 'pass' | 'refer' | 'reject';
  isComplete: boolean;
}

export const EVALUATION_OUTCOMES = ['fit', 'repaired', 'unfit', 'not_examined', 'destroyed'] as const;
export type EvaluationOutcome = (typeof EVALUATION_OUTCOMES)[number];

export const SHIPMENT_PURPOSES = ['evaluate', 'repair', 'destroy', 'fittings'] as const;
export type ShipmentPurpose = (typeof SHIPMENT_PURPOSES)[number];

/** The line of the last shipment that took the sling out. */
export interface EvaluationFact {
  lineId: number;
  purpose: ShipmentPurpose;
  outcome: EvaluationOutcome | null;
  hasReport: boolean;
  repairer: string | null;
  proofLoadKg: number | null;
  /** Rated loads that the evaluator gives, when they are not the old ones. */
  ratedLoads: RatedLoads | null;
  hasDestructionCertificate: boolean;
}

/** All that the lifecycle rules look at, for one sling. Sequence numbers are the sling's own ledger order. */
export interface LifecycleFacts {
  sling: KindAndSpec;
  state: SlingState;
  condemned: boolean;
  condemnedBy: number | null;
  ownerKind: 'own' | 'hired';
  makersTag: MakersTag;
  ratedLoads: RatedLoads;
  hasLiveLabel: boolean;
  certificates: readonly { basis: CertificateBasis; loadKg: number | null; seq: number }[];
  openReasons: readonly OpenReason[];
  inspections: readonly InspectionFact[];
  lastInServiceSeq: number | null;
  lastSentSeq: number | null;
  cameBackSeq: number | null;
  evaluation: EvaluationFact | null;
  custody: CustodyKind;
  nextDueOn: string | null;
  discardOn: string | null;
  offHireOn: string | null;
}

export interface Actor {
  id: number;
  roles: readonly Role[];
  /** The designation that covers this sling's kind today; null when none does or it has lapsed. */
  designation: { isQualified: boolean } | null;
}
