import type { Migration } from './migration.ts';
import { EDITABLE, tenantWall } from './tenant-table.ts';

const TIER = `text CHECK (tier IN ('foundation', 'higher'))`;
/** A chosen part of a specification. */
const OPTION = 'text CHECK (length(option) BETWEEN 1 AND 60)';

/** Specifications, papers and their sittings, topics, and the classes that study them. */
export const curriculum: Migration = {
  name: '2026-12-01-03-curriculum',
  up: (run) =>
    run(`
      CREATE TABLE specifications (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        subject_id uuid NOT NULL,
        name text NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, subject_id, name),
        FOREIGN KEY (school_id, subject_id) REFERENCES subjects (school_id, id)
      );
      CREATE TABLE papers (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        specification_id uuid NOT NULL,
        number integer NOT NULL,
        title text NOT NULL,
        tier ${TIER},
        option ${OPTION},
        minutes integer NOT NULL CHECK (minutes > 0),
        marks integer NOT NULL CHECK (marks > 0),
        PRIMARY KEY (school_id, id),
        UNIQUE NULLS NOT DISTINCT (school_id, specification_id, number, tier, option),
        FOREIGN KEY (school_id, specification_id) REFERENCES specifications (school_id, id)
      );
      CREATE TABLE seasons (
        school_id uuid NOT NULL REFERENCES schools,
        id uuid NOT NULL,
        name text NOT NULL,
        kind text NOT NULL CHECK (kind IN ('mock', 'summer')),
        starts_on date NOT NULL,
        ends_on date NOT NULL CHECK (ends_on >= starts_on),
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, name)
      );
      -- Wall-clock date and time with their zone: a sitting keeps its time when the clocks change.
      CREATE TABLE sittings (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        paper_id uuid NOT NULL,
        season_id uuid NOT NULL,
        sat_on date NOT NULL,
        starts_at time NOT NULL,
        zone text NOT NULL,
        source text NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, paper_id, season_id),
        FOREIGN KEY (school_id, paper_id) REFERENCES papers (school_id, id),
        FOREIGN KEY (school_id, season_id) REFERENCES seasons (school_id, id)
      );
      CREATE INDEX sittings_by_day ON sittings (school_id, sat_on);
      CREATE TABLE topics (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        specification_id uuid NOT NULL,
        parent_id uuid,
        number text NOT NULL,
        title text NOT NULL,
        tier ${TIER},
        option ${OPTION},
        position integer NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, specification_id, number),
        FOREIGN KEY (school_id, specification_id) REFERENCES specifications (school_id, id),
        FOREIGN KEY (school_id, parent_id) REFERENCES topics (school_id, id)
      );
      CREATE TABLE topic_weights (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        topic_id uuid NOT NULL,
        paper_id uuid NOT NULL,
        marks integer NOT NULL CHECK (marks >= 0),
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, topic_id, paper_id),
        FOREIGN KEY (school_id, topic_id) REFERENCES topics (school_id, id),
        FOREIGN KEY (school_id, paper_id) REFERENCES papers (school_id, id)
      );
      -- Topics students mix up; asked one after the other on purpose. Stored once, lower id first.
      CREATE TABLE confusable_topics (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        topic_id uuid NOT NULL,
        other_topic_id uuid NOT NULL CHECK (other_topic_id > topic_id),
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, topic_id, other_topic_id),
        FOREIGN KEY (school_id, topic_id) REFERENCES topics (school_id, id),
        FOREIGN KEY (school_id, other_topic_id) REFERENCES topics (school_id, id)
      );
      CREATE TABLE classes (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        subject_id uuid NOT NULL,
        specification_id uuid NOT NULL,
        year_group_id uuid NOT NULL,
        name text NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, name),
        FOREIGN KEY (school_id, subject_id) REFERENCES subjects (school_id, id),
        FOREIGN KEY (school_id, specification_id) REFERENCES specifications (school_id, id),
        FOREIGN KEY (school_id, year_group_id) REFERENCES year_groups (school_id, id)
      );
      CREATE TABLE class_teachers (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        class_id uuid NOT NULL,
        user_id uuid NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, user_id, class_id),
        FOREIGN KEY (school_id, class_id) REFERENCES classes (school_id, id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id)
      );
      -- A student's place in a class, with the tier and option they are entered for.
      CREATE TABLE enrolments (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        class_id uuid NOT NULL,
        user_id uuid NOT NULL,
        tier ${TIER},
        option ${OPTION},
        valid_from date NOT NULL,
        valid_to date,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, user_id, class_id),
        FOREIGN KEY (school_id, class_id) REFERENCES classes (school_id, id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id)
      );
      CREATE INDEX enrolments_by_class ON enrolments (school_id, class_id);
      CREATE TABLE topic_teachings (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        class_id uuid NOT NULL,
        topic_id uuid NOT NULL,
        taught_on date NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, class_id, topic_id),
        FOREIGN KEY (school_id, class_id) REFERENCES classes (school_id, id),
        FOREIGN KEY (school_id, topic_id) REFERENCES topics (school_id, id)
      );
      ${[
        'specifications',
        'papers',
        'seasons',
        'sittings',
        'topics',
        'topic_weights',
        'confusable_topics',
        'classes',
        'class_teachers',
        'enrolments',
        'topic_teachings',
      ]
        .map((table) => tenantWall(table, EDITABLE))
        .join('')}
    `),
};
