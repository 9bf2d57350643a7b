import type { Migration } from './migration.ts';
import { EDITABLE, tenantWall } from './tenant-table.ts';

/** People, what they are at the school, and who answers for whom. */
export const people: Migration = {
  name: '2026-12-01-02-people',
  up: (run) =>
    run(`
      CREATE TABLE year_groups (
        school_id uuid NOT NULL REFERENCES schools,
        id uuid NOT NULL,
        name text NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, name)
      );
      CREATE TABLE tutor_groups (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        year_group_id uuid NOT NULL,
        name text NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, name),
        FOREIGN KEY (school_id, year_group_id) REFERENCES year_groups (school_id, id)
      );
      CREATE TABLE users (
        school_id uuid NOT NULL REFERENCES schools,
        id uuid NOT NULL,
        username text NOT NULL,
        email text,
        -- As the school writes the person: "Ms I. Sorley", "Tamsin Oyelaran".
        name text NOT NULL,
        sort_name text NOT NULL,
        password_hash text,
        disabled_at timestamptz,
        created_at timestamptz NOT NULL DEFAULT now(),
        PRIMARY KEY (school_id, id)
      );
      CREATE UNIQUE INDEX users_username ON users (school_id, lower(username));
      CREATE UNIQUE INDEX users_email ON users (school_id, lower(email));

      CREATE TABLE subjects (
        school_id uuid NOT NULL REFERENCES schools,
        id uuid NOT NULL,
        code text NOT NULL,
        name text NOT NULL,
        strand text NOT NULL,
        position integer NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, code)
      );
      -- A role held from a day to a day; subject, year group or tutor group says how far it reaches.
      CREATE TABLE memberships (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        user_id uuid NOT NULL,
        role text NOT NULL CHECK (role IN
          ('student','carer','teacher','headOfDepartment','headOfYear','schoolAdmin','tutor','senco')),
        subject_id uuid,
        year_group_id uuid,
        tutor_group_id uuid,
        valid_from date NOT NULL,
        valid_to date,
        PRIMARY KEY (school_id, id),
        UNIQUE NULLS NOT DISTINCT (school_id, user_id, role, subject_id, year_group_id, tutor_group_id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, subject_id) REFERENCES subjects (school_id, id),
        FOREIGN KEY (school_id, year_group_id) REFERENCES year_groups (school_id, id),
        FOREIGN KEY (school_id, tutor_group_id) REFERENCES tutor_groups (school_id, id),
        CHECK (role NOT IN ('teacher', 'headOfDepartment') OR subject_id IS NOT NULL),
        CHECK (role NOT IN ('headOfYear', 'student') OR year_group_id IS NOT NULL),
        CHECK (role <> 'tutor' OR tutor_group_id IS NOT NULL)
      );
      CREATE TABLE carer_links (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        carer_id uuid NOT NULL,
        student_id uuid NOT NULL,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, carer_id, student_id),
        FOREIGN KEY (school_id, carer_id) REFERENCES users (school_id, id),
        FOREIGN KEY (school_id, student_id) REFERENCES users (school_id, id)
      );
      CREATE INDEX carer_links_student ON carer_links (school_id, student_id);
      -- Special-category data: a table of its own, so that nothing else reads it by accident.
      CREATE TABLE access_arrangements (
        school_id uuid NOT NULL,
        id uuid NOT NULL,
        user_id uuid NOT NULL,
        extra_time_percent integer NOT NULL DEFAULT 0 CHECK (extra_time_percent BETWEEN 0 AND 100),
        has_rest_breaks boolean NOT NULL DEFAULT false,
        PRIMARY KEY (school_id, id),
        UNIQUE (school_id, user_id),
        FOREIGN KEY (school_id, user_id) REFERENCES users (school_id, id)
      );
      ${['year_groups', 'tutor_groups', 'users', 'subjects', 'memberships', 'carer_links', 'access_arrangements']
        .map((table) => tenantWall(table, EDITABLE))
        .join('')}
    `),
};
