import type { ReactNode } from 'react';
import { ROLE_NAMES } from '../../../shared/domain/access/roles';
import { LinkButton } from '../../components/ui/Button';
import { PageHeader } from '../../components/ui/PageHeader';
import { FactList, Panel } from '../../components/ui/Panel';
import { paths } from '../../config/paths';
import { AccountForm } from '../../features/people/components/AccountForm';
import { DesignationList } from '../../features/people/components/DesignationList';
import { DeviceSettings } from '../../features/people/components/DeviceSettings';
import { PasswordForm } from '../../features/people/components/PasswordForm';
import { SignOutButton } from '../../features/people/components/SignOutButton';
import { useSites } from '../../lib/places';
import { hasRole, useSession, useUser } from '../../lib/session';

export function Component(): ReactNode {
  const user = useUser();
  const { refresh } = useSession();
  const sites = useSites().data?.items ?? [];
  const siteNames = sites.filter(({ id }) => user.siteIds.includes(id)).map(({ name }) => name);
  const isInspector = hasRole(user, 'inspector');
  return (
    <>
      <PageHeader
        title={user.name}
        sub={user.email}
        actions={
          <>
            {hasRole(user, 'admin') && (
              <LinkButton tone="quiet" to={paths.users}>
                Users
              </LinkButton>
            )}
            <LinkButton tone="quiet" to={paths.sites}>
              Sites and locations
            </LinkButton>
          </>
        }
      />
      <div className="grid gap-8 lg:grid-cols-2 lg:gap-x-12">
        <Panel title="Account">
          <AccountForm user={user} onSaved={refresh} />
        </Panel>
        <Panel title="What you may do here">
          <FactList
            facts={[
              { term: 'Roles', value: user.roles.map((role) => ROLE_NAMES[role]).join(', ') },
              { term: 'Sites', value: siteNames.join(', ') || 'None' },
            ]}
          />
          {isInspector && (
            <div className="mt-4">
              <h3 className="font-semibold">Designations</h3>
              {user.designations.length > 0 ? (
                <DesignationList designations={user.designations} />
              ) : (
                <p className="text-muted">
                  None yet. Without one, inspections can’t accept, release or return a sling. An administrator
                  enters it.
                </p>
              )}
            </div>
          )}
        </Panel>
        <Panel title="This device">
          <DeviceSettings />
        </Panel>
        <Panel title="Password">
          <PasswordForm email={user.email} />
        </Panel>
        <Panel title="Leave">
          <SignOutButton />
        </Panel>
      </div>
    </>
  );
}
