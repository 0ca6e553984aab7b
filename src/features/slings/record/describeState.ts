import { REASON_FACTS } from '../../../../shared/domain/lifecycle/reasons';
import type { Sling } from '../../../../shared/schemas/slings';
import { formatAge, formatDateWithDistance, formatDay } from '../../../lib/format';
import { describeWhere } from '../components/describe';

type Described = Pick<
  Sling,
  'state' | 'condemned' | 'mayUse' | 'mayNotUse' | 'custody' | 'stateSince' | 'nextDueOn' | 'openReasons'
>;

export interface Clock {
  now: Date;
  today: string;
  timeZone?: string | undefined;
}

/** The band's sentence: since when, why, where. */
export function describeState(sling: Described, clock: Clock): string {
  const day = formatDay(sling.stateSince, clock.now, clock.timeZone);
  const since = `Since ${day}, ${formatAge(sling.stateSince, clock.now)}.`;
  const where = `${describeWhere(sling)}.`;
  switch (sling.state) {
    case 'received':
      return `On the books since ${day}, not used before its first inspection has passed. ${where}`;
    case 'in_service':
      return sling.mayUse
        ? `Next inspection ${sling.nextDueOn ? formatDateWithDistance(sling.nextDueOn, clock.today) : 'not set'}. ${where}`
        : [...sling.mayNotUse.map(({ message }) => message), where].join(' ');
    case 'held':
      return `${since} ${describeReasons(sling)} ${sling.custody.kind === 'cage' ? where : `Not in a cage: ${lower(where)}`}`;
    case 'sent_for_evaluation':
      return `${since} ${where}`;
    case 'returned':
      return `Back since ${day}, not used before it is inspected again. ${where}`;
    case 'lost':
      return `Written off as not found on ${day}. In your hands it comes back as held.`;
    case 'destroyed':
      return `Made unusable on ${day}.`;
    case 'departed':
      return `Left this store on ${day}.`;
  }
}

/** "Broken wires in one lay. Hook latch." A note says more than the reason's name. */
function describeReasons({ openReasons, condemned }: Described): string {
  const words = openReasons.map(({ code, note }) => (note ? stop(note) : stop(REASON_FACTS[code].name)));
  return [...(condemned ? ['To be destroyed.'] : []), ...words].join(' ') || 'No reason is open.';
}

const stop = (text: string): string => (/[.!?]$/.test(text) ? text : `${text}.`);
const lower = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
