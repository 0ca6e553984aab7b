import { useSyncExternalStore } from 'react';

/** From here a table's columns fit beside the rail; the same width as Tailwind's `lg`. */
const WIDE = '(min-width: 64rem)';

function watch(onChange: () => void): () => void {
  const query = matchMedia(WIDE);
  query.addEventListener('change', onChange);
  return () => query.removeEventListener('change', onChange);
}

/** Is there room for a table? Only one of table and cards is built: a screen reader would read both. */
export const useWideScreen = (): boolean => useSyncExternalStore(watch, () => matchMedia(WIDE).matches);
