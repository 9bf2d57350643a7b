import { default_w } from 'ts-fsrs';
import { secondsOf } from '#shared/domain/schedule/candidate.ts';
import { DEFAULT_MODEL, type Memory } from '#shared/domain/schedule/memory.ts';
import { firstMemory, type Prior } from '#shared/domain/schedule/unseen.ts';
import type { ValueFunction } from '#shared/domain/schedule/value.ts';
import { Fsrs } from './fsrs.ts';
import { Lattice } from './lattice.ts';
import { type Branch, PRICES, Programme } from './programme.ts';

const STABILITIES = [0.05, 0.1, 0.2, 0.4, 0.7, 1, 1.5, 2.3, 3.5, 5, 8, 12, 20, 30, 50, 80, 140, 300, 1000];
const DIFFICULTIES = [1, 2.5, 4, 5.5, 7, 8.5, 10];
const ELAPSED = [1, 2, 3, 4, 6, 9, 13, 19, 28, 40, 60, 90];
const LEFT = [1, 2, 3, 4, 5, 7, 10, 14, 20, 28, 40, 60, 90, 120];
const RECALLS = [0.03, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.97];
const SINCE_TAUGHT = [1, 10, 30, 60, 120, 250, 450, 700];

const logs = (knots: readonly number[]): number[] => knots.map(Math.log);

/** What can be done with an item: where a go `wait` days from now leads, and its recall then if it is left alone. */
interface Prospect {
  branches: (wait: number) => readonly Branch[];
  recall: (wait: number) => number;
}

/**
 * The price of a go at which practising an item now and waiting are worth the same, all goes to come being priced alike
 * (an index in Whittle's sense, 1988), by the product's memory model. Tabulated once, read for every candidate.
 */
export class PriceIndex {
  readonly #programme: Programme;
  readonly #attempted: Lattice;
  readonly #unseen: Lattice;

  /** @param days the longest time to a paper */
  constructor(days: number) {
    this.#programme = new Programme(new Fsrs(default_w), [[3, 1]], days);
    const left = LEFT.filter((one) => one < days).concat(days);
    const prospects = new Map<string, Prospect>();
    this.#attempted = new Lattice(
      [logs(STABILITIES), DIFFICULTIES, logs(ELAPSED), logs(left)],
      (stability = 0, difficulty = 1, elapsed = 0, ahead = 0) => {
        const key = `${stability} ${difficulty} ${elapsed}`;
        const memory = { stability: Math.exp(stability), difficulty };
        const prospect = prospects.get(key) ?? this.#ofMemory(memory, Math.round(Math.exp(elapsed)));
        prospects.set(key, prospect);
        return this.#priceOf(prospect, Math.round(Math.exp(ahead)));
      },
    );
    this.#unseen = new Lattice([RECALLS, logs(SINCE_TAUGHT), logs(left)], (recall = 0, since = 0, ahead = 0) =>
      this.#priceOf(this.#ofPrior({ recall, days: Math.round(Math.exp(since)) }), Math.round(Math.exp(ahead))),
    );
  }

  /** For an item attempted `elapsed` days ago, with `left` days to its paper. */
  attempted({ stability, difficulty }: Memory, elapsed: number, left: number): number {
    return this.#attempted.read(Math.log(stability), difficulty, Math.log(elapsed), Math.log(left));
  }

  unseen({ recall, days }: Prior, left: number): number {
    return this.#unseen.read(recall, Math.log(days), Math.log(left));
  }

  #ofMemory(memory: Memory, elapsed: number): Prospect {
    const branches = remembered((wait) => this.#programme.branches(memory, elapsed + wait));
    return { branches, recall: (wait) => this.#programme.fsrs.recall(elapsed + wait, memory.stability) };
  }

  #ofPrior({ recall, days }: Prior): Prospect {
    const stability = DEFAULT_MODEL.stabilityOf(recall, days);
    const recallAfter = (wait: number): number => this.#programme.fsrs.recall(days + wait, stability);
    const branches = remembered((wait) => {
      const prior = { recall: recallAfter(wait), days: days + wait };
      return this.#programme.outcomes(prior.recall, (grade) => firstMemory(DEFAULT_MODEL, grade === 1 ? 1 : 3, prior));
    });
    return { branches, recall: recallAfter };
  }

  /** The highest price that a go now is worth; under 0 where it would do harm even for nothing. */
  #priceOf(prospect: Prospect, left: number): number {
    let [low, high] = [0, PRICES.length - 1];
    const least = this.#advantage(prospect, left, low);
    if (least < 0) return least;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (this.#advantage(prospect, left, middle) >= 0) low = middle;
      else high = middle;
    }
    const [under, over] = [this.#advantage(prospect, left, low), this.#advantage(prospect, left, high)];
    const [from = 0, to = 0] = [PRICES[low], PRICES[high]];
    return under > over ? from + ((to - from) * under) / (under - over) : from;
  }

  /** What a go now is worth over the best of waiting, at one of the prices. */
  #advantage({ branches, recall }: Prospect, left: number, place: number): number {
    const price = PRICES[place] ?? 0;
    let waiting = recall(left);
    for (let wait = 1; wait < left; wait += 1) {
      waiting = Math.max(waiting, this.#programme.worth(place, left - wait, branches(wait)) - price);
    }
    return this.#programme.worth(place, left, branches(0)) - price - waiting;
  }
}

function remembered(branches: (wait: number) => Branch[]): (wait: number) => readonly Branch[] {
  const known: Branch[][] = [];
  return (wait) => {
    known[wait] ??= branches(wait);
    return known[wait];
  };
}

/** Index per second, by the item's weight. */
export const indexPerSecond =
  (index: PriceIndex): ValueFunction =>
  (candidate, context) => {
    const left = context.daysToExam(candidate);
    const { memory } = candidate;
    const price = memory
      ? index.attempted(memory, context.elapsed(memory.lastOn), left)
      : index.unseen(context.prior(candidate), left);
    const score = (context.weight(candidate) / secondsOf(candidate)) * price;
    return { tier: 2, score };
  };
