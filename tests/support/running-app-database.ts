import { inject } from 'vitest';

// Runs before anything imports the connection: factories write where the running app reads.
process.env.DATABASE_URL = inject('appDatabaseUrl');
