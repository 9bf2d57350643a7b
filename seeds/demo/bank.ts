import { bodyOf, type QuestionContent } from '#seeds/demo/content/build.ts';
import { describeBody } from '#server/services/questions/describe-body.ts';
import { addDays, weekday } from '#shared/domain/time/calendar.ts';
import { instantOf } from '#shared/domain/time/zone.ts';
import type { DraftBody, VersionStatus } from '#shared/schemas/question.ts';
import { idFor } from './ids.ts';
import { adultId } from './people.ts';
import { type Random, randomFor } from './random.ts';
import type { Row, Rows } from './rows.ts';
import { SCHOOL } from './school.ts';
import { teachersOf } from './staff.ts';
import type { SubjectPlan } from './subjects.ts';
import { asRevised, asSentBack, asStarted, type Stage, stagesOf } from './work-in-progress.ts';

/** One question of the bank, with where it stands. */
export interface BankQuestion {
  id: string;
  versionId: string;
  number: number;
  stage: Stage;
  content: QuestionContent;
  subjectId: string;
  /** Topics it serves, one in each specification that has it. */
  topicIds: string[];
  /** The option that its topic belongs to, if any. */
  option: string | null;
}

/** Days before seeding between which questions went live: all of them before the first simulated answer. */
const LIVE_FROM_DAYS = 430;
const LIVE_TO_DAYS = 75;

/** A subject's questions in the order of its topics, numbered from 1. */
export function planBank({ id: subjectId, content, specifications }: SubjectPlan): BankQuestion[] {
  const stages = stagesOf(content.topics);
  const questions = content.topics.flatMap((topic) => {
    const served = specifications.flatMap(({ topics }) => topics.filter(({ number }) => number === topic.number));
    return topic.questions.map((question) => ({
      content: question,
      topicIds: served.map((one) => one.id),
      option: served[0]?.option ?? null,
    }));
  });
  return questions.map(({ content: question, topicIds, option }, index) => {
    const id = idFor('question', content.code, index + 1);
    return {
      id,
      versionId: idFor(id, 'version', 1),
      number: index + 1,
      stage: stages.get(question) ?? 'live',
      content: question,
      subjectId,
      topicIds,
      option,
    };
  });
}

interface Dates {
  savedAt: string;
  sentAt: string | null;
  liveAt: string | null;
}

/** An instant in school hours, `days` before seeding. */
function schoolTime(today: string, days: number, random: Random): string {
  const day = addDays(today, -days);
  const onWeekday = addDays(day, -Math.max(0, weekday(day) - 4));
  const time = `${String(8 + random.below(9)).padStart(2, '0')}:${String(random.below(60)).padStart(2, '0')}`;
  return instantOf(onWeekday, time, SCHOOL.zone).toISOString();
}

function datesOf(status: VersionStatus, today: string, random: Random): Dates {
  if (status === 'live') {
    const days = LIVE_TO_DAYS + random.below(LIVE_FROM_DAYS - LIVE_TO_DAYS);
    const sentAt = schoolTime(today, days + 4 + random.below(8), random);
    return { savedAt: sentAt, sentAt, liveAt: schoolTime(today, days, random) };
  }
  const savedAt = schoolTime(today, 1 + random.below(9), random);
  return { savedAt, sentAt: status === 'inReview' ? savedAt : null, liveAt: null };
}

interface VersionInput {
  question: BankQuestion;
  id: string;
  version: number;
  status: VersionStatus;
  body: DraftBody;
  authorId: string;
  reviewerId?: string | null;
  reviewComment?: string;
}

function versionRow(input: VersionInput, today: string): Row<'question_versions'> {
  const { question, id, version, status, body, authorId, reviewerId = null, reviewComment = null } = input;
  const random = randomFor('version', id);
  const { savedAt, sentAt, liveAt } = datesOf(status, today, random);
  const { excerpt, searchText, maxMarks } = describeBody(body);
  return {
    id,
    question_id: question.id,
    version,
    status,
    revision: 1 + random.below(6),
    kind: question.content.kind,
    tier: question.content.tier ?? null,
    option: question.option,
    body,
    search_text: searchText,
    excerpt,
    max_marks: maxMarks,
    expected_seconds: question.content.seconds,
    author_id: authorId,
    last_edited_by: authorId,
    reviewer_id: reviewerId,
    review_comment: reviewComment,
    saved_at: savedAt,
    sent_at: sentAt,
    live_at: liveAt,
  };
}

/** The versions of one question: one, or a live one with its successor waiting for review. */
function versionRows(question: BankQuestion, staff: readonly string[], today: string): Row<'question_versions'>[] {
  const [authorId = '', reviewerId = ''] = staff;
  const first = { question, id: question.versionId, version: 1, authorId };
  const body: DraftBody = bodyOf(question.content);
  const live = () => versionRow({ ...first, status: 'live', body, reviewerId }, today);
  switch (question.stage) {
    case 'live':
      return [live()];
    case 'revised':
      return [
        live(),
        versionRow(
          {
            question,
            id: idFor(question.id, 'version', 2),
            version: 2,
            status: 'inReview',
            body: asRevised(body),
            authorId: reviewerId,
          },
          today,
        ),
      ];
    case 'inReview':
      return [versionRow({ ...first, status: 'inReview', body }, today)];
    case 'started':
      return [versionRow({ ...first, status: 'draft', body: asStarted(body) }, today)];
    case 'sentBack': {
      const { body: sent, comment } = asSentBack(body);
      return [versionRow({ ...first, status: 'draft', body: sent, reviewerId, reviewComment: comment }, today)];
    }
  }
}

/** Questions, their versions and the topics they serve. */
export function bankRows({ content }: SubjectPlan, bank: readonly BankQuestion[], today: string): Rows {
  const teachers = teachersOf(content.code).map(adultId);
  const versions = new Map(
    bank.map((question) => [
      question.id,
      versionRows(question, randomFor('authors', question.id).shuffle(teachers), today),
    ]),
  );
  return {
    questions: bank.map((question) => {
      const [first] = versions.get(question.id) ?? [];
      const isLive = first?.status === 'live';
      return {
        id: question.id,
        subject_id: question.subjectId,
        number: question.number,
        author_id: first?.author_id ?? null,
        live_version_id: isLive ? question.versionId : null,
        created_at: first?.saved_at ?? null,
      };
    }),
    question_versions: [...versions.values()].flat(),
    question_topics: bank.flatMap(({ id, topicIds }) =>
      (versions.get(id) ?? []).flatMap(({ id: versionId }) =>
        topicIds.map((topicId, index) => ({
          id: idFor(versionId ?? '', 'topic', topicId),
          question_id: id,
          question_version_id: versionId,
          topic_id: topicId,
          position: index,
        })),
      ),
    ),
  };
}
