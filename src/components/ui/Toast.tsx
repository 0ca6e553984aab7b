import { useEffect, useSyncExternalStore, type ReactNode } from 'react';
import { cx } from '../../lib/cx';

interface ToastEntry {
  id: number;
  text: string;
  tone: 'good' | 'error';
}
const SHOWN_MS = 6000;
let toasts: readonly ToastEntry[] = [];
let nextId = 1;
const watchers = new Set<() => void>();

function setToasts(next: readonly ToastEntry[]): void {
  toasts = next;
  for (const watcher of watchers) watcher();
}

/** A short message that an act was done; for refusals use a notice beside the form, which stays. */
export function showToast(text: string, tone: ToastEntry['tone'] = 'good'): void {
  setToasts([...toasts.slice(-2), { id: nextId++, text, tone }]);
}

const dismiss = (id: number): void => setToasts(toasts.filter((t) => t.id !== id));

/** The live region that shows and reads out toasts; once, in the shell. */
export function Toaster(): ReactNode {
  const shown = useSyncExternalStore(
    (watcher) => {
      watchers.add(watcher);
      return () => watchers.delete(watcher);
    },
    () => toasts,
  );
  return (
    <div
      role="status"
      aria-live="polite"
      className="no-print pointer-events-none fixed inset-x-4 bottom-24 z-40 flex flex-col items-center gap-2 lg:bottom-6"
    >
      {shown.map((toast) => (
        <ToastLine key={toast.id} toast={toast} />
      ))}
    </div>
  );
}

function ToastLine({ toast }: { toast: ToastEntry }): ReactNode {
  const { id } = toast;
  useEffect(() => {
    const timer = setTimeout(() => dismiss(id), SHOWN_MS);
    return () => clearTimeout(timer);
  }, [id]);
  return (
    <p
      className={cx(
        'pointer-events-auto flex min-h-12 max-w-lg items-center gap-4 rounded bg-ink py-1 pr-1 pl-4 text-paper shadow-lg',
        toast.tone === 'error' && 'ring-2 ring-danger',
      )}
    >
      {toast.text}
      <button
        type="button"
        aria-label="Dismiss"
        onClick={() => dismiss(id)}
        className="grid size-12 shrink-0 place-items-center rounded focus-visible:outline-current"
      >
        <svg viewBox="0 0 24 24" className="size-5" aria-hidden="true">
          <path d="M6 6 18 18M18 6 6 18" stroke="currentColor" strokeWidth="2.2" />
        </svg>
      </button>
    </p>
  );
}
