import type { SlingsQuery } from '../../../../shared/schemas/slings';

/** What narrows and orders the register. */
export type SlingFilters = Partial<Omit<SlingsQuery, 'limit' | 'cursor' | 'siteId'>> & {
  siteId?: number | undefined;
};

/** The filters as they stand in an address or a request; what isn't set is left out. */
export function toSlingSearch(filters: SlingFilters): string {
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(filters)) {
    if (value !== undefined && value !== '') search.set(name, String(value));
  }
  return search.toString();
}
