import type { SlingAction } from '../../../shared/domain/lifecycle/actions';

export interface ActionWords {
  /** What the act does and what follows from it. */
  means: string;
  /** On the button that does it. */
  button: string;
  pending: string;
  /** After it was done. */
  done: string;
}

export const ACTION_WORDS = {
  accept: {
    means: 'Puts a new sling into service. From then on it may be used while its dates run.',
    button: 'Accept into service',
    pending: 'Accepting',
    done: 'Accepted into service.',
  },
  hold: {
    means: 'Removes the sling from service at once.',
    button: 'Hold it',
    pending: 'Holding',
    done: 'Held. Do not use it.',
  },
  secure: {
    means: 'Says in which cage the held sling is now. Tap the cage once the sling lies in it.',
    button: 'It is in this cage',
    pending: 'Securing',
    done: 'Secured in the cage.',
  },
  release: {
    means: 'Puts the held sling back into service. Every reason is cleared by what it asks for.',
    button: 'Release into service',
    pending: 'Releasing',
    done: 'Released into service.',
  },
  condemn: {
    means:
      'Decides that this sling is never used again. What follows is its destruction, by another person than you.',
    button: 'Condemn it',
    pending: 'Condemning',
    done: 'Condemned. It stays in the cage until another person destroys it.',
  },
  withdraw_as_error: {
    means: 'Takes back a confirmed reason or a condemnation that was placed by mistake.',
    button: 'Withdraw',
    pending: 'Withdrawing',
    done: 'Withdrawn as an error.',
  },
  send: {
    means: 'Sends the sling to its maker or a qualified repairer.',
    button: 'Send',
    pending: 'Sending',
    done: 'Sent for evaluation.',
  },
  receive_back: {
    means:
      'Takes the sling off the truck. The evaluator’s outcome decides what it is then: back to inspect, or held.',
    button: 'Receive it back',
    pending: 'Receiving',
    done: 'Received back.',
  },
  return_to_service: {
    means:
      'Puts a sling back into service that the evaluator called fit or repaired. The reasons it was sent with are closed.',
    button: 'Return to service',
    pending: 'Returning',
    done: 'Returned to service.',
  },
  destroy: {
    means:
      'Records that the condemned sling was made unusable. This cannot be taken back, and its label becomes void.',
    button: 'Destroyed: sign and record',
    pending: 'Recording',
    done: 'Recorded as destroyed.',
  },
  destroyed_by_evaluator: {
    means: 'Records that the evaluator destroyed the sling.',
    button: 'Record',
    pending: 'Recording',
    done: 'Recorded as destroyed.',
  },
  report_lost: {
    means:
      'Writes the sling off as not found. Its reasons stay on record; if it turns up, it comes back as held.',
    button: 'Report it lost',
    pending: 'Reporting',
    done: 'Reported lost.',
  },
  found: {
    means: 'Brings a lost sling back, as held: nobody knows what happened to it meanwhile.',
    button: 'It is found',
    pending: 'Recording',
    done: 'Found, and held. Bring it to a cage.',
  },
  depart: {
    means: 'Takes the sling off the books of this store for good. Its label becomes void.',
    button: 'It leaves the store',
    pending: 'Recording',
    done: 'Off the books of this store.',
  },
} as const satisfies Record<SlingAction, ActionWords>;
