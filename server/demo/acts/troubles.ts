import { getCause } from '../plan/causes';
import type { HoldCase } from '../plan/holdCases';
import type { OtherCase } from '../plan/otherCases';
import { label, confirm } from './begin';
import { inspect } from './inspect';
import { act, destroy, doubt, release, secure } from './quarantine';
import type { Script } from './script';

const CONDEMN_NOTE = 'Not worth an evaluation: it goes.';

/** From the doubt to whatever came of it; what a shipment brings is played with the shipment. */
export function playHold(script: Script, hold: HoldCase): void {
  const { sling, clock, keeper, inspector, manager, add } = script;
  const cause = getCause(hold.cause);
  const by = cause.how === 'inspection' ? inspector : keeper;
  const at = hold.hoursAgo === undefined ? clock.at(hold.ago, 10, 20) : clock.hoursAgo(hold.hoursAgo);
  add(at, by, (context, world) => doubt(context, world, sling, cause));
  if (hold.hoursAgo !== undefined) return;
  add(clock.at(hold.ago, 11, 45), keeper, (context, world) => secure(context, world, sling));
  switch (hold.then) {
    case 'held':
    case 'shipped':
      return;
    case 'released':
      return playRelease(script, hold.ago - hold.after, hold.note);
    case 'condemned':
    case 'destroyed': {
      const condemnedAgo = hold.ago - hold.after;
      add(clock.at(condemnedAgo, 14, 10), manager, (context, world) =>
        act(context, world, sling, 'condemn', { note: CONDEMN_NOTE }),
      );
      if (hold.then === 'destroyed') playDestruction(script, condemnedAgo - hold.destroyedAfter);
    }
  }
}

/** By the second inspector: whoever placed a reason doesn't release it. */
function playRelease({ sling, clock, secondInspector, add }: Script, ago: number, note: string): void {
  add(clock.at(ago, 9, 30), secondInspector, (context, world) => inspect(context, world, sling, 'release'));
  add(clock.at(ago, 9, 50), secondInspector, (context, world) => release(context, world, sling, note));
}

/** By a storekeeper: whoever condemned it doesn't destroy it. */
export function playDestruction({ sling, clock, keeper, add }: Script, ago: number): void {
  add(clock.at(ago, 15, 5), keeper, (context, world) => destroy(context, world, sling));
}

/** What happens to a sling that nobody doubts. */
export function playOther(script: Script, other: OtherCase): void {
  const { sling, clock, keeper, manager, add } = script;
  switch (other.then) {
    case 'lost':
      add(clock.at(other.ago, 15), manager, (context, world) =>
        act(context, world, sling, 'report_lost', { note: other.note }),
      );
      return;
    case 'found':
      add(clock.at(other.lostAgo, 15), manager, (context, world) =>
        act(context, world, sling, 'report_lost', { note: 'Missing at the count of the blade hall.' }),
      );
      add(clock.at(other.ago, 13), keeper, (context, world) =>
        act(context, world, sling, 'found', { note: other.note }),
      );
      add(clock.at(other.ago, 13, 25), keeper, (context, world) => secure(context, world, sling));
      return;
    case 'departed':
      return playDeparture(script, other.ago, other.cause, other.note);
    case 'relabelled':
      add(clock.at(other.ago, 10), keeper, (context, world) => label(context, world, [sling], other.reason));
      add(clock.at(other.ago, 10, 40), keeper, (context, world) => confirm(context, world, sling));
  }
}

export function playDeparture(
  { sling, clock, manager, add }: Script,
  ago: number,
  cause: Extract<OtherCase, { then: 'departed' }>['cause'],
  note: string,
): void {
  add(clock.at(ago, 14), manager, (context, world) => act(context, world, sling, 'depart', { cause, note }));
}
