import type { Role } from '../../../shared/domain/access/roles';
import type { CreateUserRequest, User } from '../../../shared/schemas/people';

/** What each role comes for, as the administrator chooses it (product design, section 1). */
export const ROLE_HINTS = {
  storekeeper: 'Receives, labels, hands out, brings to the cage',
  inspector: 'Examines, accepts, releases; needs a designation',
  manager: 'Decides what happens to held slings',
  admin: 'Accounts, sites and locations; no say over slings',
  auditor: 'Reads everything, changes nothing; ends by date',
} as const satisfies Record<Role, string>;

export const NEW_USER: CreateUserRequest = {
  name: '',
  email: '',
  roles: [],
  siteIds: [],
  endsOn: null,
  designations: [],
};

export function toFormValues(user: User): CreateUserRequest {
  const { name, email, roles, siteIds, endsOn, designations } = user;
  return { name, email, roles, siteIds, endsOn, designations };
}

/** An empty date field means "none". */
export const emptyToNull = (value: unknown): unknown => (value === '' ? null : value);
