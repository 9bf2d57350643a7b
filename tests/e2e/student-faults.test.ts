import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import { aStudent, type FactoryPerson } from '#seeds/factories/people.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { logFaults, storedAnswers } from '#tests/support/practice-log.ts';

const { signIn } = withChromium();

const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name });
const question = (page: Page, number: number) => page.getByRole('heading', { name: `Question ${number} of` });
const marked = (page: Page) => page.getByRole('heading', { name: 'Mark scheme' });
const status = (page: Page, words: string | RegExp) => page.getByRole('status').filter({ hasText: words });

/** Three questions that Plait marks, in as many subjects, none a recall card. */
async function threeQuestions(): Promise<Study> {
  const study = await aStudy({ subjects: 3, topics: 1, questions: 2 });
  await withSchool(study.school.id, () =>
    execute(
      `UPDATE questions SET live_version_id = NULL
       WHERE id IN (SELECT question_id FROM question_versions WHERE kind = 'recallCard')`,
    ),
  );
  return study;
}

/** Puts another student into every class of the study. */
const enrol = ({ school, subjects }: Study, { id }: FactoryPerson): Promise<void> =>
  withSchool(school.id, async () => {
    for (const { classId } of subjects) {
      await execute(
        `INSERT INTO enrolments (school_id, id, class_id, user_id, valid_from)
         VALUES ($1, gen_random_uuid(), $2, $3, '2020-01-01')`,
        [school.id, classId, id],
      );
    }
  });

async function openSet(page: Page): Promise<void> {
  await page.goto('/today');
  await page.getByRole('link', { name: /(Start|Continue) mixed set/ }).click();
  await question(page, 1).waitFor();
}

async function write(page: Page, text: string): Promise<void> {
  await page.getByRole('textbox').fill(text);
  await page.getByRole('radio', { name: 'Certain' }).check({ force: true });
}

/** Fills in the form of the sign-in page that is open. */
async function signInOn(page: Page, { username }: FactoryPerson): Promise<void> {
  await page.getByLabel('E-mail or school username').fill(username);
  await page.getByLabel('Password', { exact: true }).fill(FACTORY_PASSWORD);
  await button(page, 'Sign in').click();
}

/** Ends every session of a person on the server, as its time running out would. */
const endSessions = ({ schoolId, id }: FactoryPerson): Promise<unknown> =>
  withSchool(schoolId, () => execute(`DELETE FROM session WHERE sess -> 'passport' -> 'user' ->> 'userId' = $1`, [id]));

/** What is kept on the device and not sent, as the browser holds it. */
const kept = (page: Page): Promise<string[]> =>
  page.evaluate(() => Object.keys(sessionStorage).filter((key) => key.startsWith('plait.answers.')));

const counted = async (schoolId: string) =>
  (await storedAnswers(schoolId)).map(({ position, responses, mark_events }) => [position, responses[0], mark_events]);

test('answers handed in offline go on, wait in words, and are sent in order once back', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await openSet(page);
  await context.setOffline(true);
  await page
    .getByText('Your answers are kept on this page and sent when you are back. Keep it open until then.')
    .waitFor();
  await write(page, '42');
  await button(page, 'Keep and go on').click();
  await question(page, 2).waitFor();
  await status(page, 'One is waiting: question 1.').waitFor();
  await write(page, '41');
  await button(page, 'Keep and go on').click();
  await question(page, 3).waitFor();
  await status(page, 'Two are waiting: questions 1 and 2.').waitFor();
  await page.getByRole('textbox').fill('typed while away');
  expect(await storedAnswers(study.school.id)).toEqual([]);

  await context.setOffline(false);
  await status(page, 'You are back. Your answers are saved and marked.').waitFor();
  await expect.poll(() => kept(page)).toEqual([]);
  // What was being typed meanwhile is still there, and the marks can be looked at.
  expect(await page.getByRole('textbox').inputValue()).toBe('typed while away');
  await button(page, 'See question 1').click();
  await status(page, '1 of 1 marks.').waitFor({ state: 'attached' });
  await button(page, 'See question 2').click();
  await status(page, '0 of 1 marks.').waitFor({ state: 'attached' });
  await button(page, 'Next question').click();
  expect(await page.getByRole('textbox').inputValue()).toBe('typed while away');
  expect(await counted(study.school.id)).toEqual([
    [1, '42', 1],
    [2, '41', 1],
  ]);
  expect(await logFaults(study.school.id)).toEqual([]);
  await context.close();
});

