import { queryOptions, useQuery } from '@tanstack/react-query';
import { publicTagResponse } from '../../../../shared/schemas/publicPage';
import { api } from '../../../lib/apiClient';

export const getPublicTagOptions = (code: string) =>
  queryOptions({
    queryKey: ['public-tag', code],
    queryFn: ({ signal }) =>
      api.get(`/public/tags/${encodeURIComponent(code)}`, publicTagResponse, { signal }),
    // Without a network it fails at once with words, instead of waiting unseen
    networkMode: 'always',
    // An answer that is a minute old may already be wrong: asked again whenever the page is looked at
    staleTime: 0,
  });

/** What anybody may know about a label: use or not, and why. */
export const usePublicTag = (code: string) => useQuery(getPublicTagOptions(code));
