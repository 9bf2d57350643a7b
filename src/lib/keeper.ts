/** Where a browser keeps texts by key: for as long as the tab lives, or for as long as nobody clears them. */
export interface Keeper {
  /** Everything one person left here. @throws where the browser keeps nothing */
  load: (userId: string) => Promise<[key: string, text: string][]>;
  /** Resolves once it is kept; null takes the key away. @throws where storage is full or off */
  write: (key: string, text: string | null) => Promise<void>;
  clear: () => Promise<void>;
}

const PREFIX = 'plait.';

/** True for a key of one person: "plait.<what>.<person>.<set>.<id>". */
export const isKeyOf = (userId: string, key: string): boolean => key.startsWith(PREFIX) && key.split('.')[2] === userId;

/** Until the tab is closed; a reload keeps it. For a shared device. */
export const tabKeeper: Keeper = {
  load: async (userId) =>
    Object.keys(sessionStorage)
      .filter((key) => isKeyOf(userId, key))
      .map((key) => [key, sessionStorage.getItem(key) ?? '']),
  write: async (key, text) => {
    if (text === null) sessionStorage.removeItem(key);
    else sessionStorage.setItem(key, text);
  },
  clear: async () => {
    for (const key of Object.keys(sessionStorage)) if (key.startsWith(PREFIX)) sessionStorage.removeItem(key);
  },
};
