import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { listOf } from '../../../../shared/schemas/common';
import {
  locationSchema,
  siteSchema,
  type CreateLocationRequest,
  type CreateSiteRequest,
} from '../../../../shared/schemas/places';
import { api } from '../../../lib/apiClient';

const PLACES_STALE_MS = 60_000;

/** The sites where the signed-in person works. */
export const sitesQuery = queryOptions({
  queryKey: ['sites'],
  queryFn: async ({ signal }) => (await api.get('/sites', listOf(siteSchema), { signal })).items,
  staleTime: PLACES_STALE_MS,
});

/** All locations of those sites. */
export const locationsQuery = queryOptions({
  queryKey: ['locations'],
  queryFn: async ({ signal }) => (await api.get('/locations', listOf(locationSchema), { signal })).items,
  staleTime: PLACES_STALE_MS,
});

export function useCreateSite() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: CreateSiteRequest) => api.send('POST', '/sites', request, siteSchema),
    // Lists of places stand in many caches, and the session holds one's sites: this happens a few times a year
    onSuccess: () => client.invalidateQueries(),
  });
}

export function useCreateLocation() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: CreateLocationRequest) => api.send('POST', '/locations', request, locationSchema),
    onSuccess: () => client.invalidateQueries(),
  });
}
