import { useMutation, useQueryClient } from '@tanstack/react-query';
import {
  locationSchema,
  siteSchema,
  type CreateLocationRequest,
  type CreateSiteRequest,
} from '../../../../shared/schemas/places';
import { api } from '../../../lib/apiClient';

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
