import { decidedPoints } from '#shared/domain/marking/asked-question.ts';
import { nextWords } from '#shared/domain/schedule/next-words.ts';
import { reasonWords } from '#shared/domain/schedule/reason.ts';
import type { HowSure } from '#shared/schemas/how-sure.ts';
import type { MarkedPart } from '#shared/schemas/marked-part.ts';
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
