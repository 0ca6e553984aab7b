import { useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { slingsQuery } from '../../../../shared/schemas/slings';
import type { SlingFilters } from '../api/slingFilters';

const FILTER_NAMES = [
  'q',
  'state',
  'kind',
  'siteId',
  'due',
  'custody',
  'secured',
  'condemned',
  'label',
  'sort',
] as const;
type FilterName = (typeof FILTER_NAMES)[number];
const filterFields = slingsQuery.omit({ limit: true, cursor: true }).partial().shape;

export interface RegisterFilters {
  filters: SlingFilters;
  /** How many narrow the list; the order and the search aren't counted. */
  activeCount: number;
  setFilter: (name: FilterName, value: string) => void;
  clear: () => void;
}

/** The register's filters, which stand in the address; what no filter understands is passed over. */
export function useRegisterFilters(): RegisterFilters {
  const [search, setSearch] = useSearchParams();
  const filters = useMemo(() => parseFilters(search), [search]);
  return {
    filters,
    activeCount: Object.keys(filters).filter((name) => name !== 'sort' && name !== 'q').length,
    setFilter: (name, value) =>
      setSearch(
        (old) => {
          const next = new URLSearchParams(old);
          if (value) next.set(name, value);
          else next.delete(name);
          return next;
        },
        { replace: true },
      ),
    clear: () =>
      setSearch(
        (old) => {
          const sort = old.get('sort');
          return new URLSearchParams(sort ? { sort } : {});
        },
        { replace: true },
      ),
  };
}

/** Each filter for itself: a wrong one must not throw away the others. */
export function parseFilters(search: URLSearchParams): SlingFilters {
  const found: Record<string, unknown> = {};
  for (const name of FILTER_NAMES) {
    const value = search.get(name);
    if (!value) continue;
    const parsed = filterFields[name].safeParse(value);
    if (parsed.success) found[name] = parsed.data;
  }
  return found;
}
