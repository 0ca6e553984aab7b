import { z } from 'zod';
import { EVALUATION_OUTCOMES, SHIPMENT_PURPOSES } from '../domain/lifecycle/facts';
import { SLING_KINDS } from '../domain/slings/kinds';
import { LIMITS } from '../limits';
import { dateSchema, fileIdSchema, idSchema, instantSchema, requiredText, text } from './common';
import { emailSchema } from './people';
import { certificateInputSchema, ratedLoadsSchema } from './slings';

export const createEvaluatorRequest = z.strictObject({
  name: requiredText(LIMITS.name),
  email: emailSchema,
  isMaker: z.boolean(),
  mayRepair: z.array(z.enum(SLING_KINDS)),
});
export const evaluatorSchema = createEvaluatorRequest.extend({
  id: idSchema,
  email: z.string(),
  name: z.string(),
});
export type Evaluator = z.infer<typeof evaluatorSchema>;

export const createShipmentRequest = z.strictObject({
  evaluatorId: idSchema,
  siteId: idSchema,
  lines: z
    .array(
      z.strictObject({
        slingId: idSchema,
        purpose: z.enum(SHIPMENT_PURPOSES),
        fittingIds: z.array(idSchema).max(LIMITS.fittings).optional(),
        note: text(LIMITS.note).optional(),
      }),
    )
    .min(1, 'Put at least one sling on it.')
    .max(200),
  expectedBackOn: dateSchema,
});
export type CreateShipmentRequest = z.infer<typeof createShipmentRequest>;

export const outcomeRequest = z.strictObject({
  outcome: z.enum(EVALUATION_OUTCOMES),
  reportFileId: fileIdSchema.optional(),
  repairer: text(LIMITS.name).optional(),
  proofCertificate: certificateInputSchema.optional(),
  ratedLoads: ratedLoadsSchema.optional(),
});
export type OutcomeRequest = z.infer<typeof outcomeRequest>;

export const shipmentLineSchema = z.object({
  id: idSchema,
  slingId: idSchema,
  purpose: z.enum(SHIPMENT_PURPOSES),
  note: z.string(),
  outcome: z.enum(EVALUATION_OUTCOMES).nullable(),
  outcomeAt: instantSchema.nullable(),
});
export const shipmentSchema = z.object({
  id: idSchema,
  evaluatorId: idSchema,
  siteId: idSchema,
  status: z.enum(['draft', 'sent']),
  expectedBackOn: dateSchema,
  createdAt: instantSchema,
  sentAt: instantSchema.nullable(),
  lines: z.array(shipmentLineSchema),
});
export type Shipment = z.infer<typeof shipmentSchema>;
