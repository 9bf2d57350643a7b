const KEY = 'plait.time';

/** True where the reader hid the time of a set, on this device. */
export function isTimeHidden(): boolean {
  try {
    return localStorage.getItem(KEY) === 'hidden';
  } catch {
    return false;
  }
}

/** Keeps on this device whether the time of a set is shown. */
export function hideTime(isHidden: boolean): void {
  try {
    if (isHidden) localStorage.setItem(KEY, 'hidden');
    else localStorage.removeItem(KEY);
  } catch {
    // Storage may be off; the choice then lasts until the page is left.
  }
}
