import { mayCall } from '../../../../shared/domain/access/routes';
import type { SlingAction } from '../../../../shared/domain/lifecycle/actions';
import type { Sling } from '../../../../shared/schemas/slings';
import type { SessionUser } from '../../../../shared/schemas/people';
import { paths } from '../../../config/paths';

export interface Step {
  to: string;
  label: string;
}
type Judged = Pick<
  Sling,
  'id' | 'state' | 'condemned' | 'custody' | 'tag' | 'due' | 'mayUse' | 'allowedActions'
>;

/** The one act that this person most likely wants on this sling now; null where there is none for them. */
export function findLikelyStep(sling: Judged, user: Pick<SessionUser, 'roles'>): Step | null {
  const act = (action: SlingAction, label: string): Step | null =>
    isOpen(sling, action) ? { to: paths.act(sling.id, action), label } : null;
  const inspect = (type: string, label: string): Step | null =>
    mayCall('POST /api/slings/:id/inspections', user.roles)
      ? { to: `${paths.inspect(sling.id)}?type=${type}`, label }
      : null;
  switch (sling.state) {
    case 'received':
      return (
        act('accept', 'Accept into service') ??
        inspect('initial', 'Make its first inspection') ??
        findLabelStep(sling, user)
      );
    case 'in_service':
      return (
        (sling.due === 'ok' ? null : inspect('periodic', 'Inspect it')) ??
        findLabelStep(sling, user) ??
        inspect('frequent', 'Inspect it')
      );
    case 'held':
      if (sling.custody.kind !== 'cage') return act('secure', 'Bring it to a cage');
      if (sling.condemned) return act('destroy', 'Record its destruction');
      return (
        act('release', 'Release into service') ??
        inspect('release', 'Make a release inspection') ??
        act('condemn', 'Condemn it')
      );
    case 'sent_for_evaluation':
      return act('receive_back', 'Receive it back');
    case 'returned':
      return act('return_to_service', 'Return to service') ?? inspect('release', 'Inspect it again');
    case 'lost':
      return act('found', 'It is found');
    case 'destroyed':
    case 'departed':
      return null;
  }
}

/** Print a label where there is none, confirm one that is only printed. */
export function findLabelStep(
  sling: Pick<Sling, 'id' | 'tag'>,
  user: Pick<SessionUser, 'roles'>,
): Step | null {
  if (!mayCall('POST /api/label-runs', user.roles)) return null;
  if (sling.tag === null || sling.tag.status === 'void') {
    return { to: paths.labelsFor([sling.id]), label: 'Print its label' };
  }
  return sling.tag.status === 'printed' ? { to: paths.scan(), label: 'Confirm its label by scan' } : null;
}

export const isOpen = (sling: Pick<Sling, 'allowedActions'>, action: SlingAction): boolean =>
  sling.allowedActions.some((answer) => answer.action === action && answer.open);
