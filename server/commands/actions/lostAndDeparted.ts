import { invalidField } from '../../errors';
import type { CustodyKind } from '../../../shared/domain/lifecycle/states';
import type { Location } from '../../models/Location';
import { appendLedger } from '../appendLedger';
import { placeHold } from '../placeHold';
import type { ActionEffect } from './actionInput';
import { getPlace } from './holdAndSecure';

export const reportLost: ActionEffect<'report_lost'> = ({ context, sling, body }) =>
  appendLedger(context, sling, {
    type: 'report_lost',
    to: 'lost',
    custody: { kind: 'unknown', locationId: null },
    data: { note: body.note },
  });

export const found: ActionEffect<'found'> = async (input) => {
  const { context, sling, body } = input;
  const place = body.locationId === undefined ? null : await getPlace(input, body.locationId);
  // placeHold brings the automatic reason `found` for a lost sling.
  return placeHold(context, sling, {
    reasons: [],
    photos: [],
    data: body.note ? { note: body.note } : {},
    event: { type: 'found', to: 'held', custody: custodyAt(place) },
  });
};

/** Where a sling is once it was put down in this place. */
export function custodyAt(place: Location | null): { kind: CustodyKind; locationId: number | null } {
  if (!place) return { kind: 'unknown', locationId: null };
  return { kind: place.purpose === 'cage' ? 'cage' : 'in_store', locationId: place.id };
}

export const depart: ActionEffect<'depart'> = async ({ context, sling, facts, parts, body }) => {
  const isHired = sling.ownerKind === 'hired';
  if (body.cause === 'off_hire' && !isHired) {
    throw invalidField('cause', 'It is the store’s own sling: there is no hire to end.');
  }
  if (body.cause === 'sold' && isHired) {
    throw invalidField('cause', 'It is hired: it goes back to its owner and cannot be sold.');
  }
  if (facts.state === 'held' && body.cause !== 'off_hire') {
    throw invalidField('cause', 'A held sling leaves only off hire, back to its owner.');
  }
  return appendLedger(context, sling, {
    type: 'depart',
    to: 'departed',
    custody: { kind: 'none', locationId: null },
    data: {
      cause: body.cause,
      note: body.note,
      // They stand on the hand-over paper.
      openReasons: parts.openReasons.map(({ id, code, note }) => ({ reasonId: id, code, note })),
    },
  });
};
