import { queryOptions, useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { pageOf } from '../../../../shared/schemas/common';
import {
  oneTimeLinkResponse,
  userSchema,
  type CreateUserRequest,
  type UpdateUserRequest,
  type User,
} from '../../../../shared/schemas/people';
import { LIMITS } from '../../../../shared/limits';
import { api } from '../../../lib/apiClient';

const usersPage = pageOf(userSchema);
type UsersPage = z.infer<typeof usersPage>;

/** All of them: a store has dozens of people, not thousands. */
async function findAllUsers(signal: AbortSignal): Promise<User[]> {
  const users: User[] = [];
  let cursor: string | null = null;
  do {
    const query: URLSearchParams = new URLSearchParams({
      limit: String(LIMITS.pageMax),
      ...(cursor ? { cursor } : {}),
    });
    const page: UsersPage = await api.get(`/users?${query.toString()}`, usersPage, { signal });
    users.push(...page.items);
    cursor = page.nextCursor;
  } while (cursor);
  return users;
}

export const usersQuery = queryOptions({
  queryKey: ['users'],
  queryFn: ({ signal }) => findAllUsers(signal),
});

const renew = (client: QueryClient) => client.invalidateQueries({ queryKey: usersQuery.queryKey });

export function useCreateUser() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: CreateUserRequest) => api.send('POST', '/users', request, oneTimeLinkResponse),
    onSuccess: () => renew(client),
  });
}

export function useUpdateUser(id: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (request: UpdateUserRequest) => api.send('PATCH', `/users/${id}`, request, userSchema),
    onSuccess: () => renew(client),
  });
}

/** A new one-time link: for an invitation that ran out, or a forgotten password. */
export function useMakeLink() {
  return useMutation({
    mutationFn: (id: number) => api.send('POST', `/users/${id}/link`, undefined, oneTimeLinkResponse),
  });
}
