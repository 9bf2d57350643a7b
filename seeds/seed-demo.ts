import { rename, writeFile } from 'node:fs/promises';
import { demoList } from '#seeds/demo/demo-people.ts';
import { allBankRows, planDemo, planPractice, studyRows } from '#seeds/demo/plan.ts';
import { insertAll, type Rows } from '#seeds/demo/rows.ts';
import { DEMO_PASSWORD, SCHOOL } from '#seeds/demo/school.ts';
import { findSchoolId } from '#server/db/directory.ts';
import { withSchool } from '#server/db/scope.ts';
import { sequelize } from '#server/db/sequelize.ts';
import { runNightly } from '#server/jobs/nightly.ts';
import { hashPassword } from '#server/services/people/passwords.ts';
import { loadOptimiser } from '#server/services/practice/optimiser.ts';
import { BUDGET_SECONDS } from '#server/services/practice/propose-set.ts';
import { localDate } from '#shared/domain/time/zone.ts';

/** Says what a step came to and how long it took, one line a step. */
async function step<T>(name: string, work: () => T | Promise<T>, words: (result: T) => string): Promise<T> {
  const started = performance.now();
  const result = await work();
  const seconds = ((performance.now() - started) / 1000).toFixed(1);
  process.stdout.write(`${name}: ${words(result)} (${seconds} s)\n`);
  return result;
}

const count = (rows: Rows, table: keyof Rows): string => (rows[table]?.length ?? 0).toLocaleString('en-GB');

/** Written beside and put in place, so that nobody reads half a list. */
async function writeDemoFile(file: string, list: object): Promise<void> {
  const draft = `${file}.new`;
  await writeFile(draft, `${JSON.stringify(list, null, 2)}\n`, { mode: 0o600 });
  await rename(draft, file);
}

/**
 * Makes the demo school, all of it in one transaction: a seed that was cut short has written nothing and is simply
 * started again. Where the school exists already, nothing is changed.
 */
async function seedDemo(): Promise<void> {
  const existing = await findSchoolId(SCHOOL.code);
  if (existing && existing !== SCHOOL.id) {
    throw new Error(`The code "${SCHOOL.code}" belongs to a school that is not the demo. The demo was not seeded.`);
  }
  const now = await withSchool(SCHOOL.id, async (scope) => scope.now);
  const plan = planDemo(localDate(now, SCHOOL.zone));

  if (existing) process.stdout.write(`${SCHOOL.name} is there already.\n`);
  else {
    const passwordHash = await hashPassword(DEMO_PASSWORD);
    const study = studyRows(plan, passwordHash);
    const bank = allBankRows(plan);
    const practice = await step(
      'Simulated practice',
      () => planPractice(plan, BUDGET_SECONDS),
      ({ sets, answers }) =>
        `${sets.length.toLocaleString('en-GB')} sets, ${answers.length.toLocaleString('en-GB')} answers`,
    );
    await withSchool(SCHOOL.id, async () => {
      await step(
        'School',
        () => insertAll(study),
        () =>
          `${count(study, 'users')} people, ${count(study, 'subjects')} subjects, ${count(study, 'topics')} topics, ${count(study, 'classes')} classes, ${count(study, 'sittings')} sittings`,
      );
      await step(
        'Question bank',
        () => insertAll(bank),
        () => `${count(bank, 'questions')} questions, ${count(bank, 'question_versions')} versions`,
      );
      await step(
        'Answers',
        () => insertAll({ ...practice }),
        (written) => `${written.toLocaleString('en-GB')} rows of sets, answers, marks and memory`,
      );
    });
    // A seed that was cut short here lacks figures that the school's first night adds.
    await step(
      'Estimates',
      () => runNightly(SCHOOL.id, { optimise: loadOptimiser() }),
      ({ versions, checked }) => `seconds of ${versions} questions, recall of ${checked} students`,
    );
  }
  const file = process.env.DEMO_FILE;
  if (file) await writeDemoFile(file, demoList(plan.classes));
}

try {
  await seedDemo();
} catch (error) {
  process.stderr.write(`Seeding failed: ${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
} finally {
  await sequelize.close();
}
