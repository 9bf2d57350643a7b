import type { Migration } from './migration.ts';
import { APPEND_ONLY, EDITABLE, tenantWall } from './tenant-table.ts';

/** Sets, the append-only log of answers and marks, and the memory states folded from it. */
export const practice: Migration = {
  name: '2026-12-01-05-practice',
  up: (run) =>
    run(`
      CREATE TABLE sets (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        user_id uuid NOT NULL,
        kind text NOT NULL CHECK (kind IN ('mixed', 'morning')),
        set_on date NOT NULL,
        budget_seconds integer NOT NULL,
        opened_at timestamptz NOT NULL,
        finished_at timestamptz,
        PRIMARY KEY (school_id, id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id)
      );
      -- Two tabs asking at once get the same set.
      CREATE UNIQUE INDEX sets_open ON sets (school_id, user_id, kind) WHERE finished_at IS NULL;
      CREATE INDEX sets_by_day ON sets (school_id, user_id, set_on);
      CREATE TABLE set_items (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        set_id uuid NOT NULL,
        position integer NOT NULL,
        question_id uuid NOT NULL,
        question_version_id uuid NOT NULL,
        subject_id uuid NOT NULL,
        topic_id uuid NOT NULL,
        -- Why the scheduler chose it, as data.
        reason jsonb NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, set_id, position),
        FOREIGN KEY (school_id, set_id) REFERENCES sets (school_id, id),
        FOREIGN KEY (school_id, question_id, question_version_id)
          REFERENCES question_versions (school_id, question_id, id),
        FOREIGN KEY (school_id, subject_id) REFERENCES subjects (school_id, id),
        FOREIGN KEY (school_id, topic_id) REFERENCES topics (school_id, id)
      );
      CREATE TABLE answers (
        school_id uuid NOT NULL,
        -- Made by the client before sending, so a repeat is known for one.
        id uuid NOT NULL,
        set_item_id uuid NOT NULL,
        user_id uuid NOT NULL,
        question_id uuid NOT NULL,
        question_version_id uuid NOT NULL,
        topic_id uuid NOT NULL,
        responses jsonb NOT NULL,
        how_sure text NOT NULL CHECK (how_sure IN ('guess', 'fairlySure', 'certain')),
        seconds integer NOT NULL CHECK (seconds BETWEEN 0 AND 7200),
        given_at timestamptz NOT NULL,
        -- The school's calendar day at given_at.
        given_on date NOT NULL,
        received_at timestamptz NOT NULL,
        -- Given more than a day before it arrived.
        is_late boolean NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, set_item_id),
        FOREIGN KEY (school_id, set_item_id) REFERENCES set_items (school_id, id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, question_id, question_version_id)
          REFERENCES question_versions (school_id, question_id, id),
        FOREIGN KEY (school_id, topic_id) REFERENCES topics (school_id, id)
      );
      CREATE INDEX answers_by_student ON answers (school_id, user_id, question_id, given_at);
      CREATE INDEX answers_by_version ON answers (school_id, question_version_id) INCLUDE (id, user_id, seconds);
      -- A mark is an event: marking again adds one and the newest counts.
      CREATE TABLE mark_events (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        answer_id uuid NOT NULL,
        -- Order of the events of one answer.
        sequence integer NOT NULL,
        source text NOT NULL CHECK (source IN ('plait', 'student', 'teacher')),
        marked_by uuid,
        -- Per part: who decided it, the words shown, and per mark point whether it was earned.
        parts jsonb NOT NULL,
        marks integer NOT NULL CHECK (marks >= 0),
        max_marks integer NOT NULL CHECK (max_marks >= marks),
        marked_at timestamptz NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, answer_id, sequence) INCLUDE (marks, max_marks),
        FOREIGN KEY (school_id, answer_id) REFERENCES answers (school_id, id),
        FOREIGN KEY (school_id, marked_by) REFERENCES users (school_id, id)
      );
      -- Derived from the two logs above, never the other way round.
      CREATE TABLE memory_states (
        school_id uuid NOT NULL,
        user_id uuid NOT NULL,
        question_id uuid NOT NULL,
        stability double precision NOT NULL,
        difficulty double precision NOT NULL,
        last_on date NOT NULL,
        attempts integer NOT NULL,
        last_grade integer NOT NULL,
        -- Marks of the newest attempt ÷ marks available.
        last_share double precision NOT NULL,
        PRIMARY KEY (school_id, user_id, question_id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, question_id) REFERENCES questions (school_id, id)
      );
      ${['sets', 'memory_states'].map((table) => tenantWall(table, EDITABLE)).join('')}
      ${['set_items', 'answers', 'mark_events'].map((table) => tenantWall(table, APPEND_ONLY)).join('')}
    `),
};
