import { wasSentSinceService } from '../../../shared/domain/lifecycle/needs';
import { clearingOf, REASON_FACTS } from '../../../shared/domain/lifecycle/reasons';
import type { SlingAction } from '../../../shared/domain/lifecycle/actions';
import type { CustodyKind } from '../../../shared/domain/lifecycle/states';
import type { RatedLoads } from '../../../shared/domain/slings/spec';
import { InvalidError } from '../../errors';
import type { FieldError } from '../../../shared/errors';
import { HoldReasonRow } from '../../models/HoldReasonRow';
import type { SlingRecord } from '../../models/SlingRecord';
import { getEvidence, type Evidence } from '../../queries/files';
import { appendLedger } from '../appendLedger';
import { toDecimal } from '../decimals';
import type { ActionEffect, ActionInput } from './actionInput';

export const accept: ActionEffect<'accept'> = ({ context, sling, body }) =>
  appendLedger(context, sling, {
    type: 'accept',
    to: 'in_service',
    data: body.note ? { note: body.note } : {},
  });

/** A sling that leaves quarantine goes back to its home rack, not to stay in the cage. */
function backInStore(sling: SlingRecord): { kind: CustodyKind; locationId: number | null } {
  const isAway = sling.custodyKind === 'cage' || sling.custodyKind === 'unknown';
  return isAway
    ? { kind: 'in_store', locationId: sling.homeLocationId }
    : { kind: sling.custodyKind, locationId: sling.custodyLocationId };
}

/** The evaluator's lower rated load goes on the record with the act that ends the evaluation. */
async function takeRatedLoads({
  context,
  sling,
  parts,
}: Pick<ActionInput<SlingAction>, 'context' | 'sling' | 'parts'>): Promise<{ ratedLoads?: RatedLoads }> {
  const loads = parts.line?.ratedLoads ?? null;
  if (!loads) return {};
  await sling.update(
    {
      verticalKg: String(loads.verticalKg),
      chokerKg: toDecimal(loads.chokerKg),
      basketKg: toDecimal(loads.basketKg),
      bridleKg: toDecimal(loads.bridle?.kg),
      bridleAngleDeg: toDecimal(loads.bridle?.angleDeg),
    },
    { transaction: context.transaction },
  );
  return { ratedLoads: loads };
}

export const release: ActionEffect<'release'> = async (input) => {
  const { context, sling, facts, parts, body } = input;
  checkClearing(input);
  const evidence = await getEvidence(
    context,
    body.clear.flatMap((clear) => clear.evidenceFileId ?? []),
    'clear',
  );
  const clearedSeq = sling.ledgerCount + 1;
  for (const { reasonId, note, evidenceFileId } of body.clear) {
    await HoldReasonRow.update(
      {
        clearedBy: context.user.id,
        clearedAt: context.at,
        clearedSeq,
        clearNote: note,
        evidenceFileId: evidenceFileId ?? null,
      },
      { where: { id: reasonId, slingId: sling.id, clearedAt: null }, transaction: context.transaction },
    );
  }
  const isRetagged = parts.openReasons.some(
    ({ code }) => code === 'makers_tag_missing' || code === 'makers_tag_illegible',
  );
  if (isRetagged) await sling.update({ makersTag: 'legible' }, { transaction: context.transaction });
  const given = wasSentSinceService(facts) ? await takeRatedLoads(input) : {};
  return appendLedger(context, sling, {
    type: 'release',
    to: 'in_service',
    custody: backInStore(sling),
    data: {
      cleared: describeCleared(input, evidence),
      ...(isRetagged ? { makersTag: 'legible' } : {}),
      ...given,
    },
  });
};

/** @throws InvalidError 422 unless each open reason, and no other, is cleared with what it asks for */
function checkClearing({ sling, parts, body }: ActionInput<'release'>): void {
  const errors: FieldError[] = [];
  const open = new Map(parts.openReasons.map((reason) => [reason.id, reason]));
  for (const [index, { reasonId, evidenceFileId }] of body.clear.entries()) {
    const reason = open.get(reasonId);
    open.delete(reasonId);
    if (!reason) {
      errors.push({ path: `clear.${index}.reasonId`, message: 'This reason is not open on this sling.' });
    } else if (
      clearingOf(reason.code, sling.kind, Boolean(reason.confirmed)).needsEvidence &&
      !evidenceFileId
    ) {
      errors.push({
        path: `clear.${index}.evidenceFileId`,
        message: `${REASON_FACTS[reason.code].name}: evidence is needed.`,
      });
    }
  }
  for (const reason of open.values()) {
    errors.push({
      path: 'clear',
      message: `${REASON_FACTS[reason.code].name} is not cleared yet: say why it may be.`,
    });
  }
  if (errors.length > 0) throw new InvalidError(errors);
}

function describeCleared({ parts, body }: ActionInput<'release'>, evidence: readonly Evidence[]): unknown[] {
  return body.clear.map(({ reasonId, note, evidenceFileId }) => ({
    reasonId,
    code: parts.openReasons.find((reason) => reason.id === reasonId)?.code ?? null,
    note,
    evidence: evidence.find((file) => file.fileId === evidenceFileId) ?? null,
  }));
}

export const returnToService: ActionEffect<'return_to_service'> = async (input) => {
  const { context, sling, parts, body } = input;
  const closed = parts.openReasons.map(({ id, code }) => ({ reasonId: id, code }));
  await HoldReasonRow.update(
    {
      clearedBy: context.user.id,
      clearedAt: context.at,
      clearedSeq: sling.ledgerCount + 1,
      clearNote: body.note ?? 'Closed by its return from evaluation.',
    },
    { where: { slingId: sling.id, clearedAt: null }, transaction: context.transaction },
  );
  const given = await takeRatedLoads(input);
  return appendLedger(context, sling, {
    type: 'return_to_service',
    to: 'in_service',
    custody: backInStore(sling),
    data: {
      ...(body.note ? { note: body.note } : {}),
      closed,
      lineId: parts.line?.id ?? null,
      ...given,
    },
  });
};
