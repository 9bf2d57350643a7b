/** What the app's own role may do with a table; nothing else is granted to it, ever. */
export type AppGrant = 'SELECT' | 'INSERT' | 'UPDATE' | 'DELETE';

/**
 * SQL that puts a table behind the tenant wall: row-level security, forced on its owner too, and the grants the
 * app needs. The table must carry `school_id uuid NOT NULL` as the first column of its primary key.
 */
export const tenantWall = (table: string, grants: AppGrant[]): string => `
  ALTER TABLE ${table} ENABLE ROW LEVEL SECURITY;
  ALTER TABLE ${table} FORCE ROW LEVEL SECURITY;
  CREATE POLICY tenant ON ${table}
    USING (school_id = (SELECT app.current_school()))
    WITH CHECK (school_id = (SELECT app.current_school()));
  GRANT ${grants.join(', ')} ON ${table} TO plait_app;
`;

/** Grants of a table whose rows people edit. */
export const EDITABLE: AppGrant[] = ['SELECT', 'INSERT', 'UPDATE', 'DELETE'];
/** Grants of a log: rows are added and never changed. */
export const APPEND_ONLY: AppGrant[] = ['SELECT', 'INSERT'];
