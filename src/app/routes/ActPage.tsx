import type { ReactNode } from 'react';
import { Navigate, useNavigate, useParams } from 'react-router-dom';
import { ACTION_FACTS, isSlingAction, type SlingAction } from '../../../shared/domain/lifecycle/actions';
import { LinkButton } from '../../components/ui/Button';
import { PageHeader } from '../../components/ui/PageHeader';
import { EmptyState, ErrorState, SkeletonLines } from '../../components/ui/states';
import { showToast } from '../../components/ui/Toast';
import { paths } from '../../config/paths';
import { ACTION_WORDS } from '../../features/actions/actionWords';
import { ActForm } from '../../features/actions/components/ActForm';
import { SlingLine } from '../../features/actions/components/SlingLine';
import { useSling } from '../../features/slings/api/getSling';
import { useLocations } from '../../lib/places';
import { useKeepSling } from '../../features/slings/hooks/useKeepSling';

export function Component(): ReactNode {
  const { id = '', action = '' } = useParams();
  if (action === 'hold') return <Navigate to={paths.hold(id)} replace />;
  if (!isSlingAction(action)) return <NoSuchAction slingId={id} />;
  return <ActOnSling key={`${id}/${action}`} id={Number(id)} action={action} />;
}

function ActOnSling({ id, action }: { id: number; action: SlingAction }): ReactNode {
  const navigate = useNavigate();
  const query = useSling(id);
  const locations = useLocations();
  const { onSuccess: keep } = useKeepSling(id);
  const sling = query.data;
  const error = query.error ?? locations.error;
  const retry = (): void => {
    if (query.error) void query.refetch();
    if (locations.error) void locations.refetch();
  };
  return (
    <div className="max-w-4xl">
      <PageHeader
        title={ACTION_FACTS[action].name}
        sub={ACTION_WORDS[action].means}
        back={{ to: paths.sling(id), label: sling ? `Sling ${sling.number}` : 'The sling' }}
      />
      {sling && locations.data ? (
        <>
          <SlingLine sling={sling} />
          <ActForm
            sling={sling}
            action={action}
            locations={locations.data.items}
            onReload={query.refetch}
            onDone={(answer) => {
              void keep(answer.sling);
              showToast(`${answer.sling.number}: ${ACTION_WORDS[action].done}`);
              void navigate(paths.sling(id));
            }}
          />
        </>
      ) : error ? (
        <ErrorState error={error} onRetry={retry} />
      ) : (
        <SkeletonLines lines={8} />
      )}
    </div>
  );
}

function NoSuchAction({ slingId }: { slingId: string }): ReactNode {
  return (
    <>
      <PageHeader title="No such action" back={{ to: paths.sling(slingId), label: 'The sling' }} />
      <EmptyState
        title="There is nothing to do under this address"
        action={<LinkButton to={paths.sling(slingId)}>Open the sling</LinkButton>}
      >
        The record shows everything that can be done with it.
      </EmptyState>
    </>
  );
}
