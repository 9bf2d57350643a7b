const KEY = 'plait.device';

/** True where whoever signed in last said that this device is their own. */
export function isOwnDevice(): boolean {
  try {
    return localStorage.getItem(KEY) === 'own';
  } catch {
    return false;
  }
}

/** Remembers on this device, until the sign-out, whose it is. */
export function rememberDevice(isOwn: boolean): void {
  try {
    if (isOwn) localStorage.setItem(KEY, 'own');
    else localStorage.removeItem(KEY);
  } catch {
    // Storage may be off; the device then counts as shared.
  }
}
