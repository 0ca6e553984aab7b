import { z } from 'zod';
import { LIMITS } from '../limits';
import { idSchema, instantSchema, requiredText } from './common';
import { slingSchema, tagSchema } from './slings';

export const REPRINT_REASONS = ['lost', 'illegible', 'retagged', 'misprint'] as const;
export type ReprintReason = (typeof REPRINT_REASONS)[number];
/** `lost` and `misprint` void the old label at once, the others when the new one is confirmed (product design, section 11). */
export const REPRINT_REASON_FACTS = {
  lost: { name: 'The old label is lost', voidsAtOnce: true },
  illegible: { name: 'The old label cannot be read', voidsAtOnce: false },
  retagged: { name: 'The sling gets a new place for its label', voidsAtOnce: false },
  misprint: { name: 'The print came out wrong', voidsAtOnce: true },
} as const satisfies Record<ReprintReason, { name: string; voidsAtOnce: boolean }>;

export const labelStockSchema = z.object({
  id: z.string(),
  name: z.string(),
  kind: z.enum(['single', 'sheet', 'roll']),
  widthMm: z.number(),
  heightMm: z.number(),
  dpi: z.number(),
  qrMm: z.number(),
  perSheet: z.number(),
});
export type LabelStockView = z.infer<typeof labelStockSchema>;

export const createLabelRunRequest = z.strictObject({
  slingIds: z.array(idSchema).min(1, 'Choose at least one sling.').max(LIMITS.labelsPerRun),
  stock: z.string().max(60),
  startAt: z.number().int().min(1).max(1000).optional(),
  reason: z.enum(REPRINT_REASONS).optional(),
});
export type CreateLabelRunRequest = z.infer<typeof createLabelRunRequest>;

export const labelRunSchema = z.object({
  id: idSchema,
  stock: z.string(),
  startAt: z.number(),
  createdAt: instantSchema,
  createdBy: z.string(),
  tags: z.array(
    z.object({ slingId: idSchema, code: z.string(), number: z.string(), status: tagSchema.shape.status }),
  ),
  warnings: z.array(z.string()),
});
export type LabelRun = z.infer<typeof labelRunSchema>;

export const confirmTagRequest = z.strictObject({
  via: z.enum(['camera', 'photo', 'scanner']),
  lastFour: z
    .string()
    .trim()
    .min(1, 'Type the last four characters that stand on the sling.')
    .max(8, 'Only the last four characters.'),
});
export type ConfirmTagRequest = z.infer<typeof confirmTagRequest>;
export const voidTagRequest = z.strictObject({
  reason: z.enum(REPRINT_REASONS),
  note: requiredText(LIMITS.note),
});

export const taggedSlingResponse = z.object({ tag: tagSchema, sling: slingSchema });
export const scanResponse = taggedSlingResponse;
export type ScanResponse = z.infer<typeof scanResponse>;
