import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { aStudent } from '#seeds/factories/people.ts';
import { aStudy } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { runNightly } from '#server/jobs/nightly.ts';
import { rebuildMemory } from '#server/services/practice/rebuild-memory.ts';
import { rebuildStudent, studentsWithMemory } from '#server/services/practice/rebuild-student.ts';
import { takeTurn } from '#server/services/practice/take-turn.ts';
import { verifyLog } from '#server/services/practice/verify-log.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { allRows } from '#tests/support/as-role.ts';
import { AFTERWARDS, aDriftingStudy } from '#tests/support/drifting.ts';
import { logAnswers } from '#tests/support/log-answers.ts';
import { anAnswer, openSet } from '#tests/support/practise.ts';

const app = testApp();

const rebuild = (schoolId: string, userId: string) => withSchool(schoolId, (scope) => rebuildStudent(scope, userId));
const faults = async (schoolId: string) => (await withSchool(schoolId, verifyLog)).faults;
const stored = (schoolId: string) =>
  withSchool(schoolId, async () =>
    (await select<{ row: string }>('SELECT ms::text AS row FROM memory_states ms ORDER BY user_id, question_id')).map(
      ({ row }) => row,
    ),
  );

/** The school's weights from now on, as if fitted and adopted: memories grow half as fast. */
const adopt = (schoolId: string) =>
  withSchool(schoolId, ({ now }) =>
    execute(
      `INSERT INTO memory_models (school_id, id, version, weights, attempts, log_loss_before, log_loss_after, drift,
         is_adopted, fitted_at)
       VALUES ($1, $2, 1, $3, 1000, 0.6, 0.5, -0.1, true, $4)`,
      [schoolId, randomUUID(), DEFAULT_MODEL.weights.map((weight, index) => (index === 8 ? 1 : weight)), now],
    ),
  );

/** A promise and what keeps it. */
function withResolvers() {
  let resolve: () => void = () => undefined;
  const promise = new Promise<void>((done) => {
    resolve = done;
  });
  return { promise, resolve };
}

const modelIds = (schoolId: string) =>
  withSchool(schoolId, () => select<{ model_id: string | null }>('SELECT model_id FROM student_models'));

test('scrambled, lost and made-up states are put right, to the byte', async () => {
  const { school, student, subjects } = await aDriftingStudy(8, 6);
  expect(await rebuild(school.id, student.id)).toEqual({ states: 8, changed: 8 });
  const before = await stored(school.id);
  expect(before).toHaveLength(8);

  await withSchool(school.id, async ({ schoolId }) => {
    await execute(
      `UPDATE memory_states SET stability = stability * 1.0000001, attempts = attempts + 1
       WHERE question_id IN (SELECT question_id FROM memory_states ORDER BY question_id LIMIT 3)`,
    );
    await execute(
      'DELETE FROM memory_states WHERE question_id IN (SELECT max(question_id::text)::uuid FROM memory_states)',
    );
    // A memory of the question that the student was never asked.
    await execute(
      `INSERT INTO memory_states (school_id, user_id, question_id, stability, difficulty, last_on, attempts, first_grade,
         last_grade, last_share)
       SELECT $1, $2, q.id, 4, 5, '2027-01-01', 1, 3, 3, 1 FROM questions q
       WHERE NOT EXISTS (SELECT FROM answers a WHERE a.question_id = q.id)`,
      [schoolId, student.id],
    );
  });
  expect((await faults(school.id)).length).toBe(5);

  expect(await withSchool(school.id, studentsWithMemory)).toEqual([student.id]);
  expect(await rebuild(school.id, student.id)).toEqual({ states: 8, changed: 5 });
  expect(await stored(school.id)).toEqual(before);
  expect(await rebuild(school.id, student.id)).toEqual({ states: 8, changed: 0 });
  expect(await faults(school.id)).toEqual([]);
  expect(subjects).toHaveLength(1);
});

test('a state that nobody’s log bears out is found and removed', async () => {
  const { school, student } = await aStudy({ subjects: 1, topics: 1, questions: 1 });
  await withSchool(school.id, ({ schoolId }) =>
    execute(
      `INSERT INTO memory_states (school_id, user_id, question_id, stability, difficulty, last_on, attempts, first_grade,
         last_grade, last_share)
       SELECT $1, $2, id, 4, 5, '2027-01-01', 1, 3, 3, 1 FROM questions`,
      [schoolId, student.id],
    ),
  );
  expect(await withSchool(school.id, studentsWithMemory)).toEqual([student.id]);
  expect(await rebuild(school.id, student.id)).toEqual({ states: 0, changed: 1 });
  expect(await stored(school.id)).toEqual([]);
});

