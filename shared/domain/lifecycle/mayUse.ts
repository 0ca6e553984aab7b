import type { LifecycleFacts, Unmet } from './facts';
import { STATE_FACTS } from './states';

type UseFacts = Pick<
  LifecycleFacts,
  'state' | 'condemned' | 'hasLiveLabel' | 'makersTag' | 'nextDueOn' | 'discardOn' | 'offHireOn'
>;

/**
 * Why a sling may not be used, empty when it may: the state alone never decides.
 * A date counts while it lies in the future: on the day itself the sling is due and stays in the store.
 * @param today the site's date, YYYY-MM-DD
 */
export function listMayNotUse(facts: UseFacts, today: string): Unmet[] {
  const reasons: Unmet[] = [];
  const add = (isWrong: boolean, rule: string, message: string): void => {
    if (isWrong) reasons.push({ rule, message });
  };
  add(
    facts.state !== 'in_service',
    'state',
    facts.condemned && facts.state === 'held'
      ? 'It is condemned.'
      : `It is ${STATE_FACTS[facts.state].word.toLowerCase()}, not in service.`,
  );
  add(facts.makersTag !== 'legible', 'makers_tag', `Its maker’s tag is ${facts.makersTag}.`);
  add(!facts.hasLiveLabel, 'live_label', 'No label is confirmed on it.');
  add(facts.nextDueOn === null, 'never_inspected', 'It has no complete inspection yet.');
  add(isReached(facts.nextDueOn, today), 'inspection_due', 'Its inspection is due.');
  add(isReached(facts.discardOn, today), 'discard_date', 'Its discard date has come.');
  add(isReached(facts.offHireOn, today), 'off_hire', 'Its hire has ended.');
  return reasons;
}

function isReached(date: string | null, today: string): boolean {
  return date !== null && date <= today;
}
