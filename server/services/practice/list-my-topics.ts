import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { presentForecast, presentMyTopic, presentSubject } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { StudyContext } from '#shared/domain/schedule/context.ts';
import { forecastPaper } from '#shared/domain/schedule/forecast.ts';
import { canBeAsked } from '#shared/domain/schedule/select.ts';
import type { MyTopicDto, MyTopicListDto } from '#shared/schemas/my-topics.ts';
import type { Standing } from '#shared/schemas/standing.ts';
import { findOpenChosenSet } from './find-set.ts';
import { groupBy } from './group-by.ts';
import type { LoadedCandidate } from './load-candidates.ts';
import { loadMyPapers, loadMyTopics, type MyPaper, type MyTopic } from './load-my-topics.ts';
import { loadStudy } from './load-study.ts';
import { loadSubjects, need } from './study-facts.ts';

// Weak, then developing, secure, and last what cannot be said.
const ORDER: Record<Standing, number> = { weak: 0, developing: 1, secure: 2, notEnough: 3, notStarted: 4 };

const weakestFirst = (a: MyTopicDto, b: MyTopicDto): number =>
  ORDER[a.standing] - ORDER[b.standing] || (a.recallOnDay ?? 100) - (b.recallOnDay ?? 100);

const isTakenElsewhere = ({ waitsIn }: LoadedCandidate): boolean => waitsIn !== null && waitsIn !== 'chosen';

/** The first dated paper that examines a topic. @param papers soonest first, those without a sitting last */
function nextPaper({ marks }: MyTopic, papers: readonly MyPaper[]): { title: string; on: string } | null {
  const paper = papers.find(({ id }) => marks[id] !== undefined);
  return paper?.on ? { title: paper.title, on: paper.on } : null;
}

/** What today's standing would mean in one paper, on its own day or else on the season's last. */
const forecastOf = (paper: MyPaper, topics: readonly MyTopic[], context: StudyContext, seasonEndsOn: string) =>
  forecastPaper({
    marks: paper.marks,
    topics: topics.flatMap(({ id, marks }) =>
      marks[paper.id] === undefined
        ? []
        : [{ marks: marks[paper.id] ?? 0, mastery: context.masteryOn(id, paper.on ?? seasonEndsOn) }],
    ),
    recallElsewhere: context.recallInSubject(paper.subjectId),
    optimism: context.optimism,
  });

/** The acting student's topics with what they could expect to recall of each, weakest first, and what it would mean. */
export async function listMyTopics(scope: Scope): Promise<MyTopicListDto> {
  authorize(practicePolicy, 'read', scope.actor, { userId: scope.actor.userId });
  const { candidates, ...moment } = await loadStudy(scope);
  const topics = await loadMyTopics(scope);
  const papers = await loadMyPapers(scope);
  const subjects = await loadSubjects();
  const context = new StudyContext(candidates, moment);
  const byTopic = groupBy(candidates, ({ topicId }) => topicId);
  const items = topics.map((topic) => {
    const own = byTopic.get(topic.id) ?? [];
    return presentMyTopic({
      topic,
      subject: presentSubject(need(subjects, topic.subjectId)),
      mastery: context.masteries.get(topic.id),
      memories: own.flatMap(({ memory }) => memory ?? []),
      isAhead: own.some(({ examOn }) => examOn !== null),
      canPractise: own.some((candidate) => !isTakenElsewhere(candidate) && canBeAsked(candidate, context)),
      paper: nextPaper(topic, papers),
      today: scope.today,
    });
  });
  return {
    on: scope.today,
    items: items.sort(weakestFirst),
    papers: papers.map((paper) =>
      presentForecast(
        paper,
        presentSubject(need(subjects, paper.subjectId)),
        forecastOf(paper, topics, context, scope.school.seasonEndsOn),
      ),
    ),
    openSet: await findOpenChosenSet(scope),
    isTooHopeful: context.optimism > 0,
  };
}
