import type { HoldReason } from '../../../shared/domain/lifecycle/reasons';
import type { LifecycleFacts } from '../../../shared/domain/lifecycle/facts';
import { appendLedger } from '../appendLedger';
import { placeHold } from '../placeHold';
import type { ActionEffect } from './actionInput';
import { getPlace } from './holdAndSecure';
import { custodyAt } from './lostAndDeparted';

/** A place is all that is asked for: a truck can always be unloaded. */
export const receiveBack: ActionEffect<'receive_back'> = async (input) => {
  const { context, sling, facts, parts, body } = input;
  const place = await getPlace(input, body.locationId);
  const event = { type: 'receive_back', custody: custodyAt(place) } as const;
  const data = { location: place.name, outcome: parts.line?.outcome ?? null };
  const reason = findReasonOnReturn(facts);
  if (reason) {
    return placeHold(context, sling, {
      reasons: [{ code: reason, placedBy: null }],
      photos: [],
      data,
      event: { ...event, to: 'held' },
    });
  }
  const mustBeHeld = facts.condemned || hasReasonSinceSent(facts);
  return appendLedger(context, sling, { ...event, to: mustBeHeld ? 'held' : 'returned', data });
};

/** The reason that an outcome brings with it; null when it is fit, repaired, or the sling is condemned anyway. */
export function findReasonOnReturn(facts: LifecycleFacts): HoldReason | null {
  const outcome = facts.evaluation?.outcome ?? null;
  if (outcome === 'unfit') return 'evaluation_unfit';
  if (facts.condemned || outcome === 'fit' || outcome === 'repaired') return null;
  return 'record_in_doubt';
}

/** A report that came while the sling was away keeps it held when it is back (rule 1). */
export function hasReasonSinceSent(facts: LifecycleFacts): boolean {
  return facts.openReasons.some((reason) => reason.placedSeq > (facts.lastSentSeq ?? 0));
}
