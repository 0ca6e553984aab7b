import { z } from 'zod';
import { MAKERS_TAG_STATES, SERVICE_CLASSES } from '../domain/slings/kinds';
import { LIMITS } from '../limits';
import { fileIdSchema, idSchema, lengthMmSchema, requiredText, text } from './common';
import { ratedLoadsSchema } from './slings';

/** What identifies or rates a sling; it changes by a correction only (product design, section 3). */
export const correctionChanges = z
  .strictObject({
    number: requiredText(LIMITS.number),
    maker: requiredText(LIMITS.name),
    makerSerial: text(LIMITS.shortText),
    makersTag: z.enum(MAKERS_TAG_STATES),
    serviceClass: z.enum(SERVICE_CLASSES),
    reachMm: lengthMmSchema,
    ratedLoads: ratedLoadsSchema,
    siteId: idSchema,
  })
  .partial()
  .refine((changes) => Object.values(changes).some((value) => value !== undefined), 'Nothing is changed.');
export type CorrectionChanges = z.infer<typeof correctionChanges>;

export const correctionRequest = z.strictObject({
  changes: correctionChanges,
  reason: requiredText(LIMITS.note, 'Say why the record was wrong.'),
  evidenceFileIds: z.array(fileIdSchema).min(1, 'Evidence is needed.').max(LIMITS.photosPerAct),
});
export type CorrectionRequest = z.infer<typeof correctionRequest>;
