import { z } from 'zod';
import { ROLES } from '../domain/access/roles';
import { SLING_KINDS } from '../domain/slings/kinds';
import { LENGTH_UNITS, LOAD_UNITS } from '../domain/units/units';
import { LIMITS } from '../limits';
import { dateSchema, idSchema, instantSchema, requiredText } from './common';

export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .max(LIMITS.email, `At most ${LIMITS.email} characters.`)
  .pipe(z.email('An e-mail address, such as name@store.example.'));
/** Length only: long passphrases beat rules about characters. */
export const newPasswordSchema = z
  .string()
  .min(LIMITS.password.min, `At least ${LIMITS.password.min} characters.`)
  .max(LIMITS.password.max, `At most ${LIMITS.password.max} characters.`);

export const signInRequest = z.strictObject({
  email: z.string().min(1, 'Please fill this in.').max(LIMITS.email),
  password: z.string().min(1, 'Please fill this in.').max(LIMITS.password.max),
});
export type SignInRequest = z.infer<typeof signInRequest>;

export const designationSchema = z.object({
  kinds: z.array(z.enum(SLING_KINDS)).min(1, 'Choose at least one kind.'),
  designatedBy: requiredText(LIMITS.name),
  designatedOn: dateSchema,
  until: dateSchema.nullable(),
  isQualified: z.boolean(),
});
export type DesignationInput = z.infer<typeof designationSchema>;

export const sessionUserSchema = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  roles: z.array(z.enum(ROLES)),
  siteIds: z.array(idSchema),
  loadUnit: z.enum(LOAD_UNITS),
  lengthUnit: z.enum(LENGTH_UNITS),
  designations: z.array(designationSchema),
});
export type SessionUser = z.infer<typeof sessionUserSchema>;
export const sessionResponse = z.object({ user: sessionUserSchema });

export const updateAccountRequest = z.strictObject({
  name: requiredText(LIMITS.name).optional(),
  loadUnit: z.enum(LOAD_UNITS).optional(),
  lengthUnit: z.enum(LENGTH_UNITS).optional(),
});
export const changePasswordRequest = z.strictObject({
  currentPassword: z.string().min(1, 'Please fill this in.').max(LIMITS.password.max),
  newPassword: newPasswordSchema,
});

export const setUpState = z.object({ needed: z.boolean() });
export const setUpRequest = z.strictObject({
  name: requiredText(LIMITS.name),
  email: emailSchema,
  password: newPasswordSchema,
  siteName: requiredText(LIMITS.shortText),
  timeZone: requiredText(64).refine(isTimeZone, 'A time zone such as Europe/London.'),
  ruleSets: z.enum(['us', 'uk_eu']),
});
export type SetUpRequest = z.infer<typeof setUpRequest>;

function isTimeZone(value: string): boolean {
  try {
    new Intl.DateTimeFormat('en', { timeZone: value });
    return true;
  } catch {
    return false;
  }
}
export const timeZoneSchema = requiredText(64).refine(isTimeZone, 'A time zone such as Europe/London.');

const userFields = z.strictObject({
  name: requiredText(LIMITS.name),
  email: emailSchema,
  roles: z.array(z.enum(ROLES)).min(1, 'Choose at least one role.'),
  siteIds: z.array(idSchema).max(200),
  /** The account works until the end of this day. */
  endsOn: dateSchema.nullable(),
  designations: z.array(designationSchema).max(20),
});
/** A visiting auditor's account always ends by date (product design, section 1). */
export const createUserRequest = userFields.refine(auditorEnds, {
  path: ['endsOn'],
  message: 'An auditor’s account needs a date on which it ends.',
});
export type CreateUserRequest = z.infer<typeof createUserRequest>;
export const updateUserRequest = userFields.omit({ email: true }).partial();
export type UpdateUserRequest = z.infer<typeof updateUserRequest>;

function auditorEnds(user: { roles: readonly string[]; endsOn: string | null }): boolean {
  return !user.roles.includes('auditor') || user.endsOn !== null;
}

export const userSchema = z.object({
  id: idSchema,
  name: z.string(),
  email: z.string(),
  roles: z.array(z.enum(ROLES)),
  siteIds: z.array(idSchema),
  endsOn: dateSchema.nullable(),
  designations: z.array(designationSchema),
  hasPassword: z.boolean(),
  createdAt: instantSchema,
});
export type User = z.infer<typeof userSchema>;

/** `link` is shown once and kept nowhere; it sets the password and dies with its use. */
export const oneTimeLinkResponse = z.object({ user: userSchema, link: z.string(), expiresAt: instantSchema });
export const invitationSchema = z.object({ name: z.string(), email: z.string(), expiresAt: instantSchema });
export const acceptInvitationRequest = z.strictObject({ password: newPasswordSchema });
