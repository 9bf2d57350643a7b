import type pg from 'pg';
import { aNumberBody } from '#seeds/factories/question.ts';
import type { FactorySchool } from '#seeds/factories/school.ts';
import { describeBody } from '#server/services/questions/describe-body.ts';

const SUBJECTS = 8;
/** A subject's; its two papers share them. */
const TOPICS = 10;
const MOST_MARKS = 4;

export interface BankSizes {
  questions: number;
  /** Teaching groups a subject. */
  groups: number;
}

const CURRICULUM = [
  `INSERT INTO users (school_id, id, username, name, sort_name)
   VALUES ($1, gen_random_uuid(), 'author', 'Author', 'Author')`,
  `INSERT INTO subjects (school_id, id, code, name, strand, position)
   SELECT $1, gen_random_uuid(), 'S' || n, 'Subject ' || n, 'ma', n FROM generate_series(1, ${SUBJECTS}) n`,
  `INSERT INTO specifications (school_id, id, subject_id, name)
   SELECT $1, gen_random_uuid(), id, name || ' specification' FROM subjects WHERE school_id = $1`,
  `INSERT INTO papers (school_id, id, specification_id, number, title, minutes, marks)
   SELECT $1, gen_random_uuid(), id, n, 'Paper ' || n, 90, 80
   FROM specifications, generate_series(1, 2) n WHERE school_id = $1`,
  `INSERT INTO seasons (school_id, id, name, kind, starts_on, ends_on)
   VALUES ($1, gen_random_uuid(), 'Summer', 'summer', current_date, current_date + 100)`,
  `INSERT INTO sittings (school_id, id, paper_id, season_id, sat_on, starts_at, zone, source)
   SELECT $1, gen_random_uuid(), p.id, s.id, current_date + 20 + 3 * (row_number() OVER (ORDER BY p.number, p.id))::int,
     '09:00', 'Europe/London', 'Bench'
   FROM papers p JOIN seasons s USING (school_id) WHERE school_id = $1`,
  `INSERT INTO topics (school_id, id, specification_id, number, title, position)
   SELECT $1, gen_random_uuid(), id, n::text, name || ', topic ' || n, n
   FROM specifications, generate_series(1, ${TOPICS}) n WHERE school_id = $1`,
  `INSERT INTO topic_weights (school_id, id, topic_id, paper_id, marks)
   SELECT $1, gen_random_uuid(), t.id, p.id, 8 + 2 * t.position
   FROM topics t JOIN papers p USING (school_id, specification_id)
   WHERE school_id = $1 AND p.number = 1 + t.position % 2`,
];

const CLASSES = `
  INSERT INTO classes (school_id, id, subject_id, specification_id, year_group_id, name)
  SELECT $1, gen_random_uuid(), subject_id, id, $2, name || ', group ' || n
  FROM specifications, generate_series(1, $3::int) n WHERE school_id = $1`;

const TEACHINGS = `
  INSERT INTO topic_teachings (school_id, id, class_id, topic_id, taught_on)
  SELECT $1, gen_random_uuid(), c.id, t.id, current_date - 220 + 20 * t.position
  FROM classes c JOIN topics t USING (school_id, specification_id) WHERE school_id = $1`;

/** What is asked, numbered through: the other tables of questions and the students' work are made from it. */
const QUESTIONS = `
  CREATE TEMP TABLE bench_questions AS
  SELECT n, gen_random_uuid() AS id, gen_random_uuid() AS version_id, topic.id AS topic_id, topic.subject_id
  FROM generate_series(1, $2::int) n
  JOIN (SELECT t.id, s.subject_id, row_number() OVER (ORDER BY t.position, t.id) AS place
        FROM topics t JOIN specifications s ON (s.school_id, s.id) = (t.school_id, t.specification_id)
        WHERE t.school_id = $1) topic ON topic.place = 1 + n % ${SUBJECTS * TOPICS}`;

const ENTRIES = `
  INSERT INTO questions (school_id, id, subject_id, number, author_id, live_version_id)
  SELECT $1, q.id, q.subject_id, q.n, u.id, q.version_id
  FROM bench_questions q JOIN users u ON u.school_id = $1 AND u.username = 'author'`;

const SERVED = `
  INSERT INTO question_topics (school_id, id, question_id, question_version_id, topic_id, position)
  SELECT $1, gen_random_uuid(), id, version_id, topic_id, 0 FROM bench_questions`;

const VERSIONS = `
  INSERT INTO question_versions (school_id, id, question_id, version, status, revision, kind, body, search_text, excerpt,
    max_marks, expected_seconds, author_id, last_edited_by, saved_at, sent_at, live_at)
  SELECT $1, q.version_id, q.id, 1, 'live', 1, 'shortAnswer', b.body -> 'body', b.body ->> 'searchText',
    b.body ->> 'excerpt', (b.body ->> 'maxMarks')::int, 30 + q.n % 60, u.id, u.id, now(), now(), now()
  FROM bench_questions q
  JOIN users u ON u.school_id = $1 AND u.username = 'author'
  JOIN jsonb_array_elements($2::jsonb) WITH ORDINALITY b (body, marks) ON b.marks = 1 + q.n % ${MOST_MARKS}`;

/** Bodies of one mark to the most, with what a version's row says of each. */
const bodies = () =>
  Array.from({ length: MOST_MARKS }, (_, index) => {
    const body = aNumberBody();
    for (const point of body.parts.flatMap((part) => part.points)) point.marks = index + 1;
    return { body, ...describeBody(body) };
  });

/** Every class has a few questions its teacher set or keeps out. */
const CHOICES = `
  INSERT INTO class_questions (school_id, id, class_id, question_id, choice, chosen_by, chosen_at)
  SELECT $1, gen_random_uuid(), c.id, q.id, CASE WHEN q.number % 3 = 0 THEN 'excluded' ELSE 'set' END, q.author_id,
    now() - interval '20 days'
  FROM classes c JOIN questions q USING (school_id, subject_id) WHERE school_id = $1 AND q.number <= 16`;

/**
 * Fills a school with subjects, classes and a bank of live questions, all taught and all to be examined within the
 * next ten weeks. Leaves the questions in the temporary table bench_questions.
 */
export async function fillBank(admin: pg.Client, school: FactorySchool, sizes: BankSizes): Promise<void> {
  const steps: [sql: string, ...more: unknown[]][] = [
    ...CURRICULUM.map((sql): [string] => [sql]),
    [CLASSES, school.yearGroupId, sizes.groups],
    [TEACHINGS],
    [QUESTIONS, sizes.questions],
    [ENTRIES],
    [VERSIONS, JSON.stringify(bodies())],
    [SERVED],
    [CHOICES],
  ];
  await admin.query('DROP TABLE IF EXISTS bench_questions');
  await admin.query('BEGIN');
  for (const [sql, ...more] of steps) await admin.query(sql, [school.id, ...more]);
  await admin.query('COMMIT');
}
