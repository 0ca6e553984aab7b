import { z } from 'zod';
import { CUSTODY_KINDS, SLING_STATES } from '../domain/lifecycle/states';
import { idParam, idSchema, instantSchema, pageOf, pageQuery } from './common';

export const ledgerRowSchema = z.object({
  /** Place in the whole ledger. */
  seq: z.number(),
  id: z.number(),
  slingId: idSchema,
  /** Place in this sling's own chain, from 1. */
  slingSeq: z.number(),
  type: z.string(),
  at: instantSchema,
  actor: z.object({ id: idSchema.nullable(), name: z.string() }),
  from: z.enum(SLING_STATES).nullable(),
  to: z.enum(SLING_STATES),
  condemned: z.boolean(),
  custody: z.object({ kind: z.enum(CUSTODY_KINDS), locationId: idSchema.nullable() }),
  data: z.record(z.string(), z.unknown()),
  prevHash: z.string(),
  hash: z.string(),
});
export type LedgerRow = z.infer<typeof ledgerRowSchema>;

export const ledgerQuery = pageQuery.extend({
  slingId: idParam.optional(),
  order: z.enum(['newest', 'oldest']).default('newest'),
});
export const ledgerPage = pageOf(ledgerRowSchema);

export const verifyQuery = z.strictObject({ slingId: idParam.optional() });
export const verifyResponse = z.object({
  ok: z.boolean(),
  rows: z.number(),
  slings: z.number(),
  firstBad: z.object({ slingId: idSchema, slingSeq: z.number(), message: z.string() }).optional(),
});
export type VerifyResponse = z.infer<typeof verifyResponse>;
