import { expect, test } from 'vitest';
import { withChromium } from '#tests/support/chromium.ts';
import { logFaults, storedAnswers } from '#tests/support/practice-log.ts';
import {
  button,
  counted,
  kept,
  marked,
  openSet,
  question,
  status,
  threeQuestions,
  write,
} from '#tests/support/student-page.ts';

const { signIn } = withChromium();

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
  await expect.poll(() => kept(page), { timeout: 60_000 }).toEqual([]);
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
  await marked(page).waitFor({ timeout: 60_000 });
  expect(await counted(study.school.id)).toEqual([[1, '42', 1]]);
  await context.close();
});
