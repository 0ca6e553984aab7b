import { queryOptions, useQuery } from '@tanstack/react-query';
import { listOf } from '../../../../shared/schemas/common';
import { inspectionSchema } from '../../../../shared/schemas/inspection';
import { api } from '../../../lib/apiClient';
import { slingKeys } from './slingKeys';

const inspectionsResponse = listOf(inspectionSchema);

export const listInspectionsOptions = (slingId: number) =>
  queryOptions({
    queryKey: slingKeys.inspections(slingId),
    queryFn: ({ signal }) => api.get(`/slings/${slingId}/inspections`, inspectionsResponse, { signal }),
    staleTime: 0,
  });

export const useInspections = (slingId: number) => useQuery(listInspectionsOptions(slingId));
