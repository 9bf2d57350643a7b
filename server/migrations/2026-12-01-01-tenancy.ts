import type { Migration } from './migration.ts';
import { tenantWall } from './tenant-table.ts';

/** The tenant wall, the school, and the few tables needed before a school is known. */
export const tenancy: Migration = {
  name: '2026-12-01-01-tenancy',
  up: (run) =>
    run(`
      CREATE SCHEMA app;
      GRANT USAGE ON SCHEMA app TO plait_app;
      -- '' is what the setting reads after a transaction, NULL before the first one: both mean "no school".
      CREATE FUNCTION app.current_school() RETURNS uuid LANGUAGE sql STABLE PARALLEL SAFE AS
        $$ SELECT nullif(current_setting('app.school_id', true), '')::uuid $$;

      CREATE TABLE school_directory (
        code text PRIMARY KEY CHECK (code ~ '^[a-z0-9-]{2,40}$'),
        school_id uuid NOT NULL UNIQUE
      );
      GRANT SELECT ON school_directory TO plait_app;

      -- connect-pg-simple's columns; the user's ids in sess are indexed so that sessions can be ended.
      CREATE TABLE session (
        sid varchar NOT NULL PRIMARY KEY,
        sess json NOT NULL,
        expire timestamptz(6) NOT NULL
      );
      CREATE INDEX session_expire ON session (expire);
      CREATE INDEX session_by_user ON session ((sess -> 'passport' -> 'user' ->> 'userId'));
      GRANT SELECT, INSERT, UPDATE, DELETE ON session TO plait_app;

      -- rate-limiter-flexible's columns.
      CREATE TABLE rate_limit (
        key varchar(255) PRIMARY KEY,
        points integer NOT NULL DEFAULT 0,
        expire bigint
      );
      GRANT SELECT, INSERT, UPDATE, DELETE ON rate_limit TO plait_app;

      CREATE TABLE schools (
        school_id uuid PRIMARY KEY REFERENCES school_directory (school_id) DEFERRABLE INITIALLY DEFERRED,
        name text NOT NULL,
        code text NOT NULL UNIQUE,
        zone text NOT NULL,
        is_demo boolean NOT NULL DEFAULT false,
        subjects_per_set integer NOT NULL DEFAULT 4 CHECK (subjects_per_set BETWEEN 2 AND 8),
        season_ends_on date NOT NULL,
        created_at timestamptz NOT NULL DEFAULT now()
      );
      ${tenantWall('schools', ['SELECT', 'INSERT', 'UPDATE'])}

      -- The directory follows the schools and is written in no other way: the wall lets a scope add its own school
      -- alone, and a trigger's function can be called by nobody.
      CREATE FUNCTION app.enter_school() RETURNS trigger LANGUAGE plpgsql SECURITY DEFINER
        SET search_path = pg_catalog, pg_temp AS $$
        BEGIN
          IF TG_OP = 'INSERT' THEN
            INSERT INTO public.school_directory (code, school_id) VALUES (NEW.code, NEW.school_id);
          ELSE
            UPDATE public.school_directory SET code = NEW.code WHERE school_id = NEW.school_id;
          END IF;
          RETURN NULL;
        END $$;
      REVOKE ALL ON FUNCTION app.enter_school() FROM PUBLIC;
      CREATE TRIGGER enter_school AFTER INSERT OR UPDATE OF code ON schools
        FOR EACH ROW EXECUTE FUNCTION app.enter_school();
    `),
};
