import { z } from 'zod';
import { LOCATION_PURPOSES } from '../domain/lifecycle/states';
import { LIMITS } from '../limits';
import { idParam, idSchema, requiredText } from './common';
import { timeZoneSchema } from './people';

export const RULE_SET_IDS = ['osha', 'osha_construction', 'asme', 'en', 'as'] as const;

export const siteSchema = z.object({
  id: idSchema,
  name: z.string(),
  timeZone: z.string(),
  ruleSets: z.array(z.enum(RULE_SET_IDS)),
});
export type Site = z.infer<typeof siteSchema>;

export const createSiteRequest = z.strictObject({
  name: requiredText(LIMITS.shortText),
  timeZone: timeZoneSchema,
  ruleSets: z.array(z.enum(RULE_SET_IDS)).min(1, 'Choose at least one rule set.'),
});
export type CreateSiteRequest = z.infer<typeof createSiteRequest>;

export const locationSchema = z.object({
  id: idSchema,
  siteId: idSchema,
  name: z.string(),
  purpose: z.enum(LOCATION_PURPOSES),
});
export type Location = z.infer<typeof locationSchema>;

export const locationsQuery = z.strictObject({ siteId: idParam.optional() });
export const createLocationRequest = z.strictObject({
  siteId: idSchema,
  name: requiredText(LIMITS.shortText),
  purpose: z.enum(LOCATION_PURPOSES),
});
export type CreateLocationRequest = z.infer<typeof createLocationRequest>;
