import { useCallback, useRef } from 'react';
import type { z } from 'zod';
import { useDraft } from './draft';

/**
 * `useDraft` changed by functions: an upload that ends later than the render it began in adds its photo to what is true by
 * then, and takes away nothing that was typed meanwhile.
 */
export function useLiveDraft<T>(
  key: string,
  schema: z.ZodType<T>,
  initial: T,
): { values: T; update: (change: (now: T) => T) => void; clear: () => void; wasRestored: boolean } {
  const { values, setValues, clear, wasRestored } = useDraft(key, schema, initial);
  const latest = useRef(values);
  const update = useCallback(
    (change: (now: T) => T) => {
      latest.current = change(latest.current);
      setValues(latest.current);
    },
    [setValues],
  );
  return { values, update, clear, wasRestored };
}
