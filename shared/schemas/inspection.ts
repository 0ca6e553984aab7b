import { z } from 'zod';
import {
  ANSWER_TYPES,
  CRITERION_PARTS,
  FITTING_TARGETS,
  LIMIT_UNITS,
  NOMINAL_SOURCES,
  OUTCOMES,
  SOURCE_MARKS,
  type Answer,
} from '../domain/inspection/criterion';
import { INSPECTION_TYPES } from '../domain/inspection/inspectionTypes';
import type { CriterionRow } from '../domain/inspection/rows';
import { CHOOSABLE_RULE_SETS, RULE_SET_IDS } from '../domain/inspection/ruleSets';
import { VERDICTS } from '../domain/inspection/severity';
import type { Finding } from '../domain/inspection/verdict';
import { SLING_KINDS } from '../domain/slings/kinds';
import { FITTING_POSITIONS, FITTING_TYPES } from '../domain/slings/spec';
import { LIMITS } from '../limits';
import {
  dateSchema,
  fileIdSchema,
  idParam,
  idSchema,
  instantSchema,
  lengthMmSchema,
  requiredText,
  text,
} from './common';
import { slingSchema } from './slings';
import { kindAndSpecSchema } from './spec';

/** More than any sling has questions: 24 fittings with every fitting criterion, and the body's. */
const ANSWERS_MAX = 400;

/** A verdict may be asked for with fittings that are on no record, so their ids are the asker's own. */
const fittingRefSchema = z.union([idSchema, z.string().min(1).max(LIMITS.shortText)]);

/** One answer; which of its figures are needed depends on the criterion. Lengths in mm, temperatures in °C. */
export const answerSchema = z.strictObject({
  criterionId: z.string().min(1).max(LIMITS.shortText),
  seen: z.boolean().optional(),
  count: z.number().int('A whole number.').nonnegative('Not below zero.').max(100_000).optional(),
  total: z.number().int('A whole number.').positive('More than zero.').max(100_000).optional(),
  nominal: lengthMmSchema.optional(),
  /** Below zero only for temperatures, down to absolute zero. */
  measured: z.number().min(-273.15, 'Below anything that can be measured.').max(LIMITS.lengthMm).optional(),
  measured2: z.number().nonnegative('Not below zero.').max(LIMITS.lengthMm).optional(),
  fittingId: fittingRefSchema.optional(),
  note: text(LIMITS.note).optional(),
  photoIds: z.array(fileIdSchema).max(LIMITS.photosPerAct).optional(),
  at: z
    .strictObject({
      leg: z.number().int().min(LIMITS.legs.min).max(LIMITS.legs.max),
      /** Distance from the upper end of the leg. */
      positionMm: z.number().nonnegative('Not below zero.').max(LIMITS.lengthMm),
    })
    .optional(),
}) satisfies z.ZodType<Answer>;
/** The same as kept and sent back. */
const keptAnswerSchema = answerSchema.extend({ note: z.string().optional() });

export const criteriaParams = z.strictObject({ kind: z.enum(SLING_KINDS) });
export const criteriaQuery = z.strictObject({ slingId: idParam.optional() });

const sourceSchema = z.object({
  ruleSet: z.enum(RULE_SET_IDS),
  document: z.string(),
  clause: z.string(),
  mark: z.enum(SOURCE_MARKS),
});

export const criterionRowSchema = z.object({
  id: z.string(),
  part: z.enum(CRITERION_PARTS),
  name: z.string(),
  question: z.string(),
  help: z.string(),
  answer: z.enum(ANSWER_TYPES),
  unit: z.enum(LIMIT_UNITS).optional(),
  perFitting: z.enum(FITTING_TARGETS).nullable(),
  fittingId: fittingRefSchema.optional(),
  nominalFrom: z.enum(NOMINAL_SOURCES).optional(),
  nominal: z.number().optional(),
  limits: z.array(
    z.object({
      ruleSet: z.enum(RULE_SET_IDS),
      edition: z.string(),
      op: z.enum(['seen', 'over', 'at_least', 'under']),
      value: z.number().optional(),
      unit: z.enum(LIMIT_UNITS).optional(),
      outcome: z.enum(OUTCOMES),
    }),
  ),
  sources: z.array(sourceSchema),
  clean: keptAnswerSchema,
}) satisfies z.ZodType<CriterionRow>;
export const criteriaResponse = z.object({ items: z.array(criterionRowSchema) });
export type CriteriaResponse = z.infer<typeof criteriaResponse>;

