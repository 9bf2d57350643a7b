export type SaveState =
  | { kind: 'clean' }
  | { kind: 'unsaved' }
  | { kind: 'saving' }
  | { kind: 'saved' }
  | { kind: 'failed'; why: SaveFailure };

/**
 * `stale`: a newer save exists. `moved`: it is no draft any more, so nothing can be saved onto it. `offline` and
 * `busy` are tried again; the others wait for the writer.
 */
export interface SaveFailure {
  kind: 'stale' | 'moved' | 'offline' | 'busy' | 'signedOut' | 'refused';
  detail: string;
}

const isStuck = (failure: SaveFailure | null): boolean => failure?.kind === 'stale' || failure?.kind === 'moved';

interface SaverPort<Draft> {
  read: () => Draft;
  /** Sends a draft; resolves with the revision it became. `revision` is null for a question not yet made. */
  send: (revision: number | null, draft: Draft) => Promise<number>;
  explain: (error: unknown) => SaveFailure | Promise<SaveFailure>;
  onState: (state: SaveState) => void;
}

/** Pause after the last key before a save, and the first and longest wait before a failed one is tried again. */
const PAUSE_MS = 1500;
const FIRST_RETRY_MS = 4000;
const LONGEST_RETRY_MS = 60_000;

/** Saves a draft as it is typed: one request at a time, the newest text last, failures tried again. */
export class DraftSaver<Draft> {
  #port: SaverPort<Draft>;
  #revision: number | null;
  #typed = 0;
  #saved = 0;
  #timer: ReturnType<typeof setTimeout> | undefined;
  #running: Promise<boolean> | null = null;
  #retryMs = FIRST_RETRY_MS;
  #failure: SaveFailure | null = null;

  constructor(port: SaverPort<Draft>, revision: number | null) {
    this.#port = port;
    this.#revision = revision;
  }

  get hasUnsaved() {
    return this.#typed !== this.#saved;
  }

  /** Call after each change of the form. */
  changed() {
    this.#typed += 1;
    if (isStuck(this.#failure)) return;
    if (!this.#running && !this.#failure) this.#port.onState({ kind: 'unsaved' });
    this.#wait(PAUSE_MS);
  }

  /** Saves now. Resolves with the saved revision, or null where it could not be saved. */
  async flush(): Promise<number | null> {
    clearTimeout(this.#timer);
    while (this.hasUnsaved || this.#revision === null || this.#running !== null) {
      if (!(await this.#attempt())) return null;
    }
    return this.#revision;
  }

  /** Takes a newer revision as the base: after the newer text was loaded, or to save over it. */
  rebase(revision: number, isTextTaken: boolean) {
    this.#revision = revision;
    this.#failure = null;
    if (isTextTaken) {
      this.#saved = this.#typed;
      clearTimeout(this.#timer);
      this.#port.onState({ kind: 'clean' });
    }
  }

  stop() {
    clearTimeout(this.#timer);
  }

  #wait(ms: number) {
    clearTimeout(this.#timer);
    this.#timer = setTimeout(() => void this.#attempt(), ms);
  }

  #attempt(): Promise<boolean> {
    this.#running ??= this.#sendOnce().finally(() => {
      this.#running = null;
    });
    return this.#running;
  }

  async #sendOnce(): Promise<boolean> {
    if (isStuck(this.#failure)) return false;
    const upTo = this.#typed;
    this.#port.onState({ kind: 'saving' });
    try {
      this.#revision = await this.#port.send(this.#revision, this.#port.read());
    } catch (error) {
      this.#fail(await this.#port.explain(error));
      return false;
    }
    this.#saved = upTo;
    this.#failure = null;
    this.#retryMs = FIRST_RETRY_MS;
    this.#port.onState({ kind: this.hasUnsaved ? 'unsaved' : 'saved' });
    if (this.hasUnsaved) this.#wait(PAUSE_MS);
    return true;
  }

  #fail(why: SaveFailure) {
    this.#failure = why;
    this.#port.onState({ kind: 'failed', why });
    if (why.kind === 'offline' || why.kind === 'busy') {
      this.#wait(this.#retryMs);
      this.#retryMs = Math.min(this.#retryMs * 2, LONGEST_RETRY_MS);
    }
  }
}
