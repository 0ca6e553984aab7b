import { queryOptions, useQuery } from '@tanstack/react-query';
import { listOf } from '../../shared/schemas/common';
import { locationSchema, siteSchema } from '../../shared/schemas/places';
import { api } from './apiClient';

const sitesResponse = listOf(siteSchema);
const locationsResponse = listOf(locationSchema);
/** Sites and locations change a few times a year. */
const STALE_MS = 60_000;

const sitesQuery = queryOptions({
  queryKey: ['sites'],
  queryFn: ({ signal }) => api.get('/sites', sitesResponse, { signal }),
  staleTime: STALE_MS,
});

const locationsQuery = queryOptions({
  queryKey: ['locations'],
  queryFn: ({ signal }) => api.get('/locations', locationsResponse, { signal }),
  staleTime: STALE_MS,
});

/** The sites where the person works; an administrator sees all. */
export const useSites = () => useQuery(sitesQuery);
/** Locations of every one of those sites. */
export const useLocations = () => useQuery(locationsQuery);
