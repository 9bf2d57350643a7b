/** Passwords of the throw-away roles: the cluster listens on loopback and lives for one run. */
const PASSWORD = 'throw-away';

export const rolePasswords = { owner: PASSWORD, app: PASSWORD, backup: PASSWORD };

/** The address of one database on the test cluster, as one of the project's roles. */
export function databaseUrl(adminUrl: string, role: 'owner' | 'app' | 'backup' | 'admin', database: string): string {
  const url = new URL(adminUrl);
  url.pathname = `/${database}`;
  if (role !== 'admin') {
    url.username = `plait_${role}`;
    url.password = PASSWORD;
  }
  return url.toString();
}

/** The superuser's address on the cluster that the test command started. */
export function adminUrl(): string {
  const url = process.env.TEST_ADMIN_URL;
  if (!url)
    throw new Error('TEST_ADMIN_URL is not set. Run the tests with npm test, or npm test -- --project api FILE.');
  return url;
}
