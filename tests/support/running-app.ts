import type { TestProject } from 'vitest/node';
import { startAppProcess } from './app-process.ts';

declare module 'vitest' {
  interface ProvidedContext {
    origin: string;
    appDatabaseUrl: string;
  }
}

/** One running app for all browser tests; each test makes a school of its own in it. */
export async function setup(project: TestProject): Promise<() => Promise<void>> {
  const app = await startAppProcess();
  project.provide('origin', app.origin);
  project.provide('appDatabaseUrl', app.databaseUrl);
  return app.stop;
}
