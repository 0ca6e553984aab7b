import { queryOptions, useMutation } from '@tanstack/react-query';
import { z } from 'zod';
import {
  invitationSchema,
  sessionResponse,
  type SetUpRequest,
  type SignInRequest,
} from '../../../../shared/schemas/people';
import { api } from '../../../lib/apiClient';

export const useSignIn = () =>
  useMutation({
    mutationFn: (request: SignInRequest) => api.send('POST', '/session', request, sessionResponse),
  });

/** Makes the first administrator and signs them in. */
export const useSetUp = () =>
  useMutation({
    mutationFn: (request: SetUpRequest) => api.send('POST', '/setup', request, sessionResponse),
  });

export const invitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) =>
      api.get(`/invitations/${encodeURIComponent(token)}`, invitationSchema, { signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });

export const useAcceptInvitation = (token: string) =>
  useMutation({
    mutationFn: (password: string) =>
      api.send('POST', `/invitations/${encodeURIComponent(token)}`, { password }, z.unknown()),
  });
