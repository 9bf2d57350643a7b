import { writeFile } from 'node:fs/promises';
import type pg from 'pg';
import { aSchool } from '#seeds/factories/school.ts';
import { sequelize } from '#server/db/sequelize.ts';
import type { BenchDatabase } from './bench-database.ts';
import type { Verdict } from './figures.ts';
import { fillBank } from './fill-bank.ts';
import { fillStudents } from './fill-students.ts';
import { judgeBuilds } from './judge-build.ts';
import { judgeBurst } from './judge-burst.ts';
import { type BuildFigures, type Learner, measureBuilds } from './measure-build.ts';
import { measureBurst } from './measure-burst.ts';
import { measureFloor } from './measure-floor.ts';
import type { Options } from './options.ts';
import { closeConnections } from './post.ts';
import { buildLines, burstLines, floorLines, verdictLines } from './report.ts';

/** Students of a measured school: the one who is measured has classmates, whose rows lie between theirs. */
const CLASS = 5;

const print = (lines: readonly string[]): void => console.log(`${lines.join('\n')}\n`);

async function fillSize(admin: pg.Client, size: number): Promise<Learner> {
  const school = await aSchool();
  await fillBank(admin, school, { questions: size, groups: 1 });
  const [studentId] = await fillStudents(admin, school, { students: CLASS, groups: 1, answers: size });
  if (studentId === undefined) throw new Error('there is no student to measure');
  return { schoolId: school.id, studentId };
}

async function measureSizes({ admin }: BenchDatabase, { sizes, runs }: Options): Promise<BuildFigures[]> {
  const learners: Learner[] = [];
  for (const size of sizes) learners.push(await fillSize(admin, size));
  // What autovacuum does by itself within a minute: without it the planner knows nothing of the new rows.
  await admin.query('VACUUM ANALYZE');
  return measureBuilds(learners, runs);
}

/** Measures, prints, and writes all figures where asked. @returns what was found of the goals */
export async function run(options: Options, database: BenchDatabase): Promise<Verdict[]> {
  try {
    const floor = await measureFloor(database.appUrl, (await aSchool()).id);
    print(floorLines(floor));
    const builds = await measureSizes(database, options);
    for (const figures of builds) print(buildLines(figures, floor));
    const burst = options.hasBurst ? await measureBurst(database.admin, database.appUrl, options) : undefined;
    if (burst) print(burstLines(burst, floor));
    const verdicts = [...judgeBuilds(builds), ...(burst ? judgeBurst(burst) : [])];
    print(verdictLines(verdicts));
    if (options.json)
      await writeFile(options.json, JSON.stringify({ options, floor, builds, burst, verdicts }, null, 2));
    return verdicts;
  } finally {
    closeConnections();
    await sequelize.close();
  }
}
