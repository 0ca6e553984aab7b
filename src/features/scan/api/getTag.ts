import { queryOptions } from '@tanstack/react-query';
import { scanResponse, type ScanResponse } from '../../../../shared/schemas/labels';
import { api } from '../../../lib/apiClient';
import type { Reading } from '../reading';

const getTag = (code: string, signal: AbortSignal): Promise<ScanResponse> =>
  api.get(`/tags/${encodeURIComponent(code)}`, scanResponse, { signal });

/** Each scan asks anew and keeps nothing: an answer of five minutes ago may be wrong by now. */
export const tagQuery = ({ code, readAt }: Reading) =>
  queryOptions({
    queryKey: ['tags', code, readAt],
    queryFn: ({ signal }) => getTag(code, signal),
    gcTime: 0,
    staleTime: 0,
  });
