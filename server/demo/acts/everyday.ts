import type { Random } from '../random';
import { confirm, accept, label, register } from './begin';
import { inspect } from './inspect';
import type { Script } from './script';

/** A periodic inspection is made so many days after the last one: before a year is over. */
const PERIOD_DAYS = 350;
const YEAR_DAYS = 365;
/** A sling's next due date lies at least so far ahead unless its story says otherwise: not "due soon". */
const LEAST_DUE_IN = 35;
const FREQUENT_COUNT = { normal: 0.08, severe: 2, special: 2 };

/**
 * Registered the day it came, labelled, confirmed; inspected and accepted the day after. The first of a lot prints for
 * all, and the lot goes through each step together.
 */
export function playBeginning({ sling, clock, keeper, inspector, add }: Script): void {
  const { lot, place } = sling;
  const { receivedAgo, arrival } = lot;
  const round = (step: string): string => `${step} ${lot.name}`;
  add(
    clock.at(receivedAgo, 8, 2 * place),
    keeper,
    (context, world) => register(context, world, sling),
    round('register'),
  );
  if (arrival === 'unlabelled') return;
  if (place === 0) {
    add(clock.at(receivedAgo, 11), keeper, (context, world) =>
      label(
        context,
        world,
        [...world.records.keys()].filter((other) => other.lot === lot),
      ),
    );
  }
  if (arrival === 'printed') return;
  add(
    clock.at(receivedAgo, 13, 3 * place),
    keeper,
    (context, world) => confirm(context, world, sling),
    round('confirm'),
  );
  add(
    clock.at(receivedAgo - 1, 9, 7 * place),
    inspector,
    (context, world) => inspect(context, world, sling, 'initial'),
    round('inspect'),
  );
  if (arrival === 'inspected') return;
  add(
    clock.at(receivedAgo - 1, 11, 2 * place),
    inspector,
    (context, world) => accept(context, world, sling),
    round('accept'),
  );
}

/** The inspections of a sling in service until `untilAgo`, none of them late. */
export function playInspections(script: Script, random: Random, untilAgo: number): void {
  const firstAgo = script.sling.lot.receivedAgo - 1;
  const periodic: number[] = [];
  for (let ago = firstAgo - PERIOD_DAYS; ago > untilAgo; ago -= PERIOD_DAYS) periodic.push(ago);
  addPeriodic(script, periodic);
  addFrequent(script, random, untilAgo);
}

/**
 * The inspections of a sling in service to this day.
 * @param nextDueIn days until the next one is due, negative when it is overdue; null when its lot decides
 */
export function playInspectionsToDate(script: Script, random: Random, nextDueIn: number | null): void {
  const { receivedAgo, lastInspection } = script.sling.lot;
  const firstAgo = receivedAgo - 1;
  addFrequent(script, random, 1);
  if (nextDueIn === null && YEAR_DAYS - firstAgo >= LEAST_DUE_IN) return;
  const latestAgo = Math.min(YEAR_DAYS - LEAST_DUE_IN, firstAgo - 20);
  const lastAgo =
    nextDueIn === null ? Math.round(10 + lastInspection * (latestAgo - 10)) : YEAR_DAYS - nextDueIn;
  const steps = Math.ceil((firstAgo - lastAgo) / PERIOD_DAYS);
  const dayOfStep = (step: number): number => Math.round(firstAgo - ((firstAgo - lastAgo) * step) / steps);
  addPeriodic(
    script,
    Array.from({ length: steps }, (_, index) => dayOfStep(index + 1)),
  );
}

function addPeriodic({ sling, clock, inspector, add }: Script, daysAgo: readonly number[]): void {
  const { place, lot } = sling;
  const hour = 8 + Math.floor(lot.lastInspection * 6);
  for (const ago of daysAgo) {
    add(
      clock.at(ago, hour, 6 * place + 1),
      inspector,
      (context, world) => inspect(context, world, sling, 'periodic'),
      `periodic ${lot.name}`,
    );
  }
}

function addFrequent({ sling, clock, inspector, add }: Script, random: Random, untilAgo: number): void {
  const { receivedAgo, serviceClass } = sling.lot;
  const wanted = FREQUENT_COUNT[serviceClass];
  const count = Math.floor(wanted) + (random.next() < wanted % 1 ? 1 : 0);
  if (receivedAgo - 5 <= untilAgo) return;
  for (let made = 0; made < count; made++) {
    add(
      clock.at(random.int(untilAgo + 1, receivedAgo - 4), 15, random.int(0, 59)),
      inspector,
      (context, world) => inspect(context, world, sling, 'frequent'),
    );
  }
}
