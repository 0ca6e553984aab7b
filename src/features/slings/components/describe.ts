import { CUSTODY_NAMES } from '../../../../shared/domain/lifecycle/states';
import type { SlingSummary } from '../../../../shared/schemas/slings';
import { formatDateWithDistance } from '../../../lib/format';

/** Where it is, in few words: "Cage 2", "With the evaluator". */
export function describePlace({ custody }: Pick<SlingSummary, 'custody'>): string {
  return custody.locationName ?? CUSTODY_NAMES[custody.kind];
}

/** "In Cage 2." or what stands for a place. */
export function describeWhere(sling: Pick<SlingSummary, 'custody'>): string {
  const { custody } = sling;
  return custody.locationName ? `In ${custody.locationName}` : CUSTODY_NAMES[custody.kind];
}

/** "12 Mar 2026, in 9 days"; "No inspection yet" before the first. */
export function describeDue({ nextDueOn }: Pick<SlingSummary, 'nextDueOn'>, today: string): string {
  return nextDueOn ? formatDateWithDistance(nextDueOn, today) : 'No inspection yet';
}

export const DUE_WORDS = { overdue: 'Overdue', soon: 'Due soon', ok: 'Not due yet' } as const;

export const LABEL_WORDS = {
  none: 'No label',
  printed: 'Printed, not confirmed',
  live: 'Live',
  void: 'Void',
} as const;

export const describeLabel = ({ tag }: Pick<SlingSummary, 'tag'>): string =>
  LABEL_WORDS[tag?.status ?? 'none'];
