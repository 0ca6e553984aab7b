import { useQuery } from '@tanstack/react-query';
import { useState, type ReactNode } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { LinkButton } from '../../components/ui/Button';
import { Notice } from '../../components/ui/Notice';
import { PageHeader } from '../../components/ui/PageHeader';
import { EmptyState, ErrorState, SkeletonLines } from '../../components/ui/states';
import { paths } from '../../config/paths';
import { usersQuery } from '../../features/people/api/users';
import { EditUser } from '../../features/people/components/EditUser';
import { NewUser, type MadeLink } from '../../features/people/components/NewUser';
import { OneTimeLink } from '../../features/people/components/OneTimeLink';
import { UserList } from '../../features/people/components/UserList';
import { useSites } from '../../lib/places';
import { hasRole, useUser } from '../../lib/session';

const addressOf = (person: number | 'new'): string => `${paths.users}?person=${person}`;

export function Component(): ReactNode {
  const me = useUser();
  if (hasRole(me, 'admin')) return <Users />;
  return (
    <>
      <PageHeader title="Users" />
      <Notice title="Not part of your roles">Administrators make and change accounts.</Notice>
    </>
  );
}

function Users(): ReactNode {
  const me = useUser();
  const users = useQuery(usersQuery);
  const sites = useSites();
  const [query] = useSearchParams();
  const navigate = useNavigate();
  const [made, setMade] = useState<MadeLink | null>(null);
  const person = query.get('person');
  const edited = users.data?.find(({ id }) => String(id) === person);
  const showList = (): void => void navigate(paths.users);

  if (!users.data || !sites.data) {
    const error = users.error ?? sites.error;
    return (
      <>
        <PageHeader title="Users" />
        {error ? (
          <ErrorState error={error} onRetry={() => void Promise.all([users.refetch(), sites.refetch()])} />
        ) : (
          <SkeletonLines lines={9} />
        )}
      </>
    );
  }
  const back = { to: paths.users, label: 'Users' };
  const link = made && (
    <OneTimeLink
      name={made.user.name}
      link={made.link}
      expiresAt={made.expiresAt}
      onDone={() => setMade(null)}
    />
  );

  if (person === 'new') {
    return (
      <>
        <PageHeader title="Add a person" back={back} />
        <NewUser
          sites={sites.data.items}
          onMade={(answer) => {
            setMade(answer);
            showList();
          }}
        />
      </>
    );
  }
  if (edited) {
    return (
      <>
        <PageHeader title={edited.name} back={back} sub={edited.email} />
        {link}
        <EditUser
          key={edited.id}
          user={edited}
          sites={sites.data.items}
          isSelf={edited.id === me.id}
          onSaved={showList}
          onLink={setMade}
        />
      </>
    );
  }
  return (
    <>
      <PageHeader title="Users" actions={<LinkButton to={addressOf('new')}>Add a person</LinkButton>} />
      {link}
      <UserList users={users.data} sites={sites.data.items} addressOf={addressOf} />
      {users.data.length === 1 && (
        <EmptyState
          title="Only you so far"
          action={<LinkButton to={addressOf('new')}>Add a person</LinkButton>}
        >
          A store needs a storekeeper, an inspector and a manager. Some acts need two different people, so
          give each their own account.
        </EmptyState>
      )}
    </>
  );
}
