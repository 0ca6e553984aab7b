import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './problem';

/** Fired on `window` when a call was answered 401: the shell turns it into sign-in with a way back. */
export const SIGNED_OUT_EVENT = 'slingward:signed-out';

function tellWhenSignedOut(error: unknown): void {
  if (error instanceof ApiProblem && error.status === 401) window.dispatchEvent(new Event(SIGNED_OUT_EVENT));
}

/** A refusal stays a refusal however often it is asked; only silence and server faults are worth another try. */
export function shouldRetry(failureCount: number, error: unknown): boolean {
  if (error instanceof ApiProblem && (error.kind === 'broken' || (error.status >= 400 && error.status < 500)))
    return false;
  return failureCount < 2;
}

export const queryClient = new QueryClient({
  queryCache: new QueryCache({ onError: tellWhenSignedOut }),
  mutationCache: new MutationCache({ onError: tellWhenSignedOut }),
  defaultOptions: {
    queries: { retry: shouldRetry, staleTime: 5_000, refetchOnWindowFocus: true },
    // 'always': without a network an act fails at once with words, instead of waiting unseen for the network
    mutations: { retry: false, networkMode: 'always' },
  },
});
