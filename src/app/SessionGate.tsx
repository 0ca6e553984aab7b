import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, type ReactNode } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { paths } from '../config/paths';
import { api, noContent } from '../lib/apiClient';
import { SIGNED_OUT_EVENT } from '../lib/queryClient';
import { SessionContext, type Session } from '../lib/session';
import { ErrorState, SkeletonLines } from '../components/ui/states';
import { sessionQuery, setUpQuery } from './sessionQuery';

/** Gives every page below it the session, and turns an ended one into "nobody". */
export function SessionProvider(): ReactNode {
  const client = useQueryClient();
  const { data: user, error, isPending, refetch } = useQuery(sessionQuery);

  useEffect(() => {
    const forget = (): void => void client.setQueryData(sessionQuery.queryKey, null);
    window.addEventListener(SIGNED_OUT_EVENT, forget);
    return () => window.removeEventListener(SIGNED_OUT_EVENT, forget);
  }, [client]);

  const session = useMemo<Session>(
    () => ({
      user: user ?? null,
      signOut: async () => {
        await api.send('DELETE', '/session', undefined, noContent);
        // Through the query that is on the screen: one that `clear()` took away would tell nobody
        client.setQueryData(sessionQuery.queryKey, null);
        // What one person saw must not flash up for the next
        client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== sessionQuery.queryKey[0] });
      },
      refresh: async () => {
        await client.invalidateQueries({ queryKey: sessionQuery.queryKey });
      },
    }),
    [client, user],
  );

  if (isPending) return <Waiting />;
  if (error && user === undefined) {
    return (
      <main className="mx-auto max-w-xl p-4 pt-10">
        <h1 className="sr-only">Slingward</h1>
        <ErrorState error={error} onRetry={() => void refetch()} />
      </main>
    );
  }
  return (
    <SessionContext value={session}>
      <Outlet />
    </SessionContext>
  );
}

/** Lets signed-in people through; others go to sign-in (or, on a fresh store, to set-up) and come back here after. */
export function RequireUser({ user, children }: { user: Session['user']; children: ReactNode }): ReactNode {
  const location = useLocation();
  const setUp = useQuery({ ...setUpQuery, enabled: user === null });
  if (user) return children;
  if (setUp.isPending) return <Waiting />;
  if (setUp.data?.needed) return <Navigate to={paths.setUp} replace />;
  return <Navigate to={paths.signIn(location.pathname + location.search)} replace />;
}

export function Waiting(): ReactNode {
  return (
    <main className="mx-auto max-w-xl p-4 pt-10">
      <SkeletonLines lines={5} />
    </main>
  );
}
