import { queryOptions, useQuery } from '@tanstack/react-query';
import { slingSchema } from '../../../../shared/schemas/slings';
import { api } from '../../../lib/apiClient';
import { slingKeys } from './slingKeys';

export const getSlingOptions = (id: number) =>
  queryOptions({
    queryKey: slingKeys.record(id),
    queryFn: ({ signal }) => api.get(`/slings/${id}`, slingSchema, { signal }),
    // An act on another page may just have changed it: the record is always asked for anew
    staleTime: 0,
  });

export const useSling = (id: number) => useQuery(getSlingOptions(id));
