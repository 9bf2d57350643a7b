// Compares the scheduler with what could be done instead, on simulated learners: npm run bench:scheduler -- --help
import { writeFile } from 'node:fs/promises';
import { acceptanceLines, MAIN_ROW } from './acceptance.ts';
import { applies, type Job } from './job.ts';
import { HELP, type Options, readOptions } from './options.ts';
import { picture } from './picture.ts';
import { runJobs } from './pool.ts';
import { report } from './report.ts';
import { Results } from './results.ts';
import { SENSITIVITY } from './settings.ts';

/** What the sensitivity table compares, as far as it was asked for. */
const SENSITIVITY_POLICIES = ['due', 'tg', 'bound'];

function jobsOf({ learners, seed, types, policies, settings, hasSensitivity }: Options): Job[] {
  const rows = [
    { id: MAIN_ROW, settings, policies },
    ...(hasSensitivity
      ? SENSITIVITY.map((row) => ({ ...row, policies: SENSITIVITY_POLICIES.filter((id) => policies.includes(id)) }))
      : []),
  ];
  return rows.flatMap((row) =>
    types.flatMap((type) =>
      Array.from({ length: learners }, (_, learner) => ({
        rowId: row.id,
        seed: seed + learner,
        type,
        settings: row.settings,
        policies: row.policies.filter((id) => applies(id, type, row.settings)),
      })),
    ),
  );
}

/** @returns the code to end with */
async function bench(options: Options): Promise<number> {
  const start = performance.now();
  const seconds = (): string => `${Math.round((performance.now() - start) / 1000)} s`;
  const done = await runJobs(jobsOf(options), options.workers, (count, of) => {
    process.stderr.write(`\r${count} of ${of} learners' seasons, ${seconds()} `);
  });
  process.stderr.write('\n');
  const results = new Results(done);
  const lines = options.isStandard ? acceptanceLines(results, options.isQuick ? 2 : 0) : [];
  console.log(report(results, options, lines));
  const { user, system } = process.cpuUsage();
  console.log(`\n${seconds()} on ${options.workers} threads, ${Math.round((user + system) / 1e6)} s of processor time`);
  if (options.json) await writeFile(options.json, `${JSON.stringify({ options, results, lines }, null, 1)}\n`);
  if (options.svg) await writeFile(options.svg, picture(results, options));
  return lines.every(({ isPassed }) => isPassed !== false) ? 0 : 1;
}

/** What was asked for; ends with 2, saying why, where it cannot be. */
function optionsOrEnd(): Options | null {
  try {
    return readOptions(process.argv.slice(2));
  } catch (error) {
    console.error(error instanceof Error ? error.message : error);
    return process.exit(2);
  }
}

const options = optionsOrEnd();
if (options) process.exitCode = await bench(options);
else console.log(HELP);
