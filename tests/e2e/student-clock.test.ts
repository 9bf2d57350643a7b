import { expect, test } from 'vitest';
import { aStudent, type FactoryPerson } from '#seeds/factories/people.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { logFaults, storedAnswers } from '#tests/support/practice-log.ts';
import { button, enrol, kept, marked, openSet, question, threeQuestions, write } from '#tests/support/student-page.ts';

const { signIn } = withChromium();

const memories = ({ schoolId, id }: FactoryPerson) =>
  withSchool(schoolId, () =>
    select<object>(
      `SELECT i.position, m.stability, m.difficulty, to_char(m.last_on, 'YYYY-MM-DD') AS last_on, m.attempts, m.last_grade
       FROM memory_states m JOIN set_items i ON i.question_id = m.question_id
       JOIN sets s ON s.id = i.set_id AND s.user_id = m.user_id
       WHERE m.user_id = $1 ORDER BY i.position`,
      [id],
    ),
  );

const DAY_MS = 24 * 3600 * 1000;

test.each([
  { words: 'a day ahead', offset: DAY_MS },
  { words: 'a day behind', offset: -DAY_MS },
])('a device clock $words changes no date and no memory', async ({ offset }) => {
  const study = await threeQuestions();
  const twin = await aStudent(study.school);
  await enrol(study, twin);
  const words: string[] = [];
  for (const person of [study.student, twin]) {
    const { page, context, troubles } = await signIn(person);
    const isWrong = person === twin;
    if (isWrong) await page.clock.install({ time: Date.now() + offset });
    await openSet(page);
    for (const number of [1, 2]) {
      await question(page, number).waitFor();
      await write(page, number === 1 ? '42' : '41');
      if (number === 2 && isWrong) {
        // The clock jumps once more while an answer waits, and the page is loaded again.
        await page.route('**/api/sets/*/answers', (route) => route.abort());
        await button(page, 'Hand in answer').click();
        await page.getByRole('heading', { name: 'Kept on this page' }).waitFor();
        await page.clock.setSystemTime(Date.now() + 2 * offset);
        await page.reload();
        await page.unroute('**/api/sets/*/answers');
        await expect.poll(() => kept(page), { timeout: 60_000 }).toEqual([]);
        await page.goto(`${new URL(page.url()).pathname}?q=2`);
      } else await button(page, 'Hand in answer').click();
      await marked(page).waitFor();
      words.push(
        (await page
          .getByText(/comes back/)
          .first()
          .textContent()) ?? '',
      );
      if (number === 1) await button(page, 'Next question').click();
    }
    if (!isWrong) expect(troubles).toEqual([]);
    await context.close();
  }
  expect(words.slice(2)).toEqual(words.slice(0, 2));
  const own = await memories(study.student);
  expect(own.length).toBe(2);
  expect(await memories(twin)).toEqual(own);
  const answers = await storedAnswers(study.school.id);
  expect(answers.map(({ given_on, set_on }) => given_on === set_on)).toEqual([true, true, true, true]);
  expect(await logFaults(study.school.id)).toEqual([]);
});
