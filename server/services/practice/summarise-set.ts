import { select } from '#server/db/scope.ts';
import type { PracticeSet } from '#server/models/practice-set.ts';
import { presentSubject, presentTopic } from '#server/presenters/practice.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { SetSummaryDto } from '#shared/schemas/practice.ts';
import { bodyMarks } from '#shared/schemas/question-body.ts';
import { changeSet, findSet } from './find-set.ts';
import { groupBy } from './group-by.ts';
import { type LoadedItem, loadSetItems } from './load-set-items.ts';
import { loadStudy } from './load-study.ts';
import { loadLog } from './rebuild-memory.ts';
import { secondsSoFar } from './show-set.ts';
import { loadSubjects, loadTopics, need } from './study-facts.ts';
import { NEWEST_MARK } from './study-sql.ts';
import { topicChanges } from './topic-change.ts';

/** Minutes of break after a session, and the longer one after every third of a day. Common practice. */
const BREAK_MINUTES = 10;
const LONG_BREAK_MINUTES = 20;
const LONG_BREAK_AFTER = 3;

interface ItemMarks {
  item: LoadedItem;
  /** Null while the answer waits for its student's marking. */
  marks: number | null;
}

async function loadItemMarks(items: readonly LoadedItem[]): Promise<ItemMarks[]> {
  const rows = await select<{ set_item_id: string; marks: number | null }>(
    `SELECT a.set_item_id, m.marks FROM answers a ${NEWEST_MARK} WHERE a.set_item_id = ANY($1)`,
    [items.map((item) => item.id)],
  );
  const answered = new Map(rows.map((row) => [row.set_item_id, row.marks]));
  return items.filter((item) => answered.has(item.id)).map((item) => ({ item, marks: answered.get(item.id) ?? null }));
}

/** Marks earned and available over the answers that are marked. */
const sumMarks = (rows: readonly ItemMarks[]): { marks: number; maxMarks: number } => {
  const marked = rows.filter(({ marks }) => marks !== null);
  return {
    marks: marked.reduce((sum, { marks }) => sum + (marks ?? 0), 0),
    maxMarks: marked.reduce((sum, { item }) => sum + bodyMarks(item.body), 0),
  };
};

async function breakMinutes({ actor, today }: Scope): Promise<number> {
  const [row] = await select<{ count: number }>(
    'SELECT count(*)::int AS count FROM sets WHERE user_id = $1 AND set_on = $2 AND finished_at IS NOT NULL',
    [actor.userId, today],
  );
  const finished = row?.count ?? 0;
  return finished > 0 && finished % LONG_BREAK_AFTER === 0 ? LONG_BREAK_MINUTES : BREAK_MINUTES;
}

async function summarise(scope: Scope, set: PracticeSet): Promise<SetSummaryDto> {
  const items = await loadSetItems(set.id);
  const answered = await loadItemMarks(items);
  const byTopic = groupBy(answered, ({ item }) => item.topic_id);
  const subjects = await loadSubjects();
  const topics = await loadTopics(byTopic.keys());
  const study = await loadStudy(scope);
  const log = await loadLog(
    scope.actor.userId,
    answered.map(({ item }) => item.question_id),
  );
  const changeOf = topicChanges(study, log, set.id);
  return {
    id: set.id,
    kind: set.kind,
    on: set.setOn,
    answered: answered.length,
    waiting: answered.filter(({ marks }) => marks === null).length,
    ...sumMarks(answered),
    minutes: Math.max(1, Math.round((await secondsSoFar(set.id)) / 60)),
    unused: items.length - answered.length,
    items: answered.map(({ item, marks }) => ({
      setItemId: item.id,
      subject: presentSubject(need(subjects, item.subject_id)),
      marks,
      maxMarks: bodyMarks(item.body),
    })),
    topics: [...byTopic].map(([topicId, rows]) => {
      const topic = need(topics, topicId);
      return {
        subject: presentSubject(need(subjects, topic.subjectId)),
        topic: presentTopic(topic),
        ...sumMarks(rows),
        ...changeOf(topicId),
      };
    }),
    breakMinutes: await breakMinutes(scope),
  };
}

/** How one of one's own sets went so far. @throws Problem 404 */
export const showSummary = async (scope: Scope, id: string): Promise<SetSummaryDto> =>
  summarise(scope, await findSet(scope, id));

/** Closes a set: what was not asked returns to the pool. Closing it again changes nothing. @throws Problem 404 */
export async function finishSet(scope: Scope, id: string): Promise<SetSummaryDto> {
  const set = await changeSet(scope, id);
  if (!set.finishedAt) await set.update({ finishedAt: scope.now });
  return summarise(scope, set);
}
