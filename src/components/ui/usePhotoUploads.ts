import { useEffect, useRef, useState } from 'react';
import { toProblem } from '../../lib/problem';
import { uploadFile } from '../../lib/uploadFile';

export interface PhotoUploadProps {
  /** Ids of the stored photos; controlled, so that a draft keeps them. */
  value: readonly string[];
  onChange: (ids: string[]) => void;
  /** While true, uploads are under way: hold the submit back or let the person wait. */
  onBusyChange?: (isBusy: boolean) => void;
  max?: number;
  /** API path to upload to; default `/files`. */
  path?: string;
}

export interface PendingPhotoEntry {
  key: number;
  file: File;
  share: number;
  failed: string | null;
}

let nextKey = 1;

/** Sends photos as they are taken, several at once; a failed one stays with its words until sent again or left out. */
export function usePhotoUploads({ value, onChange, onBusyChange, path, max = 12 }: PhotoUploadProps): {
  pending: readonly PendingPhotoEntry[];
  previews: ReadonlyMap<string, string>;
  add: (files: readonly File[]) => void;
  retry: (entry: PendingPhotoEntry) => void;
  drop: (key: number) => void;
  remove: (id: string) => void;
} {
  const [pending, setPending] = useState<readonly PendingPhotoEntry[]>([]);
  const [previews, setPreviews] = useState<ReadonlyMap<string, string>>(new Map());
  const shown = useRef<string[]>([]);
  useEffect(() => {
    const urls = shown.current;
    return () => urls.forEach((url) => URL.revokeObjectURL(url));
  }, []);
  // Uploads end later than the render that began them: both refs hold what is true by then
  const ids = useRef<string[]>([...value]);
  const running = useRef(0);
  const set = (next: string[]): void => {
    ids.current = next;
    onChange(next);
  };
  const count = (step: 1 | -1): void => {
    running.current += step;
    onBusyChange?.(running.current > 0);
  };
  const change = (key: number, part: Partial<PendingPhotoEntry>): void =>
    setPending((all) => all.map((p) => (p.key === key ? { ...p, ...part } : p)));
  const drop = (key: number): void => setPending((all) => all.filter((p) => p.key !== key));

  const send = async ({ key, file }: PendingPhotoEntry): Promise<void> => {
    count(1);
    try {
      const stored = await uploadFile(file, { path, onProgress: (share) => change(key, { share }) });
      const preview = URL.createObjectURL(file);
      shown.current.push(preview);
      setPreviews((all) => new Map(all).set(stored.id, preview));
      drop(key);
      set([...ids.current, stored.id]);
    } catch (thrown) {
      const problem = toProblem(thrown);
      change(key, { failed: problem.detail || problem.title });
    } finally {
      count(-1);
    }
  };

  return {
    pending,
    previews,
    drop,
    add: (files) => {
      ids.current = [...value];
      const room = max - value.length - pending.length;
      const entries = files.slice(0, room).map((file) => ({ key: nextKey++, file, share: 0, failed: null }));
      setPending((all) => [...all, ...entries]);
      for (const entry of entries) void send(entry);
    },
    retry: (entry) => {
      change(entry.key, { failed: null, share: 0 });
      void send(entry);
    },
    remove: (id) => set(value.filter((v) => v !== id)),
  };
}
