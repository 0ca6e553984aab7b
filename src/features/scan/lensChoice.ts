const SETTING = 'slingward.lens';

/** The lens that was last chosen on this device; null when none was, or where the browser keeps nothing. */
export function readKeptLens(): string | null {
  try {
    return localStorage.getItem(SETTING);
  } catch {
    return null;
  }
}

export function keepLens(id: string): void {
  try {
    localStorage.setItem(SETTING, id);
  } catch {
    return;
  }
}
