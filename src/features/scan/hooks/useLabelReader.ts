import { useEffect, useState } from 'react';
import type { LabelReader } from '../reader/labelReader';
import { loadLabelReader } from '../reader/loadLabelReader';

/** The reader, once its code has arrived; `hasFailed` when it didn't (the network went away meanwhile). */
export function useLabelReader(): { reader: LabelReader | null; hasFailed: boolean } {
  const [reader, setReader] = useState<LabelReader | null>(null);
  const [hasFailed, setFailed] = useState(false);
  useEffect(() => {
    let loaded: LabelReader | undefined;
    let isOver = false;
    loadLabelReader().then(
      (ready) => {
        loaded = ready;
        if (isOver) ready.close();
        else setReader(ready);
      },
      () => {
        if (!isOver) setFailed(true);
      },
    );
    return () => {
      isOver = true;
      loaded?.close();
    };
  }, []);
  return { reader, hasFailed };
}
