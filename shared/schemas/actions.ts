import { z } from 'zod';
import type { SlingAction } from '../domain/lifecycle/actions';
import { HOLD_REASONS, REASON_FACTS } from '../domain/lifecycle/reasons';
import { LIMITS } from '../limits';
import { fileIdSchema, idSchema, instantSchema, requiredText, text } from './common';
import { ledgerRowSchema } from './ledger';
import { slingSchema } from './slings';

const note = text(LIMITS.note);
const photoIds = z.array(fileIdSchema).max(LIMITS.photosPerAct);

export const holdReasonInput = z
  .strictObject({
    code: z.enum(HOLD_REASONS),
    criterionId: text(LIMITS.shortText).optional(),
    note: note.optional(),
  })
  .refine((reason) => REASON_FACTS[reason.code].isChoosable, {
    path: ['code'],
    message: 'This reason is not chosen by hand: it follows from an inspection, a notice or the system.',
  })
  .refine((reason) => !REASON_FACTS[reason.code].needsNote || Boolean(reason.note), {
    path: ['note'],
    message: 'Say what it is.',
  });
export type HoldReasonInput = z.infer<typeof holdReasonInput>;

export const DEPART_CAUSES = ['off_hire', 'sold', 'transferred_out', 'registered_in_error'] as const;
export const DEPART_CAUSE_NAMES = {
  off_hire: 'Off hire, back to its owner',
  sold: 'Sold',
  transferred_out: 'Transferred out',
  registered_in_error: 'Registered in error',
} as const satisfies Record<(typeof DEPART_CAUSES)[number], string>;

export const DESTROY_METHODS = [
  'Cut through all load-bearing parts',
  'Crushed beyond use',
  'Burned or melted through',
] as const;

export const actionBodies = {
  accept: z.strictObject({ note: note.optional() }),
  hold: z.strictObject({
    reasons: z.array(holdReasonInput).min(1, 'Choose at least one reason.').max(HOLD_REASONS.length),
    photoIds: photoIds.optional(),
    /** When it was seen, for an act queued without a network; kept beside the server's time. */
    at: instantSchema.optional(),
  }),
  secure: z.strictObject({ locationId: idSchema }),
  release: z.strictObject({
    clear: z
      .array(
        z.strictObject({
          reasonId: idSchema,
          note: requiredText(LIMITS.note, 'Say why it is cleared.'),
          evidenceFileId: fileIdSchema.optional(),
        }),
      )
      .max(50),
  }),
  condemn: z.strictObject({ note: requiredText(LIMITS.note, 'Say why.') }),
  withdraw_as_error: z
    .strictObject({
      reasonId: idSchema.optional(),
      condemnation: z.literal(true).optional(),
      inspectionId: idSchema,
      photoIds: photoIds.min(1, 'Photos are needed.'),
      note: requiredText(LIMITS.note, 'Say what was wrong.'),
    })
    .refine((body) => (body.reasonId === undefined) !== (body.condemnation === undefined), {
      path: ['reasonId'],
      message: 'Withdraw either one reason or the condemnation.',
    }),
  send: z.strictObject({}),
  receive_back: z.strictObject({ locationId: idSchema }),
  return_to_service: z.strictObject({ note: note.optional() }),
  destroy: z.strictObject({
    method: requiredText(LIMITS.name, 'How was it destroyed?'),
    photoIds: photoIds.min(1, 'A photo of the destroyed sling is needed.'),
    fittings: z
      .array(z.strictObject({ fittingId: idSchema, fate: z.enum(['destroyed', 'salvaged']) }))
      .max(LIMITS.fittings),
    legs: z
      .array(
        z.strictObject({
          leg: z.number().int().min(1).max(LIMITS.legs.max),
          fate: z.enum(['destroyed', 'salvaged']),
        }),
      )
      .max(LIMITS.legs.max)
      .optional(),
    password: z.string().min(1, 'Your password is needed.').max(LIMITS.password.max),
  }),
  destroyed_by_evaluator: z.strictObject({}),
  report_lost: z.strictObject({ note: requiredText(LIMITS.note, 'Say what is known.') }),
  found: z.strictObject({ locationId: idSchema.optional(), note: note.optional() }),
  depart: z.strictObject({
    cause: z.enum(DEPART_CAUSES),
    note: requiredText(LIMITS.note, 'Say where it goes.'),
  }),
} as const satisfies Record<SlingAction, z.ZodType>;

export type ActionBodies = { [A in SlingAction]: z.infer<(typeof actionBodies)[A]> };

export const actionResponse = z.object({ sling: slingSchema, event: ledgerRowSchema });
export type ActionResponse = z.infer<typeof actionResponse>;