test('a busy server and a reload lose nothing that was handed in', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await openSet(page);
  await page.route('**/api/sets/*/answers', (route) =>
    route.fulfill({
      status: 503,
      contentType: 'application/problem+json',
      body: JSON.stringify({ type: '/problems/busy', title: 'Busy', status: 503, detail: 'Plait is busy.' }),
    }),
  );
  await write(page, '42');
  await button(page, 'Hand in answer').click();
  await status(page, 'Plait is busy.').waitFor();
  await page.getByRole('heading', { name: 'Kept on this page' }).waitFor();
  await page.reload();
  await status(page, 'One is waiting: question 1.').waitFor();
  await page.unroute('**/api/sets/*/answers');
  await expect.poll(() => kept(page), { timeout: 15_000 }).toEqual([]);
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  expect(await logFaults(study.school.id)).toEqual([]);
  await context.close();
});

test('an answer whose acknowledgement got lost counts once', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await openSet(page);
  let sent = 0;
  await page.route('**/api/sets/*/answers', async (route) => {
    sent += 1;
    if (sent > 1) return route.continue();
    await route.fetch();
    await route.abort('connectionreset');
  });
  await write(page, '42');
  await button(page, 'Hand in answer').click();
  await status(page, '1 of 1 marks.').waitFor({ state: 'attached' });
  expect(sent).toBe(2);
  expect(await page.getByText('You had already answered').count()).toBe(0);
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  await context.close();
});

test('two tabs race on each question: one answer counts, and both show its mark', async () => {
  const study = await threeQuestions();
  const first = await signIn(study.student);
  const { context, troubles } = first;
  const tabs = [first.page, await context.newPage()];
  await openSet(first.page);
  await tabs[1]?.goto(first.page.url());
  const given = ['42', '41'];
  const winners: (string | undefined)[] = [];
  for (const number of [1, 2, 3]) {
    for (const [index, page] of tabs.entries()) {
      await question(page, number).waitFor();
      await write(page, given[index] ?? '');
    }
    // By key: a tab in the background does not paint, and a click would wait for that.
    await Promise.all(tabs.map((page) => button(page, 'Hand in answer').press('Enter')));
    await Promise.all(tabs.map((page) => marked(page).waitFor()));
    const answers = (await storedAnswers(study.school.id)).filter(({ position }) => position === number);
    expect(answers.length).toBe(1);
    winners.push(answers[0]?.responses[0]);
    const words = `${answers[0]?.marks} of 1 marks.`;
    for (const [index, page] of tabs.entries()) {
      await status(page, words).waitFor({ state: 'attached' });
      await page
        .getByText(answers[0]?.responses[0] ?? '', { exact: true })
        .first()
        .waitFor();
      const isLoser = given[index] !== answers[0]?.responses[0];
      expect(await status(page, 'You had already answered this question').count()).toBe(isLoser ? 1 : 0);
      if (number < 3) await button(page, 'Next question').press('Enter');
    }
  }
  expect(winners.every((winner) => given.includes(winner ?? ''))).toBe(true);
  // Both may finish it: the second time changes nothing.
  for (const page of tabs) await button(page, 'Finish the set').press('Enter');
  for (const page of tabs) await page.getByRole('heading', { name: /^3 questions in/ }).waitFor();
  expect(troubles).toEqual([]);
  expect(await logFaults(study.school.id)).toEqual([]);
  await context.close();
});

