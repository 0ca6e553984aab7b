import { queryOptions } from '@tanstack/react-query';
import { labelRunSchema } from '../../../../shared/schemas/labels';
import { api } from '../../../lib/apiClient';
import { labelKeys } from './labelKeys';

const ASK_AGAIN_MS = 10_000;

/** Asked again while labels wait for their confirmation: somebody else may be walking the rack with a phone. */
export const labelRunQuery = (id: number) =>
  queryOptions({
    queryKey: labelKeys.run(id),
    queryFn: ({ signal }) => api.get(`/label-runs/${id}`, labelRunSchema, { signal }),
    refetchInterval: ({ state }) =>
      state.data?.tags.some(({ status }) => status === 'printed') ? ASK_AGAIN_MS : false,
  });

export const labelRunPdfUrl = (id: number): string => `/api/label-runs/${id}/pdf`;
export const testPageUrl = (stockId: string): string =>
  `/api/label-stocks/${encodeURIComponent(stockId)}/test-page`;
