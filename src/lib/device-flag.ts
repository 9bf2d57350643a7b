/** A yes or no that is kept on this device. Where storage is off it reads as no, and setting it does nothing. */
export interface DeviceFlag {
  isSet: () => boolean;
  set: (isOn: boolean) => void;
}

/** @param key where it is kept @param yes what stands there for yes; nothing stands there for no */
export const deviceFlag = (key: string, yes: string): DeviceFlag => ({
  isSet() {
    try {
      return localStorage.getItem(key) === yes;
    } catch {
      return false;
    }
  },
  set(isOn) {
    try {
      if (isOn) localStorage.setItem(key, yes);
      else localStorage.removeItem(key);
    } catch {
      // Storage may be off: the choice then lasts until the page is left.
    }
  },
});