test('a session that ends under the page keeps the answer for its owner alone', async () => {
  const study = await threeQuestions();
  const other = await aStudent(study.school);
  await enrol(study, other);
  const { page, context } = await signIn(study.student);
  await openSet(page);
  const set = new URL(page.url()).pathname;

  // The same person signs in again and is back at the question, its answer sent.
  await endSessions(study.student);
  await write(page, '42');
  await button(page, 'Hand in answer').click();
  await page.getByText('Sign in to go on where you were.').waitFor();
  expect((await kept(page)).length).toBe(1);
  await signInOn(page, study.student);
  await page.waitForURL(`**${set}?q=*`);
  await expect.poll(() => kept(page)).toEqual([]);
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);

  // Somebody else signs in on the same browser and sees nothing of it.
  await page.goto(set);
  await question(page, 2).waitFor();
  await endSessions(study.student);
  await write(page, 'seventeen');
  await button(page, 'Hand in answer').click();
  await page.getByText('Sign in to go on where you were.').waitFor();
  await signInOn(page, other);
  await page.getByRole('heading', { name: /There is no such page|^\w+day \d+/ }).waitFor();
  await page.goto('/today');
  await page.getByRole('heading', { name: /^\w+day \d+/ }).waitFor();
  expect(await page.getByText(/kept on this (device|page)|seventeen/).count()).toBe(0);
  await openSet(page);
  expect(await page.getByRole('textbox').inputValue()).toBe('');
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  await endSessions(other);

  // Back again, it is sent from wherever the owner arrives.
  await page.goto(`/sign-in/${study.school.code}`);
  await signInOn(page, study.student);
  await page.getByRole('heading', { name: /^\w+day \d+/ }).waitFor();
  await expect.poll(() => kept(page)).toEqual([]);
  const answers = await storedAnswers(study.school.id);
  expect(answers.map(({ user_id, position, responses }) => [user_id, position, responses[0]])).toEqual([
    [study.student.id, 1, '42'],
    [study.student.id, 2, 'seventeen'],
  ]);
  expect(await logFaults(study.school.id)).toEqual([]);
  await context.close();
});

test('signing out in another tab leads this one to the sign-in, and what waits here is sent afterwards', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await openSet(page);
  await page.route('**/api/sets/*/answers', (route) => route.abort());
  await write(page, '42');
  await button(page, 'Hand in answer').click();
  await page.getByRole('heading', { name: 'Kept on this page' }).waitFor();
  const tab = await context.newPage();
  await tab.goto('/today');
  await button(tab, /your settings$/).click();
  await button(tab, 'Sign out').click();
  await tab.getByRole('heading', { name: 'Sign in' }).waitFor();
  await tab.close();
  await page.unroute('**/api/sets/*/answers');
  await page.getByText('Sign in to go on where you were.').waitFor();
  expect((await kept(page)).length).toBe(1);
  await signInOn(page, study.student);
  await expect.poll(() => kept(page)).toEqual([]);
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  await context.close();
});

test('somebody else who signs in in another tab neither sends nor loses what waits in this one', async () => {
  const study = await threeQuestions();
  const other = await aStudent(study.school);
  await enrol(study, other);
  const { page, context } = await signIn(study.student);
  await openSet(page);
  await page.route('**/api/sets/*/answers', (route) => route.abort());
  await write(page, '42');
  await button(page, 'Hand in answer').click();
  await page.getByRole('heading', { name: 'Kept on this page' }).waitFor();
  const tab = await context.newPage();
  await tab.goto(`/sign-in/${study.school.code}`);
  await signInOn(tab, other);
  await tab.getByRole('heading', { name: /^\w+day \d+/ }).waitFor();
  expect(await tab.getByText(/kept on this/).count()).toBe(0);
  await page.unroute('**/api/sets/*/answers');
  await page.getByText('Sign in to go on where you were.').waitFor();
  expect((await kept(page)).length).toBe(1);
  expect(await storedAnswers(study.school.id)).toEqual([]);
  await signInOn(page, study.student);
  await marked(page).waitFor();
  const answers = await storedAnswers(study.school.id);
  expect(answers.map(({ user_id, responses }) => [user_id, responses[0]])).toEqual([[study.student.id, '42']]);
  expect(await kept(page)).toEqual([]);
  await context.close();
});

/** What a person's own device keeps, as the browser's database holds it; none where there is no database. */
const onDevice = (page: Page): Promise<string[]> =>
  page.evaluate(async () => {
    if (!(await indexedDB.databases()).some(({ name }) => name === 'plait')) return [];
    const opened = indexedDB.open('plait');
    await new Promise((resolve) => {
      opened.onsuccess = resolve;
    });
    const keys = opened.result.transaction('kept').objectStore('kept').getAllKeys();
    await new Promise((resolve) => {
      keys.onsuccess = resolve;
    });
    opened.result.close();
    return keys.result.map(String);
  });

