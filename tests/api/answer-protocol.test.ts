import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { aStudent } from '#seeds/factories/people.ts';
import { aStudy } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { verifyLog } from '#server/services/practice/verify-log.ts';
import type { HandIn, SetDto } from '#shared/schemas/practice.ts';
import { signedInAs, testApp } from '#tests/support/app.ts';
import { anAnswer, openSet } from '#tests/support/practise.ts';

const app = testApp();
const study = await aStudy({ subjects: 2, topics: 1, questions: 4 });

/** A student of the same classes, so that every run meets the same questions. */
async function aClassmate() {
  const student = await aStudent(study.school);
  await withSchool(study.school.id, async () => {
    for (const { classId } of study.subjects) {
      await execute(
        `INSERT INTO enrolments (school_id, id, class_id, user_id, valid_from) VALUES ($1, $2, $3, $4, '2020-01-01')`,
        [study.school.id, randomUUID(), classId, student.id],
      );
    }
  });
  return student;
}

const numberItems = (set: SetDto) => set.items.filter((item) => item.question.kind === 'shortAnswer');

const statesOf = (userId: string) =>
  withSchool(study.school.id, () =>
    select(
      `SELECT question_id, stability, difficulty, last_on, attempts, last_grade, last_share
       FROM memory_states WHERE user_id = $1 ORDER BY question_id`,
      [userId],
    ),
  );

// Right and wrong in turn, the same for every student.
const answersFor = (set: SetDto): HandIn[] =>
  numberItems(set)
    .sort((a, b) => a.question.number - b.question.number)
    .map((item, index) =>
      anAnswer(item, { responses: [index % 2 ? '42' : '7'], howSure: index % 3 ? 'certain' : 'guess' }),
    );

/** Delivers answers in this order, repeats included, then everything once more: as a page does that lost its replies. */
async function practise(order: number[]): Promise<string> {
  const student = await aClassmate();
  const agent = await signedInAs(app, student);
  const set = await openSet(agent);
  const answers = answersFor(set);
  const deliveries = [...order.map((index) => answers[index % answers.length]), ...answers];
  for (const answer of deliveries) await agent.post(`/api/sets/${set.id}/answers`).send(answer).expect(200);
  return student.id;
}

test('answers repeated, reordered and sent again leave the states of the run in order', async () => {
  const inOrder = await statesOf(await practise([]));
  expect(inOrder.length).toBe(6);
  await fc.assert(
    fc.asyncProperty(fc.array(fc.nat({ max: 20 }), { maxLength: 12 }), async (order) => {
      expect(await statesOf(await practise(order))).toEqual(inOrder);
    }),
    { numRuns: 12 },
  );
  const report = await withSchool(study.school.id, verifyLog);
  expect(report.faults).toEqual([]);
});

test('an answer kept on the device counts on the day it was given, held to the life of its set', async () => {
  const student = await aClassmate();
  const agent = await signedInAs(app, student);
  const set = await openSet(agent);
  await withSchool(study.school.id, () =>
    execute(`UPDATE sets SET opened_at = opened_at - interval '3 days' WHERE id = $1`, [set.id]),
  );
  const [first, second] = numberItems(set);
  if (!first || !second) throw new Error('the set is too small');
  const day = 24 * 3600 * 1000;
  await agent
    .post(`/api/sets/${set.id}/answers`)
    .send(anAnswer(first, { ageMs: 2 * day }))
    .expect(200);
  await agent
    .post(`/api/sets/${set.id}/answers`)
    .send(anAnswer(second, { ageMs: 40 * day }))
    .expect(200);
  const rows = await withSchool(study.school.id, () =>
    select<{ days: number; is_late: boolean }>(
      `SELECT round(extract(epoch FROM received_at - given_at) / 86400)::int AS days, is_late
       FROM answers WHERE user_id = $1 ORDER BY days`,
      [student.id],
    ),
  );
  expect(rows).toEqual([
    { days: 2, is_late: true },
    { days: 3, is_late: true },
  ]);
});

test('a scrambled state is found, and folding the log again mends it', async () => {
  const userId = await practise([]);
  const before = await statesOf(userId);
  await withSchool(study.school.id, () =>
    execute('UPDATE memory_states SET stability = stability + 1 WHERE user_id = $1', [userId]),
  );
  const broken = await withSchool(study.school.id, verifyLog);
  expect(broken.faults.length).toBe(before.length);
  const { rebuildMemory } = await import('#server/services/practice/rebuild-memory.ts');
  await withSchool(study.school.id, async ({ schoolId }) => {
    const rows = await select<{ question_id: string }>('SELECT question_id FROM memory_states WHERE user_id = $1', [
      userId,
    ]);
    for (const row of rows) await rebuildMemory(schoolId, userId, row.question_id);
  });
  expect(await statesOf(userId)).toEqual(before);
  expect((await withSchool(study.school.id, verifyLog)).faults).toEqual([]);
});
