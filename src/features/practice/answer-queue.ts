import { z } from 'zod';
import { handInSchema, selfMarkSchema } from '#shared/schemas/practice.ts';
import { answersPrefix } from '#src/lib/kept-keys.ts';
import type { KeptStore } from '#src/lib/kept-store.ts';

/** When something was handed in: on this page's monotonic clock, and on the wall clock for after a reload. */
const stampSchema = z.object({ page: z.string(), monotonic: z.number(), wall: z.number() });

const waitingSchema = z.discriminatedUnion('kind', [
  z.object({
    kind: z.literal('answer'),
    setItemId: z.string(),
    body: handInSchema.omit({ ageMs: true }),
    stamp: stampSchema,
  }),
  z.object({ kind: z.literal('selfMark'), setItemId: z.string(), body: selfMarkSchema }),
]);
export type Waiting = z.output<typeof waitingSchema>;

/** As it is kept: `turn` says which came first, whatever the clock did meanwhile. */
const keptSchema = z.object({ turn: z.number(), entry: waitingSchema });
type Kept = z.output<typeof keptSchema>;

const PAGE = crypto.randomUUID();
const AGE_LIMIT_MS = 90 * 24 * 3600 * 1000;

/** Marks the moment of handing in. */
export const stampNow = (): z.output<typeof stampSchema> => ({
  page: PAGE,
  monotonic: performance.now(),
  wall: Date.now(),
});

/** Milliseconds since `stamp`. The wall clock only counts where the page was loaded again in between. */
export function ageOf(stamp: z.output<typeof stampSchema>): number {
  const age = stamp.page === PAGE ? performance.now() - stamp.monotonic : Date.now() - stamp.wall;
  return Math.round(Math.min(Math.max(age, 0), AGE_LIMIT_MS));
}

function readKept(text: string): Kept | null {
  try {
    return keptSchema.parse(JSON.parse(text));
  } catch {
    return null;
  }
}

/**
 * Answers of one set that the server has not acknowledged, oldest first. Each is kept under a key of its own, by
 * person and set, so that two tabs cannot write over one another and nobody else's session sends them.
 */
export class AnswerQueue {
  readonly prefix: string;
  readonly #store: KeptStore;
  #texts = '';
  #kept: Kept[] = [];
  #waiting: readonly Waiting[] = [];

  constructor(store: KeptStore, userId: string, setId: string) {
    this.prefix = answersPrefix(userId, setId);
    this.#store = store;
  }

  readonly subscribe = (listener: () => void): (() => void) => this.#store.subscribe(listener);

  /** The same array for as long as nothing changes. */
  readonly waiting = (): readonly Waiting[] => {
    const texts = this.#store.entries(this.prefix).map(([, text]) => text);
    const joined = texts.join('\n');
    if (joined !== this.#texts) {
      this.#texts = joined;
      this.#kept = texts.flatMap((text) => readKept(text) ?? []).sort((a, b) => a.turn - b.turn);
      this.#waiting = this.#kept.map(({ entry }) => entry);
    }
    return this.#waiting;
  };

  add(entry: Waiting): void {
    this.waiting();
    const turn = (this.#kept.at(-1)?.turn ?? 0) + 1;
    this.#store.write(this.prefix + entry.body.id, JSON.stringify({ turn, entry } satisfies Kept));
  }

  /** Puts back what a sign-out in another tab has wiped from this tab's storage. */
  keep(): void {
    this.#store.keep();
  }

  remove(id: string): void {
    this.#store.remove(this.prefix + id);
  }
}
