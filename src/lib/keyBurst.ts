/** A scanner's keys come every few ms; a fast typist stays above 60 (common practice, no source). */
const MAX_GAP_MS = 50;
const MIN_LENGTH = 6;

export interface KeyBurst {
  /** Gives the whole text when this key ends a burst, else null. Control keys other than Enter and Tab are ignored. */
  take: (key: string, atMs: number) => string | null;
  /** Is a burst under way at this moment? */
  isRunning: (atMs: number) => boolean;
}

/** Tells a handheld scanner that types from a person that does. */
export function createKeyBurst(): KeyBurst {
  let text = '';
  let lastMs = Number.NEGATIVE_INFINITY;
  const isRunning = (atMs: number): boolean => text.length > 0 && atMs - lastMs <= MAX_GAP_MS;
  return {
    isRunning,
    take(key, atMs) {
      const isEnd = key === 'Enter' || key === 'Tab';
      if (key.length > 1 && !isEnd) return null;
      if (!isRunning(atMs)) text = '';
      lastMs = atMs;
      if (!isEnd) {
        text += key;
        return null;
      }
      const whole = text;
      text = '';
      return whole.length >= MIN_LENGTH ? whole : null;
    },
  };
}
