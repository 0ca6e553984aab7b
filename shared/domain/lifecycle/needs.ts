import { requiredProofLoadKg } from '../quarantine/proofLoad';
import { needsCertificate } from '../slings/certificates';
import { KIND_FACTS } from '../slings/kinds';
import { compareRatedLoads } from '../slings/ratedLoads';
import type { Actor, InspectionFact, LifecycleFacts, Unmet } from './facts';
import { clearingOf, REASON_FACTS } from './reasons';

/** One need of an action: the words for what is missing, or null when it is met. */
type Need = (facts: LifecycleFacts, actor: Actor) => Unmet | null;

const unless = (isMet: boolean, rule: string, message: string): Unmet | null =>
  isMet ? null : { rule, message };

const designation: Need = ({ sling }, actor) =>
  unless(
    actor.designation !== null,
    'designation',
    `You hold no designation in date for this kind (${KIND_FACTS[sling.kind].name.toLowerCase()}).`,
  );

const liveLabel: Need = ({ hasLiveLabel }) =>
  unless(
    hasLiveLabel,
    'live_label',
    'Its label is not confirmed on the sling: print one, fix it and confirm it.',
  );

const makersTag: Need = ({ makersTag: tag }) =>
  unless(tag === 'legible', 'makers_tag', `The maker’s tag is ${tag}.`);

const ratedLoad: Need = ({ ratedLoads }) =>
  unless(ratedLoads.verticalKg > 0, 'rated_load', 'No rated load is on record.');

const certificate: Need = ({ sling, certificates }) =>
  unless(
    !needsCertificate(sling) || certificates.length > 0,
    'certificate',
    'A certificate (proof test, components or declaration of conformity) must be on file.',
  );

const initialInspection: Need = ({ inspections }) => {
  const last = inspections.filter((inspection) => inspection.type === 'initial').at(-1);
  return unless(
    last !== undefined && last.verdict === 'pass' && last.isComplete,
    'initial_inspection',
    'Needs an initial inspection that passes.',
  );
};

const noConfirmedReason: Need = ({ openReasons }) => {
  const confirmed = openReasons.find((reason) => reason.confirmed);
  return unless(
    !confirmed,
    'confirmed_reason',
    `${confirmed ? REASON_FACTS[confirmed.code].name : 'A confirmed reason'} is confirmed: it is evaluated or destroyed, never released here.`,
  );
};

const clearableReasons: Need = ({ openReasons, sling }, actor) => {
  for (const reason of openReasons) {
    const clearing = clearingOf(reason.code, sling.kind, reason.confirmed);
    const name = REASON_FACTS[reason.code].name;
    if (!clearing.isClearable) return { rule: 'reason_not_clearable', message: `${name}: ${clearing.how}` };
    if (clearing.needsQualified && !actor.designation?.isQualified) {
      return { rule: 'qualified_person', message: `${name} needs an inspector designated as qualified.` };
    }
  }
  return null;
};

function isPassingRelease(inspection: InspectionFact): boolean {
  return inspection.type === 'release' && inspection.verdict === 'pass' && inspection.isComplete;
}

const releaseInspection: Need = ({ openReasons, inspections, cameBackSeq }, actor) => {
  // A condemned sling comes back without a new reason: what was seen before it was sent counts no more.
  const after = Math.max(cameBackSeq ?? 0, ...openReasons.map((reason) => reason.placedSeq));
  const passed = inspections.some(
    (inspection) =>
      isPassingRelease(inspection) && inspection.inspectorId === actor.id && inspection.seq > after,
  );
  return unless(
    passed,
    'release_inspection',
    'Needs a release inspection of yours that passes, made after the last reason was placed.',
  );
};

const releaseInspectionSinceBack: Need = ({ inspections, cameBackSeq }) =>
  unless(
    inspections.some((inspection) => isPassingRelease(inspection) && inspection.seq > (cameBackSeq ?? 0)),
    'release_inspection',
    'Needs a release inspection that passes, made since it came back.',
  );

const evaluationOutcome: Need = ({ evaluation }) =>
  unless(
    evaluation?.outcome === 'fit' || evaluation?.outcome === 'repaired',
    'evaluation_outcome',
    'The evaluator has not called it fit or repaired.',
  );

const evaluationReport: Need = ({ evaluation }) =>
  unless(evaluation?.hasReport === true, 'evaluation_report', 'The evaluator’s report is not on file.');

const repairAllowed: Need = ({ evaluation, sling }) =>
  unless(
    evaluation?.outcome !== 'repaired' || KIND_FACTS[sling.kind].isRepairable,
    'repair_not_allowed',
    `A ${KIND_FACTS[sling.kind].name.toLowerCase()} is never repaired.`,
  );

const repairerNamed: Need = ({ evaluation }) =>
  unless(
    evaluation?.outcome !== 'repaired' || Boolean(evaluation.repairer),
    'repairer',
    'Who repaired it is not named.',
  );

