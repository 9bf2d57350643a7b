import { type Mastery, TOO_WIDE, Z80 } from './mastery.ts';

/** A part of a paper that is examined together. */
export interface PaperTopic {
  /** Marks it carries in this paper. */
  marks: number;
  /** Null where no question of it is live. */
  mastery: Mastery | null;
}

export interface PaperFacts {
  /** Marks of the whole paper. */
  marks: number;
  topics: readonly PaperTopic[];
  /** Recall to expect of what no question speaks for. */
  recallElsewhere: number;
  /** By how much the model has lately expected too much of the student, 0 to 1. */
  optimism: number;
}

/** What today's standing would mean in marks: the 80% range, whole marks. */
export interface Forecast {
  low: number;
  high: number;
}

/** A paper only samples its topics: questions of about this many marks, each earned or not. Our assumption. */
const MARKS_A_QUESTION = 3;

/**
 * Marks to expect in a paper if practice stopped today and it asked for nothing but recall. Topics err each for itself,
 * but what they share (what a student has not attempted, and the memory model) adds up over the paper. Null where the
 * range would be wider than half the paper, so that it says nothing.
 */
export function forecastPaper({ marks, topics, recallElsewhere, optimism }: PaperFacts): Forecast | null {
  if (marks <= 0) return null;
  // Topics listed with more marks than the paper has share it.
  const scale =
    marks /
    Math.max(
      marks,
      topics.reduce((sum, topic) => sum + topic.marks, 0),
    );
  const covered = topics.reduce((sum, topic) => sum + (topic.mastery ? topic.marks * scale : 0), 0);
  const elsewhere = Math.max(0, marks - covered);
  let mean = elsewhere * recallElsewhere;
  let ownVariance = elsewhere ** 2 * recallElsewhere * (1 - recallElsewhere);
  let shared = 0;
  for (const topic of topics) {
    if (!topic.mastery) continue;
    const { mean: recalled, ownVariance: own, sharedVariance } = topic.mastery;
    const carried = topic.marks * scale;
    mean += carried * recalled;
    ownVariance += carried ** 2 * own + carried * MARKS_A_QUESTION * recalled * (1 - recalled);
    shared += carried * Math.sqrt(sharedVariance);
  }
  const half = Z80 * Math.sqrt(ownVariance + shared ** 2);
  const low = Math.max(0, Math.floor(mean - half - optimism * marks));
  const high = Math.min(marks, Math.ceil(mean + half));
  return high - low > TOO_WIDE * marks ? null : { low, high };
}
