import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { LinkButton } from '../../components/ui/Button';
import { Notice } from '../../components/ui/Notice';
import { PageHeader } from '../../components/ui/PageHeader';
import { ErrorState, SkeletonLines } from '../../components/ui/states';
import { showToast } from '../../components/ui/Toast';
import { paths } from '../../config/paths';
import { invitationQuery } from '../../features/people/api/session';
import { InvitationForm } from '../../features/people/components/InvitationForm';
import { ApiProblem } from '../../lib/apiClient';
import { formatDateTime } from '../../lib/format';
import { useSession } from '../../lib/session';

export function Component(): ReactNode {
  const { token = '' } = useParams();
  const { data, error, refetch } = useQuery(invitationQuery(token));
  const { refresh } = useSession();
  const navigate = useNavigate();
  const isOver = error instanceof ApiProblem && error.status === 404;
  return (
    <>
      <PageHeader title={data ? `Welcome, ${data.name}` : 'Your account'} />
      {!data && !error && <SkeletonLines lines={4} />}
      {isOver && (
        <Notice
          tone="warn"
          title="This link doesn’t work any more"
          action={
            <LinkButton tone="quiet" to={paths.signIn()}>
              Sign in
            </LinkButton>
          }
        >
          It was used already, or its time ran out. Sign in with your password, or ask an administrator for a
          new link.
        </Notice>
      )}
      {error && !isOver && <ErrorState error={error} onRetry={() => void refetch()} />}
      {data && (
        <>
          <p className="mb-5">
            Choose a password for your account. This link works once, until {formatDateTime(data.expiresAt)}.
          </p>
          <InvitationForm
            token={token}
            email={data.email}
            onDone={async () => {
              showToast('Password saved');
              await refresh();
              await navigate(paths.home, { replace: true });
            }}
          />
        </>
      )}
    </>
  );
}
