import type { ReactNode } from 'react';
import { Button } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { useAct } from '../api/actOnSling';
import type { ActFormProps } from '../actFormProps';
import { ActProblem } from './ActProblem';
import { CageButtons } from './CageButtons';

/** Acts that only ask where the sling is now: one tap on the place. */
export function PlaceForm({
  action,
  ...props
}: ActFormProps & { action: 'secure' | 'receive_back' }): ReactNode {
  if (action === 'secure') return <CageButtons {...props} />;
  return <ReceiveBackPlaces {...props} />;
}

function ReceiveBackPlaces({ sling, locations, onDone, onReload }: ActFormProps): ReactNode {
  const act = useAct(sling, 'receive_back');
  const places = locations.filter(({ siteId }) => siteId === sling.siteId);
  if (places.length === 0) {
    return (
      <Notice tone="warn" title="No place is on the books for this site">
        An administrator adds the places of this site; then the sling can be received there.
      </Notice>
    );
  }
  return (
    <div className="flex flex-col gap-4">
      <h2 className="text-lg font-bold">Where did you put it?</h2>
      <ul className="grid gap-3 sm:grid-cols-2 lg:grid-cols-3">
        {places.map((place) => (
          <li key={place.id}>
            <Button
              wide
              tone="quiet"
              className="min-h-16"
              pending={act.isPending && act.variables.locationId === place.id}
              pendingText="Receiving"
              disabled={act.isPending}
              onClick={() => act.mutate({ locationId: place.id }, { onSuccess: onDone })}
            >
              {place.name}
            </Button>
          </li>
        ))}
      </ul>
      <ActProblem problem={act.error} onReload={onReload} onDismiss={act.reset} />
    </div>
  );
}