const proofTest: Need = ({ evaluation, sling, ratedLoads }) => {
  if (evaluation?.outcome !== 'repaired') return null;
  const required = requiredProofLoadKg(sling, ratedLoads.verticalKg);
  return unless(
    required !== null && evaluation.proofLoadKg !== null && evaluation.proofLoadKg >= required,
    'proof_test',
    required === null
      ? 'No proof test makes a repair of this kind acceptable.'
      : `Needs a proof-test certificate at ${Math.ceil(required)} kg or more.`,
  );
};

/** The same rated loads, or lower ones with a new maker's tag and certificate: never a higher one. */
const ratedLoadAfterEvaluation: Need = ({
  evaluation,
  ratedLoads,
  certificates,
  lastSentSeq,
  makersTag: tag,
}) => {
  const change = evaluation?.ratedLoads ? compareRatedLoads(ratedLoads, evaluation.ratedLoads) : 'same';
  if (change === 'same') return null;
  if (change === 'higher') {
    return { rule: 'rated_load', message: 'The evaluator’s rated load is higher than the one on record.' };
  }
  const hasNewCertificate = certificates.some((held) => held.seq > (lastSentSeq ?? 0));
  return unless(
    tag === 'legible' && hasNewCertificate,
    'rated_load',
    'A lower rated load needs a new maker’s tag and a new certificate.',
  );
};

/** A reason placed while the sling was away is not closed by coming back. */
const noReasonSinceSent: Need = ({ openReasons, lastSentSeq }) =>
  unless(
    openReasons.every((reason) => reason.placedSeq <= (lastSentSeq ?? 0)),
    'open_reason',
    'A reason was placed after it was sent: hold it, inspect it and release it.',
  );

const secured: Need = ({ custody }) =>
  unless(custody === 'cage', 'secured', 'It is not secured in a cage yet.');

const shipment: Need = () => ({
  rule: 'shipment',
  message: 'It leaves with a shipment: put it on one and send that.',
});

const destructionCertificate: Need = ({ evaluation }) =>
  unless(
    evaluation?.outcome === 'destroyed' && evaluation.hasDestructionCertificate,
    'destruction_certificate',
    'Needs the evaluator’s certificate of destruction.',
  );

const ownerOnlyFromHeld: Need = ({ state, ownerKind }) =>
  unless(
    state !== 'held' || ownerKind === 'hired',
    'held_leaves_to_owner',
    'A held sling leaves only to its owner: it is the store’s own.',
  );

const noConfirmedOwn: Need = ({ ownerKind, openReasons }) =>
  unless(
    ownerKind === 'hired' || !openReasons.some((reason) => reason.confirmed),
    'confirmed_reason',
    'A rejected sling of the store’s own does not leave it: it is evaluated or destroyed.',
  );

export const acceptNeeds: readonly Need[] = [
  designation,
  initialInspection,
  liveLabel,
  makersTag,
  ratedLoad,
  certificate,
];

const returnEvidence: readonly Need[] = [
  evaluationOutcome,
  evaluationReport,
  repairAllowed,
  repairerNamed,
  proofTest,
  ratedLoadAfterEvaluation,
];

export const returnNeeds: readonly Need[] = [
  designation,
  ...returnEvidence,
  noReasonSinceSent,
  releaseInspectionSinceBack,
  makersTag,
  liveLabel,
];

const alwaysForRelease: readonly Need[] = [
  designation,
  noConfirmedReason,
  clearableReasons,
  releaseInspection,
  liveLabel,
];

/** The maker's tag is asked for as well unless a reason that says so is among those being cleared with evidence. */
const tagUnlessRetagged: Need = (facts, actor) =>
  facts.openReasons.some(({ code }) => code === 'makers_tag_missing' || code === 'makers_tag_illegible')
    ? null
    : makersTag(facts, actor);

export function wasSentSinceService({ lastSentSeq, lastInServiceSeq }: LifecycleFacts): boolean {
  return lastSentSeq !== null && lastSentSeq > (lastInServiceSeq ?? 0);
}

/** All that `release` needs: more, when the sling was never accepted or was sent since it was last in service. */
export function releaseNeeds(facts: LifecycleFacts): readonly Need[] {
  return [
    ...alwaysForRelease,
    tagUnlessRetagged,
    ...(facts.lastInServiceSeq === null ? [initialInspection, ratedLoad, certificate] : []),
    ...(wasSentSinceService(facts) ? returnEvidence : []),
  ];
}

export const sendNeeds: readonly Need[] = [secured];
export const sendAloneNeeds: readonly Need[] = [secured, shipment];
export const destroyedElsewhereNeeds: readonly Need[] = [destructionCertificate];
export const departNeeds: readonly Need[] = [ownerOnlyFromHeld, noConfirmedOwn];

export function listUnmet(needs: readonly Need[], facts: LifecycleFacts, actor: Actor): Unmet[] {
  return needs.flatMap((need) => need(facts, actor) ?? []);
}
