import { z } from 'zod';
import { CUSTODY_KINDS, SLING_STATES } from '../domain/lifecycle/states';
import { HOLD_REASONS } from '../domain/lifecycle/reasons';
import { SLING_ACTIONS } from '../domain/lifecycle/actions';
import {
  CERTIFICATE_BASES,
  KIND_FACTS,
  MAKERS_TAG_STATES,
  SERVICE_CLASSES,
  SLING_KINDS,
} from '../domain/slings/kinds';
import { FITTING_POSITIONS, FITTING_TYPES } from '../domain/slings/spec';
import { unmetSchema } from '../errors';
import { LIMITS } from '../limits';
import {
  dateSchema,
  fileIdSchema,
  idParam,
  idSchema,
  instantSchema,
  lengthMmSchema,
  loadKgSchema,
  pageOf,
  pageQuery,
  requiredText,
  text,
} from './common';
import { enteredUnitsSchema, kindAndSpecSchema } from './spec';

export const ownerSchema = z
  .strictObject({
    kind: z.enum(['own', 'hired']),
    name: text(LIMITS.name).optional(),
    offHireOn: dateSchema.optional(),
  })
  .refine((owner) => owner.kind === 'own' || Boolean(owner.name), {
    path: ['name'],
    message: 'Who is it hired from?',
  });

export const ratedLoadsSchema = z.strictObject({
  verticalKg: loadKgSchema,
  chokerKg: loadKgSchema.optional(),
  basketKg: loadKgSchema.optional(),
  bridle: z
    .strictObject({
      kg: loadKgSchema,
      angleDeg: z.number().min(30, 'Never under 30° from horizontal.').max(90, 'At most 90°.'),
    })
    .optional(),
});

export const fittingInputSchema = z.strictObject({
  position: z.enum(FITTING_POSITIONS),
  type: z.enum(FITTING_TYPES),
  sizeMm: lengthMmSchema.optional(),
  throatMm: lengthMmSchema.optional(),
  hasLatch: z.boolean().optional(),
  detachable: z.boolean(),
});

export const makerLimitSchema = z.strictObject({
  criterionId: requiredText(LIMITS.shortText),
  limit: z.number().finite(),
  source: requiredText(LIMITS.name),
});

export const certificateInputSchema = z.strictObject({
  basis: z.enum(CERTIFICATE_BASES),
  loadKg: loadKgSchema.optional(),
  testedOn: dateSchema,
  number: requiredText(LIMITS.shortText),
  fileId: fileIdSchema.optional(),
});
export type CertificateInput = z.infer<typeof certificateInputSchema>;

const recordFields = z.object({
  number: requiredText(LIMITS.number),
  maker: requiredText(LIMITS.name),
  makerSerial: text(LIMITS.shortText).optional(),
  stockNumber: text(LIMITS.shortText).optional(),
  lot: text(LIMITS.shortText).optional(),
  madeOn: dateSchema.optional(),
  firstUseOn: dateSchema.optional(),
  owner: ownerSchema.optional(),
  siteId: idSchema,
  homeLocationId: idSchema.optional(),
  serviceClass: z.enum(SERVICE_CLASSES),
  legs: z.number().int().min(LIMITS.legs.min).max(LIMITS.legs.max),
  reachMm: lengthMmSchema,
  ratedLoads: ratedLoadsSchema,
  fittings: z.array(fittingInputSchema).max(LIMITS.fittings),
  makerLimits: z.array(makerLimitSchema).max(40).optional(),
  discardOn: dateSchema.optional(),
  receivedOn: dateSchema,
  makersTag: z.enum(MAKERS_TAG_STATES),
  proofCertificate: certificateInputSchema.optional(),
  notes: text(LIMITS.note).optional(),
  cost: z.number().nonnegative().max(10_000_000).optional(),
  photoIds: z.array(fileIdSchema).max(LIMITS.photosPerAct).optional(),
  /** The unit that each load and length was typed in, for reading it back as it was written. */
  enteredUnits: enteredUnitsSchema.optional(),
});

export const createSlingRequest = recordFields.and(kindAndSpecSchema).superRefine((sling, context) => {
  const fail = (path: (string | number)[], message: string): void =>
    context.addIssue({ code: 'custom', path, message });
  if (KIND_FACTS[sling.kind].needsMakerSerial && !sling.makerSerial) {
    fail(
      ['makerSerial'],
      `The maker’s tag of a ${KIND_FACTS[sling.kind].name.toLowerCase()} carries a serial: type it as it stands there.`,
    );
  }
  if (!sling.makerSerial && !sling.stockNumber) {
    fail(['stockNumber'], 'A serial or a stock number is needed to tell it apart.');
  }
  if (sling.madeOn && sling.madeOn > sling.receivedOn) {
    fail(['madeOn'], 'It cannot be made after it was received.');
  }
});
export type CreateSlingRequest = z.infer<typeof createSlingRequest>;
export type CreateSlingInput = z.input<typeof createSlingRequest>;

