import { tenancy } from './2026-12-01-01-tenancy.ts';
import { people } from './2026-12-01-02-people.ts';
import { curriculum } from './2026-12-01-03-curriculum.ts';
import { questions } from './2026-12-01-04-questions.ts';
import { practice } from './2026-12-01-05-practice.ts';
import { audit } from './2026-12-01-06-audit.ts';
import { jobs } from './2026-12-01-07-jobs.ts';
import { scheduler } from './2026-12-01-08-scheduler.ts';
import { topicMerge } from './2026-12-01-09-topic-merge.ts';
import { nightlyQueue } from './2026-12-01-10-nightly-queue.ts';
import type { Migration } from './migration.ts';

/** Every migration in the order it runs. An explicit list survives bundling; a merged file is never edited. */
export const migrations: Migration[] = [
  tenancy,
  people,
  curriculum,
  questions,
  practice,
  audit,
  jobs,
  scheduler,
  topicMerge,
  nightlyQueue,
];
