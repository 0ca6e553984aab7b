/** A label still in view after its answer was closed isn't a new scan until it was out of view this long. */
const OUT_OF_VIEW_MS = 1500;

export interface RepeatGuard {
  /** Is this a new code, or the same one still in view? Call for every frame that held a code. */
  isNew(text: string, atMs: number): boolean;
  /** The person said that this text is done with; it may still be in view. */
  settle(text: string, atMs: number): void;
}

export function createRepeatGuard(): RepeatGuard {
  let last = '';
  let seenMs = Number.NEGATIVE_INFINITY;
  return {
    isNew(text, atMs) {
      const isSame = text === last && atMs - seenMs < OUT_OF_VIEW_MS;
      last = text;
      seenMs = atMs;
      return !isSame;
    },
    settle(text, atMs) {
      last = text;
      seenMs = atMs;
    },
  };
}
