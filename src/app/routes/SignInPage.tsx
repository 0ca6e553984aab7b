import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { PageHeader } from '../../components/ui/PageHeader';
import { paths } from '../../config/paths';
import { SignInForm } from '../../features/people/components/SignInForm';
import { safeReturnPath } from '../../features/people/returnPath';
import { useSession } from '../../lib/session';
import { setUpQuery } from '../sessionQuery';

export function Component(): ReactNode {
  const { user, refresh } = useSession();
  const { data: setUp } = useQuery({ ...setUpQuery, enabled: user === null });
  const [query] = useSearchParams();
  const navigate = useNavigate();
  const returnPath = safeReturnPath(query.get('to'));
  if (user) return <Navigate to={returnPath} replace />;
  if (setUp?.needed) return <Navigate to={paths.setUp} replace />;
  return (
    <>
      <PageHeader
        title="Sign in"
        sub={returnPath === '/' ? undefined : 'You come back to the page that you wanted.'}
      />
      <SignInForm
        onSignedIn={async () => {
          await refresh();
          await navigate(returnPath, { replace: true });
        }}
      />
      <p className="mt-8 border-t border-rule pt-4 text-muted">
        To see whether a sling may be used, nobody has to sign in: point your phone’s camera at its label.
      </p>
    </>
  );
}
