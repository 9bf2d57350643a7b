// Time and memory that a set takes to build, alone and with a school arriving at once, as ratios to its bare query and
// to the least a request can cost on the same machine: npm run bench:set -- [--sizes 300,1200] [--runs 60]
// [--seconds 300] [--students 2000] [--no-burst] [--json FILE]. Fails where a goal is missed.
import { startBenchDatabase } from './bench-database.ts';
import { readOptions } from './options.ts';

const options = readOptions(process.argv.slice(2));
const database = await startBenchDatabase();
process.env.DATABASE_URL = database.appUrl;
try {
  // Only now may anything open the connection.
  const { run } = await import('./run.ts');
  const verdicts = await run(options, database);
  if (verdicts.some(({ isMet }) => !isMet)) process.exitCode = 1;
} finally {
  await database.stop();
}