test('on an own device an answer outlives its tab and is sent from any page of the same person', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await page.goto(`/sign-in/${study.school.code}`);
  await page.getByLabel('This is my own device').check();
  await signInOn(page, study.student);
  await page.getByRole('heading', { name: /^\w+day \d+/ }).waitFor();
  await openSet(page);
  await context.route('**/api/sets/*/answers', (route) => route.abort());
  await write(page, '42');
  await button(page, 'Hand in answer').click();
  await page.getByRole('heading', { name: 'Kept on this device' }).waitFor();
  await status(page, 'If you close it, they go when you next open Plait.').waitFor();
  await button(page, 'Next question').click();
  await page.getByRole('textbox').fill('half an');
  await expect.poll(() => onDevice(page)).toHaveLength(2);
  expect(await kept(page)).toEqual([]);
  await page.close();

  const later = await context.newPage();
  await later.goto('/topics');
  await status(later, 'One answer is kept on this device and sent when').waitFor();
  await context.unroute('**/api/sets/*/answers');
  await expect.poll(async () => (await onDevice(later)).filter((key) => key.includes('answers'))).toEqual([]);
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  await later.goto('/today');
  await later.getByRole('link', { name: 'Continue mixed set' }).click();
  await question(later, 2).waitFor();
  expect(await later.getByRole('textbox').inputValue()).toBe('half an');

  // Signing out asks where something is unsent, and leaves nothing behind.
  await context.route('**/api/sets/*/answers', (route) => route.abort());
  await write(later, '41');
  await button(later, 'Hand in answer').click();
  await later.getByRole('heading', { name: 'Kept on this device' }).waitFor();
  await later.getByRole('link', { name: 'Leave the set' }).click();
  await button(later, /your settings$/).click();
  await button(later, 'Sign out').click();
  const dialog = later.getByRole('dialog', { name: 'Sign out and lose what is not sent?' });
  await dialog.getByText('One answer is kept here and not sent yet.').waitFor();
  await dialog.getByRole('button', { name: 'Sign out' }).click();
  await later.getByRole('heading', { name: 'Sign in' }).waitFor();
  await expect.poll(() => onDevice(later)).toEqual([]);
  expect(await later.evaluate(() => localStorage.getItem('plait.device'))).toBeNull();
  await context.close();
});

test('an answer refused after its set was left is told in words, with what was written', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await openSet(page);
  await page.route('**/api/sets/*/answers', (route) => route.abort());
  await write(page, '42 sheep');
  await button(page, 'Hand in answer').click();
  await page.getByRole('heading', { name: 'Kept on this page' }).waitFor();
  await page.unroute('**/api/sets/*/answers');
  await page.route('**/api/sets/*/answers', (route) =>
    route.fulfill({
      status: 422,
      contentType: 'application/problem+json',
      body: JSON.stringify({ type: '/problems/refused', title: 'No', status: 422, detail: 'It is too long.' }),
    }),
  );
  await page.getByRole('link', { name: 'Leave the set' }).click();
  await status(page, 'An answer was not taken. It is too long. You wrote: “42 sheep”.').waitFor();
  expect(await kept(page)).toEqual([]);
  await page.reload();
  await button(page, 'Put this note away').click();
  expect(await page.getByText('42 sheep').count()).toBe(0);
  await page.reload();
  await page.getByRole('heading', { name: /^\w+day \d+/ }).waitFor();
  expect(await page.getByText('42 sheep').count()).toBe(0);
  await context.close();
});

test('a browser that stores nothing loses no answer while the page stays, and says so', async () => {
  const study = await threeQuestions();
  const { page, context } = await signIn(study.student);
  await page.addInitScript(() => {
    Storage.prototype.setItem = () => {
      throw new DOMException('full', 'QuotaExceededError');
    };
  });
  await openSet(page);
  await write(page, '42');
  await status(page, 'This browser stores nothing.').waitFor();
  await page.route('**/api/sets/*/answers', (route) => route.abort());
  await button(page, 'Hand in answer').click();
  await status(page, 'This browser stores nothing, so do not close or reload it until then.').waitFor();
  await page.unroute('**/api/sets/*/answers');
  await marked(page).waitFor({ timeout: 15_000 });
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  await context.close();
});

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
        await expect.poll(() => kept(page), { timeout: 15_000 }).toEqual([]);
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
