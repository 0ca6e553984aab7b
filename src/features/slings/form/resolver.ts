import { toNestErrors } from '@hookform/resolvers';
import type { FieldError, Resolver } from 'react-hook-form';
import { KIND_FACTS } from '../../../../shared/domain/slings/kinds';
import { createSlingRequest, type CreateSlingRequest } from '../../../../shared/schemas/slings';
import { buildRequest } from './buildRequest';
import { listFaults, type Fault } from './faults';
import type { SlingFormValues } from './values';

export type CheckedForm = { request: CreateSlingRequest; faults: null } | { request: null; faults: Fault[] };

/** The form against the same schema that the server checks with; one fault per field, the first. */
export function checkForm(values: SlingFormValues): CheckedForm {
  const parsed = createSlingRequest.safeParse(buildRequest(values), { reportInput: true });
  if (parsed.success) return { request: parsed.data, faults: null };
  const faults = [...listFaults(parsed.error.issues, values.kind), ...listIdentityFaults(values)];
  return { request: null, faults: keepFirst(faults) };
}

/** The schema compares fields only once each is right by itself; said here at once, so that nobody is sent round twice. */
function listIdentityFaults({ kind, makerSerial, stockNumber }: SlingFormValues): Fault[] {
  if (!kind || makerSerial.trim()) return [];
  if (KIND_FACTS[kind].needsMakerSerial) {
    return [{ path: 'makerSerial', message: 'Type the serial as it stands on the maker’s tag.' }];
  }
  if (stockNumber.trim()) return [];
  return [{ path: 'stockNumber', message: 'A serial or a stock number is needed to tell it apart.' }];
}

function keepFirst(faults: readonly Fault[]): Fault[] {
  return faults.filter(({ path }, i) => faults.findIndex((other) => other.path === path) === i);
}

export const slingFormResolver: Resolver<SlingFormValues> = (values, _context, options) => {
  const { faults } = checkForm(values);
  if (faults === null) return { values, errors: {} };
  const flat = Object.fromEntries(
    faults.map(({ path, message }): [string, FieldError] => [path, { type: 'rule', message }]),
  );
  return { values: {}, errors: toNestErrors(flat, options) };
};
