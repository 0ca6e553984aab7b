import type { ReactNode } from 'react';
import { mayCall } from '../../../../../shared/domain/access/routes';
import type { Sling } from '../../../../../shared/schemas/slings';
import { Band } from '../../../../components/sling/Band';
import { Plate } from '../../../../components/sling/Plate';
import { LinkButton } from '../../../../components/ui/Button';
import { paths } from '../../../../config/paths';
import { useUser } from '../../../../lib/session';
import { usePlaceNames } from '../../hooks/usePlaceNames';
import { useToday } from '../../hooks/useToday';
import { describeState } from '../../record/describeState';
import { findLikelyStep, isOpen } from '../../record/likelyStep';

const INSPECTED_STATES: readonly Sling['state'][] = ['received', 'in_service', 'held', 'returned'];

/** Plate and band as one, then hold: one tap away. A held sling takes more reasons at the open ones, away from destroy. */
export function RecordHead({ sling }: { sling: Sling }): ReactNode {
  const user = useUser();
  const places = usePlaceNames();
  const today = useToday(sling.siteId);
  const step = findLikelyStep(sling, user);
  const mayInspect =
    mayCall('POST /api/slings/:id/inspections', user.roles) && INSPECTED_STATES.includes(sling.state);
  const inspectPath = paths.inspect(sling.id);
  return (
    <div>
      <Plate sling={sling} isJoined heading="p" />
      <Band
        sling={sling}
        isJoined
        action={
          step && (
            <LinkButton to={step.to} tone="quiet" className="max-sm:w-full">
              {step.label}
            </LinkButton>
          )
        }
      >
        {describeState(sling, { now: new Date(), today, timeZone: places.timeZone(sling.siteId) })}
      </Band>
      <div className="no-print mt-3 flex flex-wrap gap-3">
        {isOpen(sling, 'hold') && sling.state !== 'held' && (
          <LinkButton to={paths.hold(sling.id)} tone="danger" className="max-sm:flex-1">
            Hold it
          </LinkButton>
        )}
        {mayInspect && !step?.to.startsWith(inspectPath) && (
          <LinkButton to={inspectPath} tone="quiet" className="max-sm:flex-1">
            Inspect it
          </LinkButton>
        )}
      </div>
    </div>
  );
}
