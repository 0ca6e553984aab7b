import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import { slingSchema, slingsPage } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { labelKeys } from './labelKeys';

export const LABEL_VIEWS = ['none', 'printed', 'live'] as const;
export type LabelView = (typeof LABEL_VIEWS)[number];

const PAGE_SIZE = 50;

/** Slings by the state of their label, page by page. */
export const choosableQuery = (view: LabelView, search: string) => {
  const filters = { label: view, limit: String(PAGE_SIZE), ...(search ? { q: search } : {}) };
  return infiniteQueryOptions({
    queryKey: labelKeys.choosable(filters),
    queryFn: ({ pageParam, signal }) => {
      const query = new URLSearchParams({ ...filters, ...(pageParam ? { cursor: pageParam } : {}) });
      return api.get(`/slings?${query.toString()}`, slingsPage, { signal });
    },
    initialPageParam: '',
    getNextPageParam: (page) => page.nextCursor,
  });
};

/** One that was chosen elsewhere and stands on no page fetched here. */
export const chosenSlingQuery = (id: number) =>
  queryOptions({
    queryKey: labelKeys.sling(id),
    queryFn: ({ signal }) => api.get(`/slings/${id}`, slingSchema, { signal }),
  });
