import type { FieldError } from '../../../shared/errors';
import { InvalidError, invalidField } from '../../errors';
import { Fitting } from '../../models/Fitting';
import { getPhotos } from '../../queries/files';
import { verifyOwnPassword } from '../../security/passwords';
import { addPhotos } from '../addPhotos';
import { appendLedger } from '../appendLedger';
import type { ActionEffect, ActionInput } from './actionInput';

export const condemn: ActionEffect<'condemn'> = ({ context, sling, body }) =>
  appendLedger(context, sling, { type: 'condemn', condemned: true, data: { note: body.note } });

export const destroy: ActionEffect<'destroy'> = async (input) => {
  const { context, sling, body } = input;
  await checkFates(input);
  const photos = await getPhotos(context, body.photoIds, 'photoIds');
  if (!(await verifyOwnPassword(context, body.password))) {
    throw invalidField('password', 'This is not your password.');
  }
  const row = await appendLedger(context, sling, {
    type: 'destroy',
    to: 'destroyed',
    custody: { kind: 'none', locationId: null },
    data: {
      method: body.method,
      photos,
      fittings: body.fittings,
      legs: body.legs ?? allLegsDestroyed(sling.legs),
    },
  });
  await addPhotos(context, sling.id, photos, 'destruction', row.slingSeq);
  return row;
};

function allLegsDestroyed(legs: number): { leg: number; fate: 'destroyed' }[] {
  return Array.from({ length: legs }, (_, index) => ({ leg: index + 1, fate: 'destroyed' as const }));
}

/** @throws InvalidError 422 unless the fate of each fitting and, where legs are named, of each leg is said once */
async function checkFates({ context, sling, body }: ActionInput<'destroy'>): Promise<void> {
  const fittings = await Fitting.findAll({ where: { slingId: sling.id }, transaction: context.transaction });
  const errors: FieldError[] = [];
  const said = body.fittings.map((fitting) => fitting.fittingId);
  for (const fitting of fittings) {
    if (said.filter((id) => id === fitting.id).length !== 1) {
      errors.push({ path: 'fittings', message: `Say once what became of fitting ${fitting.id}.` });
    }
  }
  if (said.some((id) => !fittings.some((fitting) => fitting.id === id))) {
    errors.push({ path: 'fittings', message: 'A fitting named here is not on this sling.' });
  }
  const legs = body.legs?.map((leg) => leg.leg).sort((a, b) => a - b);
  if (
    legs &&
    legs.join() !==
      allLegsDestroyed(sling.legs)
        .map(({ leg }) => leg)
        .join()
  ) {
    errors.push({ path: 'legs', message: `Say once what became of each of its ${sling.legs} legs.` });
  }
  if (errors.length > 0) throw new InvalidError(errors);
}
