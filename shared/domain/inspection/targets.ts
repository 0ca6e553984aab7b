import { isHook } from '../slings/spec';
import type { Criterion, ExaminedFitting, ExaminedSling, FittingTarget } from './criterion';

interface Target {
  /** An answer about this fitting is taken. */
  isAnswerable: (fitting: ExaminedFitting) => boolean;
  /** The question is put for this fitting. */
  isAsked: (fitting: ExaminedFitting) => boolean;
  words: string;
}
const only = (isMeant: Target['isAsked'], words: string): Target => ({
  isAnswerable: isMeant,
  isAsked: isMeant,
  words,
});

const TARGETS = {
  fitting: only(() => true, 'a fitting'),
  hook: only(isHook, 'a hook'),
  // Whether a plain hook has a latch may not be on record: then it isn't asked, but damage to one is never turned away.
  latched_hook: {
    isAnswerable: (fitting) => isHook(fitting) && fitting.hasLatch !== false,
    isAsked: (fitting) =>
      fitting.type === 'self_locking_hook' || (isHook(fitting) && fitting.hasLatch === true),
    words: 'a hook with a latch',
  },
  shackle: only((fitting) => fitting.type === 'shackle', 'a shackle'),
} as const satisfies Record<FittingTarget, Target>;

export const isAnswerableFor = (target: FittingTarget, fitting: ExaminedFitting): boolean =>
  TARGETS[target].isAnswerable(fitting);
export const targetWords = (target: FittingTarget): string => TARGETS[target].words;

/** Does the criterion belong to this sling at all, whatever its fittings? */
export function appliesToSling(criterion: Criterion, sling: ExaminedSling): boolean {
  return criterion.kinds.includes(sling.kind) && (criterion.appliesTo?.(sling) ?? true);
}

/** The fittings that the criterion is asked of; [null] where it is asked once of the whole sling. */
export function listAskedOf(criterion: Criterion, sling: ExaminedSling): (ExaminedFitting | null)[] {
  if (!criterion.perFitting) return [null];
  return sling.fittings.filter(TARGETS[criterion.perFitting].isAsked);
}
