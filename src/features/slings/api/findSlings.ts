import {
  infiniteQueryOptions,
  keepPreviousData,
  queryOptions,
  useInfiniteQuery,
  useQuery,
} from '@tanstack/react-query';
import { slingsPage, type SlingSummary } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { toSlingSearch, type SlingFilters } from './slingFilters';
import { slingKeys } from './slingKeys';

type Page = { items: SlingSummary[]; nextCursor: string | null };

const PAGE_ROWS = 50;
/** A number on the home page needs no more: beyond it "more than" says enough. */
const COUNT_ROWS = 100;

function fetchSlings(
  filters: SlingFilters,
  limit: number,
  cursor: string | null,
  signal: AbortSignal,
): Promise<Page> {
  const search = new URLSearchParams(toSlingSearch(filters));
  search.set('limit', String(limit));
  if (cursor) search.set('cursor', cursor);
  return api.get(`/slings?${search}`, slingsPage, { signal });
}

export const findSlingsOptions = (filters: SlingFilters) =>
  infiniteQueryOptions({
    queryKey: slingKeys.list(filters),
    queryFn: ({ pageParam, signal }) => fetchSlings(filters, PAGE_ROWS, pageParam, signal),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
  });

/** The register by filters, page by page; while other filters load, the old rows stay. */
export const useSlings = (filters: SlingFilters) =>
  useInfiniteQuery({ ...findSlingsOptions(filters), placeholderData: keepPreviousData });

export const countSlingsOptions = (filters: SlingFilters) =>
  queryOptions({
    queryKey: slingKeys.count(filters),
    queryFn: async ({ signal }) => {
      const page = await fetchSlings(filters, COUNT_ROWS, null, signal);
      return { count: page.items.length, isMore: page.nextCursor !== null };
    },
  });

export const useSlingCount = (filters: SlingFilters) => useQuery(countSlingsOptions(filters));
