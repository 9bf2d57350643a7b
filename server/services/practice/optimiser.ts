import { createRequire } from 'node:module';
import { setImmediate as otherWork } from 'node:timers/promises';
import type { Review } from '#shared/domain/schedule/fit.ts';

/** Fits the 21 weights of the memory model to sequences of attempts, one a question. */
export type Optimise = (sequences: readonly (readonly Review[])[]) => Promise<number[]>;

/** What is used of the open library's optimiser. */
interface Binding {
  FSRSBindingReview: new (rating: number, days: number) => object;
  FSRSBindingItem: new (reviews: object[]) => object;
  computeParameters(items: object[], options: { enableShortTerm: boolean }): Promise<number[]>;
}

/** Built for this platform alone, and optional: elsewhere npm leaves it out. */
const PACKAGE = '@open-spaced-repetition/binding-linux-x64-gnu';
/** Sequences made ready at a stretch, so that requests are not kept waiting. */
const AT_A_STRETCH = 200;

/** Each attempt after the first is one thing to learn from, told with all that came before it. */
function itemsOf({ FSRSBindingReview, FSRSBindingItem }: Binding, sequence: readonly Review[]): object[] {
  const reviews = sequence.map(({ grade, days }) => new FSRSBindingReview(grade, days));
  return reviews.slice(1).map((_, index) => new FSRSBindingItem(reviews.slice(0, index + 2)));
}

/** How a package is loaded. @throws where it is not installed, or does not run here */
type Load = (name: string) => unknown;

function loadBinding(load: Load): Binding | null {
  try {
    return load(PACKAGE) as Binding;
  } catch {
    return null;
  }
}

/**
 * The open library's optimiser, computing on a thread of its own; null where it is not installed, and then weights stay
 * as they are. Its promise rejects where the library fails.
 */
export function loadOptimiser(load: Load = createRequire(import.meta.url)): Optimise | null {
  const binding = loadBinding(load);
  if (!binding) return null;
  return async (sequences) => {
    const items: object[] = [];
    for (const [index, sequence] of sequences.entries()) {
      items.push(...itemsOf(binding, sequence));
      if (index % AT_A_STRETCH === 0) await otherWork();
    }
    return binding.computeParameters(items, { enableShortTerm: true });
  };
}
