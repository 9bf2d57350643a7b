import type { VersionStatus } from '#shared/schemas/question.ts';
import { type Actor, leads, worksIn } from './actor.ts';
import type { Policy } from './authorize.ts';

/** The question and the version being worked on; `workingStatus` is null where none is. */
export interface QuestionFacts {
  subjectId: string;
  authorId: string;
  /** Author of the version being worked on. */
  workingAuthorId: string | null;
  /** Whoever saved that version last. */
  workingEditorId: string | null;
  workingStatus: VersionStatus | null;
  isLive: boolean;
  isRetired: boolean;
}

const works = (actor: Actor, { subjectId }: { subjectId: string }) => worksIn(actor, subjectId);
const ownsDraft = (actor: Actor, q: QuestionFacts) =>
  works(actor, q) && q.workingStatus === 'draft' && (q.workingAuthorId === actor.userId || leads(actor, q.subjectId));
// What is in review is one's own by having written it, or by having saved it last.
const isOwn = (actor: Actor, q: QuestionFacts) => [q.workingAuthorId, q.workingEditorId].includes(actor.userId);
// Nobody reviews their own question, heads of department included.
const reviews = (actor: Actor, q: QuestionFacts) =>
  works(actor, q) && q.workingStatus === 'inReview' && !isOwn(actor, q);
const withdraws = (actor: Actor, q: QuestionFacts) =>
  works(actor, q) && q.workingStatus === 'inReview' && isOwn(actor, q);

/** Questions belong to their subject's teachers; students only ever meet them as set items. */
export const questionPolicy = {
  read: works,
  edit: ownsDraft,
  send: ownsDraft,
  discardDraft: ownsDraft,
  putLive: reviews,
  returnToAuthor: (actor: Actor, q: QuestionFacts) => reviews(actor, q) || withdraws(actor, q),
  startVersion: (actor: Actor, q: QuestionFacts) =>
    works(actor, q) && (q.isLive || q.isRetired) && q.workingStatus === null,
  retire: (actor: Actor, q: QuestionFacts) =>
    q.isLive && (leads(actor, q.subjectId) || (works(actor, q) && q.authorId === actor.userId)),
} satisfies Policy<
  'read' | 'edit' | 'send' | 'discardDraft' | 'putLive' | 'returnToAuthor' | 'startVersion' | 'retire',
  QuestionFacts
>;
