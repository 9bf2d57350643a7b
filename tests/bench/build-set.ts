// Prints how long a set takes to build for a student with 1,200 questions, as a ratio to the bare query: npm run bench:set
import pg from 'pg';
import { migrate } from '#server/db/migrator.ts';
import { startThrowAwayCluster } from '#server/launch/postgres.mjs';
import { ensureDatabase, ensureRoles } from '#server/launch/roles.mjs';
import { databaseUrl, rolePasswords } from '#tests/support/database-urls.ts';

const QUESTIONS = 1200;
const SUBJECTS = 8;
const TOPICS = 10;
const RUNS = 60;
const WARM_UP = 10;

const cluster = await startThrowAwayCluster({ durable: true });
await ensureRoles(cluster.adminUrl, rolePasswords);
await ensureDatabase(cluster.adminUrl, 'plait_bench');
await migrate(databaseUrl(cluster.adminUrl, 'owner', 'plait_bench'));
process.env.DATABASE_URL = databaseUrl(cluster.adminUrl, 'app', 'plait_bench');

// Only now may anything open the connection.
const { withSchool, execute, select } = await import('#server/db/scope.ts');
const { sequelize } = await import('#server/db/sequelize.ts');
const { aStudy } = await import('#seeds/factories/study.ts');
const { aSitting } = await import('#seeds/factories/curriculum.ts');
const { loadScope } = await import('#server/services/people/load-scope.ts');
const { loadCandidates, CANDIDATES } = await import('#server/services/practice/load-candidates.ts');
const { loadConfusable, proposeSet } = await import('#server/services/practice/propose-set.ts');

const study = await aStudy({ subjects: SUBJECTS, topics: TOPICS, questions: QUESTIONS / SUBJECTS / TOPICS });
for (const subject of study.subjects) await aSitting(study.school, subject, { on: '2099-05-20' });
await withSchool(study.school.id, () =>
  execute(
    `INSERT INTO memory_states
       (school_id, user_id, question_id, stability, difficulty, last_on, attempts, last_grade, last_share)
     SELECT $1, $2, id, 1 + number % 40, 5, current_date - (number % 30)::int, 2, 3, 1
     FROM questions WHERE number % 3 > 0`,
    [study.school.id, study.student.id],
  ),
);

// What autovacuum does by itself within a minute: without it the planner knows nothing of the new rows.
const admin = new pg.Client({ connectionString: databaseUrl(cluster.adminUrl, 'admin', 'plait_bench') });
await admin.connect();
await admin.query('ANALYZE');
await admin.end();

async function scopeFor<T>(
  work: (scope: NonNullable<Awaited<ReturnType<typeof loadScope>>>) => Promise<T>,
): Promise<T> {
  return withSchool(study.school.id, async (school) => {
    const scope = await loadScope(school, study.student.id);
    if (!scope) throw new Error('the student cannot be loaded');
    return work(scope);
  });
}

/** Milliseconds of each run, the first ones left out. */
async function time(work: () => Promise<unknown>): Promise<number[]> {
  const times: number[] = [];
  for (let run = 0; run < RUNS + WARM_UP; run++) {
    const start = performance.now();
    await work();
    if (run >= WARM_UP) times.push(performance.now() - start);
  }
  return times.sort((a, b) => a - b);
}
const quantile = (sorted: number[], q: number): number => sorted[Math.floor(q * (sorted.length - 1))] ?? 0;

const bare = await time(() => scopeFor(({ actor, today, now }) => select(CANDIDATES, [actor.userId, today, now])));
const build = await time(() =>
  scopeFor(async (scope) => proposeSet(scope, 'mixed', await loadCandidates(scope), await loadConfusable())),
);
const items = await scopeFor(async (scope) => proposeSet(scope, 'mixed', await loadCandidates(scope), []));

const line = (name: string, times: number[]) =>
  console.log(
    `${name.padEnd(12)} median ${quantile(times, 0.5).toFixed(1)} ms, p95 ${quantile(times, 0.95).toFixed(1)} ms`,
  );
console.log(`A set of ${items.length} questions for a student with ${QUESTIONS}, ${RUNS} runs:`);
line('bare query', bare);
line('whole set', build);
const ratio = (q: number) => (quantile(build, q) / quantile(bare, q)).toFixed(2);
console.log(`whole set ÷ bare query: median ${ratio(0.5)}, p95 ${ratio(0.95)}`);

await sequelize.close();
await cluster.stop();
