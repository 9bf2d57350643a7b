import type { Question } from '#server/models/question.ts';
import type { QuestionVersion } from '#server/models/question-version.ts';
import type { Subject } from '#server/models/subject.ts';
import type { Actor } from '#server/policies/actor.ts';
import { type QuestionFacts, questionPolicy } from '#server/policies/question-policy.ts';
import type { QuestionDto, QuestionVersionDto } from '#shared/schemas/question.ts';
import { roundSeconds, roundShare } from './figures.ts';
import { presentSubjectRef } from './subject.ts';

/** All that a question's page shows, already loaded. */
export interface QuestionToPresent {
  question: Question;
  facts: QuestionFacts;
  subject: Subject;
  topics: QuestionDto['topics'];
  versions: QuestionVersion[];
  newest: QuestionVersion;
  live: QuestionVersion | null;
  /** Names of authors and reviewers by id. */
  names: Map<string, string>;
  /** Of the live version. */
  figures: { answers: number; facility: number | null; medianSeconds: number | null };
}

const instant = (at: Date | null): string | null => at?.toISOString() ?? null;

function presentVersion(version: QuestionVersion, names: Map<string, string>): QuestionVersionDto {
  const person = (id: string) => ({ id, name: names.get(id) ?? '' });
  return {
    id: version.id,
    version: version.version,
    status: version.status,
    revision: version.revision,
    kind: version.kind,
    tier: version.tier,
    option: version.option,
    expectedSeconds: version.expectedSeconds,
    maxMarks: version.maxMarks,
    body: version.body,
    author: person(version.authorId),
    reviewer: version.reviewerId === null ? null : person(version.reviewerId),
    reviewComment: version.reviewComment,
    savedAt: version.savedAt.toISOString(),
    sentAt: instant(version.sentAt),
    liveAt: instant(version.liveAt),
  };
}

/** When a version came into the state it is in, as near as is kept. */
const reachedAt = ({ status, savedAt, sentAt, liveAt }: QuestionVersion): Date =>
  (status === 'draft' ? savedAt : status === 'inReview' ? sentAt : liveAt) ?? savedAt;

/** A question as its subject's teachers see it. Never sent to students. */
export function presentQuestion(loaded: QuestionToPresent, actor: Actor): QuestionDto {
  const { question, facts, subject, topics, versions, newest, live, names, figures } = loaded;
  const can = (action: keyof typeof questionPolicy) => questionPolicy[action](actor, facts);
  return {
    id: question.id,
    number: question.number,
    subject: presentSubjectRef(subject),
    topics,
    current: presentVersion(newest, names),
    live: live && presentVersion(live, names),
    versions: versions.map((version) => ({
      id: version.id,
      version: version.version,
      status: version.status,
      author: names.get(version.authorId) ?? '',
      at: reachedAt(version).toISOString(),
    })),
    statistics: live && {
      answers: figures.answers,
      facility: roundShare(figures.facility),
      medianSeconds: roundSeconds(figures.medianSeconds),
    },
    can: {
      edit: can('edit'),
      send: can('send'),
      putLive: can('putLive'),
      returnToAuthor: can('returnToAuthor'),
      startVersion: can('startVersion'),
      retire: can('retire'),
      discardDraft: can('discardDraft'),
    },
  };
}
