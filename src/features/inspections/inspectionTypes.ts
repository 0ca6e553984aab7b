import type { InspectionType } from '../../../shared/domain/inspection/inspectionTypes';
import type { Sling } from '../../../shared/schemas/slings';

type TypedSling = Pick<Sling, 'state' | 'due' | 'allowedActions'>;

/** What each type is for, in one line under its name. */
export const TYPE_HINTS = {
  initial: 'Before first use. Every question is answered.',
  periodic: 'The complete one that sets the next due date.',
  frequent: 'A look-over in between; what you find is noted, the rest may be clean.',
  release: 'Before a held or returned sling goes back. Every question is answered.',
} as const satisfies Record<InspectionType, string>;

/** The types that make sense for the sling as it is now, the likeliest first; empty where it can't be inspected. */
export function listTypes({ state, due, allowedActions }: TypedSling): InspectionType[] {
  switch (state) {
    case 'received':
      return ['initial'];
    case 'in_service':
      return due === 'ok' ? ['frequent', 'periodic'] : ['periodic', 'frequent'];
    case 'held':
      // Held before it was ever accepted: release then asks for an initial inspection as well
      return allowedActions.some(({ unmet }) => unmet.some(({ rule }) => rule === 'initial_inspection'))
        ? ['release', 'initial']
        : ['release'];
    case 'returned':
      return ['release'];
    case 'sent_for_evaluation':
    case 'destroyed':
    case 'lost':
    case 'departed':
      return [];
  }
}