test('a rebuild waits for the answer in hand, and takes it in', async () => {
  const { school, student, subjects } = await aDriftingStudy(2, 3);
  const [subject] = subjects;
  const topicId = subject?.topicIds[0];
  const [asked] = await withSchool(school.id, () =>
    select<{ id: string; versionId: string }>(
      'SELECT question_id AS id, question_version_id AS "versionId" FROM answers',
    ),
  );
  if (!subject || !topicId || !asked) throw new Error('the study has no answer');
  const waiting = () =>
    allRows<{ n: number }>(
      'SELECT count(*)::int AS n FROM pg_stat_activity WHERE datname = current_database() AND cardinality(pg_blocking_pids(pid)) > 0',
    );
  await adopt(school.id);
  const begun = withResolvers();
  const answering = withSchool(school.id, async ({ schoolId }) => {
    await takeTurn(student.id);
    begun.resolve();
    await expect.poll(waiting, { interval: 20, timeout: 1500 }).toEqual([{ n: 1 }]);
    await logAnswers(school, subject, topicId, [{ studentId: student.id, question: asked, on: '2027-05-01' }]);
    await rebuildMemory(schoolId, student.id, asked.id);
  });
  await begun.promise;
  await Promise.all([answering, rebuild(school.id, student.id)]);
  expect(await faults(school.id)).toEqual([]);
  const [row] = await withSchool(school.id, () =>
    select<{ attempts: number }>('SELECT attempts FROM memory_states WHERE question_id = $1', [asked.id]),
  );
  expect(row?.attempts).toBe(4);
});

test('answers that arrive while a new model is brought in leave no fault', async () => {
  const study = await aStudy({ subjects: 1, topics: 2, questions: 8 });
  const { school, student } = study;
  const agent = await signedInAs(app, student);
  const set = await openSet(agent);
  const items = set.items.filter(({ question }) => question.kind === 'shortAnswer');
  const send = async (from: number, to: number) => {
    for (const item of items.slice(from, to)) {
      await agent.post(`/api/sets/${set.id}/answers`).send(anAnswer(item)).expect(200);
    }
  };
  await send(0, 4);
  await adopt(school.id);
  // What is answered before the rebuild still folds by the old weights, what comes after it by the new.
  await Promise.all([send(4, items.length), runNightly(school.id, { optimise: null })]);
  expect(items.length).toBeGreaterThan(6);
  expect((await modelIds(school.id)).map(({ model_id }) => model_id)).not.toContain(null);
  expect(await stored(school.id)).toHaveLength(items.length);
  expect(await faults(school.id)).toEqual([]);
});

test('work that is cut short goes on at the next run, and states agree with their model all along', async () => {
  const { school, subjects } = await aDriftingStudy(4, 4);
  const [subject] = subjects;
  const topicId = subject?.topicIds[0];
  const [question] = await withSchool(school.id, () =>
    select<{ id: string; versionId: string }>(
      `SELECT q.id, q.live_version_id AS "versionId" FROM questions q
       WHERE EXISTS (SELECT FROM answers a WHERE a.question_id = q.id)`,
    ),
  );
  if (!subject || !topicId || !question) throw new Error('the study has no question');
  const students = [await aStudent(school), await aStudent(school)];
  await logAnswers(
    school,
    subject,
    topicId,
    students.flatMap(({ id: studentId }) => [
      { studentId, question, on: '2027-01-04' },
      { studentId, question, on: '2027-01-20' },
    ]),
  );
  for (const id of await withSchool(school.id, studentsWithMemory)) await rebuild(school.id, id);
  await adopt(school.id);

  const stop = new AbortController();
  const { signal } = stop;
  const throwIfAborted = signal.throwIfAborted.bind(signal);
  const rebuilt = async () => (await modelIds(school.id)).filter(({ model_id }) => model_id !== null).length;
  // Stops as the server would, between two students: three are checked, of three one is rebuilt.
  const steps = ['whom to check', 'check', 'check', 'check', 'drift', 'whom to rebuild', 'rebuild'];
  signal.throwIfAborted = () => {
    if (steps.shift() === undefined) stop.abort(new Error('stopping'));
    throwIfAborted();
  };
  await expect(runNightly(school.id, { optimise: null, now: AFTERWARDS, signal })).rejects.toThrow('stopping');
  expect(await rebuilt()).toBe(1);
  expect(await faults(school.id)).toEqual([]);

  expect((await runNightly(school.id, { optimise: null, now: AFTERWARDS })).rebuilt).toBe(2);
  expect(await rebuilt()).toBe(3);
  expect(await faults(school.id)).toEqual([]);
});
