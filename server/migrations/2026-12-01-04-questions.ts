import type { Migration } from './migration.ts';
import { EDITABLE, tenantWall } from './tenant-table.ts';

/** Questions and their versions. A version that has left draft can never be reworded. */
export const questions: Migration = {
  name: '2026-12-01-04-questions',
  up: (run) =>
    run(`
      CREATE TABLE questions (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        subject_id uuid NOT NULL,
        -- Counted per subject: "Question 223".
        number integer NOT NULL,
        author_id uuid NOT NULL,
        live_version_id uuid,
        retired_at timestamptz,
        created_at timestamptz NOT NULL DEFAULT now(),
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, subject_id, number),
        FOREIGN KEY (school_id, subject_id) REFERENCES subjects (school_id, id),
        FOREIGN KEY (school_id, author_id) REFERENCES users (school_id, id)
      );
      CREATE INDEX questions_live ON questions (school_id, id) WHERE live_version_id IS NOT NULL;
      CREATE TABLE question_versions (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        question_id uuid NOT NULL,
        version integer NOT NULL,
        status text NOT NULL CHECK (status IN ('draft', 'inReview', 'live', 'superseded', 'retired')),
        -- Counts saves, so that two editors cannot overwrite each other unseen.
        revision integer NOT NULL DEFAULT 0,
        kind text NOT NULL CHECK (kind IN ('shortAnswer', 'recallCard')),
        tier text CHECK (tier IN ('foundation', 'higher')),
        -- A chosen part of the specification; NULL for every student of it.
        option text CHECK (length(option) BETWEEN 1 AND 60),
        body jsonb NOT NULL,
        -- Wording and scheme in one plain string in lower case, for the list's search.
        search_text text NOT NULL,
        excerpt text NOT NULL,
        max_marks integer NOT NULL CHECK (max_marks >= 0),
        expected_seconds integer NOT NULL CHECK (expected_seconds BETWEEN 20 AND 1800),
        author_id uuid NOT NULL,
        -- Whoever saved it last may not approve it either.
        last_edited_by uuid NOT NULL,
        reviewer_id uuid,
        review_comment text,
        saved_at timestamptz NOT NULL,
        sent_at timestamptz,
        live_at timestamptz,
        PRIMARY KEY (school_id, id),
        -- The list counts a subject's questions by state, kind and author from this index alone.
        UNIQUE (school_id, question_id, version) INCLUDE (status, kind, author_id),
        -- Lets a set item name a question and one of its own versions, never another's.
        UNIQUE (school_id, question_id, id),
        FOREIGN KEY (school_id, question_id) REFERENCES questions (school_id, id),
        FOREIGN KEY (school_id, author_id) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, last_edited_by) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, reviewer_id) REFERENCES users (school_id, id)
      );
      -- One version at a time is being worked on.
      CREATE UNIQUE INDEX question_versions_open ON question_versions (school_id, question_id)
        WHERE status IN ('draft', 'inReview');
      CREATE UNIQUE INDEX question_versions_live ON question_versions (school_id, question_id) WHERE status = 'live';
      CREATE INDEX question_versions_review ON question_versions (school_id, sent_at) WHERE status = 'inReview';
      ALTER TABLE questions ADD FOREIGN KEY (school_id, live_version_id)
        REFERENCES question_versions (school_id, id) DEFERRABLE INITIALLY DEFERRED;

      CREATE FUNCTION app.keep_version_wording() RETURNS trigger LANGUAGE plpgsql AS $$
        BEGIN
          -- All that students and reviewers saw. Expected seconds may be put right later, by what is observed.
          IF OLD.status <> 'draft' AND
             (NEW.body, NEW.kind, NEW.tier, NEW.option, NEW.max_marks, NEW.search_text, NEW.excerpt,
              NEW.version, NEW.question_id, NEW.author_id, NEW.last_edited_by)
             IS DISTINCT FROM
             (OLD.body, OLD.kind, OLD.tier, OLD.option, OLD.max_marks, OLD.search_text, OLD.excerpt,
              OLD.version, OLD.question_id, OLD.author_id, OLD.last_edited_by) THEN
            RAISE EXCEPTION 'a question version that has left draft is never reworded' USING ERRCODE = '23001';
          END IF;
          RETURN NEW;
        END $$;
      CREATE TRIGGER keep_version_wording BEFORE UPDATE ON question_versions
        FOR EACH ROW EXECUTE FUNCTION app.keep_version_wording();

      -- The topics a version serves, one in each of several specifications: reviewed with it, live with it.
      CREATE TABLE question_topics (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        question_id uuid NOT NULL,
        question_version_id uuid NOT NULL,
        topic_id uuid NOT NULL,
        position integer NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, question_version_id, topic_id) INCLUDE (position),
        FOREIGN KEY (school_id, question_id, question_version_id)
          REFERENCES question_versions (school_id, question_id, id),
        FOREIGN KEY (school_id, topic_id) REFERENCES topics (school_id, id)
      );
      CREATE INDEX question_topics_by_topic ON question_topics (school_id, topic_id, question_version_id)
        INCLUDE (question_id);
      ${['questions', 'question_versions', 'question_topics'].map((table) => tenantWall(table, EDITABLE)).join('')}
    `),
};
