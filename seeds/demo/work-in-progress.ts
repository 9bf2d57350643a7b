import type { QuestionContent, TopicContent } from '#seeds/demo/content/build.ts';
import type { DraftBody } from '#shared/schemas/question.ts';

/**
 * Where a question of the bank stands. `revised`: live, with a new version in review. `sentBack`: a draft that came
 * back from review. `started`: a draft half written.
 */
export type Stage = 'live' | 'revised' | 'inReview' | 'started' | 'sentBack';

/** Stages other than live, one question of a subject each: enough for its review queue and drafts to have something. */
const IN_PROGRESS: Stage[] = ['inReview', 'started', 'inReview', 'sentBack', 'revised'];

/** The last question of each of the topics with most of them, so that no topic runs short of live ones. */
export function stagesOf(topics: readonly TopicContent[]): Map<QuestionContent, Stage> {
  const fullest = topics
    .map((topic, index) => ({ topic, index }))
    .sort((a, b) => b.topic.questions.length - a.topic.questions.length || a.index - b.index);
  return new Map(
    IN_PROGRESS.flatMap((stage, index) => {
      const last = fullest[index]?.topic.questions.at(-1);
      return last ? [[last, stage]] : [];
    }),
  );
}

const withoutGuidance = ({ guidance: _, ...rest }: DraftBody): DraftBody => rest;

/** A live question's next wording: the guidance says a little more. */
export function asRevised(body: DraftBody): DraftBody {
  const more = 'Before moving on, count the marks and check that the answer makes as many points.';
  return { ...body, guidance: body.guidance ? `${body.guidance}\n\n${more}` : more };
}

/** Only the wording and the first mark point are there yet. */
export const asStarted = (body: DraftBody): DraftBody => ({
  ...withoutGuidance(body),
  parts: body.parts.map((part) => ({ ...part, points: part.points.slice(0, 1), modelAnswer: '' })),
});

/** Back with its author for want of guidance. */
export const asSentBack = (body: DraftBody): { body: DraftBody; comment: string } => ({
  body: withoutGuidance(body),
  comment: 'Reads well. Please add a line of guidance on where marks usually go, then send it again.',
});
