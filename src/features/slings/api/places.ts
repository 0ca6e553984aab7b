import { queryOptions, useQuery } from '@tanstack/react-query';
import { listOf } from '../../../../shared/schemas/common';
import { locationSchema, siteSchema } from '../../../../shared/schemas/places';
import { api } from '../../../lib/apiClient';

const sitesResponse = listOf(siteSchema);
const locationsResponse = listOf(locationSchema);
/** Sites and locations change a few times a year. */
const STALE_MS = 60_000;

export const listSitesOptions = queryOptions({
  queryKey: ['slings', 'sites'],
  queryFn: ({ signal }) => api.get('/sites', sitesResponse, { signal }),
  staleTime: STALE_MS,
});

export const listLocationsOptions = queryOptions({
  queryKey: ['slings', 'locations'],
  queryFn: ({ signal }) => api.get('/locations', locationsResponse, { signal }),
  staleTime: STALE_MS,
});

export const useSites = () => useQuery(listSitesOptions);
/** Locations of every site where the person works. */
export const useLocations = () => useQuery(listLocationsOptions);
