import { randomBytes } from 'node:crypto';
import {
  chooseMasks,
  findModuleDots,
  findStock,
  labelsPerPage,
  pickVersion,
  type QrSymbol,
} from '../../labels';
import { drawTagCode, tagPayload, type TagCode } from '../../shared/domain/tags/tagCode';
import {
  REPRINT_REASON_FACTS,
  type CreateLabelRunRequest,
  type ReprintReason,
} from '../../shared/schemas/labels';
import type { ActorContext, Services } from '../context';
import { invalidField, UnmetError } from '../errors';
import { LabelRun } from '../models/LabelRun';
import type { SlingRecord } from '../models/SlingRecord';
import { Tag } from '../models/Tag';
import { appendLedger } from './appendLedger';
import { lockSling } from './lockSling';

export interface DrawnTag {
  code: TagCode;
  payload: string;
  symbol: QrSymbol;
}

/** Draws codes and finds for each the mask that reads best; between two of them others get their turn. */
export async function drawTags(
  { publicUrl }: Pick<Services, 'publicUrl'>,
  count: number,
  source: (n: number) => Uint8Array = randomBytes,
): Promise<DrawnTag[]> {
  const codes = Array.from({ length: count }, () => drawTagCode((n) => source(n)));
  const tags = codes.map((code) => ({ code, payload: tagPayload(publicUrl, code) }));
  const symbols = await chooseMasks(tags.map((tag) => tag.payload));
  return tags.flatMap((tag, index) => {
    const symbol = symbols[index];
    return symbol ? [{ ...tag, symbol }] : [];
  });
}

/** What the person should know before the labels go on slings. */
export function listWarnings(publicUrl: string): string[] {
  const { hostname } = new URL(publicUrl);
  const warnings: string[] = [];
  if (hostname === 'localhost' || hostname === '[::1]' || hostname.startsWith('127.')) {
    warnings.push(
      `The labels hold the address ${publicUrl}, which only this machine can open. A phone that scans one will not find the sling. Set PUBLIC_URL before you print labels for use.`,
    );
  }
  const { warning } = pickVersion(tagPayload(publicUrl, '0000000000' as TagCode));
  return warning ? [...warnings, warning] : warnings;
}

/**
 * Issues a label for each sling and keeps them as one run.
 * @throws UnmetError 422 when a sling has a printed or live label already and no reason is given
 */
export async function printLabels(
  context: ActorContext,
  request: CreateLabelRunRequest,
  drawn: readonly DrawnTag[],
): Promise<LabelRun> {
  const { transaction, at, user } = context;
  const stock = findStock(request.stock);
  if (!stock) throw invalidField('stock', 'There is no such stock of labels.');
  if ((request.startAt ?? 1) > labelsPerPage(stock)) {
    throw invalidField('startAt', `A page of this stock has ${labelsPerPage(stock)} places.`);
  }
  const [first] = drawn;
  if (first && findModuleDots(stock, first.symbol.version) === null) {
    throw invalidField(
      'stock',
      'The public address is too long for a code on this stock: choose a larger label.',
    );
  }
  const slings = await lockAll(context, request.slingIds);
  const run = await LabelRun.create(
    {
      stock: stock.id,
      startAt: request.startAt ?? 1,
      warnings: listWarnings(context.publicUrl),
      createdBy: user.id,
      createdByName: user.name,
      createdAt: at,
    },
    { transaction },
  );
  for (const [index, sling] of slings.entries()) {
    const tag = drawn[index];
    if (!tag) throw new Error('Fewer codes were drawn than labels are asked for.');
    const replaced = await makeRoom(context, sling, request.reason);
    await Tag.create(
      {
        code: tag.code,
        slingId: sling.id,
        status: 'printed',
        payload: tag.payload,
        qrLevel: tag.symbol.level,
        qrVersion: tag.symbol.version,
        qrMask: tag.symbol.mask,
        runId: run.id,
        runPosition: index + 1,
        reprintReason: replaced.length > 0 ? (request.reason ?? null) : null,
        printedAt: at,
      },
      { transaction },
    );
    await appendLedger(context, sling, {
      type: 'label_printed',
      data: {
        code: tag.code,
        runId: run.id,
        stock: stock.id,
        ...(replaced.length > 0 ? { reason: request.reason ?? null, replaces: replaced } : {}),
      },
    });
  }
  return run;
}

/** Always in the order of their ids, so that two runs over the same slings never wait for each other in a ring. */
async function lockAll(context: ActorContext, ids: readonly number[]): Promise<SlingRecord[]> {
  if (new Set(ids).size < ids.length) throw invalidField('slingIds', 'A sling is named twice.');
  const byId = new Map<number, SlingRecord>();
  for (const id of [...ids].sort((a, b) => a - b)) byId.set(id, await lockSling(context, id));
  const slings = ids.flatMap((id) => byId.get(id) ?? []);
  const gone = slings.find((sling) => sling.state === 'destroyed' || sling.state === 'departed');
  if (gone) throw invalidField('slingIds', `${gone.number} is ${gone.state}: it gets no label any more.`);
  return slings;
}

/** @returns the codes that the new label replaces, now or once it is confirmed */
async function makeRoom(
  context: ActorContext,
  sling: SlingRecord,
  reason: ReprintReason | undefined,
): Promise<string[]> {
  const current = await Tag.findAll({
    where: { slingId: sling.id, status: ['printed', 'live'] },
    transaction: context.transaction,
  });
  if (current.length === 0) return [];
  if (!reason) {
    throw new UnmetError([
      {
        rule: 'reprint_reason',
        message: `${sling.number} has a label already. Say why it gets another one.`,
      },
    ]);
  }
  for (const tag of current) {
    // A live label keeps counting until its successor is on the sling, unless it is lost or wrong.
    if (tag.status === 'live' && !REPRINT_REASON_FACTS[reason].voidsAtOnce) continue;
    await voidTag(context, tag, reason);
  }
  return current.map((tag) => tag.code);
}

export async function voidTag(context: ActorContext, tag: Tag, reason: string): Promise<void> {
  await tag.update(
    { status: 'void', voidedAt: context.at, voidReason: reason },
    { transaction: context.transaction },
  );
}
