import { inTime } from './in-time.ts';
import { isKeyOf, type Keeper } from './keeper.ts';
import { DATABASE } from './kept-keys.ts';

const STORE = 'kept';
const settled = <Result>(request: IDBRequest<Result>): Promise<Result> =>
  new Promise((resolve, reject) => {
    request.onsuccess = () => resolve(request.result);
    request.onerror = () => reject(request.error ?? new Error('The browser keeps nothing.'));
  });

const done = (change: IDBTransaction): Promise<void> =>
  new Promise((resolve, reject) => {
    change.oncomplete = () => resolve();
    change.onabort = () => reject(change.error ?? new Error('The browser did not keep it.'));
  });

let opened: Promise<IDBDatabase> | null = null;

async function connect(): Promise<IDBDatabase> {
  const request = indexedDB.open(DATABASE, 1);
  request.onupgradeneeded = () => request.result.createObjectStore(STORE);
  const database = await settled(request);
  const forget = () => {
    opened = null;
  };
  // A sign-out clears the site's storage, and the connection with it; the next use makes both anew.
  database.onclose = forget;
  database.onversionchange = () => {
    database.close();
    forget();
  };
  return database;
}

function database(): Promise<IDBDatabase> {
  opened ??= inTime(connect());
  opened.catch(() => {
    opened = null;
  });
  return opened;
}

/** Runs `work` in one change of the store; once more on a new connection where the old one was closed meanwhile. */
async function change(work: (store: IDBObjectStore) => void): Promise<void> {
  const run = async () => {
    const transaction = (await database()).transaction(STORE, 'readwrite', { durability: 'strict' });
    work(transaction.objectStore(STORE));
    transaction.commit();
    await done(transaction);
  };
  try {
    await run();
  } catch (error) {
    if (!(error instanceof DOMException) || !['InvalidStateError', 'AbortError'].includes(error.name)) throw error;
    opened = null;
    await run();
  }
}

/** Takes the whole database away; the connections of all tabs close by themselves. */
const removeDatabase = (): Promise<void> =>
  new Promise((resolve, reject) => {
    const request = indexedDB.deleteDatabase(DATABASE);
    request.onsuccess = () => resolve();
    request.onerror = () => reject(request.error ?? new Error('The browser did not clear it.'));
  });

/** Until it is taken away or the person signs out, also when the browser is closed. For a person's own device. */
export const deviceKeeper: Keeper = {
  load: async (userId) => {
    const store = (await database()).transaction(STORE).objectStore(STORE);
    const [keys, texts] = await inTime(Promise.all([settled(store.getAllKeys()), settled(store.getAll())]));
    return keys.flatMap((key, at): [string, string][] =>
      typeof key === 'string' && isKeyOf(userId, key) ? [[key, String(texts[at])]] : [],
    );
  },
  write: (key, text) => change((store) => (text === null ? store.delete(key) : store.put(text, key))),
  clear: () => inTime(removeDatabase()),
};
