/** Grades of the memory model, 4 (effortless) included, which the product never awards. */
export type TrueGrade = 1 | 2 | 3 | 4;

/** A simulated memory of all items of a world, by their place in it. */
export interface Learner {
  /** Chance that a pass is read as another of the three. */
  misread: number;
  /** Chance of recalling an item on a day. */
  recall(item: number, day: number): number;
  /** A day's first attempt at an item, feedback included. */
  attempt(item: number, day: number, grade: TrueGrade): void;
}

export type LearnerType = 'a' | 'b' | 'c';
