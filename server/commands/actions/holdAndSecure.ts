import { invalidField } from '../../errors';
import { Location } from '../../models/Location';
import { findEvidence } from '../../queries/files';
import { appendLedger } from '../appendLedger';
import { placeHold } from '../placeHold';
import type { ActionEffect, ActionInput } from './actionInput';

/** Nothing may stop a hold: a photo that is not here, or a time that cannot be, is left out. */
export const hold: ActionEffect<'hold'> = async ({ context, sling, body }) => {
  const seenAt = body.at && new Date(body.at) <= context.at ? body.at : null;
  return placeHold(context, sling, {
    reasons: body.reasons.map((reason) => ({ ...reason, placedBy: context.user.id })),
    photos: await findEvidence(context, body.photoIds ?? []),
    data: seenAt ? { seenAt } : {},
  });
};

export const secure: ActionEffect<'secure'> = async (input) => {
  const cage = await getPlace(input, input.body.locationId);
  if (cage.purpose !== 'cage') throw invalidField('locationId', `${cage.name} is not a cage.`);
  return appendLedger(input.context, input.sling, {
    type: 'secure',
    custody: { kind: 'cage', locationId: cage.id },
    data: { location: cage.name },
  });
};

/** @throws InvalidError 422 for a place that is not at the site where the sling is */
export async function getPlace(
  { context, sling }: Pick<ActionInput<'secure'>, 'context' | 'sling'>,
  locationId: number,
): Promise<Location> {
  const place = await Location.findByPk(locationId, { transaction: context.transaction });
  if (place?.siteId !== sling.siteId) {
    throw invalidField('locationId', 'This is no place of the site where the sling is.');
  }
  return place;
}