const ruleSetUsedSchema = z.object({ id: z.enum(RULE_SET_IDS), edition: z.string() });
export const findingSchema = z.object({
  criterionId: z.string(),
  fittingId: fittingRefSchema.optional(),
  outcome: z.enum(OUTCOMES),
  ruleSet: z.enum(RULE_SET_IDS),
  edition: z.string(),
  limit: z.number().nullable(),
  value: z.number().nullable(),
  unit: z.string().nullable(),
  message: z.string(),
  sources: z.array(sourceSchema),
  others: z.array(
    z.object({ ruleSet: z.enum(RULE_SET_IDS), outcome: z.enum([...OUTCOMES, 'pass', 'silent']) }),
  ),
  isFromOtherSet: z.boolean(),
  holdReason: z
    .enum(['criterion', 'referred', 'latch', 'makers_tag_missing', 'unauthorised_repair'])
    .nullable(),
}) satisfies z.ZodType<Finding>;

/** `ruleSets` absent: the site's. The maker's own limits always count. */
export const verdictRequest = kindAndSpecSchema.and(
  z.object({
    legs: z.number().int().min(LIMITS.legs.min).max(LIMITS.legs.max).optional(),
    fittings: z
      .array(
        z.object({
          id: fittingRefSchema,
          type: z.enum(FITTING_TYPES),
          position: z.enum(FITTING_POSITIONS).optional(),
          sizeMm: lengthMmSchema.optional(),
          throatMm: lengthMmSchema.optional(),
          hasLatch: z.boolean().optional(),
          detachable: z.boolean().optional(),
        }),
      )
      .max(LIMITS.fittings)
      .default([]),
    answers: z.array(answerSchema).max(ANSWERS_MAX),
    ruleSets: z
      .array(z.enum([...CHOOSABLE_RULE_SETS, 'maker']))
      .min(1, 'Choose at least one rule set.')
      .max(RULE_SET_IDS.length)
      .optional(),
  }),
);
export type VerdictRequest = z.infer<typeof verdictRequest>;
export const verdictResponse = z.object({
  verdict: z.enum(VERDICTS),
  findings: z.array(findingSchema),
  ruleSets: z.array(ruleSetUsedSchema),
});
export type VerdictResponse = z.infer<typeof verdictResponse>;

export const createInspectionRequest = z.strictObject({
  type: z.enum(INSPECTION_TYPES),
  /** Absent: today. Never in the future, which the server checks against the site's date. */
  inspectedOn: dateSchema.optional(),
  answers: z.array(answerSchema).max(ANSWERS_MAX),
  restClean: z.boolean().optional(),
  stricter: z
    .strictObject({ verdict: z.enum(VERDICTS), note: requiredText(LIMITS.note, 'Say why you are stricter.') })
    .optional(),
});
export type CreateInspectionRequest = z.infer<typeof createInspectionRequest>;

const criterionRefSchema = z.object({ criterionId: z.string(), fittingId: fittingRefSchema.optional() });
export const inspectionSchema = z.object({
  id: idSchema,
  type: z.enum(INSPECTION_TYPES),
  inspectedOn: dateSchema,
  recordedAt: instantSchema,
  inspector: z.object({ id: idSchema, name: z.string() }),
  verdict: z.enum(VERDICTS),
  stricter: z.object({ verdict: z.enum(VERDICTS), note: z.string() }).nullable(),
  restClean: z.boolean(),
  answers: z.array(keptAnswerSchema),
  findings: z.array(findingSchema),
  notTaken: z.array(criterionRefSchema),
  ruleSets: z.array(ruleSetUsedSchema),
  nextDueOn: dateSchema.nullable(),
});
export type Inspection = z.infer<typeof inspectionSchema>;
export const createInspectionResponse = z.object({ inspection: inspectionSchema, sling: slingSchema });
export type CreateInspectionResponse = z.infer<typeof createInspectionResponse>;
