import { useEffect, useRef } from 'react';
import { createKeyBurst } from './keyBurst';

type Listener = (text: string) => void;
interface Entry {
  listener: { current: Listener };
  isFallback: boolean;
}
const entries: Entry[] = [];
const burst = createKeyBurst();
let fieldAtStart: { field: HTMLInputElement | HTMLTextAreaElement; value: string } | null = null;

/** Only a label of ours may be taken out of a field: a serial's barcode scanned into its own field belongs there. */
const isOurLabel = (text: string): boolean => /^https?:\/\/.+\/t\/[0-9a-z-]{10,14}$/i.test(text);

/**
 * Listens for a handheld scanner typing anywhere, also when no field has focus. The page mounted last gets the text; the
 * shell registers as `fallback` and gets it only when no page listens.
 */
export function useHandheldScanner(onScan: Listener, options: { fallback?: boolean } = {}): void {
  const listener = useRef(onScan);
  useEffect(() => {
    listener.current = onScan;
  });
  const isFallback = options.fallback ?? false;
  useEffect(() => {
    const entry: Entry = { listener, isFallback };
    if (entries.length === 0) window.addEventListener('keydown', handleKey, true);
    entries.push(entry);
    return () => {
      entries.splice(entries.indexOf(entry), 1);
      if (entries.length === 0) window.removeEventListener('keydown', handleKey, true);
    };
  }, [isFallback]);
}

/** Calls `onOpen` when `/` is pressed outside every field (and isn't part of a scanner's text). */
export function useSlashKey(onOpen: () => void): void {
  const handler = useRef(onOpen);
  useEffect(() => {
    handler.current = onOpen;
  });
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || isEditable(event.target))
        return;
      if (event.timeStamp - lastOtherKeyMs < 80) return;
      event.preventDefault();
      handler.current();
    };
    let lastOtherKeyMs = Number.NEGATIVE_INFINITY;
    const note = (event: KeyboardEvent): void => {
      if (event.key !== '/') lastOtherKeyMs = event.timeStamp;
    };
    window.addEventListener('keydown', onKey);
    window.addEventListener('keydown', note);
    return () => {
      window.removeEventListener('keydown', onKey);
      window.removeEventListener('keydown', note);
    };
  }, []);
}

function handleKey(event: KeyboardEvent): void {
  if (event.ctrlKey || event.metaKey || event.altKey || event.isComposing) return;
  const field = getField(event.target);
  if (!burst.isRunning(event.timeStamp)) fieldAtStart = field ? { field, value: field.value } : null;
  const text = burst.take(event.key, event.timeStamp);
  if (text === null) return;
  // A field that asks for a code itself (data-takes-scan) handles its own Enter
  if (field && (field.dataset.takesScan !== undefined || !isOurLabel(text))) return;
  const target = entries.findLast((entry) => !entry.isFallback) ?? entries.at(-1);
  if (!target) return;
  event.preventDefault();
  event.stopPropagation();
  if (fieldAtStart) restoreField(fieldAtStart.field, fieldAtStart.value);
  target.listener.current(text);
}

function getField(target: EventTarget | null): HTMLInputElement | HTMLTextAreaElement | null {
  return target instanceof HTMLInputElement || target instanceof HTMLTextAreaElement ? target : null;
}

function isEditable(target: EventTarget | null): boolean {
  return (
    getField(target) !== null ||
    target instanceof HTMLSelectElement ||
    (target instanceof HTMLElement && target.isContentEditable)
  );
}

/** Through the native setter, so that React sees the change. */
function restoreField(field: HTMLInputElement | HTMLTextAreaElement, value: string): void {
  const prototype =
    field instanceof HTMLInputElement ? HTMLInputElement.prototype : HTMLTextAreaElement.prototype;
  Object.getOwnPropertyDescriptor(prototype, 'value')?.set?.call(field, value);
  field.dispatchEvent(new Event('input', { bubbles: true }));
}