export const updateSlingRequest = z.strictObject({
  notes: text(LIMITS.note).optional(),
  homeLocationId: idSchema.nullable().optional(),
  cost: z.number().nonnegative().max(10_000_000).nullable().optional(),
  /** Photos to add; a photo on a record is never taken away. */
  photoIds: z.array(fileIdSchema).max(LIMITS.photosPerAct).optional(),
});
export type UpdateSlingRequest = z.infer<typeof updateSlingRequest>;

export const clearingSchema = z.object({
  isClearable: z.boolean(),
  needsQualified: z.boolean(),
  needsEvidence: z.boolean(),
  how: z.string(),
});

export const openReasonSchema = z.object({
  id: idSchema,
  code: z.enum(HOLD_REASONS),
  criterionId: z.string().optional(),
  confirmed: z.boolean(),
  placedBy: z.object({ id: idSchema, name: z.string() }).nullable(),
  placedAt: instantSchema,
  note: z.string(),
  clearing: clearingSchema,
});
export type OpenReasonView = z.infer<typeof openReasonSchema>;

export const actionAnswerSchema = z.object({
  action: z.enum(SLING_ACTIONS),
  open: z.boolean(),
  unmet: z.array(unmetSchema),
});

export const tagSchema = z.object({ code: z.string(), status: z.enum(['printed', 'live', 'void']) });
export type Tag = z.infer<typeof tagSchema>;

export const custodySchema = z.object({
  kind: z.enum(CUSTODY_KINDS),
  locationId: idSchema.optional(),
  locationName: z.string().optional(),
  since: instantSchema,
});

export const certificateSchema = certificateInputSchema.extend({ id: idSchema, addedAt: instantSchema });

/** A row of the register: enough to tell the sling and its state, no more. */
export const slingSummarySchema = z
  .object({
    id: idSchema,
    number: z.string(),
    maker: z.string(),
    makerSerial: z.string().optional(),
    siteId: idSchema,
    legs: z.number(),
    reachMm: z.number(),
    ratedLoads: ratedLoadsSchema,
    state: z.enum(SLING_STATES),
    condemned: z.boolean(),
    mayUse: z.boolean(),
    mayNotUse: z.array(unmetSchema),
    custody: custodySchema,
    tag: tagSchema.nullable(),
    nextDueOn: dateSchema.nullable(),
    due: z.enum(['overdue', 'soon', 'ok']).nullable(),
    /** Since when it is in its state. */
    stateSince: instantSchema,
    openReasonCodes: z.array(z.enum(HOLD_REASONS)),
    version: z.number(),
  })
  .and(kindAndSpecSchema);
export type SlingSummary = z.infer<typeof slingSummarySchema>;

export const slingSchema = slingSummarySchema.and(
  z.object({
    stockNumber: z.string().optional(),
    lot: z.string().optional(),
    madeOn: dateSchema.optional(),
    firstUseOn: dateSchema.optional(),
    receivedOn: dateSchema,
    owner: z.object({
      kind: z.enum(['own', 'hired']),
      name: z.string().optional(),
      offHireOn: dateSchema.optional(),
    }),
    homeLocationId: idSchema.nullable(),
    serviceClass: z.enum(SERVICE_CLASSES),
    fittings: z.array(fittingInputSchema.extend({ id: idSchema })),
    makerLimits: z.array(makerLimitSchema),
    discardOn: dateSchema.nullable(),
    makersTag: z.enum(MAKERS_TAG_STATES),
    certificates: z.array(certificateSchema),
    photos: z.array(z.object({ fileId: fileIdSchema, addedAt: instantSchema, purpose: z.string() })),
    notes: z.string(),
    cost: z.number().nullable(),
    enteredUnits: enteredUnitsSchema,
    openReasons: z.array(openReasonSchema),
    allowedActions: z.array(actionAnswerSchema),
    headHash: z.string(),
    createdAt: instantSchema,
    updatedAt: instantSchema,
  }),
);
export type Sling = z.infer<typeof slingSchema>;

export const SLING_SORTS = ['number', '-number', 'nextDueOn', 'stateSince', '-createdAt'] as const;
export const slingsQuery = pageQuery.extend({
  state: z.enum(SLING_STATES).optional(),
  kind: z.enum(SLING_KINDS).optional(),
  siteId: idParam.optional(),
  q: z.string().max(LIMITS.shortText).optional(),
  due: z.enum(['overdue', 'soon', 'ok']).optional(),
  custody: z.enum(CUSTODY_KINDS).optional(),
  /** Held slings only: in a cage or not, condemned or not. */
  secured: z.enum(['true', 'false']).optional(),
  condemned: z.enum(['true', 'false']).optional(),
  label: z.enum(['none', 'printed', 'live']).optional(),
  sort: z.enum(SLING_SORTS).default('number'),
});
export type SlingsQuery = z.infer<typeof slingsQuery>;
export const slingsPage = pageOf(slingSummarySchema);
