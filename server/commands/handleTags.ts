import type { ConfirmTagRequest } from '../../shared/schemas/labels';
import { parseTagCode, type TagCode } from '../../shared/domain/tags/tagCode';
import type { ActorContext } from '../context';
import { AppError, invalidField, NotFoundError } from '../errors';
import type { SlingRecord } from '../models/SlingRecord';
import { Tag } from '../models/Tag';
import { appendLedger } from './appendLedger';
import { lockSling } from './lockSling';
import { voidTag } from './printLabels';

/** @throws InvalidError 422 for a code that no label can bear */
export function getTagCode(text: string): TagCode {
  const parsed = parseTagCode(text);
  if (parsed.ok) return parsed.code;
  const messages = {
    length: 'A tag code has ten characters.',
    alphabet: 'A character in it is never used in tag codes.',
    check: 'A character is wrong: compare it with the label again.',
  };
  throw invalidField('code', messages[parsed.reason]);
}

async function lockTag(context: ActorContext, code: TagCode): Promise<{ tag: Tag; sling: SlingRecord }> {
  const { transaction } = context;
  const known = await Tag.findByPk(code, { transaction });
  if (!known) throw new NotFoundError('label');
  const sling = await lockSling(context, known.slingId);
  const tag = await Tag.findByPk(code, { transaction, lock: transaction.LOCK.UPDATE });
  if (!tag) throw new NotFoundError('label');
  return { tag, sling };
}

/**
 * Makes a printed label live: it was scanned on the sling, and the last four characters that stand on the sling
 * itself were typed. Labels on the wrong twin are the commonest mix-up (product design, section 11).
 */
export async function confirmTag(
  context: ActorContext,
  code: TagCode,
  request: ConfirmTagRequest,
): Promise<number> {
  const { transaction, at, user } = context;
  const { tag, sling } = await lockTag(context, code);
  if (tag.status !== 'printed') {
    throw new AppError(
      'conflict',
      tag.status === 'live' ? 'This label is confirmed already.' : 'This label is void.',
    );
  }
  if (!matchesSling(request.lastFour, sling)) {
    throw invalidField(
      'lastFour',
      sling.makerSerial
        ? `These are not the last four characters of the serial of ${sling.number}. Look again: is the label on the right sling?`
        : `These are not the last four characters of ${sling.number}. Look again: is the label on the right sling?`,
    );
  }
  const old = await Tag.findOne({ where: { slingId: sling.id, status: 'live' }, transaction });
  if (old) await voidTag(context, old, 'replaced');
  await tag.update(
    { status: 'live', confirmedAt: at, confirmedBy: user.id, confirmedVia: request.via },
    { transaction },
  );
  await appendLedger(context, sling, {
    type: 'label_confirmed',
    data: { code, via: request.via, ...(old ? { replaces: old.code } : {}) },
  });
  return sling.id;
}

/** Case and dashes don't count: people type what they see. */
function matchesSling(typed: string, sling: SlingRecord): boolean {
  const identity = (sling.makerSerial ?? sling.number).trim().toUpperCase();
  const bare = (text: string): string => text.replace(/[^\p{L}\p{N}]/gu, '');
  const wanted = typed.trim().toUpperCase();
  return (
    wanted === identity.slice(-4) || (bare(wanted).length >= 1 && bare(wanted) === bare(identity).slice(-4))
  );
}

/** Takes a label out of use for good. */
export async function voidLabel(
  context: ActorContext,
  code: TagCode,
  reason: string,
  note: string,
): Promise<number> {
  const { tag, sling } = await lockTag(context, code);
  if (tag.status === 'void') throw new AppError('conflict', 'This label is void already.');
  await voidTag(context, tag, reason);
  await appendLedger(context, sling, { type: 'label_voided', data: { code, reason, note } });
  return sling.id;
}
