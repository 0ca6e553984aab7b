import type { LabelReader } from './labelReader';

/** Fetched only when the scan page is open: nobody else needs its weight. */
export async function loadLabelReader(): Promise<LabelReader> {
  const { createBrowserLabelReader } = await import('./browserLabelReader');
  return createBrowserLabelReader();
}
