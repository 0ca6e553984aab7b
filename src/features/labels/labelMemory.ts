const STOCK = 'slingward.label-stock';
const LAST_RUN = 'slingward.last-label-run';

function read(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

function keep(key: string, value: string): void {
  try {
    localStorage.setItem(key, value);
  } catch {
    return;
  }
}

/** What this device printed on last: the printer beside it seldom changes. */
export const readKeptStock = (): string | null => read(STOCK);
export const keepStock = (id: string): void => keep(STOCK, id);

export function readLastRun(): number | null {
  const id = Number(read(LAST_RUN));
  return Number.isInteger(id) && id > 0 ? id : null;
}
export const keepLastRun = (id: number): void => keep(LAST_RUN, String(id));
