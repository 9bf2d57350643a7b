import type { Keeper } from './keeper.ts';

/**
 * How long what is kept lasts: until it is sent (`device`), until the tab is closed (`tab`), or until the page is
 * left, because the browser's storage is full or off (`page`).
 */
export type Keeping = 'device' | 'tab' | 'page';

type Listener = () => void;

/**
 * What one person has not sent yet. Held in memory, so that reading is at once and nothing is lost while the page
 * stays, and written through to the device or the tab behind it.
 */
export class KeptStore {
  /** Grows with every change. */
  version = 0;
  readonly #keepers: { device: Keeper; tab: Keeper };
  readonly #announce: (key: string | null) => void;
  readonly #listeners = new Set<Listener>();
  #held = new Map<string, string>();
  #onDevice = new Set<string>();
  #keeping: Keeping = 'tab';
  #opened = '';

  /** @param announce tells the other tabs of a key that is gone for good; null where everything is */
  constructor(keepers: { device: Keeper; tab: Keeper }, announce: (key: string | null) => void = () => undefined) {
    this.#keepers = keepers;
    this.#announce = announce;
  }

  /** Takes up what a person left behind, here in the tab or on the device, whichever way they signed in since. */
  async open(userId: string, isOwn: boolean): Promise<void> {
    const wanted = `${userId} ${isOwn}`;
    if (this.#opened === wanted) return;
    this.#opened = wanted;
    this.#held = new Map();
    this.#keeping = isOwn ? 'device' : 'tab';
    await this.refresh(userId);
  }

  /** Reads again what other tabs of the same device have kept meanwhile. */
  async refresh(userId: string): Promise<void> {
    const { tab, device } = this.#keepers;
    const inTab = await tab.load(userId).catch(() => this.#fallTo('page'));
    const onDevice = await device.load(userId).catch(() => this.#fallTo('tab'));
    this.#onDevice = new Set(onDevice?.map(([key]) => key));
    this.#held = new Map([...(onDevice ?? []), ...(inTab ?? []), ...this.#held]);
    this.#tell();
  }

  get keeping(): Keeping {
    return this.#keeping;
  }

  readonly subscribe = (listener: Listener): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  read(key: string): string | undefined {
    return this.#held.get(key);
  }

  /** Everything under a prefix. */
  entries(prefix: string): [key: string, text: string][] {
    return [...this.#held].filter(([key]) => key.startsWith(prefix));
  }

  write(key: string, text: string): void {
    this.#held.set(key, text);
    void this.#persist(key, text);
    this.#tell();
  }

  remove(key: string): void {
    const { device, tab } = this.#keepers;
    this.drop(key);
    tab.write(key, null).catch(() => undefined);
    // On a shared device the database is not even made, unless something is left in it from another day.
    if (this.#keeping === 'device' || this.#onDevice.delete(key)) device.write(key, null).catch(() => undefined);
    this.#announce(key);
  }

  /** Forgets a key that another tab took away. @returns whether it was here */
  drop(key: string): boolean {
    const wasHere = this.#held.delete(key);
    if (wasHere) this.#tell();
    return wasHere;
  }

  /** Writes everything once more, after something outside has cleared the storage. */
  keep(): void {
    for (const [key, text] of this.#held) void this.#persist(key, text);
  }

  /** Forgets everything, here and in the other tabs of an own device: the person signs out. */
  async clear(): Promise<void> {
    const isOnDevice = this.#keeping === 'device';
    this.forget();
    await Promise.all(Object.values(this.#keepers).map((keeper) => keeper.clear().catch(() => undefined)));
    if (isOnDevice) this.#announce(null);
  }

  /** Forgets what is in memory, and whose it was. */
  forget(): void {
    this.#held = new Map();
    this.#opened = '';
    this.#tell();
  }

  async #persist(key: string, text: string): Promise<void> {
    // After a sign-out in another tab nothing may stay behind.
    if (this.#opened === '') return;
    const { device, tab } = this.#keepers;
    try {
      if (this.#keeping === 'device') return await device.write(key, text);
    } catch {
      this.#fallTo('tab');
    }
    if (this.#held.get(key) !== text) return;
    try {
      await tab.write(key, text);
      if (this.#keeping === 'page') this.#settle('tab');
    } catch {
      this.#fallTo('page');
    }
  }

  /** Less is kept than was thought. */
  #fallTo(keeping: 'tab' | 'page'): undefined {
    const isLess = keeping === 'page' ? this.#keeping !== 'page' : this.#keeping === 'device';
    if (isLess) this.#settle(keeping);
  }

  #settle(keeping: Keeping): void {
    this.#keeping = keeping;
    this.#tell();
  }

  #tell(): void {
    this.version += 1;
    for (const listener of this.#listeners) listener();
  }
}
