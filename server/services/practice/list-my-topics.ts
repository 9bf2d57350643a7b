import type { z } from 'zod';
import { select } from '#server/db/scope.ts';
import { authorize } from '#server/policies/authorize.ts';
import { practicePolicy } from '#server/policies/practice-policy.ts';
import { presentSubject, presentTopic } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { recallPercent, standingOf, type TopicItem, topicRecall } from '#shared/domain/schedule/expected-recall.ts';
import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { MyTopicDto, myTopicListSchema } from '#shared/schemas/practice.ts';
import { loadNextPapers, type NextPaper } from './next-papers.ts';
import { loadSubjects, need, type TopicFact } from './study-facts.ts';

interface Row extends TopicFact {
  isTaught: boolean;
  questions: number;
  states: { stability: number; difficulty: number; lastOn: string }[];
}

const loadOwnTopics = ({ actor, today }: Scope) =>
  select<Row>(
    `SELECT t.id, t.number, t.title, c.subject_id AS "subjectId",
       bool_or(taught.id IS NOT NULL) AS "isTaught",
       count(DISTINCT q.id)::int AS questions,
       coalesce(jsonb_agg(DISTINCT jsonb_build_object('id', ms.question_id, 'stability', ms.stability,
         'difficulty', ms.difficulty, 'lastOn', ms.last_on)) FILTER (WHERE ms.question_id IS NOT NULL), '[]') AS states
     FROM enrolments e
     JOIN classes c ON c.id = e.class_id
     JOIN topics t ON t.specification_id = c.specification_id
       AND (t.tier IS NULL OR t.tier = e.tier) AND (t.option IS NULL OR t.option = e.option)
     LEFT JOIN topic_teachings taught ON taught.class_id = c.id AND taught.topic_id = t.id AND taught.taught_on <= $2
     LEFT JOIN question_topics qt ON qt.topic_id = t.id
     LEFT JOIN questions live ON live.id = qt.question_id
     LEFT JOIN question_versions v ON v.id = live.live_version_id AND (v.tier IS NULL OR v.tier = e.tier)
       AND (v.option IS NULL OR v.option = e.option)
     LEFT JOIN questions q ON q.id = v.question_id
     LEFT JOIN memory_states ms ON ms.user_id = e.user_id AND ms.question_id = q.id
     WHERE e.user_id = $1 AND e.valid_from <= $2 AND (e.valid_to IS NULL OR e.valid_to >= $2)
     GROUP BY t.id, t.number, t.title, t.position, c.subject_id
     ORDER BY t.position, t.id
     LIMIT 1000`,
    [actor.userId, today],
  );

function figures(row: Row, paper: NextPaper | undefined, { today, school: { seasonEndsOn } }: Scope) {
  const examOn = paper?.on ?? seasonEndsOn;
  const items: TopicItem[] = row.states.map((memory) => ({ memory, examOn }));
  const { onExamDay } = topicRecall(items, today);
  const returns = row.states.flatMap((memory) => returnOn(memory, paper?.on ?? null, today) ?? []).sort();
  const practised = row.states.map((memory) => memory.lastOn).sort();
  return {
    standing: standingOf(onExamDay),
    recall: onExamDay === null ? null : recallPercent(onExamDay),
    returnsOn: returns[0] ?? null,
    lastPractisedOn: practised.at(-1) ?? null,
  };
}

// Weak, then developing, then not started, then secure: what needs attention comes first.
const ORDER: Record<MyTopicDto['standing'], number> = { weak: 0, developing: 1, notStarted: 2, secure: 3 };

/** The acting student's topics with what they could expect to recall of each, weakest first. */
export async function listMyTopics(scope: Scope): Promise<z.output<typeof myTopicListSchema>> {
  authorize(practicePolicy, 'read', scope.actor, { userId: scope.actor.userId });
  const rows = await loadOwnTopics(scope);
  const subjects = await loadSubjects();
  const papers = await loadNextPapers(
    scope,
    rows.map((row) => row.id),
  );
  const items = rows.map((row): MyTopicDto => {
    const paper = papers.get(row.id);
    return {
      subject: presentSubject(need(subjects, row.subjectId)),
      topic: presentTopic(row),
      ...figures(row, paper, scope),
      attempted: row.states.length,
      questions: row.questions,
      nextPaper: paper ? { title: paper.title, on: paper.on, daysAway: daysBetween(scope.today, paper.on) } : null,
      isTaught: row.isTaught,
    };
  });
  items.sort((a, b) => ORDER[a.standing] - ORDER[b.standing] || (a.recall ?? 100) - (b.recall ?? 100));
  return { on: scope.today, items };
}
