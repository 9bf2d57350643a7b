import type pg from 'pg';
import type { FactorySchool } from '#seeds/factories/school.ts';

/** Questions in a set of the log. */
const ITEMS = 20;

export interface StudentSizes {
  students: number;
  /** Teaching groups a subject, over which the students are spread. */
  groups: number;
  /** Answers each has given so far, in sets of twenty, one set a day up to yesterday. */
  answers: number;
}

const PEOPLE = `
  CREATE TEMP TABLE bench_students AS SELECT n, gen_random_uuid() AS id FROM generate_series(1, $1::int) n`;

const USERS = `
  INSERT INTO users (school_id, id, username, name, sort_name)
  SELECT $1, id, 'student' || n, 'Student ' || n, 'Student ' || n FROM bench_students`;

const ROLES = `
  INSERT INTO memberships (school_id, id, user_id, role, year_group_id, valid_from)
  SELECT $1, gen_random_uuid(), id, 'student', $2, '2020-01-01' FROM bench_students`;

const ENROLMENTS = `
  INSERT INTO enrolments (school_id, id, class_id, user_id, valid_from)
  SELECT $1, gen_random_uuid(), c.id, s.id, '2020-01-01'
  FROM bench_students s
  JOIN (SELECT id, row_number() OVER (PARTITION BY subject_id ORDER BY id) AS place FROM classes
        WHERE school_id = $1) c ON c.place = 1 + s.n % $2::int`;

/**
 * Two questions in three have been attempted. Question by question, so that a student's states lie scattered over the
 * table, as months of practice leave them.
 */
const MEMORY = `
  INSERT INTO memory_states (school_id, user_id, question_id, stability, difficulty, last_on, attempts, first_grade,
    last_grade, last_share)
  SELECT $1, s.id, q.id, 0.5 + (q.n * 7 + s.n) % 60, 2 + (q.n + s.n) % 7, current_date - 1 - (q.n + s.n) % 40, 2,
    1 + (q.n + s.n) % 3, 3, 1
  FROM bench_questions q CROSS JOIN bench_students s
  WHERE (q.n + s.n) % 3 > 0
  ORDER BY q.n, s.n`;

/** Every answer that was given, with the ids that its rows share. */
const ANSWERS = `
  CREATE TEMP TABLE bench_items AS
  SELECT s.id AS user_id, set.n AS day, set.id AS set_id, i.n AS position, gen_random_uuid() AS id,
    gen_random_uuid() AS answer_id, 1 + (s.n + ${ITEMS} * set.n + i.n) % (SELECT count(*) FROM bench_questions) AS question
  FROM bench_students s
  CROSS JOIN LATERAL (SELECT n, gen_random_uuid() AS id FROM generate_series(1, $1::int) n WHERE s.n > 0) set
  CROSS JOIN generate_series(1, ${ITEMS}) i (n)
  ORDER BY set.n DESC, s.n`;

const LOG = [
  `INSERT INTO sets (school_id, id, user_id, kind, set_on, budget_seconds, opened_at, finished_at)
   SELECT DISTINCT $1::uuid, set_id, user_id, 'mixed', current_date - day::int, 1500, now() - day * interval '1 day',
     now() - day * interval '1 day' FROM bench_items`,
  `INSERT INTO set_items (school_id, id, set_id, position, question_id, question_version_id, subject_id, topic_id, reason)
   SELECT $1, i.id, i.set_id, i.position, q.id, q.version_id, q.subject_id, q.topic_id, '{"kind": "setByTeacher"}'
   FROM bench_items i JOIN bench_questions q ON q.n = i.question`,
  `INSERT INTO answers (school_id, id, set_item_id, user_id, question_id, question_version_id, topic_id, responses,
     how_sure, seconds, given_at, given_on, received_at, is_late)
   SELECT $1, i.answer_id, i.id, i.user_id, q.id, q.version_id, q.topic_id, '["42"]', 'fairlySure', 40,
     now() - i.day * interval '1 day', current_date - i.day::int, now() - i.day * interval '1 day', false
   FROM bench_items i JOIN bench_questions q ON q.n = i.question`,
  `INSERT INTO mark_events (school_id, id, answer_id, sequence, source, parts, marks, max_marks, marked_at)
   SELECT $1, gen_random_uuid(), answer_id, 1, 'plait', '[]', 1, 1, now() - day * interval '1 day' FROM bench_items`,
];

/**
 * Fills a school, whose bank was filled just now, with students, what they remember and what they have answered. Foreign
 * keys are not checked here, which would take most of the time. @returns the students' ids
 */
export async function fillStudents(admin: pg.Client, school: FactorySchool, sizes: StudentSizes): Promise<string[]> {
  const steps: [sql: string, ...more: unknown[]][] = [
    [USERS],
    [ROLES, school.yearGroupId],
    [ENROLMENTS, sizes.groups],
    [MEMORY],
    ...LOG.map((sql): [string] => [sql]),
  ];
  await admin.query('DROP TABLE IF EXISTS bench_students, bench_items');
  await admin.query('BEGIN');
  await admin.query('SET LOCAL session_replication_role = replica');
  await admin.query(PEOPLE, [sizes.students]);
  await admin.query(ANSWERS, [Math.ceil(sizes.answers / ITEMS)]);
  for (const [sql, ...more] of steps) await admin.query(sql, [school.id, ...more]);
  await admin.query('COMMIT');
  const { rows } = await admin.query<{ id: string }>('SELECT id FROM bench_students ORDER BY n');
  return rows.map(({ id }) => id);
}
