import type { Role } from '../../../../shared/domain/access/roles';
import type { SlingFilters } from '../api/slingFilters';

export interface Waiting {
  id: string;
  title: string;
  /** What to do about it. */
  todo: string;
  filters: SlingFilters;
  /** For whom it waits, first of all. */
  roles: readonly Role[];
  /** Stands out while it isn't zero. */
  isUrgent?: boolean;
}

/** What can wait for a person, the most urgent first; each leads to its list. */
export const WAITING: readonly Waiting[] = [
  {
    id: 'not-secured',
    title: 'Held, not secured',
    todo: 'Bring them to a cage',
    filters: { state: 'held', secured: 'false', sort: 'stateSince' },
    roles: ['storekeeper', 'inspector', 'manager', 'auditor'],
    isUrgent: true,
  },
  {
    id: 'overdue',
    title: 'Inspection overdue',
    todo: 'Inspect them, or hold them',
    filters: { state: 'in_service', due: 'overdue', sort: 'nextDueOn' },
    roles: ['inspector', 'manager', 'auditor'],
    isUrgent: true,
  },
  {
    id: 'to-decide',
    title: 'In the cage, to decide',
    todo: 'Release, evaluate or condemn',
    filters: { state: 'held', secured: 'true', condemned: 'false', sort: 'stateSince' },
    roles: ['manager', 'inspector', 'auditor'],
  },
  {
    id: 'condemned',
    title: 'Condemned, to destroy',
    todo: 'By another person than who condemned',
    filters: { state: 'held', condemned: 'true', sort: 'stateSince' },
    roles: ['storekeeper', 'inspector', 'manager', 'auditor'],
  },
  {
    id: 'first-inspections',
    title: 'First inspections',
    todo: 'Inspect and accept into service',
    filters: { state: 'received', sort: 'stateSince' },
    roles: ['inspector'],
  },
  {
    id: 'returned',
    title: 'Back from evaluation',
    todo: 'Inspect them again',
    filters: { state: 'returned', sort: 'stateSince' },
    roles: ['inspector', 'manager', 'auditor'],
  },
  {
    id: 'soon',
    title: 'Inspection due soon',
    todo: 'Plan them',
    filters: { state: 'in_service', due: 'soon', sort: 'nextDueOn' },
    roles: ['inspector', 'manager'],
  },
  {
    id: 'labels-to-print',
    title: 'Labels to print',
    todo: 'Choose them and print one run',
    filters: { state: 'received', label: 'none', sort: '-createdAt' },
    roles: ['storekeeper'],
  },
  {
    id: 'labels-to-confirm',
    title: 'Labels to confirm',
    todo: 'Scan each on its sling',
    filters: { label: 'printed', sort: 'number' },
    roles: ['storekeeper', 'inspector'],
  },
  {
    id: 'sent',
    title: 'Out for evaluation',
    todo: 'Chase what is late',
    filters: { state: 'sent_for_evaluation', sort: 'stateSince' },
    roles: ['manager', 'auditor'],
  },
];

export const listWaiting = (roles: readonly Role[]): readonly Waiting[] =>
  WAITING.filter((waiting) => waiting.roles.some((role) => roles.includes(role)));
