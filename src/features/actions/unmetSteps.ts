import type { SlingAction } from '../../../shared/domain/lifecycle/actions';
import { paths } from '../../config/paths';

export interface NextStep {
  to: string;
  label: string;
}

/** Where a person goes to meet what is unmet; null where no page of ours can meet it. */
export function findNextStep(rule: string, slingId: number): NextStep | null {
  switch (rule) {
    case 'initial_inspection':
      return { to: `${paths.inspect(slingId)}?type=initial`, label: 'Make the initial inspection' };
    case 'release_inspection':
      return { to: `${paths.inspect(slingId)}?type=release`, label: 'Make a release inspection' };
    case 'live_label':
      return { to: paths.labelsFor([slingId]), label: 'Print its label' };
    case 'secured':
      return { to: paths.act(slingId, 'secure'), label: 'Bring it to a cage' };
    case 'certificate':
      return { to: paths.sling(slingId), label: 'Put a certificate on the record' };
    case 'open_reason':
      return { to: paths.hold(slingId), label: 'Hold it' };
    default:
      return null;
  }
}

/** Acts that have no form here, with where they are done and what holds until then. */
export const DONE_ELSEWHERE: Partial<Record<SlingAction, string>> = {
  send: 'A sling leaves with a shipment, which names the evaluator, the purpose and the day it is expected back. It cannot be done from this page. Until it is on a shipment, it stays held in its cage.',
  destroyed_by_evaluator:
    'This is recorded on the shipment that took the sling out, with the evaluator’s certificate of destruction. It cannot be done from this page.',
  withdraw_as_error:
    'A withdrawal needs a complete new inspection by a second designated inspector, with photos and a note. It cannot be done from this page yet. Until then the sling stays held; it can be evaluated or condemned.',
};
