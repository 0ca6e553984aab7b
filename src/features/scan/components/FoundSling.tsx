import type { ReactNode } from 'react';
import { CUSTODY_NAMES } from '../../../../shared/domain/lifecycle/states';
import type { ScanResponse } from '../../../../shared/schemas/labels';
import { Plate } from '../../../components/sling/Plate';
import { StateMark } from '../../../components/sling/StateMark';
import { ActionBar } from '../../../components/ui/ActionBar';
import { Button, LinkButton } from '../../../components/ui/Button';
import { FactList } from '../../../components/ui/Panel';
import { TagCode } from '../../../components/ui/TagCode';
import { paths } from '../../../config/paths';
import { formatAge } from '../../../lib/format';
import type { ReadWay } from '../reading';
import { ConfirmLabel } from './ConfirmLabel';

/** Under the band: what the sling is, where it belongs, and what this person can do with it. */
export function FoundSling({
  found,
  via,
  onNext,
}: {
  found: ScanResponse;
  via: ReadWay;
  onNext: () => void;
}): ReactNode {
  const { tag, sling } = found;
  const isWaiting = tag.status === 'printed';
  // A bar at the thumb would lie over the field in which the last four characters are typed
  const Actions = isWaiting ? ActionRow : ActionBar;
  const mayHold = sling.allowedActions.some(({ action, open }) => action === 'hold' && open);
  return (
    <>
      {isWaiting && <ConfirmLabel found={found} via={via} />}
      {/* The plate would give away what has to be read off the sling */}
      {!isWaiting && <Plate sling={sling} heading="h2" />}
      {!isWaiting && <FactList facts={listFacts(found)} />}
      {sling.mayUse && tag.status === 'live' && (
        <p className="text-muted">
          Look it over before each use; the maker’s tag has the last word on its loads.
        </p>
      )}
      <Actions>
        {mayHold && (
          <LinkButton tone="danger" to={paths.hold(sling.id)}>
            {sling.state === 'held' ? 'Add a reason' : 'Hold it'}
          </LinkButton>
        )}
        <LinkButton tone="quiet" to={paths.sling(sling.id)}>
          Open record
        </LinkButton>
        <Button tone={isWaiting ? 'quiet' : 'primary'} onClick={onNext}>
          Scan next
        </Button>
      </Actions>
    </>
  );
}

function ActionRow({ children }: { children: ReactNode }): ReactNode {
  return <div className="flex flex-wrap gap-3 *:flex-1">{children}</div>;
}

function listFacts({ tag, sling }: ScanResponse): { term: string; value: ReactNode }[] {
  const where = sling.custody.locationName ?? CUSTODY_NAMES[sling.custody.kind];
  const facts: { term: string; value: ReactNode }[] = [
    { term: 'State', value: <StateMark sling={sling} /> },
    { term: 'Where', value: `${where}, ${formatAge(sling.custody.since)}` },
    { term: tag.status === 'void' ? 'Void label' : 'Label', value: <TagCode code={tag.code} /> },
  ];
  if (sling.tag && sling.tag.code !== tag.code) {
    facts.push({ term: 'Its label now', value: <TagCode code={sling.tag.code} /> });
  }
  return facts;
}
