import { z } from 'zod';
import { SLING_KINDS } from '../domain/slings/kinds';
import { LIMITS } from '../limits';
import { dateSchema, fileIdSchema, requiredText } from './common';
import { ratedLoadsSchema } from './slings';

export const publicTagResponse = z.object({
  verdict: z.enum(['use', 'do_not_use']),
  message: z.string(),
  number: z.string().optional(),
  kind: z.enum(SLING_KINDS).optional(),
  ratedLoads: ratedLoadsSchema.optional(),
  nextDueOn: dateSchema.optional(),
});
export type PublicTag = z.infer<typeof publicTagResponse>;

export const damageReportRequest = z.strictObject({
  name: requiredText(LIMITS.name, 'Your name, so that someone can ask.'),
  note: requiredText(LIMITS.note, 'Say what you saw.'),
  photoIds: z.array(fileIdSchema).max(LIMITS.photosPerAct).optional(),
});
export type DamageReportRequest = z.infer<typeof damageReportRequest>;
export const damageReportResponse = z.object({ received: z.literal(true), message: z.string() });
