import { useCallback, useState } from 'react';
import type { z } from 'zod';

const PREFIX = 'slingward.draft.';

/** What was kept under the key, or null when nothing was, or when it no longer fits the schema. */
export function readDraft<T>(key: string, schema: z.ZodType<T>): T | null {
  try {
    const text = localStorage.getItem(PREFIX + key);
    if (text === null) return null;
    const parsed = schema.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : null;
  } catch {
    return null;
  }
}

/** Keeps the values; silently does without where the browser forbids or has no room left. */
export function writeDraft(key: string, values: unknown): void {
  try {
    localStorage.setItem(PREFIX + key, JSON.stringify(values));
  } catch {
    return;
  }
}

export function clearDraft(key: string): void {
  try {
    localStorage.removeItem(PREFIX + key);
  } catch {
    return;
  }
}

/** State that survives a reload and a closed browser until `clear` is called (after the submit succeeded). */
export function useDraft<T>(
  key: string,
  schema: z.ZodType<T>,
  initial: T,
): { values: T; setValues: (next: T) => void; clear: () => void; wasRestored: boolean } {
  const [kept] = useState(() => readDraft(key, schema));
  const [values, setState] = useState<T>(kept ?? initial);
  const setValues = useCallback(
    (next: T) => {
      setState(next);
      writeDraft(key, next);
    },
    [key],
  );
  const clear = useCallback(() => clearDraft(key), [key]);
  return { values, setValues, clear, wasRestored: kept !== null };
}
