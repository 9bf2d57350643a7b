import { decidedPoints } from '#shared/domain/marking/asked-question.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import type { Forecast } from '#shared/domain/schedule/forecast.ts';
import { type Mastery, recallPercent, standingOf } from '#shared/domain/schedule/mastery.ts';
import type { MemoryState } from '#shared/domain/schedule/memory.ts';
import { nextWords } from '#shared/domain/schedule/next-words.ts';
import { reasonWords } from '#shared/domain/schedule/reason.ts';
import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
import type { MyTopicDto, PaperForecastDto } from '#shared/schemas/my-topics.ts';
import type { AnswerResultDto, SetItemDto } from '#shared/schemas/practice.ts';
import { bodyMarks, type QuestionBody } from '#shared/schemas/question-body.ts';
import type { Reason } from '#shared/schemas/reason.ts';

export const presentSubject = ({ id, code, name, strand }: SetItemDto['subject']): SetItemDto['subject'] => ({
  id,
  code,
  name,
  strand,
});

export const presentTopic = ({ id, number, title }: AnswerResultDto['topic']): AnswerResultDto['topic'] => ({
  id,
  number,
  title,
});

/** How one part of an answer stands: decided, or waiting for the student's own ticks. */
export interface PartStanding extends Pick<MarkedPart, 'words'> {
  markedBy: 'plait' | 'student';
  earned: (boolean | null)[];
}

export interface ResultFacts {
  answerId: string;
  setItemId: string;
  already: boolean;
  howSure: HowSure;
  responses: string[];
  body: QuestionBody;
  topic: AnswerResultDto['topic'];
  reason: Reason;
  reasonPaper: string | null;
  parts: PartStanding[];
  /** Null until every part is marked. */
  marks: number | null;
  returnsOn: string | null;
  paper: { title: string; on: string } | null;
}

/** An answer with its marks and scheme, as its student sees it. */
export function presentResult(facts: ResultFacts): AnswerResultDto {
  const { body, marks, topic, howSure, returnsOn, paper } = facts;
  const maxMarks = bodyMarks(body);
  return {
    answerId: facts.answerId,
    setItemId: facts.setItemId,
    already: facts.already,
    state: marks === null ? 'selfMark' : 'marked',
    howSure,
    responses: facts.responses,
    marks,
    maxMarks,
    topic: presentTopic(topic),
    parts: body.parts.map((part, index) => {
      const standing = facts.parts[index];
      return {
        markedBy: standing?.markedBy ?? 'student',
        words: standing?.words ?? '',
        modelAnswer: part.modelAnswer,
        points: decidedPoints(part, standing?.earned),
      };
    }),
    guidance: body.guidance ?? null,
    why: reasonWords(facts.reason, { topic: topic.title, paper: facts.reasonPaper }),
    next: marks === null ? null : { words: nextWords({ marks, maxMarks, howSure, returnsOn, paper }), returnsOn },
  };
}

export interface MyTopicFacts {
  topic: AnswerResultDto['topic'] & { isTaught: boolean; notBefore: string | null };
  subject: SetItemDto['subject'];
  /** Undefined where it has no live question. */
  mastery: Mastery | undefined;
  memories: readonly MemoryState[];
  /** False once its last paper has been sat. */
  isAhead: boolean;
  canPractise: boolean;
  paper: { title: string; on: string } | null;
  today: string;
}

/** A range that holds what it stands for after rounding. */
const percentRange = ({ low, high }: Mastery) => ({ low: Math.floor(low * 100), high: Math.ceil(high * 100) });

/** One of a student's own topics: where it stands, how sure that is, and when it comes back. */
export function presentMyTopic({
  topic,
  subject,
  mastery,
  memories,
  paper,
  today,
  ...facts
}: MyTopicFacts): MyTopicDto {
  const standing = standingOf(mastery);
  const isKnown = mastery !== undefined && standing !== 'notStarted' && standing !== 'notEnough';
  const returns = facts.isAhead ? memories.flatMap((memory) => returnOn(memory, paper?.on ?? null, today) ?? []) : [];
  return {
    subject,
    topic: presentTopic(topic),
    standing,
    recallOnDay: isKnown ? recallPercent(mastery.mean) : null,
    range: mastery && standing !== 'notStarted' ? percentRange(mastery) : null,
    attempted: mastery?.attempted ?? 0,
    questions: mastery?.items ?? 0,
    lastPractisedOn:
      memories
        .map(({ lastOn }) => lastOn)
        .sort()
        .at(-1) ?? null,
    returnsOn: returns.sort()[0] ?? null,
    nextPaper: paper && { title: paper.title, on: paper.on, daysAway: daysBetween(today, paper.on) },
    isTaught: topic.isTaught,
    notBefore: topic.isTaught ? null : topic.notBefore,
    canPractise: facts.canPractise,
  };
}

/** What today's standing would mean in a paper. */
export const presentForecast = (
  { id, title, on, marks }: { id: string; title: string; on: string | null; marks: number },
  subject: SetItemDto['subject'],
  range: Forecast | null,
): PaperForecastDto => ({ paperId: id, subject, title, on, marks, range });
