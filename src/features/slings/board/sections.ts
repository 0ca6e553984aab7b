import { KIND_FACTS } from '../../../../shared/domain/slings/kinds';
import { REASON_FACTS } from '../../../../shared/domain/lifecycle/reasons';
import type { SlingSummary } from '../../../../shared/schemas/slings';
import type { SlingFilters } from '../api/slingFilters';

export interface BoardSection {
  id: string;
  title: string;
  filters: SlingFilters;
  /** Who acts next on this sling, and how. */
  next: (sling: SlingSummary) => string;
  /** What stands here when nothing does. */
  empty: string;
}

/** Quarantine from most to least urgent; each sling stands in one section only. Longest waiting first. */
export const BOARD_SECTIONS: readonly BoardSection[] = [
  {
    id: 'not-secured',
    title: 'Held, not secured',
    filters: { state: 'held', secured: 'false', sort: 'stateSince' },
    next: ({ custody }) =>
      custody.kind === 'issued'
        ? 'The crew brings it in; then it goes to a cage'
        : 'Anyone of the store: bring it to a cage',
    empty: 'Every held sling is in a cage.',
  },
  {
    id: 'to-decide',
    title: 'In the cage, to decide',
    filters: { state: 'held', secured: 'true', condemned: 'false', sort: 'stateSince' },
    next: decideNext,
    empty: 'Nothing waits for a decision.',
  },
  {
    id: 'condemned',
    title: 'Condemned, to destroy',
    filters: { state: 'held', secured: 'true', condemned: 'true', sort: 'stateSince' },
    next: () => 'Another person than who condemned it destroys it, with a photo',
    empty: 'Nothing waits to be destroyed.',
  },
  {
    id: 'sent',
    title: 'Out for evaluation',
    filters: { state: 'sent_for_evaluation', sort: 'stateSince' },
    next: () => 'The evaluator; then the store receives it back',
    empty: 'Nothing is with an evaluator.',
  },
  {
    id: 'returned',
    title: 'Back, to inspect',
    filters: { state: 'returned', sort: 'stateSince' },
    next: () => 'Inspector: release inspection',
    empty: 'Nothing waits to be inspected again.',
  },
];

/** A confirmed reason is never released; the kind decides whether repair is a way. */
function decideNext(sling: SlingSummary): string {
  const isConfirmed = sling.openReasonCodes.some((code) => REASON_FACTS[code].isConfirmed);
  const isRepairable = KIND_FACTS[sling.kind].isRepairable;
  if (isConfirmed)
    return isRepairable ? 'Manager: evaluate, repair or condemn' : 'Manager: evaluate or condemn';
  return 'Inspector: release inspection, or manager: evaluate or condemn';
}

/** Why it stands here, in the reasons' names. */
export const nameReasons = ({ openReasonCodes }: SlingSummary): string =>
  openReasonCodes.map((code) => REASON_FACTS[code].name).join(', ');
