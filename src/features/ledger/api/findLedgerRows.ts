import { infiniteQueryOptions, queryOptions, useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { ledgerPage } from '../../../../shared/schemas/ledger';
import { api } from '../../../lib/apiClient';

const PAGE_ROWS = 50;

function fetchRows(slingId: number, limit: number, cursor: string | null, signal: AbortSignal) {
  const search = new URLSearchParams({ slingId: String(slingId), order: 'newest', limit: String(limit) });
  if (cursor) search.set('cursor', cursor);
  return api.get(`/ledger?${search}`, ledgerPage, { signal });
}

export const findLedgerRowsOptions = (slingId: number) =>
  infiniteQueryOptions({
    queryKey: ['ledger', slingId, 'all'],
    queryFn: ({ pageParam, signal }) => fetchRows(slingId, PAGE_ROWS, pageParam, signal),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    staleTime: 0,
  });

export const findLastRowsOptions = (slingId: number, count: number) =>
  queryOptions({
    queryKey: ['ledger', slingId, 'last', count],
    queryFn: ({ signal }) => fetchRows(slingId, count, null, signal),
    staleTime: 0,
  });

/** Every row of a sling, newest first, page by page. */
export const useLedgerRows = (slingId: number) => useInfiniteQuery(findLedgerRowsOptions(slingId));
/** The last few rows, for the record page. */
export const useLastLedgerRows = (slingId: number, count: number) =>
  useQuery(findLastRowsOptions(slingId, count));
