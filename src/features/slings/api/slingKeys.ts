import type { SlingFilters } from './slingFilters';

/** Query keys of everything about slings; invalidate `all` after an act. */
export const slingKeys = {
  all: ['slings'],
  list: (filters: SlingFilters) => ['slings', 'list', filters],
  count: (filters: SlingFilters) => ['slings', 'count', filters],
  record: (id: number) => ['slings', id],
  inspections: (id: number) => ['slings', id, 'inspections'],
} as const;
