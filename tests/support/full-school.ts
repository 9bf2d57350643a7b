import { randomUUID } from 'node:crypto';
import type { Express } from 'express';
import { aSitting, aTopic } from '#seeds/factories/curriculum.ts';
import { aCarer } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import { DEFAULT_MODEL } from '#shared/domain/schedule/memory.ts';
import { signedInAs } from './app.ts';
import { anAnswer, itemOf, openSet } from './practise.ts';

/** A small school with at least one row in every table that belongs to a school. */
export async function aFullSchool(app: Express): Promise<Study> {
  const study = await aStudy();
  const { school, student, subjects } = study;
  const [subject] = subjects;
  if (!subject) throw new Error('the study has no subject');
  await aSitting(school, subject, { on: '2099-05-14' });
  const carer = await aCarer(school);
  await aQuestion(school, subject, { author: subject.teacher, topicId: subject.topicIds[0] ?? '', status: 'draft' });
  const modelId = randomUUID();
  const topicIds = [(await aTopic(school, subject)).id, (await aTopic(school, subject)).id].sort();
  const rows: [sql: string, values: unknown[]][] = [
    [
      'INSERT INTO tutor_groups (school_id, id, year_group_id, name) VALUES ($1, $2, $3, $4)',
      [school.yearGroupId, '11K'],
    ],
    ['INSERT INTO carer_links (school_id, id, carer_id, student_id) VALUES ($1, $2, $3, $4)', [carer.id, student.id]],
    [
      'INSERT INTO access_arrangements (school_id, id, user_id, extra_time_percent) VALUES ($1, $2, $3, $4)',
      [student.id, 25],
    ],
    ['INSERT INTO confusable_topics (school_id, id, topic_id, other_topic_id) VALUES ($1, $2, $3, $4)', topicIds],
  ];
  await withSchool(school.id, async () => {
    for (const [sql, values] of rows) await execute(sql, [school.id, randomUUID(), ...values]);
    await execute(
      `INSERT INTO class_questions (school_id, id, class_id, question_id, choice, chosen_by, chosen_at)
       SELECT $1, $2, $3, id, 'excluded', $4, now() FROM questions WHERE live_version_id IS NULL LIMIT 1`,
      [school.id, randomUUID(), subject.classId, subject.teacher.id],
    );
    await execute(
      `INSERT INTO memory_models (school_id, id, user_id, version, weights, attempts, log_loss_before, log_loss_after,
         drift, is_adopted, fitted_at)
       VALUES ($1, $2, $3, 1, $4, 1000, 0.5, 0.4, -0.1, false, now())`,
      [school.id, modelId, student.id, DEFAULT_MODEL.weights],
    );
    // A carer's: the student's states stay folded by the library's weights.
    await execute('INSERT INTO student_models (school_id, user_id, model_id) VALUES ($1, $2, $3)', [
      school.id,
      carer.id,
      modelId,
    ]);
    await execute(
      `INSERT INTO memberships (school_id, id, user_id, role, tutor_group_id, valid_from)
       SELECT $1, $2, $3, 'tutor', id, '2020-01-01' FROM tutor_groups`,
      [school.id, randomUUID(), subject.teacher.id],
    );
  });
  const agent = await signedInAs(app, student);
  const set = await openSet(agent);
  await agent
    .post(`/api/sets/${set.id}/answers`)
    .send(anAnswer(itemOf(set, 'shortAnswer')))
    .expect(200);
  return study;
}
