import type { Unmet } from '../../../shared/domain/lifecycle/facts';
import { AppError, invalidField, UnmetError } from '../../errors';
import { HoldReasonRow } from '../../models/HoldReasonRow';
import { Inspection } from '../../models/Inspection';
import { LedgerEntry } from '../../models/LedgerEntry';
import { getPhotos } from '../../queries/files';
import { addPhotos } from '../addPhotos';
import { appendLedger } from '../appendLedger';
import type { ActionEffect, ActionInput } from './actionInput';

/** Who wrote what is withdrawn, and when in the sling's ledger. */
interface Withdrawn {
  authorId: number | null;
  seq: number;
  reason: HoldReasonRow | null;
}

/** Two people, neither the author, and a complete new inspection; everything stays on record. */
export const withdrawAsError: ActionEffect<'withdraw_as_error'> = async (input) => {
  const { context, sling, body } = input;
  const withdrawn = await getWithdrawn(input);
  const inspection = await Inspection.findOne({
    where: { id: body.inspectionId, slingId: sling.id },
    transaction: context.transaction,
  });
  if (!inspection) throw invalidField('inspectionId', 'This inspection is not one of this sling.');
  checkPeople(context.user.id, inspection.inspectorId, withdrawn.authorId);
  checkInspection(inspection, withdrawn.seq);
  const photos = await getPhotos(context, body.photoIds, 'photoIds');
  if (withdrawn.reason) {
    await HoldReasonRow.update(
      { confirmed: false, withdrawnSeq: sling.ledgerCount + 1 },
      { where: { id: withdrawn.reason.id }, transaction: context.transaction },
    );
  }
  const row = await appendLedger(context, sling, {
    type: 'withdraw_as_error',
    ...(body.condemnation ? { condemned: false } : {}),
    data: {
      withdrawn: body.condemnation ? 'condemnation' : 'reason',
      reasonId: body.reasonId ?? null,
      inspectionId: inspection.id,
      note: body.note,
      photos,
    },
  });
  await addPhotos(context, sling.id, photos, 'withdrawal', row.slingSeq);
  return row;
};

async function getWithdrawn({
  context,
  sling,
  facts,
  parts,
  body,
}: ActionInput<'withdraw_as_error'>): Promise<Withdrawn> {
  if (body.condemnation) {
    if (!facts.condemned) throw invalidField('condemnation', 'The sling is not condemned.');
    const row = await LedgerEntry.findOne({
      where: { slingId: sling.id, type: 'condemn' },
      order: [['slingSeq', 'DESC']],
      transaction: context.transaction,
    });
    return { authorId: facts.condemnedBy, seq: row?.slingSeq ?? 0, reason: null };
  }
  const reason = parts.openReasons.find((open) => open.id === body.reasonId);
  if (!reason?.confirmed) throw invalidField('reasonId', 'This is no open confirmed reason of this sling.');
  return { authorId: reason.placedBy, seq: reason.placedSeq, reason };
}

/** @throws AppError 403 unless manager, inspector and author are three people */
function checkPeople(managerId: number, inspectorId: number, authorId: number | null): void {
  const refuse = (message: string): never => {
    throw new AppError('same-person', message, { unmet: [{ rule: 'same_person', message }] });
  };
  if (managerId === authorId)
    refuse('You are the author of what is withdrawn, so another manager has to do it.');
  if (inspectorId === authorId) refuse('The new inspection is by the author of what is withdrawn.');
  if (inspectorId === managerId) refuse('The new inspection is your own: a second person has to make it.');
}

/** @throws UnmetError 422 unless it is complete, newer than what is withdrawn, and does not reject the sling again */
function checkInspection(inspection: Inspection, afterSeq: number): void {
  const unmet: Unmet[] = [];
  const need = (isMet: boolean, rule: string, message: string): void => {
    if (!isMet) unmet.push({ rule, message });
  };
  need(
    Boolean(inspection.isComplete),
    'complete_inspection',
    'The new inspection must answer every criterion.',
  );
  need(
    inspection.ledgerSeq > afterSeq,
    'new_inspection',
    'The inspection must be made after what is withdrawn.',
  );
  need(
    inspection.verdict !== 'reject',
    'inspection_rejects',
    'The new inspection rejects the sling as well.',
  );
  if (unmet.length > 0) throw new UnmetError(unmet);
}
