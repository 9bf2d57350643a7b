import type { Reason } from '#shared/schemas/reason.ts';
import type { SetKind } from '#shared/schemas/set-kind.ts';
import { type ConfusablePair, orderSet } from './order.ts';
import { reasonFor } from './reason-for.ts';
import { contextFor, type Selection, selectSet } from './select.ts';
import type { Prior } from './unseen.ts';
import { outlookOf, tieredGain } from './value.ts';

/** All live questions the student is entered for, those answered today included, and how a set is made of them. */
export interface SetRequest extends Selection {
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
  /** What was believed of a question never attempted: its first attempt starts from there. */
  prior: Prior | null;
}

/** Chooses and orders a set. The same input gives the same set, in whatever order the candidates come. */
export function buildSet({ mode, confusable, ...selection }: SetRequest): BuiltItem[] {
  const context = contextFor(selection);
  const chosen = selectSet(selection, tieredGain, context).map((choice, priority) => {
    const { questionId, topicId, subjectId } = choice.candidate;
    return { choice, questionId, topicId, subjectId, recall: outlookOf(choice.candidate, context).today, priority };
  });
  const ordered = orderSet(chosen, mode === 'morning' ? 'hardestFirst' : 'normal', confusable);
  return ordered.map(({ choice, questionId, topicId, subjectId }, index) => ({
    questionId,
    topicId,
    subjectId,
    position: index + 1,
    expectedSeconds: choice.seconds,
    reason: reasonFor(choice, context),
    prior: choice.candidate.memory === null ? context.prior(choice.candidate) : null,
  }));
}
