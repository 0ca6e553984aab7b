import { queryOptions, useQuery } from '@tanstack/react-query';
import { criteriaResponse } from '../../../../shared/schemas/inspection';
import type { Sling } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';

export const getCriteriaOptions = ({ id, kind }: Pick<Sling, 'id' | 'kind'>) =>
  queryOptions({
    queryKey: ['criteria', kind, id],
    queryFn: ({ signal }) => api.get(`/criteria/${kind}?slingId=${id}`, criteriaResponse, { signal }),
    staleTime: 60_000,
  });

/** The questions that apply to this sling, one row per fitting where they are asked per fitting. */
export const useCriteria = (sling: Pick<Sling, 'id' | 'kind'>) => useQuery(getCriteriaOptions(sling));
