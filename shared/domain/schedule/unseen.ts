import type { Grade } from './grade.ts';
import type { Memory, MemoryModel } from './memory.ts';

/** First attempts at items, and those of them graded 2 or better. */
export interface Tally {
  tried: number;
  recalled: number;
}

/** What is believed of an item before its first attempt. */
export interface Prior {
  /** Expected recall, 0 to 1. */
  recall: number;
  /** Whole days since the topic was taught, at least 1. */
  days: number;
}

/** Days since teaching where nobody said. */
export const UNKNOWN_DAYS = 90;
/** Difficulty that an item is taken to have until it is attempted. */
const DIFFICULTY = 5;
/** Bounds of what a first attempt may make of a memory, in days. */
const MOST_AFTER_PASS = 120;
const MOST_AFTER_MISS = 10;

const clamp = (value: number, least: number, most: number): number => Math.min(most, Math.max(least, value));

/**
 * Recall of a topic's items never attempted, from the student's first attempts alone: the topic's own, drawn to the
 * subject's, drawn to all. Source: scheduling specification, section 3.
 */
export function unseenRecall(topic: Tally, subject: Tally, all: Tally): number {
  const overall = (all.recalled + 2) / (all.tried + 4);
  const inSubject = (subject.recalled + 8 * overall) / (subject.tried + 8);
  return clamp((topic.recalled + 4 * inSubject) / (topic.tried + 4), 0.03, 0.97);
}

/** Stability after a first attempt: a right answer long after the lesson is evidence of a durable memory. */
export function firstStability(model: MemoryModel, { recall, days }: Prior, grade: Grade): number {
  const before = model.stabilityOf(recall, days);
  const start = model.weights[grade - 1] ?? 0;
  return grade === 1
    ? clamp(model.missed(before, DIFFICULTY, recall), start, MOST_AFTER_MISS)
    : clamp(model.passed(before, DIFFICULTY, recall, grade), start, MOST_AFTER_PASS);
}

/** Memory after a first attempt, given what was believed before it; null where nothing was recorded. */
export function firstMemory(model: MemoryModel, grade: Grade, prior: Prior | null): Memory {
  const plain = model.first(grade);
  return prior === null ? plain : { stability: firstStability(model, prior, grade), difficulty: plain.difficulty };
}
