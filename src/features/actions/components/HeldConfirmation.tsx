import type { ReactNode } from 'react';
import { REASON_FACTS } from '../../../../shared/domain/lifecycle/reasons';
import type { ActionResponse } from '../../../../shared/schemas/actions';
import type { Location } from '../../../../shared/schemas/places';
import type { Sling } from '../../../../shared/schemas/slings';
import { Band } from '../../../components/sling/Band';
import { Plate } from '../../../components/sling/Plate';
import { LinkButton } from '../../../components/ui/Button';
import { Notice } from '../../../components/ui/Notice';
import { Panel } from '../../../components/ui/Panel';
import { paths } from '../../../config/paths';
import { CageButtons } from './CageButtons';
import { PhotosAfter } from './PhotosAfter';

export interface HeldConfirmationProps {
  sling: Sling;
  locations: readonly Location[];
  onSecured: (answer: ActionResponse) => void;
  onPhotos: (sling: Sling) => void;
  onReload: () => Promise<unknown>;
}

/** After the hold: that it counts, and the next step, which is the cage. */
export function HeldConfirmation({
  sling,
  locations,
  onSecured,
  onPhotos,
  onReload,
}: HeldConfirmationProps): ReactNode {
  const isCaged = sling.custody.kind === 'cage';
  return (
    <div className="flex flex-col gap-6">
      <div role="status">
        <Plate sling={sling} isJoined heading="p" />
        <Band sling={sling} isJoined>
          {sayHeld(sling)}
        </Band>
      </div>
      {sling.state === 'held' && !isCaged && (
        <Panel title="Now bring it to the cage">
          <CageButtons sling={sling} locations={locations} onDone={onSecured} onReload={onReload} />
        </Panel>
      )}
      {sling.state === 'held' && isCaged && (
        <Notice tone="good" title={`It is secured in ${sling.custody.locationName ?? 'a cage'}`}>
          Nothing more is to be done with it by hand. A manager decides what follows.
        </Notice>
      )}
      {sling.state === 'sent_for_evaluation' && (
        <Notice tone="info" title="The reason is on its record">
          The sling itself is with the evaluator. The reason waits for it when it comes back.
        </Notice>
      )}
      <PhotosAfter slingId={sling.id} onAdded={onPhotos} />
      <div className="flex flex-wrap gap-3 border-t border-rule pt-5">
        <LinkButton to={paths.sling(sling.id)} tone="quiet">
          Open the record
        </LinkButton>
        <LinkButton to={`${paths.hold(sling.id)}?more`} tone="quiet">
          Add a reason
        </LinkButton>
        <LinkButton to={paths.scan()} tone="quiet">
          Scan the next sling
        </LinkButton>
      </div>
    </div>
  );
}

function sayHeld({ openReasonCodes, custody }: Sling): string {
  const names = openReasonCodes.map((code) => REASON_FACTS[code].name);
  const reasons = names.length > 0 ? `${names.join(', ')}. ` : '';
  return `${reasons}${custody.kind === 'cage' ? `In ${custody.locationName ?? 'a cage'}.` : 'Not in a cage yet.'}`;
}
