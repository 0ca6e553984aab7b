import { useMutation } from '@tanstack/react-query';
import { z } from 'zod';
import type { changePasswordRequest, updateAccountRequest } from '../../../../shared/schemas/people';
import { api, noContent } from '../../../lib/apiClient';

export type UpdateAccountRequest = z.infer<typeof updateAccountRequest>;
export type ChangePasswordRequest = z.infer<typeof changePasswordRequest>;

/** Ask the session again afterwards: it carries name and units. */
export const useUpdateAccount = () =>
  useMutation({
    mutationFn: (request: UpdateAccountRequest) => api.send('PATCH', '/account', request, z.unknown()),
  });

export const useChangePassword = () =>
  useMutation({
    mutationFn: (request: ChangePasswordRequest) => api.send('POST', '/account/password', request, noContent),
  });
