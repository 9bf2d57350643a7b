import { Transaction } from 'sequelize';
import { notFound, stale } from '#server/errors.ts';
import { Question } from '#server/models/question.ts';
import { QuestionVersion } from '#server/models/question-version.ts';
import type { Actor } from '#server/policies/actor.ts';
import { authorize } from '#server/policies/authorize.ts';
import { type QuestionFacts, questionPolicy } from '#server/policies/question-policy.ts';

/** A question with its versions, newest first. */
export interface LoadedQuestion {
  question: Question;
  versions: QuestionVersion[];
  newest: QuestionVersion;
  /** The draft or the version in review, where there is one. */
  working: QuestionVersion | null;
  live: QuestionVersion | null;
}

const isWorking = ({ status }: QuestionVersion) => status === 'draft' || status === 'inReview';

async function load(id: string, options: { lock?: typeof Transaction.LOCK.UPDATE }): Promise<LoadedQuestion> {
  const question = await Question.findByPk(id, { ...options, rejectOnEmpty: notFound() });
  const versions = await QuestionVersion.findAll({ where: { questionId: id }, order: [['version', 'DESC']] });
  const [newest] = versions;
  if (!newest) throw new Error(`question ${id} has no version`);
  return {
    question,
    versions,
    newest,
    working: isWorking(newest) ? newest : null,
    live: versions.find((version) => version.status === 'live') ?? null,
  };
}

/** @throws Problem 404 */
export const loadQuestion = (id: string): Promise<LoadedQuestion> => load(id, {});

/** Holds the question for this transaction, so that two people acting at once come one after the other. */
export const lockQuestion = (id: string): Promise<LoadedQuestion> => load(id, { lock: Transaction.LOCK.UPDATE });

/** The facts that rights hang on. */
export const questionFacts = ({ question, working }: LoadedQuestion): QuestionFacts => ({
  subjectId: question.subjectId,
  authorId: question.authorId,
  workingAuthorId: working?.authorId ?? null,
  workingEditorId: working?.lastEditedBy ?? null,
  workingStatus: working?.status ?? null,
  isLive: question.liveVersionId !== null,
  isRetired: question.retiredAt !== null,
});

/**
 * Lets a step pass that needs the version being worked on in a certain state, as the person last saw it. Rights come
 * first, as they would be in that state; then the state itself.
 * @throws Problem 404, 403; 409 `stale` where somebody else was quicker
 */
export function authorizeStep(
  actor: Actor,
  loaded: LoadedQuestion,
  action: 'edit' | 'send' | 'discardDraft' | 'putLive' | 'returnToAuthor',
  seen: { status: 'draft' | 'inReview'; revision: number },
): QuestionVersion {
  const { working, newest } = loaded;
  const facts = {
    ...questionFacts(loaded),
    workingStatus: seen.status,
    workingAuthorId: newest.authorId,
    workingEditorId: newest.lastEditedBy,
  };
  authorize(questionPolicy, action, actor, facts);
  if (working?.status !== seen.status || working.revision !== seen.revision) throw stale();
  return working;
}
