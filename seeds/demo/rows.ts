import { execute } from '#server/db/scope.ts';

/** Value of a column in JavaScript, by its PostgreSQL type. Days, times and instants are ISO strings. */
interface Values {
  uuid: string;
  text: string;
  integer: number;
  'double precision': number;
  boolean: boolean;
  date: string;
  time: string;
  timestamptz: string;
  jsonb: unknown;
}

/** The tables that seeding fills, in an order that references allow, with the columns it gives. */
const TABLES = {
  schools: { name: 'text', code: 'text', zone: 'text', is_demo: 'boolean', season_ends_on: 'date' },
  year_groups: { id: 'uuid', name: 'text' },
  tutor_groups: { id: 'uuid', year_group_id: 'uuid', name: 'text' },
  users: { id: 'uuid', username: 'text', email: 'text', name: 'text', sort_name: 'text', password_hash: 'text' },
  subjects: { id: 'uuid', code: 'text', name: 'text', strand: 'text', position: 'integer' },
  memberships: {
    id: 'uuid',
    user_id: 'uuid',
    role: 'text',
    subject_id: 'uuid',
    year_group_id: 'uuid',
    tutor_group_id: 'uuid',
    valid_from: 'date',
  },
  carer_links: { id: 'uuid', carer_id: 'uuid', student_id: 'uuid' },
  access_arrangements: { id: 'uuid', user_id: 'uuid', extra_time_percent: 'integer', has_rest_breaks: 'boolean' },
  specifications: { id: 'uuid', subject_id: 'uuid', name: 'text' },
  papers: {
    id: 'uuid',
    specification_id: 'uuid',
    number: 'integer',
    title: 'text',
    tier: 'text',
    option: 'text',
    minutes: 'integer',
    marks: 'integer',
  },
  topics: {
    id: 'uuid',
    specification_id: 'uuid',
    number: 'text',
    title: 'text',
    tier: 'text',
    option: 'text',
    position: 'integer',
  },
  topic_weights: { id: 'uuid', topic_id: 'uuid', paper_id: 'uuid', marks: 'integer' },
  confusable_topics: { id: 'uuid', topic_id: 'uuid', other_topic_id: 'uuid' },
  seasons: { id: 'uuid', name: 'text', kind: 'text', starts_on: 'date', ends_on: 'date' },
  sittings: {
    id: 'uuid',
    paper_id: 'uuid',
    season_id: 'uuid',
    sat_on: 'date',
    starts_at: 'time',
    zone: 'text',
    source: 'text',
  },
  classes: { id: 'uuid', subject_id: 'uuid', specification_id: 'uuid', year_group_id: 'uuid', name: 'text' },
  class_teachers: { id: 'uuid', class_id: 'uuid', user_id: 'uuid' },
  enrolments: { id: 'uuid', class_id: 'uuid', user_id: 'uuid', tier: 'text', option: 'text', valid_from: 'date' },
  topic_teachings: { id: 'uuid', class_id: 'uuid', topic_id: 'uuid', taught_on: 'date' },
  questions: {
    id: 'uuid',
    subject_id: 'uuid',
    number: 'integer',
    author_id: 'uuid',
    live_version_id: 'uuid',
    created_at: 'timestamptz',
  },
  question_versions: {
    id: 'uuid',
    question_id: 'uuid',
    version: 'integer',
    status: 'text',
    revision: 'integer',
    kind: 'text',
    tier: 'text',
    option: 'text',
    body: 'jsonb',
    search_text: 'text',
    excerpt: 'text',
    max_marks: 'integer',
    expected_seconds: 'integer',
    author_id: 'uuid',
    last_edited_by: 'uuid',
    reviewer_id: 'uuid',
    review_comment: 'text',
    saved_at: 'timestamptz',
    sent_at: 'timestamptz',
    live_at: 'timestamptz',
  },
  question_topics: {
    id: 'uuid',
    question_id: 'uuid',
    question_version_id: 'uuid',
    topic_id: 'uuid',
    position: 'integer',
  },
  sets: {
    id: 'uuid',
    user_id: 'uuid',
    kind: 'text',
    set_on: 'date',
    budget_seconds: 'integer',
    opened_at: 'timestamptz',
    finished_at: 'timestamptz',
  },
  set_items: {
    id: 'uuid',
    set_id: 'uuid',
    position: 'integer',
    question_id: 'uuid',
    question_version_id: 'uuid',
    subject_id: 'uuid',
    topic_id: 'uuid',
    reason: 'jsonb',
    prior_recall: 'double precision',
    prior_days: 'integer',
  },
  answers: {
    id: 'uuid',
    set_item_id: 'uuid',
    user_id: 'uuid',
    question_id: 'uuid',
    question_version_id: 'uuid',
    topic_id: 'uuid',
    responses: 'jsonb',
    how_sure: 'text',
    seconds: 'integer',
    given_at: 'timestamptz',
    given_on: 'date',
    received_at: 'timestamptz',
    is_late: 'boolean',
  },
  mark_events: {
    id: 'uuid',
    answer_id: 'uuid',
    sequence: 'integer',
    source: 'text',
    marked_by: 'uuid',
    parts: 'jsonb',
    marks: 'integer',
    max_marks: 'integer',
    marked_at: 'timestamptz',
  },
  memory_states: {
    user_id: 'uuid',
    question_id: 'uuid',
    stability: 'double precision',
    difficulty: 'double precision',
    last_on: 'date',
    attempts: 'integer',
    first_grade: 'integer',
    last_grade: 'integer',
    last_share: 'double precision',
  },
} as const satisfies Record<string, Record<string, keyof Values>>;

export type Table = keyof typeof TABLES;

/** One row of a table, without its school. */
export type Row<T extends Table> = {
  [Column in keyof (typeof TABLES)[T]]: (typeof TABLES)[T][Column] extends keyof Values
    ? Values[(typeof TABLES)[T][Column]] | null
    : never;
};

/** Rows by table. */
export type Rows = { [T in Table]?: Row<T>[] };

/** Keeps a statement far under the five seconds it may take. */
const BATCH = 1000;

/** Writes the rows of one table, in batches, for the school of the open scope. @returns how many */
export async function insertRows(table: Table, rows: readonly object[]): Promise<number> {
  const columns: [string, string][] = Object.entries(TABLES[table]);
  const names = columns.map(([name]) => name);
  const sql = `INSERT INTO ${table} (school_id, ${names.join(', ')})
    SELECT app.current_school(), ${names.map((name) => `r.${name}`).join(', ')}
    FROM jsonb_to_recordset($1::jsonb) AS r(${columns.map(([name, type]) => `${name} ${type}`).join(', ')})`;
  for (let start = 0; start < rows.length; start += BATCH) {
    await execute(sql, [JSON.stringify(rows.slice(start, start + BATCH))]);
  }
  return rows.length;
}

/** Writes rows of any tables, those first that others refer to. @returns how many */
export async function insertAll(rows: Rows): Promise<number> {
  let written = 0;
  for (const table of Object.keys(TABLES) as Table[]) written += await insertRows(table, rows[table] ?? []);
  return written;
}
