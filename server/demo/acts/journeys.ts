import { getCause } from '../plan/causes';
import type { Life } from '../plan/allocate';
import { SHIPMENT_IDS, SHIPMENTS, type DemoShipment } from '../plan/shipments';
import { STAFF } from '../plan/staff';
import { HOLD_CASES } from '../plan/holdCases';
import type { DemoClock } from '../clock';
import { confirmScrapped, report, ship, type ShippedSling } from './evaluate';
import { inspect } from './inspect';
import { act } from './quarantine';
import type { Script } from './script';
import { playDestruction } from './troubles';
import type { Act } from './world';

/** Condemned so long before the shipment that takes it to be destroyed leaves. */
const CONDEMNED_DAYS_BEFORE = 5;

/** The shipments: out, the evaluator's word, back, and what the store did then. */
export function playShipments(
  lives: readonly Life[],
  scripts: ReadonlyMap<Life, Script>,
  clock: DemoClock,
  acts: Act[],
): void {
  for (const id of SHIPMENT_IDS) {
    const plan = SHIPMENTS[id];
    const travellers = lives.flatMap((life) => {
      const script = scripts.get(life);
      const hold = life.story.type === 'held' ? life.story.case : null;
      return script && hold?.then === 'shipped' && hold.shipment === id ? [{ script, hold }] : [];
    });
    // The fates stand in the order of the cases.
    travellers.sort((a, b) => HOLD_CASES.indexOf(a.hold) - HOLD_CASES.indexOf(b.hold));
    const slings = travellers.flatMap(({ script, hold }, index): (ShippedSling & { script: Script })[] => {
      const fate = plan.fates[index];
      return fate ? [{ script, sling: script.sling, fate, note: getCause(hold.cause).note }] : [];
    });
    if (slings.length < plan.fates.length) throw new Error(`The shipment ${id} lacks a sling.`);
    const [manager = 'manager2'] = STAFF[plan.site].managers;
    acts.push({
      at: clock.at(plan.sentAgo, 12),
      by: manager,
      run: (context, world) => ship(context, world, plan, slings),
    });
    for (const shipped of slings) playTraveller(shipped.script, plan, shipped);
  }
}

function playTraveller(script: Script, plan: DemoShipment, shipped: ShippedSling): void {
  const { sling, clock, keeper, manager, add } = script;
  const { fate } = shipped;
  if (fate.purpose === 'destroy') {
    add(clock.at(plan.sentAgo + CONDEMNED_DAYS_BEFORE, 14), manager, (context, world) =>
      act(context, world, sling, 'condemn', { note: 'Too heavy for our saw: the repairer cuts it up.' }),
    );
  }
  const { backAgo } = plan;
  if (backAgo === undefined) return;
  add(clock.at(backAgo, 9), manager, (context, world) => report(context, world, plan, shipped));
  if (fate.outcome === 'destroyed') {
    add(clock.at(backAgo, 9, 30), manager, (context, world) => confirmScrapped(context, world, sling));
    return;
  }
  add(clock.at(backAgo, 11), keeper, (context, world) =>
    act(context, world, sling, 'receive_back', { locationId: world.places[sling.lot.site].lookOver }),
  );
  if (fate.next === 'returns_to_service') playReturn(script, backAgo - 1);
  if (fate.next === 'destroyed') {
    add(clock.at(backAgo - 2, 14), manager, (context, world) =>
      act(context, world, sling, 'condemn', { note: 'Its maker calls it unfit.' }),
    );
    playDestruction(script, backAgo - 9);
  }
}

function playReturn({ sling, clock, inspector, add }: Script, ago: number): void {
  add(clock.at(ago, 10), inspector, (context, world) => inspect(context, world, sling, 'release'));
  add(clock.at(ago, 10, 20), inspector, (context, world) =>
    act(context, world, sling, 'return_to_service', { note: 'Back from its maker, looked at link by link.' }),
  );
}
