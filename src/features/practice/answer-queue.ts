import { z } from 'zod';
import { handInSchema, selfMarkSchema } from '#shared/schemas/practice.ts';
import { unsentKey } from '#src/lib/unsent.ts';

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

/**
 * Answers of one set that the server has not acknowledged, oldest first. They live in sessionStorage,
 * keyed by person and set, so that a reload keeps them and nobody else's session sends them.
 */
export class AnswerQueue {
  readonly #key: string;
  readonly #listeners = new Set<() => void>();
  #waiting: readonly Waiting[];

  constructor(userId: string, setId: string) {
    this.#key = unsentKey(userId, setId);
    this.#waiting = this.#read();
  }

  #read(): Waiting[] {
    try {
      const kept: unknown = JSON.parse(sessionStorage.getItem(this.#key) ?? '[]');
      return z.array(waitingSchema).parse(kept);
    } catch {
      return [];
    }
  }

  #write(waiting: readonly Waiting[]): void {
    this.#waiting = waiting;
    if (waiting.length > 0) sessionStorage.setItem(this.#key, JSON.stringify(waiting));
    else sessionStorage.removeItem(this.#key);
    for (const listener of this.#listeners) listener();
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.#listeners.add(listener);
    return () => this.#listeners.delete(listener);
  };

  readonly waiting = (): readonly Waiting[] => this.#waiting;

  add(entry: Waiting): void {
    this.#write([...this.#read().filter(({ body }) => body.id !== entry.body.id), entry]);
  }

  /** Puts back what a sign-out in another tab has wiped from this tab's storage. */
  keep(): void {
    this.#write(this.#waiting);
  }

  remove(id: string): void {
    this.#write(this.#read().filter(({ body }) => body.id !== id));
  }
}
