import type { DemoClock } from '../clock';
import type { Life, Story } from '../plan/allocate';
import type { Random } from '../random';
import { playBeginning, playInspections, playInspectionsToDate } from './everyday';
import { playShipments } from './journeys';
import { openScript, type Script } from './script';
import { playDeparture, playHold, playOther } from './troubles';
import type { Act } from './world';

/** Inspections end so long before a sling's trouble begins. */
const QUIET_DAYS = 5;

/** Everything that everybody did in two years, in the order in which it was done. */
export function writeStory(lives: readonly Life[], clock: DemoClock, random: Random): Act[] {
  const acts: Act[] = [];
  const scripts = new Map<Life, Script>();
  for (const life of lives) {
    const script = openScript(life.sling, clock, random, acts);
    scripts.set(life, script);
    playBeginning(script);
    playLife(script, life.story, random);
  }
  playShipments(lives, scripts, clock, acts);
  // Stable: what bears the same time stays in the order in which it was written.
  return acts.sort((a, b) => a.at.getTime() - b.at.getTime());
}

function playLife(script: Script, story: Story, random: Random): void {
  switch (story.type) {
    case 'arrival':
      return;
    case 'plain':
      return playInspectionsToDate(script, random, story.nextDueIn);
    case 'off_hire':
      playInspections(script, random, story.ago + QUIET_DAYS);
      return playDeparture(script, story.ago, 'off_hire', 'Collected by its owner.');
    case 'held':
      playInspections(script, random, story.case.ago + QUIET_DAYS);
      return playHold(script, story.case);
    case 'other': {
      const { case: other } = story;
      playOther(script, other);
      if (other.then === 'relabelled') return playInspectionsToDate(script, random, null);
      return playInspections(
        script,
        random,
        (other.then === 'found' ? other.lostAgo : other.ago) + QUIET_DAYS,
      );
    }
  }
}
