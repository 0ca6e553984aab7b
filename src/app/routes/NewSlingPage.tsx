import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { mayCall } from '../../../shared/domain/access/routes';
import { LinkButton } from '../../components/ui/Button';
import { PageHeader } from '../../components/ui/PageHeader';
import { EmptyState, ErrorState, SkeletonLines } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { useSites } from '../../lib/places';
import { SlingForm } from '../../features/slings/components/form/SlingForm';
import { getToday } from '../../lib/format';
import { useUser } from '../../lib/session';

export function Component(): ReactNode {
  return (
    <>
      <PageHeader
        title="Register a sling"
        back={{ to: paths.slings(), label: 'Slings' }}
        sub="Put it on the books as received. It is used only after its label and its first inspection."
      />
      <Registration />
    </>
  );
}

function Registration(): ReactNode {
  const user = useUser();
  const navigate = useNavigate();
  const sites = useSites();
  if (!mayCall('POST /api/slings', user.roles)) {
    return (
      <EmptyState
        title="Registering is not open to you"
        action={<LinkButton to={paths.slings()}>Open the register</LinkButton>}
      >
        It needs a person with the role storekeeper, inspector or manager.
      </EmptyState>
    );
  }
  if (sites.isError) return <ErrorState error={sites.error} onRetry={() => void sites.refetch()} />;
  if (!sites.data) return <SkeletonLines lines={12} />;
  const { items } = sites.data;
  if (items.length === 0) {
    return (
      <EmptyState title="You work at no site yet">
        Every sling belongs to a site. Ask an administrator to add you to one.
      </EmptyState>
    );
  }
  const only = items.length === 1 ? items[0] : undefined;
  return (
    <SlingForm
      today={getToday(new Date(), items[0]?.timeZone)}
      onlySiteId={only?.id}
      onRegistered={(sling) =>
        void navigate(paths.sling(sling.id), { replace: true, state: { registered: true } })
      }
    />
  );
}
