import type { ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import { LinkButton } from '../../../../components/ui/Button';
import { Panel } from '../../../../components/ui/Panel';
import { paths } from '../../../../config/paths';
import { useUser } from '../../../../lib/session';
import { useSlingCount } from '../../api/findSlings';
import { listWaiting } from '../../home/waiting';
import { FirstSteps } from './FirstSteps';
import { WaitingTile } from './WaitingTile';

const ALL_SLINGS = {};

/** What waits for this person, or, on the first day, how to begin. */
export function HomeBody(): ReactNode {
  const user = useUser();
  const all = useSlingCount(ALL_SLINGS);
  if (all.data?.count === 0) return <FirstSteps />;
  const waiting = listWaiting(user.roles);
  return (
    <>
      {waiting.length > 0 && (
        <Panel title="What waits">
          <ul className="grid gap-3 sm:grid-cols-2 xl:grid-cols-3">
            {waiting.map((entry) => (
              <WaitingTile key={entry.id} waiting={entry} />
            ))}
          </ul>
        </Panel>
      )}
      <nav aria-label="Shortcuts" className="mt-6 flex flex-wrap gap-3">
        <LinkButton to={paths.slings()} tone="quiet">
          Open the register
        </LinkButton>
        {mayCall('POST /api/slings', user.roles) && (
          <LinkButton to={paths.newSling} tone="quiet">
            Register a sling
          </LinkButton>
        )}
        {mayCall('GET /api/users', user.roles) && (
          <LinkButton to={paths.users} tone="quiet">
            People and their roles
          </LinkButton>
        )}
      </nav>
    </>
  );
}
