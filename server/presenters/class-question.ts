import type { Actor } from '#server/policies/actor.ts';
import { classPolicy } from '#server/policies/class-policy.ts';
import { type CannotSet, type ClassQuestionDto, MOST_SET_QUESTIONS } from '#shared/schemas/class-question.ts';

/** A question and a class of its subject, as one query answers them. */
export interface ClassQuestionRow {
  class_id: string;
  class_name: string;
  subject_id: string;
  choice: 'set' | 'excluded' | null;
  chosen_by: string | null;
  chosen_at: Date | null;
  is_live: boolean;
  /** True where the live version serves a topic of the class's specification. */
  is_served: boolean;
  /** Live questions set for the class, and the one set longest ago. */
  set_count: number;
  longest_set: { id: string; number: number } | null;
  students: number;
  answered: number;
}

function cannotSet({ is_live, is_served, choice, set_count, longest_set }: ClassQuestionRow): CannotSet | null {
  if (!is_live) return { why: 'notLive' };
  if (!is_served) return { why: 'otherSpecification' };
  // One that is set already holds a place of its own.
  const isFull = choice !== 'set' && set_count >= MOST_SET_QUESTIONS;
  return isFull && longest_set ? { why: 'full', longest: longest_set } : null;
}

/** A question in the sets of one class, as those who choose for it see it. */
export const presentClassQuestion = (row: ClassQuestionRow, actor: Actor): ClassQuestionDto => ({
  classId: row.class_id,
  className: row.class_name,
  choice: row.choice ?? 'asUsual',
  chosenBy: row.chosen_by,
  chosenAt: row.chosen_at?.toISOString() ?? null,
  students: row.students,
  answeredSince: row.choice === 'set' ? row.answered : null,
  cannotSet: cannotSet(row),
  can: { choose: classPolicy.chooseQuestions(actor, { classId: row.class_id, subjectId: row.subject_id }) },
});
