import { z } from 'zod';
import { SERVICE_CLASSES, SLING_KINDS } from '../../../../shared/domain/slings/kinds';
import { LENGTH_UNITS, LOAD_UNITS } from '../../../../shared/domain/units/units';
import { readDraft, writeDraft } from '../../../lib/draft';
import { makeEmptyForm, type SlingFormValues } from './values';
import type { UnitChoice } from '../../../../shared/domain/units/units';

/** What the next registration most likely shares with the last one. */
const lastRegistrationSchema = z.object({
  kind: z.enum(SLING_KINDS),
  siteId: z.string(),
  homeLocationId: z.string(),
  maker: z.string(),
  serviceClass: z.enum(SERVICE_CLASSES),
  loadUnit: z.enum(LOAD_UNITS),
  lengthUnit: z.enum(LENGTH_UNITS),
});

const keyOf = (userId: number): string => `slings.last-registration.${userId}`;

export function keepLastRegistration(userId: number, values: SlingFormValues): void {
  writeDraft(keyOf(userId), {
    kind: values.kind,
    siteId: values.siteId,
    homeLocationId: values.homeLocationId,
    maker: values.maker,
    serviceClass: values.serviceClass,
    loadUnit: values.ratedLoads.verticalKg.unit,
    lengthUnit: values.reachMm.unit,
  });
}

/** A form that begins where the last registration ended; received today. */
export function makeStartingForm(
  userId: number,
  units: UnitChoice,
  today: string,
  onlySiteId?: number,
): SlingFormValues {
  const last = readDraft(keyOf(userId), lastRegistrationSchema);
  if (!last) return { ...makeEmptyForm(units, today), siteId: onlySiteId ? String(onlySiteId) : '' };
  const { loadUnit, lengthUnit, ...same } = last;
  return { ...makeEmptyForm({ load: loadUnit, length: lengthUnit }, today), ...same };
}
