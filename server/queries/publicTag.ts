import type { PublicTag } from '../../shared/schemas/publicPage';
import { NotFoundError } from '../errors';
import type { Services } from '../context';
import type { Tag } from '../models/Tag';
import { findSummary, findToday, presentSummary } from './slingSummary';

export const WRONG_CODE: PublicTag = {
  verdict: 'do_not_use',
  message:
    'This code is not right: a character is wrong. Do not use the sling before the store has looked at it.',
};
export const UNKNOWN_LABEL: PublicTag = {
  verdict: 'do_not_use',
  message: 'This label is not known here. Do not use the sling before the store has looked at it.',
};

/** What anybody may know of a sling: whether to use it, and nothing that says where it is or who had it. */
export async function answerPublicTag(services: Services, tag: Tag): Promise<PublicTag> {
  const at = services.now();
  const row = await findSummary(services.sequelize, tag.slingId);
  if (!row) throw new NotFoundError('sling');
  const days = await findToday([row.siteId], at);
  const { mayUse, mayNotUse, number, kind, ratedLoads, nextDueOn } = presentSummary(
    row,
    days.get(row.siteId) ?? at.toISOString().slice(0, 10),
    [],
  );
  if (tag.status === 'void') {
    return {
      verdict: 'do_not_use',
      message: 'This label is void. Do not use the sling; give it to the store.',
    };
  }
  if (!mayUse) {
    const [first] = mayNotUse;
    return {
      verdict: 'do_not_use',
      message: `${first?.message ?? 'It may not be used.'} Do not use it; give it to the store.`,
      number,
      kind,
    };
  }
  if (tag.status !== 'live') {
    return {
      verdict: 'do_not_use',
      message: 'This label is not confirmed yet. Do not use the sling.',
      number,
      kind,
    };
  }
  return {
    verdict: 'use',
    message: 'In service and in date. Look it over before each use.',
    number,
    kind,
    ratedLoads,
    ...(nextDueOn === null ? {} : { nextDueOn }),
  };
}
