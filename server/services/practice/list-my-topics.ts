import type { z } from 'zod';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { presentSubject, presentTopic } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { recallPercent, standingOf, topicRecall } from '#shared/domain/schedule/expected-recall.ts';
import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { MyTopicDto, myTopicListSchema } from '#shared/schemas/practice.ts';
import { loadTopicStates, type TopicStates } from './load-topic-states.ts';
import { loadNextPapers } from './next-papers.ts';
import { loadSubjects, need } from './study-facts.ts';

const percent = (recalled: number | null): number | null => (recalled === null ? null : recallPercent(recalled));

function figures({ states, examOn, isAhead }: TopicStates, { today, school }: Scope) {
  const recalled = topicRecall(
    states.map((memory) => ({ memory, examOn: examOn ?? school.seasonEndsOn })),
    today,
  );
  const returns = isAhead ? states.flatMap((memory) => returnOn(memory, examOn, today) ?? []).sort() : [];
  const practised = states.map((memory) => memory.lastOn).sort();
  return {
    standing: standingOf(recalled.onExamDay),
    recallNow: percent(recalled.now),
    recallOnDay: percent(recalled.onExamDay),
    returnsOn: returns[0] ?? null,
    lastPractisedOn: practised.at(-1) ?? null,
  };
}

// Weak, then developing, then not started, then secure: what needs attention comes first.
const ORDER: Record<MyTopicDto['standing'], number> = { weak: 0, developing: 1, notStarted: 2, secure: 3 };

/** The acting student's topics with what they could expect to recall of each, weakest first. */
export async function listMyTopics(scope: Scope): Promise<z.output<typeof myTopicListSchema>> {
  authorize(practicePolicy, 'read', scope.actor, { userId: scope.actor.userId });
  const topics = await loadTopicStates(scope);
  const subjects = await loadSubjects();
  const papers = await loadNextPapers(
    scope,
    topics.map((topic) => topic.id),
  );
  const items = topics.map((topic): MyTopicDto => {
    const paper = papers.get(topic.id);
    return {
      subject: presentSubject(need(subjects, topic.subjectId)),
      topic: presentTopic(topic),
      ...figures(topic, scope),
      attempted: topic.states.length,
      questions: topic.questions,
      nextPaper: paper ? { title: paper.title, on: paper.on, daysAway: daysBetween(scope.today, paper.on) } : null,
      isTaught: topic.isTaught,
    };
  });
  items.sort((a, b) => ORDER[a.standing] - ORDER[b.standing] || (a.recallOnDay ?? 100) - (b.recallOnDay ?? 100));
  return { on: scope.today, items };
}
