import type { ReactNode } from 'react';
import { ACTION_FACTS } from '../../../../shared/domain/lifecycle/actions';
import type { Verdict } from '../../../../shared/domain/inspection/severity';
import { LinkButton } from '../../../components/ui/Button';
import { Panel } from '../../../components/ui/Panel';
import { paths } from '../../../config/paths';
import { CageButtons, type CageButtonsProps } from './CageButtons';
import { NotOpen } from './NotOpen';

const INTO_SERVICE = ['accept', 'release', 'return_to_service'] as const;

/** What to do with a sling that was just inspected: the cage, or the way into service with what still stands before it. */
export function AfterInspection({ verdict, ...props }: CageButtonsProps & { verdict: Verdict }): ReactNode {
  const { sling } = props;
  if (sling.state === 'held' && verdict !== 'pass') {
    if (sling.custody.kind === 'cage') {
      return <p className="text-lg font-semibold">It stays in {sling.custody.locationName ?? 'its cage'}.</p>;
    }
    return (
      <Panel title="Now bring it to the cage">
        <CageButtons {...props} />
      </Panel>
    );
  }
  const next = sling.allowedActions.find(
    ({ action, unmet }) =>
      INTO_SERVICE.some((each) => each === action) && !unmet.some(({ rule }) => rule === 'state'),
  );
  if (!next) {
    return (
      <LinkButton to={paths.sling(sling.id)} className="self-start">
        Back to the sling
      </LinkButton>
    );
  }
  if (!next.open) return <NotOpen sling={sling} action={next.action} unmet={next.unmet} />;
  return (
    <Panel title="It can go into service now">
      <LinkButton to={paths.act(sling.id, next.action)}>{ACTION_FACTS[next.action].name}</LinkButton>
    </Panel>
  );
}
