import { queryOptions } from '@tanstack/react-query';
import { sessionResponse, setUpState, type SessionUser } from '../../shared/schemas/people';
import { api, ApiProblem } from '../lib/apiClient';

/** Who is signed in; null when nobody is. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<SessionUser | null> => {
    try {
      return (await api.get('/session', sessionResponse, { signal })).user;
    } catch (error) {
      if (error instanceof ApiProblem && error.status === 401) return null;
      throw error;
    }
  },
  staleTime: 60_000,
});

/** Does the first administrator still have to be made? */
export const setUpQuery = queryOptions({
  queryKey: ['set-up'],
  queryFn: ({ signal }) => api.get('/setup', setUpState, { signal }),
  staleTime: Number.POSITIVE_INFINITY,
});
