import { z } from 'zod';
import { LIMITS } from '../limits';

const CONTROL = /[\u0000-\u0008\u000B\u000C\u000E-\u001F\u007F]/u;
/** Half a character: no database keeps it, so the ledger's hash would not fit what is read back. */
const HALF_CHARACTER = /\p{Surrogate}/u;

/** A line or text that a person types: trimmed, no control characters, any script and emoji welcome. */
export function text(max: number) {
  return z
    .string()
    .max(max, `At most ${max} characters.`)
    .refine((value) => !CONTROL.test(value), 'Control characters are not allowed.')
    .refine((value) => !HALF_CHARACTER.test(value), 'A character in it is broken.')
    .overwrite((value) => value.trim());
}
export function requiredText(max: number, message = 'Please fill this in.') {
  return text(max).refine((value) => value.length > 0, message);
}

export const idSchema = z.number().int().positive();
/** An id in a path or query: digits only. */
export const idParam = z
  .string()
  .regex(/^[1-9]\d{0,14}$/)
  .transform(Number);

export const fileIdSchema = z.uuid();

export const dateSchema = z
  .string()
  .regex(/^\d{4}-\d{2}-\d{2}$/, 'A date as YYYY-MM-DD.')
  .refine(isRealDate, 'This day does not exist.')
  .refine((value) => value >= '1900', 'No sling is that old: check the year.');

function isRealDate(value: string): boolean {
  const date = new Date(`${value}T00:00:00Z`);
  return !Number.isNaN(date.getTime()) && date.toISOString().startsWith(value);
}

export const instantSchema = z.iso.datetime();

export const loadKgSchema = z
  .number()
  .min(LIMITS.least, 'More than zero.')
  .max(LIMITS.loadKg, 'Far above any sling: check the unit.');
export const lengthMmSchema = z
  .number()
  .min(LIMITS.least, 'More than zero.')
  .max(LIMITS.lengthMm, 'Far longer than any sling: check the unit.');

export const pageQuery = z.strictObject({
  limit: z.coerce.number().int().min(1).max(LIMITS.pageMax).default(LIMITS.pageDefault),
  cursor: z.string().max(200).optional(),
});

export function pageOf<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item), nextCursor: z.string().nullable() });
}
export function listOf<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item) });
}
export const noContent = z.undefined();
