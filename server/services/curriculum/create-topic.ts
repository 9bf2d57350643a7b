import { Transaction } from 'sequelize';
import { execute, select } from '#server/db/scope.ts';
import { type FieldError, notFound, Problem, unprocessable } from '#server/errors.ts';
import { Specification } from '#server/models/specification.ts';
import { Topic } from '#server/models/topic.ts';
import { authorize } from '#server/policies/authorize.ts';
import { subjectPolicy } from '#server/policies/subject-policy.ts';
import { presentTopic } from '#server/presenters/topic.ts';
import { recordAudit } from '#server/services/audit/record-audit.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { CreateTopic, TopicDto } from '#shared/schemas/curriculum.ts';
import { loadTopics } from './load-topics.ts';

const byNumber = new Intl.Collator('en', { numeric: true });

interface Place {
  topics: Topic[];
  /** Marks of each paper of the specification. */
  paperMarks: ReadonlyMap<string, number>;
}

const isSame = (stored: Topic, input: CreateTopic): boolean =>
  stored.specificationId === input.specificationId &&
  stored.number === input.number &&
  stored.title === input.title &&
  stored.parentId === input.parentId &&
  stored.tier === input.tier &&
  stored.option === input.option;

function faultsOf({ number, parentId, weights }: CreateTopic, { topics, paperMarks }: Place): FieldError[] {
  const faults: FieldError[] = [];
  if (topics.some((topic) => topic.number === number)) {
    faults.push({ pointer: '#/number', detail: `There is a topic ${number} already.` });
  }
  if (parentId !== null && !topics.some((topic) => topic.id === parentId)) {
    faults.push({ pointer: '#/parentId', detail: 'Choose a topic of the same specification.' });
  }
  weights.forEach(({ paperId, marks }, at) => {
    const isDouble = weights.findIndex((weight) => weight.paperId === paperId) < at;
    if (isDouble || !paperMarks.has(paperId)) {
      const detail = isDouble ? 'Give each paper once.' : 'Choose a paper of the same specification.';
      faults.push({ pointer: `#/weights/${at}/paperId`, detail });
    }
    const most = paperMarks.get(paperId) ?? marks;
    if (marks > most) faults.push({ pointer: `#/weights/${at}/marks`, detail: `The paper has ${most} marks in all.` });
  });
  return faults;
}

/** Makes room where the number belongs among its neighbours. @returns the place in the specification's order */
async function makeRoom(specificationId: string, number: string, topics: Topic[]): Promise<number> {
  const after = topics.find((topic) => byNumber.compare(topic.number, number) > 0);
  if (!after) return Math.max(0, ...topics.map((topic) => topic.position)) + 1;
  await execute('UPDATE topics SET position = position + 1 WHERE specification_id = $1 AND position >= $2', [
    specificationId,
    after.position,
  ]);
  return after.position;
}

async function present({ actor }: Scope, subjectId: string, id: string): Promise<TopicDto> {
  const [row] = await loadTopics(actor, subjectId, id);
  if (!row) throw notFound();
  return presentTopic(row);
}

/**
 * Adds a topic to a specification. The client makes the id: the same request again gives the stored topic.
 * @throws Problem 404, 403; 409 `duplicate` for the same id with another topic; 422 at the field
 */
export async function createTopic(scope: Scope, subjectId: string, input: CreateTopic): Promise<TopicDto> {
  const { actor } = scope;
  const { id, specificationId, parentId, number, title, tier, option, weights } = input;
  authorize(subjectPolicy, 'manageTopics', actor, { subjectId });
  // One at a time within a specification: numbers are unique there, and the order has no doubles.
  const lock = Transaction.LOCK.NO_KEY_UPDATE;
  const specification = await Specification.findOne({ where: { id: specificationId, subjectId }, lock });
  if (!specification) {
    throw unprocessable([{ pointer: '#/specificationId', detail: 'Choose a specification of this subject.' }]);
  }
  const stored = await Topic.findByPk(id);
  if (stored && isSame(stored, input)) return present(scope, subjectId, id);
  if (stored) throw new Problem(409, 'duplicate', 'Another topic was already saved under this id.');

  const topics = await Topic.findAll({ where: { specificationId, mergedIntoId: null }, order: [['position', 'ASC']] });
  const papers = await select<{ id: string; marks: number }>(
    'SELECT id, marks FROM papers WHERE specification_id = $1',
    [specificationId],
  );
  const faults = faultsOf(input, { topics, paperMarks: new Map(papers.map((paper) => [paper.id, paper.marks])) });
  if (faults.length > 0) throw unprocessable(faults);

  const position = await makeRoom(specificationId, number, topics);
  await Topic.create({ id, specificationId, parentId, number, title, tier, option, position });
  await execute(
    `INSERT INTO topic_weights (school_id, id, topic_id, paper_id, marks)
     SELECT app.current_school(), gen_random_uuid(), $1, w.paper_id, w.marks
     FROM unnest($2::uuid[], $3::int[]) AS w (paper_id, marks)`,
    [id, weights.map((weight) => weight.paperId), weights.map((weight) => weight.marks)],
  );
  await recordAudit(actor, 'create-topic', 'topic', id, 'done');
  return present(scope, subjectId, id);
}
