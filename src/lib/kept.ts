import { useSyncExternalStore } from 'react';
import { inTime } from './in-time.ts';
import { type Keeper, tabKeeper } from './keeper.ts';
import { DATABASE } from './kept-keys.ts';
import { type Keeping, KeptStore } from './kept-store.ts';
import { isOwnDevice } from './own-device.ts';

/** False only where the browser can tell that nothing was ever kept on this device. */
const isThere = async (): Promise<boolean> =>
  isOwnDevice() || !indexedDB.databases || (await inTime(indexedDB.databases())).some(({ name }) => name === DATABASE);

const onDevice = async (): Promise<Keeper> => (await import('./device-keeper.ts')).deviceKeeper;

/** The database's own code is loaded where there is one, before the first page is drawn; so it is there offline too. */
const deviceKeeper: Keeper = {
  load: async (userId) => ((await isThere()) ? (await onDevice()).load(userId) : []),
  write: async (key, text) => (await onDevice()).write(key, text),
  clear: async () => ((await isThere()) ? (await onDevice()).clear() : undefined),
};

const channel = 'BroadcastChannel' in globalThis ? new BroadcastChannel('plait.kept') : null;
const goneListeners = new Set<(key: string) => void>();

/** What the person signed in has not sent yet, in this tab and on this device. */
export const kept = new KeptStore({ device: deviceKeeper, tab: tabKeeper }, (key) => channel?.postMessage(key));

channel?.addEventListener('message', ({ data }) => {
  if (data === null) kept.forget();
  else if (typeof data === 'string' && kept.drop(data)) for (const listener of goneListeners) listener(data);
});

/** Calls back when another tab has sent or taken away something that waited here too. */
export function onGoneElsewhere(listener: (key: string) => void): () => void {
  goneListeners.add(listener);
  return () => goneListeners.delete(listener);
}

/** Takes up what this person left behind. */
export const openKept = (userId: string): Promise<void> => kept.open(userId, isOwnDevice());

/** How long what is kept here lasts. */
export const useKeeping = (): Keeping => useSyncExternalStore(kept.subscribe, () => kept.keeping);
