import type { ScanResponse } from '../../../shared/schemas/labels';
import { describeSling } from '../../../shared/domain/slings/describe';
import { STATE_FACTS } from '../../../shared/domain/lifecycle/states';
import { REASON_FACTS } from '../../../shared/domain/lifecycle/reasons';
import { formatDateWithDistance, formatDay } from '../../lib/format';

export interface Answer {
  mayUse: boolean;
  title: string;
  lines: string[];
}

/**
 * What the band says. USE needs both: a sling that may be used, and the label that is live on it. A printed label may
 * hang on the wrong twin, a void one on anything.
 * @param today YYYY-MM-DD
 */
export function composeAnswer({ tag, sling }: ScanResponse, today: string): Answer {
  const name = `${sling.number}, ${lowerFirst(describeSling(sling))}`;
  switch (tag.status) {
    case 'void':
      return {
        mayUse: false,
        title: 'This label is void',
        lines: [
          `It belonged to ${name}, now ${lowerFirst(describeState(sling))}.`,
          'Cut the label off and hand it in.',
        ],
      };
    case 'printed':
      return {
        mayUse: false,
        title: 'This label is not confirmed yet',
        // Without a serial it is the number's end that has to be read off the sling: not given away here
        lines: [`Printed for ${sling.makerSerial ? name : lowerFirst(describeSling(sling))}.`],
      };
    case 'live':
      return {
        mayUse: sling.mayUse,
        title: name,
        lines: sling.mayUse ? describeUse(sling, today) : describeRefusal(sling),
      };
  }
}

type Found = ScanResponse['sling'];

function describeUse(sling: Found, today: string): string[] {
  return sling.nextDueOn ? [`Inspection due ${formatDateWithDistance(sling.nextDueOn, today)}.`] : [];
}

function describeRefusal(sling: Found): string[] {
  if (sling.state === 'in_service') return sling.mayNotUse.map(({ message }) => message);
  if (sling.state !== 'held') return [`${describeState(sling)}.`, STATE_FACTS[sling.state].meaning];
  const reasons = [...new Set(sling.openReasons.map(({ code }) => lowerFirst(REASON_FACTS[code].name)))];
  const isSecured = sling.custody.kind === 'cage';
  return [
    `${describeState(sling)}${reasons.length > 0 ? `: ${reasons.join(', ')}` : ''}.`,
    isSecured
      ? `It belongs in ${sling.custody.locationName ?? 'the cage'}.`
      : 'Not in a cage yet: bring it there.',
  ];
}

/** "Held since 3 Nov", "Condemned, held since 3 Nov". */
function describeState(sling: Found): string {
  const { word } = STATE_FACTS[sling.state];
  const start = sling.condemned ? `Condemned, ${lowerFirst(word)}` : word;
  return `${start} since ${formatDay(sling.stateSince)}`;
}

const lowerFirst = (text: string): string => text.charAt(0).toLowerCase() + text.slice(1);
