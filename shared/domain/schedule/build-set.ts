import type { SetKind } from '#shared/schemas/practice.ts';
import type { Reason } from '#shared/schemas/reason.ts';
import type { Candidate } from './candidate.ts';
import { type ConfusablePair, orderSet } from './order.ts';
import { selectSet } from './select.ts';
import { dueWeakNearest } from './value.ts';

export interface SetRequest {
  /** All live questions the student is entered for, those answered today included. */
  candidates: readonly Candidate[];
  /** The student's local date. */
  today: string;
  /** 1,500 for a mixed set, 900 for a morning set, unless the school says otherwise. */
  budgetSeconds: number;
  /** School setting, 2 to 8. */
  maxSubjects: number;
  mode: SetKind;
  confusable: readonly ConfusablePair[];
}

/** One question of a built set. */
export interface BuiltItem {
  questionId: string;
  topicId: string;
  subjectId: string;
  /** From 1, in the order they are asked. */
  position: number;
  expectedSeconds: number;
  reason: Reason;
}

/** Chooses and orders a set. The same input gives the same set, in whatever order the candidates come. */
export function buildSet({ mode, confusable, ...selection }: SetRequest): BuiltItem[] {
  const chosen = selectSet({ ...selection, value: dueWeakNearest }).map((choice, priority) => ({
    questionId: choice.candidate.questionId,
    topicId: choice.candidate.topicId,
    subjectId: choice.candidate.subjectId,
    recall: choice.recall,
    priority,
    expectedSeconds: choice.seconds,
    reason: choice.reason,
  }));
  const ordered = orderSet(chosen, mode === 'morning' ? 'hardestFirst' : 'normal', confusable);
  return ordered.map(({ questionId, topicId, subjectId, expectedSeconds, reason }, index) => ({
    questionId,
    topicId,
    subjectId,
    position: index + 1,
    expectedSeconds,
    reason,
  }));
}
