import type { SlingAction } from '../../../shared/domain/lifecycle/actions';
import { UnmetError } from '../../errors';
import type { ActionEffect } from './actionInput';
import { receiveBack } from './backFromEvaluation';
import { condemn, destroy } from './condemnAndDestroy';
import { hold, secure } from './holdAndSecure';
import { accept, release, returnToService } from './intoService';
import { depart, found, reportLost } from './lostAndDeparted';
import { withdrawAsError } from './withdrawAsError';

/** These two are done with the shipment that the sling is on. */
const withShipment = (message: string) => (): Promise<never> =>
  Promise.reject(new UnmetError([{ rule: 'shipment', message }]));

export const EFFECTS: { [A in SlingAction]: ActionEffect<A> } = {
  accept,
  hold,
  secure,
  release,
  condemn,
  withdraw_as_error: withdrawAsError,
  send: withShipment('It leaves with a shipment: put it on one and send that.'),
  receive_back: receiveBack,
  return_to_service: returnToService,
  destroy,
  destroyed_by_evaluator: withShipment('Confirm it at its line of the shipment.'),
  report_lost: reportLost,
  found,
  depart,
};
