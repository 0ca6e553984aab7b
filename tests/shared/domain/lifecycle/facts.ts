import { answerAction } from '../../../../shared/domain/lifecycle/answer';
import type { SlingAction } from '../../../../shared/domain/lifecycle/actions';
import type {
  Actor,
  EvaluationFact,
  LifecycleFacts,
  OpenReason,
} from '../../../../shared/domain/lifecycle/facts';
import type { KindAndSpec } from '../../../../shared/domain/slings/spec';

export const STOREKEEPER: Actor = { id: 1, roles: ['storekeeper'], designation: null };
export const INSPECTOR: Actor = { id: 2, roles: ['inspector'], designation: { isQualified: true } };
export const OTHER_INSPECTOR: Actor = { ...INSPECTOR, id: 3 };
export const MANAGER: Actor = { id: 4, roles: ['manager'], designation: null };

const CHAIN = { kind: 'alloy-chain', spec: { grade: 80, chainMm: 10 } } as const;

/** A received chain sling with nothing left to do before it is accepted. */
export function received(changes: Partial<LifecycleFacts> = {}): LifecycleFacts {
  return {
    sling: CHAIN,
    state: 'received',
    condemned: false,
    condemnedBy: null,
    ownerKind: 'own',
    makersTag: 'legible',
    ratedLoads: { verticalKg: 3150, chokerKg: 2520 },
    hasLiveLabel: true,
    certificates: [{ basis: 'assembly', loadKg: 6300, seq: 1 }],
    openReasons: [],
    inspections: [inspection('initial', 4)],
    lastInServiceSeq: null,
    lastSentSeq: null,
    cameBackSeq: null,
    evaluation: null,
    custody: 'in_store',
    nextDueOn: '2099-01-01',
    discardOn: null,
    offHireOn: null,
    ...changes,
  };
}

export function inspection(
  type: LifecycleFacts['inspections'][number]['type'],
  seq: number,
  changes: Partial<LifecycleFacts['inspections'][number]> = {},
): LifecycleFacts['inspections'][number] {
  return {
    id: seq,
    type,
    inspectorId: INSPECTOR.id,
    seq,
    verdict: 'pass',
    isComplete: type !== 'frequent',
    ...changes,
  };
}

export function reason(
  code: OpenReason['code'],
  placedSeq: number,
  changes: Partial<OpenReason> = {},
): OpenReason {
  return { id: placedSeq, code, confirmed: false, placedBy: STOREKEEPER.id, placedSeq, ...changes };
}

/** Was in service from row 5, held by the storekeeper at 6, inspected again by the inspector at 7: ready to release. */
export function held(changes: Partial<LifecycleFacts> = {}): LifecycleFacts {
  return received({
    state: 'held',
    custody: 'cage',
    lastInServiceSeq: 5,
    openReasons: [reason('damage_suspected', 6)],
    inspections: [inspection('initial', 4), inspection('release', 7)],
    ...changes,
  });
}

export function evaluation(changes: Partial<EvaluationFact> = {}): EvaluationFact {
  return {
    lineId: 1,
    purpose: 'evaluate',
    outcome: 'fit',
    hasReport: true,
    repairer: null,
    proofLoadKg: null,
    ratedLoads: null,
    hasDestructionCertificate: false,
    ...changes,
  };
}

/** Sent at 8, back at 9, inspected at 10: ready to return to service. */
export function returned(changes: Partial<LifecycleFacts> = {}): LifecycleFacts {
  return held({
    state: 'returned',
    custody: 'in_store',
    lastSentSeq: 8,
    cameBackSeq: 9,
    evaluation: evaluation(),
    inspections: [inspection('initial', 4), inspection('release', 10)],
    ...changes,
  });
}

export const rulesOf = (action: SlingAction, facts: LifecycleFacts, actor: Actor = INSPECTOR): string[] =>
  answerAction(action, facts, actor)
    .unmet.map(({ rule }) => rule)
    .sort();

/** Each row is one thing taken away from facts that lack nothing; the rules are all that is then unmet. */
export type Missing = [string, Partial<LifecycleFacts>, string[]];

export const web: KindAndSpec = {
  kind: 'synthetic-web',
  spec: { fibre: 'polyester', widthMm: 60, plies: 2, type: 'eye_eye_flat' },
};
export const wireRope = (
  splice: 'flemish' | 'hand_tucked' | 'turnback' | 'swaged_socket' | 'poured_socket' | 'welded_end',
) =>
  ({
    kind: 'wire-rope',
    spec: {
      construction: 'strand_laid',
      className: '6x36',
      diameterMm: 16,
      core: 'iwrc',
      ropeGrade: 'eips',
      splice,
    },
  }) as const;
export const mesh: KindAndSpec = { kind: 'metal-mesh', spec: { duty: 'heavy', widthMm: 150, wireMm: 3.4 } };
