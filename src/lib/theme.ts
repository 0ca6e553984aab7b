export type ThemeChoice = 'system' | 'light' | 'dark';
const SETTING = 'slingward.theme';

export function readThemeChoice(): ThemeChoice {
  try {
    const kept = localStorage.getItem(SETTING);
    return kept === 'light' || kept === 'dark' ? kept : 'system';
  } catch {
    return 'system';
  }
}

export function setThemeChoice(choice: ThemeChoice): void {
  try {
    localStorage.setItem(SETTING, choice);
  } catch {
    // Not kept, but applied for now
  }
  applyTheme();
}

/** Puts the theme on the document: the person's choice, else the system's. */
export function applyTheme(): void {
  const choice = readThemeChoice();
  const isDark =
    choice === 'dark' || (choice === 'system' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = isDark ? 'dark' : 'light';
}

/** Applies now and whenever the system changes. */
export function followTheme(): void {
  applyTheme();
  matchMedia('(prefers-color-scheme: dark)').addEventListener('change', applyTheme);
}
