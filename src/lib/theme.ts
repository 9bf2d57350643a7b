export type ThemeChoice = 'system' | 'light' | 'dark';

const KEY = 'plait.theme';

/** The reader's choice on this device; the system's setting unless they chose. */
export function chosenTheme(): ThemeChoice {
  try {
    const kept = localStorage.getItem(KEY);
    return kept === 'light' || kept === 'dark' ? kept : 'system';
  } catch {
    return 'system';
  }
}

/** Shows `choice` now and keeps it on this device. */
export function chooseTheme(choice: ThemeChoice): void {
  if (choice === 'system') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = choice;
  try {
    if (choice === 'system') localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, choice);
  } catch {
    // Storage may be off; the choice then lasts until the page is left.
  }
}
