/** A label still in view after its answer was closed isn't a new scan until it was out of view this long. */
const OUT_OF_VIEW_MS = 1500;
/** Right after closing an answer the camera may still have to start before it can see the label again. */
const AFTER_ANSWER_MS = 3000;

export interface RepeatGuard {
  /** Is this a new code, or the same one still in view? Call for every frame that held a code. */
  isNew(code: string, atMs: number): boolean;
  /** The person is done with this code; it may still be in view. */
  settle(code: string, atMs: number): void;
}

export function createRepeatGuard(): RepeatGuard {
  let last = '';
  let ignoreUntilMs = Number.NEGATIVE_INFINITY;
  return {
    isNew(code, atMs) {
      const isSame = code === last && atMs < ignoreUntilMs;
      last = code;
      ignoreUntilMs = atMs + OUT_OF_VIEW_MS;
      return !isSame;
    },
    settle(code, atMs) {
      last = code;
      ignoreUntilMs = atMs + AFTER_ANSWER_MS;
    },
  };
}
