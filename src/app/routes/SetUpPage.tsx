import { useQuery, useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { LinkButton } from '../../components/ui/Button';
import { Notice } from '../../components/ui/Notice';
import { PageHeader } from '../../components/ui/PageHeader';
import { ErrorState, SkeletonLines } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { SetUpForm } from '../../features/people/components/SetUpForm';
import { useSession } from '../../lib/session';
import { setUpQuery } from '../sessionQuery';

export function Component(): ReactNode {
  const { refresh } = useSession();
  const client = useQueryClient();
  const navigate = useNavigate();
  const { data, error, refetch } = useQuery(setUpQuery);
  return (
    <>
      <PageHeader
        title="Set up the store"
        sub="Once, on the first start. Everybody else gets an account from you."
      />
      {error && <ErrorState error={error} onRetry={() => void refetch()} />}
      {!data && !error && <SkeletonLines lines={6} />}
      {data && !data.needed && (
        <Notice
          title="The store is set up already"
          action={
            <LinkButton tone="quiet" to={paths.signIn()}>
              Sign in
            </LinkButton>
          }
        >
          An administrator makes further accounts.
        </Notice>
      )}
      {data?.needed && (
        <SetUpForm
          onDone={async () => {
            await refresh();
            await navigate(paths.users, { replace: true });
            await client.invalidateQueries({ queryKey: setUpQuery.queryKey });
          }}
        />
      )}
    </>
  );
}
