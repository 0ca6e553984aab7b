import type { SlingKind } from '../../../shared/domain/slings/kinds';
import type { Random } from '../random';
import type { DemoSling } from './fleet';
import { HOLD_CASES, type HoldCase } from './holdCases';
import { OTHER_CASES, type OtherCase } from './otherCases';
import type { DemoSite } from './staff';

/** What a sling's years were like. Sling and story belong together one to one. */
export type Story =
  | { type: 'arrival' }
  | { type: 'off_hire'; ago: number }
  | { type: 'held'; case: HoldCase }
  | { type: 'other'; case: OtherCase }
  | { type: 'plain'; nextDueIn: number | null };

export interface Life {
  sling: DemoSling;
  story: Story;
}

const DUE_SOON_COUNT = 12;
const OVERDUE_COUNT = 5;
/** On the books for so long before anything happens to it. */
const SETTLED_DAYS = 40;
/** Old enough for a periodic inspection that falls due about now. */
const OLD_ENOUGH_AGO = 450;

/** Gives each case a sling that was there for it, the due dates to some of the rest, and a plain life to all others. */
export function allocateStories(fleet: readonly DemoSling[], random: Random): Life[] {
  const stories = new Map<DemoSling, Story>();
  for (const sling of fleet) {
    const { arrival, hire } = sling.lot;
    if (arrival) stories.set(sling, { type: 'arrival' });
    // Hired ones are spared: their owner would have a say.
    else if (hire) stories.set(sling, endOfHire(hire.offHireAgo));
  }
  const take = (kind: SlingKind, ago: number, site?: DemoSite): DemoSling => {
    const free = fleet.filter(
      (sling) =>
        !stories.has(sling) &&
        sling.lot.model.kind === kind &&
        sling.lot.receivedAgo >= ago + SETTLED_DAYS &&
        (site === undefined || sling.lot.site === site),
    );
    if (free.length === 0) throw new Error(`No ${kind} was there ${ago} days ago.`);
    return random.pick(free);
  };
  for (const hold of HOLD_CASES)
    stories.set(take(hold.kind, hold.ago, hold.site), { type: 'held', case: hold });
  for (const other of OTHER_CASES) {
    const ago = other.then === 'found' ? other.lostAgo : other.ago;
    stories.set(take(other.kind, ago), { type: 'other', case: other });
  }
  const rest = random.shuffle(
    fleet.filter((sling) => !stories.has(sling) && sling.lot.receivedAgo >= OLD_ENOUGH_AGO),
  );
  for (const [index, sling] of rest.slice(0, DUE_SOON_COUNT + OVERDUE_COUNT).entries()) {
    const nextDueIn = index < DUE_SOON_COUNT ? random.int(3, 27) : -random.int(4, 40);
    stories.set(sling, { type: 'plain', nextDueIn });
  }
  return fleet.map((sling) => ({
    sling,
    story: stories.get(sling) ?? { type: 'plain', nextDueIn: null },
  }));
}

function endOfHire(offHireAgo: number): Story {
  return offHireAgo > 0 ? { type: 'off_hire', ago: offHireAgo + 1 } : { type: 'plain', nextDueIn: null };
}
