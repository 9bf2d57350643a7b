import { StudyContext, type StudyMoment } from '#shared/domain/schedule/context.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { type Mastery, recallPercent, standingOf } from '#shared/domain/schedule/mastery.ts';
import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import type { Study } from './load-study.ts';
import { type FoldedState, foldAnswers, type LoggedAnswer } from './rebuild-memory.ts';
import { byQuestion } from './student-log.ts';

type Change = Pick<SetSummaryDto['topics'][number], 'before' | 'after' | 'returnsOn'>;

/** States as they were before a set: each question's log folded without the set's own answers. */
const statesBefore = (
  log: readonly LoggedAnswer[],
  setId: string,
  { model }: StudyMoment,
): Map<string, FoldedState | null> =>
  new Map(
    [...byQuestion(log)].map(([questionId, answers]) => [
      questionId,
      foldAnswers(
        answers.filter((answer) => answer.set_id !== setId),
        model,
      ),
    ]),
  );

function standingIn(mastery: Mastery | undefined): Change['after'] {
  return mastery === undefined || mastery.attempted === 0
    ? null
    : { recallOnDay: recallPercent(mastery.mean), standing: standingOf(mastery) };
}

/**
 * How a set changed each of its topics, by what could be recalled on the day of its paper, and about when the first of
 * its questions comes back. @param log the answers to the questions that the set asked, the set's own included
 */
export function topicChanges(
  { candidates, ...moment }: Study,
  log: readonly LoggedAnswer[],
  setId: string,
): (topicId: string) => Change {
  const before = statesBefore(log, setId, moment);
  const earlier = candidates.map((candidate) => {
    const was = before.get(candidate.questionId);
    return was === undefined ? candidate : { ...candidate, memory: was, firstGrade: was?.firstGrade ?? null };
  });
  const [then, now] = [new StudyContext(earlier, moment), new StudyContext(candidates, moment)];
  return (topicId) => {
    const asked = candidates.filter(({ topicId: own, questionId }) => own === topicId && before.has(questionId));
    const returns = asked.flatMap(({ memory, paperId, examOn }) =>
      memory && examOn !== null ? (returnOn(memory, paperId && examOn, moment.today) ?? []) : [],
    );
    return {
      before: standingIn(then.masteries.get(topicId)),
      after: standingIn(now.masteries.get(topicId)),
      returnsOn: returns.sort()[0] ?? null,
    };
  };
}
