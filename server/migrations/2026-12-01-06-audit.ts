import type { Migration } from './migration.ts';
import { APPEND_ONLY, tenantWall } from './tenant-table.ts';

/** Who did what, with ids and field names only: no answer text, no names, no old values. */
export const audit: Migration = {
  name: '2026-12-01-06-audit',
  up: (run) =>
    run(`
      CREATE TABLE audit (
        school_id uuid NOT NULL REFERENCES schools,
        id uuid NOT NULL,
        at timestamptz NOT NULL,
        actor_id uuid,
        acting_role text,
        action text NOT NULL,
        object_type text NOT NULL,
        object_id uuid,
        fields text[] NOT NULL DEFAULT '{}',
        outcome text NOT NULL CHECK (outcome IN ('done', 'refused')),
        request_id text,
        PRIMARY KEY (school_id, id)
      );
      CREATE INDEX audit_by_time ON audit (school_id, at);
      ${tenantWall('audit', APPEND_ONLY)}
    `),
};
