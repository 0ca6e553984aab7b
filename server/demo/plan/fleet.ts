import type { ServiceClass } from '../../../shared/domain/slings/kinds';
import { SLING_MODELS, type SlingModel } from '../models';
import type { Random } from '../random';
import type { DemoSite } from './staff';

/** How far a sling that has just come in has got. */
export type Arrival = 'unlabelled' | 'printed' | 'inspected';

/** Slings of one model that came in one carton: registered, labelled and inspected together. */
export interface DemoLot {
  /** Unlike that of every other lot. */
  name: string;
  model: SlingModel;
  count: number;
  site: DemoSite;
  receivedAgo: number;
  serviceClass: ServiceClass;
  /** How far back, from 0 to 1, its last periodic inspection lies: a lot is inspected in one go. */
  lastInspection: number;
  arrival?: Arrival;
  hire?: { owner: string; offHireAgo: number };
}

export interface DemoSling {
  number: string;
  /** Place in its lot, from 0. */
  place: number;
  lot: DemoLot;
}

interface SpecialLot extends Omit<DemoLot, 'name' | 'model' | 'serviceClass' | 'lastInspection'> {
  modelId: string;
}

const ARRIVALS: readonly SpecialLot[] = [
  { modelId: 'web-60', count: 6, site: 'slipStore', receivedAgo: 1, arrival: 'unlabelled' },
  { modelId: 'rope-16-1', count: 4, site: 'slipStore', receivedAgo: 3, arrival: 'printed' },
  { modelId: 'chain-10-2', count: 4, site: 'bladeHall', receivedAgo: 6, arrival: 'inspected' },
];

const hired = (
  modelId: string,
  count: number,
  site: DemoSite,
  receivedAgo: number,
  offHireAgo: number,
): SpecialLot => ({ modelId, count, site, receivedAgo, hire: { owner: 'Ferrow Hire', offHireAgo } });

/** Off-hire days ahead are negative; the first lot went back to its owner. */
const HIRES: readonly SpecialLot[] = [
  hired('chain-13-2', 3, 'slipStore', 430, 75),
  hired('chain-10-2', 6, 'slipStore', 310, -120),
  hired('rope-20-1', 4, 'bladeHall', 150, -45),
  hired('round-5', 5, 'slipStore', 95, -30),
];

const BLADE_HALL_COUNT = 120;
const LOT_LEAST = 2;
const LOT_MOST = 8;
/** The store was put on the books from the end of its first week on, for half a year. */
const FIRST_AGO = 720;
const STOCKED_AGO = 540;
const STOCKED_SHARE = 0.45;
const LAST_AGO = 14;

/** All 420 slings, numbered in the order in which they came in. */
export function drawFleet(random: Random): DemoSling[] {
  const special = [...ARRIVALS, ...HIRES].map(({ modelId, ...lot }): DemoLot => {
    const model = SLING_MODELS.find(({ id }) => id === modelId);
    if (!model) throw new Error(`There is no model ${modelId}.`);
    return {
      ...lot,
      name: `${modelId} of day ${lot.receivedAgo}`,
      model,
      serviceClass: 'normal',
      lastInspection: random.next(),
    };
  });
  const lots = [...special, ...drawLots(random, special)].sort((a, b) => b.receivedAgo - a.receivedAgo);
  return lots
    .flatMap((lot) => Array.from({ length: lot.count }, (_, place) => ({ lot, place })))
    .map((sling, index) => ({ ...sling, number: `MQ-${String(index + 1).padStart(4, '0')}` }));
}

function drawLots(random: Random, special: readonly DemoLot[]): DemoLot[] {
  const cartons = SLING_MODELS.flatMap((model) => {
    const taken = special.filter((lot) => lot.model.id === model.id);
    return cutIntoLots(random, model.count - sumCounts(taken)).map((count) => ({ model, count }));
  });
  let bladeHallLeft = BLADE_HALL_COUNT - sumCounts(special.filter(({ site }) => site === 'bladeHall'));
  const sited = random.shuffle(cartons).map((carton) => {
    const isForBladeHall = carton.count <= bladeHallLeft;
    if (isForBladeHall) bladeHallLeft -= carton.count;
    const site: DemoSite = isForBladeHall ? 'bladeHall' : 'slipStore';
    return { ...carton, site };
  });
  return random.shuffle(sited).map((lot, index) => ({
    ...lot,
    name: `lot ${index}`,
    receivedAgo: receivedAgo(index / sited.length),
    serviceClass: random.next() < 0.12 ? 'severe' : 'normal',
    lastInspection: random.next(),
  }));
}

/** @param share how much of the fleet has come in before, 0 to 1 */
function receivedAgo(share: number): number {
  const [from, to, part] =
    share < STOCKED_SHARE
      ? [FIRST_AGO, STOCKED_AGO, share / STOCKED_SHARE]
      : [STOCKED_AGO, LAST_AGO, (share - STOCKED_SHARE) / (1 - STOCKED_SHARE)];
  return Math.round(from - part * (from - to));
}

function cutIntoLots(random: Random, count: number): number[] {
  const lots: number[] = [];
  for (let left = count; left > 0;) {
    const size = Math.min(left, random.int(LOT_LEAST, LOT_MOST));
    lots.push(size);
    left -= size;
  }
  return lots;
}

const sumCounts = (lots: readonly { count: number }[]): number =>
  lots.reduce((sum, lot) => sum + lot.count, 0);
