import { select } from '#server/db/scope.ts';
import type { PracticeSet } from '#server/models/practice-set.ts';
import { presentSubject, presentTopic } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { returnOn } from '#shared/domain/schedule/due.ts';
import { recallPercent, type TopicItem, topicRecall } from '#shared/domain/schedule/expected-recall.ts';
import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { bodyMarks } from '#shared/schemas/question-body.ts';
import { findSet } from './find-set.ts';
import { type LoadedItem, loadSetItems } from './load-set-items.ts';
import { loadNextPapers, type NextPaper } from './next-papers.ts';
import { foldAnswers, type LoggedAnswer, loadLog } from './rebuild-memory.ts';
import { secondsSoFar } from './show-set.ts';
import { loadSubjects, loadTopics, need } from './study-facts.ts';

/** Minutes of break after a session, and the longer one after every third of a day. Common practice. */
const BREAK_MINUTES = 10;
const LONG_BREAK_MINUTES = 20;
const LONG_BREAK_AFTER = 3;

interface TopicState {
  topic_id: string;
  question_id: string;
  stability: number;
  difficulty: number;
  last_on: string;
}

/** The student's memory states in these topics. */
const loadTopicStates = (userId: string, topicIds: string[]) =>
  select<TopicState>(
    `SELECT qt.topic_id, ms.question_id, ms.stability, ms.difficulty, to_char(ms.last_on, 'YYYY-MM-DD') AS last_on
     FROM question_topics qt JOIN memory_states ms ON ms.question_id = qt.question_id
     WHERE ms.user_id = $1 AND qt.topic_id = ANY($2)`,
    [userId, topicIds],
  );

const groupBy = <T, K>(rows: readonly T[], key: (row: T) => K): Map<K, T[]> => {
  const groups = new Map<K, T[]>();
  for (const row of rows) groups.set(key(row), [...(groups.get(key(row)) ?? []), row]);
  return groups;
};

interface Before {
  stability: number;
  difficulty: number;
  lastOn: string;
}

/** Each answered question's memory as it was before this set: its log folded without the set's own answers. */
const memoriesBefore = (log: readonly LoggedAnswer[], setId: string): Map<string, Before | null> =>
  new Map(
    [...groupBy(log, (answer) => answer.question_id)].map(([questionId, answers]) => [
      questionId,
      foldAnswers(answers.filter((answer) => answer.set_id !== setId)),
    ]),
  );

interface TopicFacts {
  states: readonly TopicState[];
  before: ReadonlyMap<string, Before | null>;
  scope: Scope;
  paper: NextPaper | undefined;
}

/** Expected recall of a topic, in percent, before the set and after it, and about when the first of it comes back. */
function topicChange({ states, before, scope: { today, school }, paper }: TopicFacts) {
  const examOn = paper?.on ?? school.seasonEndsOn;
  const after: TopicItem[] = states.map((state) => ({
    memory: { stability: state.stability, difficulty: state.difficulty, lastOn: state.last_on },
    examOn,
  }));
  const earlier: TopicItem[] = states.flatMap((state, index) => {
    const was = before.get(state.question_id);
    if (was === undefined) return after[index] ? [after[index]] : [];
    return was === null ? [] : [{ memory: was, examOn }];
  });
  const percent = (items: TopicItem[]) => {
    const { now } = topicRecall(items, today);
    return now === null ? null : recallPercent(now);
  };
  const returns = states
    .filter((state) => before.has(state.question_id))
    .flatMap((state) => {
      const memory = { stability: state.stability, difficulty: state.difficulty, lastOn: state.last_on };
      return returnOn(memory, paper?.on ?? null, today) ?? [];
    })
    .sort();
  return { recallBefore: percent(earlier), recallAfter: percent(after), returnsOn: returns[0] ?? null };
}

interface ItemMarks {
  item: LoadedItem;
  marks: number | null;
}

async function loadItemMarks(items: readonly LoadedItem[]): Promise<ItemMarks[]> {
  const rows = await select<{ set_item_id: string; marks: number | null }>(
    `SELECT a.set_item_id, m.marks FROM answers a
     LEFT JOIN LATERAL (SELECT e.marks FROM mark_events e WHERE e.answer_id = a.id
                        ORDER BY e.sequence DESC LIMIT 1) m ON true
     WHERE a.set_item_id = ANY($1)`,
    [items.map((item) => item.id)],
  );
  const answered = new Map(rows.map((row) => [row.set_item_id, row.marks]));
  return items.filter((item) => answered.has(item.id)).map((item) => ({ item, marks: answered.get(item.id) ?? null }));
}

const countFinishedToday = async (scope: Scope): Promise<number> => {
  const [row] = await select<{ count: number }>(
    'SELECT count(*)::int AS count FROM sets WHERE user_id = $1 AND set_on = $2 AND finished_at IS NOT NULL',
    [scope.actor.userId, scope.today],
  );
  return row?.count ?? 0;
};

async function summarise(scope: Scope, set: PracticeSet): Promise<SetSummaryDto> {
  const items = await loadSetItems(set.id);
  const answered = await loadItemMarks(items);
  const topicIds = [...new Set(answered.map(({ item }) => item.topic_id))];
  const subjects = await loadSubjects();
  const topics = await loadTopics(topicIds);
  const papers = await loadNextPapers(scope, topicIds);
  const states = groupBy(await loadTopicStates(scope.actor.userId, topicIds), (state) => state.topic_id);
  const log = await loadLog(
    scope.actor.userId,
    answered.map(({ item }) => item.question_id),
  );
  const before = memoriesBefore(log, set.id);
  const sum = (rows: ItemMarks[]) => rows.reduce((total, { marks }) => total + (marks ?? 0), 0);
  const most = (rows: ItemMarks[]) => rows.reduce((total, { item }) => total + bodyMarks(item.body), 0);
  const finishedToday = await countFinishedToday(scope);
  return {
    id: set.id,
    kind: set.kind,
    on: set.setOn,
    answered: answered.length,
    marks: sum(answered),
    maxMarks: most(answered),
    minutes: Math.max(1, Math.round((await secondsSoFar(set.id)) / 60)),
    unused: items.length - answered.length,
    items: answered.map(({ item, marks }) => ({
      setItemId: item.id,
      subject: presentSubject(need(subjects, item.subject_id)),
      marks,
      maxMarks: bodyMarks(item.body),
    })),
    topics: [...groupBy(answered, ({ item }) => item.topic_id)].map(([topicId, rows]) => {
      const topic = need(topics, topicId);
      const facts = { states: states.get(topicId) ?? [], before, scope, paper: papers.get(topicId) };
      return {
        subject: presentSubject(need(subjects, topic.subjectId)),
        topic: presentTopic(topic),
        marks: sum(rows),
        maxMarks: most(rows),
        ...topicChange(facts),
      };
    }),
    breakMinutes: finishedToday > 0 && finishedToday % LONG_BREAK_AFTER === 0 ? LONG_BREAK_MINUTES : BREAK_MINUTES,
  };
}

/** How one of one's own sets went so far. @throws Problem 404 */
export const showSummary = async (scope: Scope, id: string): Promise<SetSummaryDto> =>
  summarise(scope, await findSet(scope, id));

/** Closes a set: what was not asked returns to the pool. Closing it again changes nothing. @throws Problem 404 */
export async function finishSet(scope: Scope, id: string): Promise<SetSummaryDto> {
  const set = await findSet(scope, id, true);
  if (!set.finishedAt) await set.update({ finishedAt: scope.now });
  return summarise(scope, set);
}
