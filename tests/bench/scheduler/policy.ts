import type { Grade } from '#shared/domain/schedule/grade.ts';
import type { ValueFunction } from '#shared/domain/schedule/value.ts';
import type { LearnerType } from './learner.ts';
import type { Season } from './simulate.ts';

/** How a policy goes about one learner's season. */
export interface Rules {
  value: ValueFunction;
  /** Told of each first attempt of a day, by the item's place in the world. */
  saw?: (item: number, grade: Grade) => void;
}

/** A way to choose sets. Each goes through the product's own selection; only the value function differs. */
export interface Policy {
  id: string;
  label: string;
  /** Subjects in one set. */
  maxSubjects: number;
  /** True where an item's first attempt starts its memory as if nothing had come before. */
  isPlainStart: boolean;
  /** Learners it can be applied to; all where absent. */
  types?: readonly LearnerType[];
  prepare: (season: Season) => Rules;
}
