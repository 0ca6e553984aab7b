export const ROLES = ['storekeeper', 'inspector', 'manager', 'admin', 'auditor'] as const;
export type Role = (typeof ROLES)[number];

export const ROLE_NAMES = {
  storekeeper: 'Storekeeper',
  inspector: 'Inspector',
  manager: 'Manager',
  admin: 'Administrator',
  auditor: 'Auditor',
} as const satisfies Record<Role, string>;
