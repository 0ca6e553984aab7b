import type { ActorContext } from '../../context';
import type { DemoClock } from '../clock';
import type { DemoSling } from '../plan/fleet';
import { STAFF, type DemoAccount } from '../plan/staff';
import type { Random } from '../random';
import type { Act, World } from './world';

/** Collects what happens to a sling, with the people of its site. */
export interface Script {
  sling: DemoSling;
  clock: DemoClock;
  keeper: DemoAccount;
  inspector: DemoAccount;
  /** Another than `inspector`, where the site has two. */
  secondInspector: DemoAccount;
  manager: DemoAccount;
  add: (
    at: Date,
    by: DemoAccount,
    run: (context: ActorContext, world: World) => Promise<unknown>,
    round?: string,
  ) => void;
}

export function openScript(sling: DemoSling, clock: DemoClock, random: Random, acts: Act[]): Script {
  const { keepers, inspectors, managers } = STAFF[sling.lot.site];
  const [inspector = 'inspector2', secondInspector = inspector] = random.shuffle(inspectors);
  return {
    sling,
    clock,
    keeper: random.pick(keepers),
    inspector,
    secondInspector,
    manager: random.pick(managers),
    add: (at, by, run, round) => acts.push({ at, by, run, ...(round === undefined ? {} : { round }) }),
  };
}
