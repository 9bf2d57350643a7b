import { type Actor, leads, worksIn } from './actor.ts';
import type { Policy } from './authorize.ts';

export interface SubjectFacts {
  subjectId: string;
}

const works = (actor: Actor, { subjectId }: SubjectFacts) => worksIn(actor, subjectId);

/** A subject's specification, topics and figures. */
export const subjectPolicy = {
  read: works,
  writeQuestions: works,
  readItemStatistics: works,
  manageTopics: (actor: Actor, { subjectId }: SubjectFacts) => leads(actor, subjectId),
} satisfies Policy<'read' | 'writeQuestions' | 'readItemStatistics' | 'manageTopics', SubjectFacts>;
