import { OVERSHOOT_SECONDS } from '#shared/domain/schedule/select.ts';
import { FsrsLearner } from './learner-a.ts';
import { type Branch, type PassShares, PRICES, Programme } from './programme.ts';
import { LUCKY, SET_SECONDS } from './settings.ts';
import { isMissed, type World, type WorldItem } from './world.ts';

/** Grades of the passes of a learner. Source: scheduling specification, section 9. */
const PASSES: PassShares = [
  [2, 0.1],
  [3, 0.8],
  [4, 0.1],
];
/** Steps of the search for the price per second, which narrow it by a third each. */
const STEPS = 60;

/**
 * More than any policy can reach with a learner of type (a): each item is practised at its best days, knowing the true
 * memory, and items compete through one price per second alone. Minimised over that price (Lagrange). The other types
 * of learner have states that no small grid holds (all past days; an ease per item).
 */
export function boundOf(world: World): number {
  const learner = new FsrsLearner(world);
  const programme = new Programme(learner.fsrs, PASSES, world.lastPaperDay);
  const total = world.items.reduce((sum, { weight }) => sum + weight, 0);
  const items = world.items.map((item, index) => ({
    share: item.weight / total,
    secondsPerShare: (item.seconds * total) / item.weight,
    values: itemValues(programme, learner, item, index),
  }));
  const seconds = secondsOf(world);
  const boundAt = (price: number): number =>
    items.reduce((sum, { share, secondsPerShare, values }) => sum + share * read(values, price * secondsPerShare), 0) +
    price * seconds;
  return least(boundAt);
}

/** Seconds that the sets of a season can hold. */
function secondsOf(world: World): number {
  let sets = 0;
  for (let day = 0; day < world.studyDays; day += 1) {
    for (let set = 0; set < world.settings.setsADay; set += 1) if (!isMissed(world, day, set)) sets += 1;
  }
  return sets * (SET_SECONDS + OVERSHOOT_SECONDS);
}

/** Best value of an item at each price of a go: never practised, or first practised on its best day. */
function itemValues(programme: Programme, learner: FsrsLearner, item: WorldItem, index: number): number[] {
  const untouched = learner.recall(index, item.paperDay);
  const values = PRICES.map(() => untouched);
  for (let day = 0; day < item.paperDay; day += 1) {
    const branches = firstGo(programme, learner, index, day);
    for (const [place, price] of PRICES.entries()) {
      const value = programme.worth(place, item.paperDay - day, branches) - price;
      if (value > (values[place] ?? 0)) values[place] = value;
    }
  }
  return values;
}

function firstGo(programme: Programme, learner: FsrsLearner, index: number, day: number): Branch[] {
  const memory = learner.memory(index);
  return memory === null
    ? programme.outcomes(LUCKY, (grade) => learner.first(index, grade))
    : programme.branches(memory, day - memory.lastDay);
}

/** A value between two prices; values are convex in the price, so that this is never too low. */
function read(values: readonly number[], price: number): number {
  const above = PRICES.findIndex((one) => one >= price);
  if (above === -1) return values.at(-1) ?? 0;
  if (above === 0) return values[0] ?? 0;
  const [low = 0, high = 1] = [PRICES[above - 1], PRICES[above]];
  const part = (price - low) / (high - low);
  return (values[above - 1] ?? 0) * (1 - part) + (values[above] ?? 0) * part;
}

/** The least value of a convex function of a price, searched on a log scale. */
function least(at: (price: number) => number): number {
  let [low, high] = [-25, 0];
  for (let step = 0; step < STEPS; step += 1) {
    const [left, right] = [low + (high - low) / 3, high - (high - low) / 3];
    if (at(Math.exp(left)) < at(Math.exp(right))) high = right;
    else low = left;
  }
  return at(Math.exp((low + high) / 2));
}
