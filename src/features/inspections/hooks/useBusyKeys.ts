import { useCallback, useState } from 'react';

/** Which of several uploads are under way, and whether any is. */
export function useBusyKeys(): { isBusy: boolean; setBusy: (key: string, isBusy: boolean) => void } {
  const [keys, setKeys] = useState<ReadonlySet<string>>(new Set());
  const setBusy = useCallback((key: string, isBusy: boolean): void => {
    setKeys((before) => {
      const next = new Set(before);
      if (isBusy) next.add(key);
      else next.delete(key);
      return next;
    });
  }, []);
  return { isBusy: keys.size > 0, setBusy };
}
