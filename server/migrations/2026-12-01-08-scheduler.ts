import type { Migration } from './migration.ts';
import { APPEND_ONLY, EDITABLE, tenantWall } from './tenant-table.ts';

/** What the scheduler goes by beside the answer log: what was believed before, what teachers set, how well it fits. */
export const scheduler: Migration = {
  name: '2026-12-01-08-scheduler',
  up: (run) =>
    run(`
      -- What was believed of a question never attempted when it was put into the set: part of the log, because the
      -- memory that its first answer makes starts from there. NULL where it had been attempted.
      ALTER TABLE set_items
        ADD COLUMN prior_recall double precision CHECK (prior_recall > 0 AND prior_recall < 1),
        ADD COLUMN prior_days integer CHECK (prior_days >= 1),
        ADD CHECK ((prior_recall IS NULL) = (prior_days IS NULL));

      -- A set may be of topics that the student chose; empty otherwise.
      ALTER TABLE sets
        DROP CONSTRAINT sets_kind_check,
        ADD CONSTRAINT sets_kind_check CHECK (kind IN ('mixed', 'morning', 'chosen')),
        ADD COLUMN topic_ids uuid[] NOT NULL DEFAULT '{}',
        ADD CHECK ((kind = 'chosen') = (cardinality(topic_ids) > 0));

      -- Median seconds observed, once enough students have answered; expected_seconds stays the author's estimate.
      ALTER TABLE question_versions
        ADD COLUMN observed_seconds integer CHECK (observed_seconds BETWEEN 20 AND 1800);

      -- What a class's teachers ask of a question: to come next, or to stay out of sets.
      CREATE TABLE class_questions (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        class_id uuid NOT NULL,
        question_id uuid NOT NULL,
        choice text NOT NULL CHECK (choice IN ('set', 'excluded')),
        chosen_by uuid NOT NULL,
        chosen_at timestamptz NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, class_id, question_id) INCLUDE (choice, chosen_at),
        FOREIGN KEY (school_id, class_id) REFERENCES classes (school_id, id),
        FOREIGN KEY (school_id, question_id) REFERENCES questions (school_id, id),
        FOREIGN KEY (school_id, chosen_by) REFERENCES users (school_id, id)
      );
      CREATE INDEX class_questions_by_question ON class_questions (school_id, question_id);

      -- Weights fitted to the school's answers, or to one student's; every fit is kept, adopted or not.
      CREATE TABLE memory_models (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        -- NULL for the whole school.
        user_id uuid,
        version integer NOT NULL,
        weights double precision[] NOT NULL CHECK (cardinality(weights) = 21),
        -- Attempts it was fitted to and judged by.
        attempts integer NOT NULL CHECK (attempts >= 1000),
        -- Mean log-loss over the newest attempts, which the fit has not seen: by the weights before, and by these.
        log_loss_before double precision NOT NULL,
        log_loss_after double precision NOT NULL,
        -- Observed less expected recall that led to it.
        drift double precision NOT NULL,
        is_adopted boolean NOT NULL,
        fitted_at timestamptz NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE NULLS NOT DISTINCT (school_id, user_id, version),
        FOREIGN KEY (school_id) REFERENCES schools,
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id)
      );

      -- Which weights a student's memory states are folded by, and how they have lately done. No row: the library's.
      CREATE TABLE student_models (
        school_id uuid NOT NULL,
        user_id uuid NOT NULL,
        model_id uuid,
        -- Over the last repeat attempts, 200 at most.
        attempts integer NOT NULL DEFAULT 0,
        observed double precision,
        expected double precision,
        -- Ten bands of expected recall: attempts, sum expected, recalled.
        bands jsonb NOT NULL DEFAULT '[]',
        checked_at timestamptz,
        PRIMARY KEY (school_id, user_id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, model_id) REFERENCES memory_models (school_id, id)
      );
      ${tenantWall('class_questions', EDITABLE)}
      ${tenantWall('memory_models', APPEND_ONLY)}
      ${tenantWall('student_models', EDITABLE)}

      -- The grade of the first answer speaks for what is not yet attempted. The rows that are there are filled from
      -- the log; the wall is opened to their owner for that alone.
      ALTER TABLE memory_states ADD COLUMN first_grade integer CHECK (first_grade BETWEEN 1 AND 3);
      ALTER TABLE memory_states NO FORCE ROW LEVEL SECURITY;
      ALTER TABLE answers NO FORCE ROW LEVEL SECURITY;
      ALTER TABLE mark_events NO FORCE ROW LEVEL SECURITY;
      UPDATE memory_states ms SET first_grade = first.grade
      FROM (
        SELECT DISTINCT ON (a.school_id, a.user_id, a.question_id) a.school_id, a.user_id, a.question_id,
          CASE WHEN 2 * m.marks < m.max_marks THEN 1
               WHEN a.how_sure = 'guess' OR m.marks < m.max_marks THEN 2 ELSE 3 END AS grade
        FROM answers a
        JOIN LATERAL (SELECT e.marks, e.max_marks FROM mark_events e
                      WHERE e.school_id = a.school_id AND e.answer_id = a.id ORDER BY e.sequence DESC LIMIT 1) m ON true
        ORDER BY a.school_id, a.user_id, a.question_id, a.given_at, a.id
      ) first
      WHERE first.school_id = ms.school_id AND first.user_id = ms.user_id AND first.question_id = ms.question_id;
      ALTER TABLE memory_states FORCE ROW LEVEL SECURITY;
      ALTER TABLE answers FORCE ROW LEVEL SECURITY;
      ALTER TABLE mark_events FORCE ROW LEVEL SECURITY;
      ALTER TABLE memory_states ALTER COLUMN first_grade SET NOT NULL;

      -- A set's one query reads states and versions from these indexes alone, and a day's answers without the rest.
      ALTER TABLE memory_states
        DROP CONSTRAINT memory_states_pkey,
        ADD PRIMARY KEY (school_id, user_id, question_id)
          INCLUDE (stability, difficulty, last_on, first_grade, last_share);
      CREATE INDEX question_versions_asked ON question_versions (school_id, id)
        INCLUDE (question_id, max_marks, expected_seconds, observed_seconds, tier, option) WHERE status = 'live';
      CREATE INDEX answers_by_day ON answers (school_id, user_id, given_on);
      -- Every answer rewrites a state: swept while few pages are touched, so that the index goes on being enough.
      ALTER TABLE memory_states SET
        (autovacuum_vacuum_scale_factor = 0.02, autovacuum_vacuum_insert_scale_factor = 0.02);
    `),
};
