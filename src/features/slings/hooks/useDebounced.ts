import { useEffect, useRef } from 'react';

/** Calls `run` once typing has rested; a pending call is dropped when the page is left. */
export function useDebounced(
  run: (value: string) => void,
  restMs: number,
): { call: (value: string) => void; flush: (value: string) => void } {
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  useEffect(() => () => clearTimeout(timer.current), []);
  return {
    call: (value) => {
      clearTimeout(timer.current);
      timer.current = setTimeout(() => run(value), restMs);
    },
    flush: (value) => {
      clearTimeout(timer.current);
      run(value);
    },
  };
}
