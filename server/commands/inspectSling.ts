import { computeVerdict, applyStricter, type VerdictResult } from '../../shared/domain/inspection/verdict';
import { INSPECTION_TYPE_FACTS, listInspectionErrors } from '../../shared/domain/inspection/inspectionTypes';
import { nextDueOn } from '../../shared/domain/inspection/due';
import type { ExaminedSling } from '../../shared/domain/inspection/criterion';
import { STATE_FACTS, type SlingState } from '../../shared/domain/lifecycle/states';
import { KIND_FACTS } from '../../shared/domain/slings/kinds';
import type { CreateInspectionRequest } from '../../shared/schemas/inspection';
import type { ActorContext } from '../context';
import { AppError, InvalidError, invalidField, UnmetError } from '../errors';
import { Fitting } from '../models/Fitting';
import { Inspection } from '../models/Inspection';
import { Site } from '../models/Site';
import type { SlingRecord } from '../models/SlingRecord';
import { getEvidence } from '../queries/files';
import { kindAndSpecOf } from '../queries/lifecycleFacts';
import { dayInZone } from '../queries/siteDay';
import { presentFitting } from '../queries/slingDetail';
import { toActor } from '../../shared/domain/lifecycle/actor';
import { addPhotos } from './addPhotos';
import { appendLedger } from './appendLedger';
import { checkVersion, lockSling } from './lockSling';
import { placeHold, type NewReason } from './placeHold';

const INSPECTED_IN: readonly SlingState[] = ['received', 'in_service', 'held', 'returned'];

/**
 * Keeps an inspection with the verdict that the server computes. A reject or refer holds the sling in the same
 * transaction; a passed complete one sets the next due date.
 */
export async function inspectSling(
  context: ActorContext,
  slingId: number,
  request: CreateInspectionRequest,
  ifMatch: number | null,
): Promise<Inspection> {
  const sling = await lockSling(context, slingId);
  await checkVersion(context, sling, ifMatch);
  const state: SlingState = sling.state;
  if (!INSPECTED_IN.includes(state)) {
    throw new AppError(
      'conflict',
      `A sling that is ${STATE_FACTS[state].word.toLowerCase()} is not here to inspect.`,
    );
  }
  const site = await Site.findByPk(sling.siteId, { transaction: context.transaction });
  const today = dayInZone(context.at, site?.timeZone ?? 'UTC');
  checkDesignation(context, sling, today);
  const inspectedOn = checkDate(request, sling, today);
  const examined = await loadExamined(context, sling);
  const result = computeVerdict({
    sling: examined,
    answers: request.answers,
    ruleSets: site?.ruleSets ?? [],
    complete: INSPECTION_TYPE_FACTS[request.type].isComplete,
    restClean: request.restClean ?? false,
  });
  const errors = listInspectionErrors(request.type, request.restClean ?? false, result);
  if (errors.length > 0)
    throw new InvalidError(errors, 'The inspection is not complete. What is missing is listed.');
  return keepInspection(context, sling, request, inspectedOn, result);
}

async function keepInspection(
  context: ActorContext,
  sling: SlingRecord,
  request: CreateInspectionRequest,
  inspectedOn: string,
  result: VerdictResult,
): Promise<Inspection> {
  const { transaction, at, user } = context;
  const final = applyStricter(result.verdict, request.stricter);
  const { isComplete } = INSPECTION_TYPE_FACTS[request.type];
  const dueOn = isComplete && final.verdict === 'pass' ? nextDueOn(inspectedOn) : null;
  const photos = await getEvidence(
    context,
    request.answers.flatMap((answer) => answer.photoIds ?? []),
    'answers',
  );
  const inspection = await Inspection.create(
    {
      slingId: sling.id,
      type: request.type,
      inspectedOn,
      inspectorId: user.id,
      inspectorName: user.name,
      verdict: final.verdict,
      computedVerdict: result.verdict,
      stricterNote: request.stricter?.note ?? null,
      isComplete,
      restClean: request.restClean ?? false,
      ruleSets: result.ruleSets,
      answers: JSON.parse(JSON.stringify(request.answers)) as typeof request.answers,
      findings: result.findings,
      notTaken: result.notTaken,
      nextDueOn: dueOn,
      ledgerSeq: sling.ledgerCount + 1,
      createdAt: at,
    },
    { transaction },
  );
  const row = await appendLedger(context, sling, {
    type: 'inspected',
    data: {
      inspectionId: inspection.id,
      inspection: request.type,
      inspectedOn,
      verdict: final.verdict,
      ruleSets: result.ruleSets,
      findings: result.findings.map(({ criterionId, fittingId, outcome, ruleSet, message }) => ({
        criterionId,
        ...(fittingId === undefined ? {} : { fittingId }),
        outcome,
        ruleSet,
        message,
      })),
      ...(request.stricter ? { stricter: request.stricter } : {}),
      ...(photos.length > 0 ? { photos } : {}),
    },
  });
  await addPhotos(context, sling.id, photos, 'inspection', row.slingSeq);
  const reasons = listReasons(context, request, result);
  if (reasons.length > 0)
    await placeHold(context, sling, { reasons, photos: [], data: { inspectionId: inspection.id } });
  if (dueOn !== null && (sling.nextDueOn === null || dueOn > sling.nextDueOn)) {
    await sling.update({ nextDueOn: dueOn }, { transaction });
  }
  return inspection;
}

/** One reason for each finding that holds the sling, and one for a verdict stricter than the findings. */
function listReasons(
  { user }: ActorContext,
  { stricter, answers }: CreateInspectionRequest,
  result: VerdictResult,
): NewReason[] {
  const reasons: NewReason[] = result.findings.flatMap((finding) => {
    if (finding.holdReason === null) return [];
    const answer = answers.find(
      ({ criterionId, fittingId }) => criterionId === finding.criterionId && fittingId === finding.fittingId,
    );
    const note = answer?.note ? `${finding.message} ${answer.note}` : finding.message;
    return [{ code: finding.holdReason, criterionId: finding.criterionId, note, placedBy: user.id }];
  });
  const own = applyStricter(result.verdict, stricter);
  if (own.holdReason) reasons.push({ code: own.holdReason, note: stricter?.note, placedBy: user.id });
  return reasons;
}

function checkDesignation(context: ActorContext, sling: SlingRecord, today: string): void {
  if (toActor(context.user, sling.kind, today).designation) return;
  throw new UnmetError([
    {
      rule: 'designation',
      message: `You hold no designation in date for this kind (${KIND_FACTS[sling.kind].name.toLowerCase()}). If you doubt the sling, hold it.`,
    },
  ]);
}

function checkDate(request: CreateInspectionRequest, sling: SlingRecord, today: string): string {
  const inspectedOn = request.inspectedOn ?? today;
  if (inspectedOn > today) throw invalidField('inspectedOn', 'This day lies in the future.');
  if (inspectedOn < sling.receivedOn)
    throw invalidField('inspectedOn', 'It was not here before it was received.');
  return inspectedOn;
}

async function loadExamined(context: ActorContext, sling: SlingRecord): Promise<ExaminedSling> {
  const fittings = await Fitting.findAll({ where: { slingId: sling.id }, transaction: context.transaction });
  return { ...kindAndSpecOf(sling), legs: sling.legs, fittings: fittings.map(presentFitting) };
}
