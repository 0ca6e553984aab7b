import type { Role } from '../access/roles';
import { findDesignation, type Designation } from '../inspection/designations';
import type { SlingKind } from '../slings/kinds';
import type { Actor } from './facts';

interface Person {
  id: number;
  roles: readonly Role[];
  designations: readonly Designation[];
}

/**
 * The person as the lifecycle rules see them, for a sling of this kind.
 * @param today the site's date, YYYY-MM-DD
 */
export function toActor(person: Person, kind: SlingKind, today: string): Actor {
  const designation = findDesignation(person.designations, kind, today);
  return {
    id: person.id,
    roles: person.roles,
    designation: designation ? { isQualified: designation.isQualified } : null,
  };
}
