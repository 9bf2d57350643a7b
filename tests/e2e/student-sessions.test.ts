import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { aStudent } from '#seeds/factories/people.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { logFaults, storedAnswers } from '#tests/support/practice-log.ts';
import {
  button,
  counted,
  endSessions,
  enrol,
  kept,
  marked,
  openSet,
  question,
  signInOn,
  status,
  threeQuestions,
  write,
} from '#tests/support/student-page.ts';

const { signIn } = withChromium();

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
