import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { aMemory } from '#seeds/factories/answer.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import { axe, DESK, PHONE, withChromium } from '#tests/support/chromium.ts';
import { expectFocus, tabTo } from '#tests/support/keyboard.ts';
import { logFaults, storedAnswers } from '#tests/support/practice-log.ts';

const { signIn } = withChromium();

const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name });
const answerField = (page: Page) => page.getByRole('textbox');
const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { name });

/** Types an answer and says how sure, without leaving the question. */
async function write(page: Page, text: string, howSure = 'Fairly sure'): Promise<void> {
  await answerField(page).fill(text);
  await page.getByRole('radio', { name: howSure }).check({ force: true });
}

/** Hands in what is on the page and sees it through to its mark, a recall card with no point ticked. */
async function handIn(page: Page): Promise<void> {
  const isCard = (await answerField(page).evaluate((field) => field.tagName)) === 'TEXTAREA';
  await button(page, 'Hand in answer').click();
  if (isCard) await button(page, 'Save 0 marks').click();
  await heading(page, 'Mark scheme').waitFor();
}

const openMixedSet = async (page: Page): Promise<void> => {
  await page.goto('/today');
  await page.getByRole('link', { name: 'Start mixed set' }).click();
  await heading(page, /^Question 1 of/).waitFor();
};

/** Answers the question on the page with keys only, up to its mark. */
async function answerByKeys(page: Page): Promise<void> {
  const isCard = (await answerField(page).evaluate((field) => field.tagName)) === 'TEXTAREA';
  await tabTo(page, answerField(page));
  await page.keyboard.type(isCard ? 'A shared pair of electrons' : '42');
  await tabTo(page, page.getByRole('radio').first());
  await page.keyboard.press('Space');
  await page.keyboard.press('ArrowRight');
  expect(await page.getByRole('radio', { name: 'Fairly sure' }).isChecked()).toBe(true);
  // A region that is there before it speaks is one that screen readers hear.
  await page.getByRole('status').evaluateAll((regions) => {
    for (const region of regions) region.setAttribute('data-was-there', '');
  });
  const said = page.locator('[role=status][data-was-there]');
  await tabTo(page, button(page, 'Hand in answer'));
  await page.keyboard.press('Enter');
  if (isCard) {
    await said.filter({ hasText: 'Handed in. Mark it against the scheme.' }).waitFor({ state: 'attached' });
    await expectFocus(heading(page, 'Tick each point you earned'));
    await tabTo(page, page.getByRole('checkbox').first());
    await page.keyboard.press('Space');
    await page.keyboard.press('ArrowDown');
    await page.keyboard.press('Space');
    await tabTo(page, button(page, 'Save 2 marks'));
    await page.keyboard.press('Enter');
  }
  await said.filter({ hasText: isCard ? '2 of 2 marks.' : '1 of 1 marks.' }).waitFor({ state: 'attached' });
  await expectFocus(heading(page, 'Mark scheme'));
}

test.each([
  { width: 1280, viewport: DESK, asked: 4 },
  { width: 390, viewport: PHONE, asked: 3 },
])('a mixed set by keyboard alone, $width wide, $asked questions of four', async ({ viewport, asked }) => {
  const study = await aStudy({ subjects: 2, topics: 1, questions: 2 });
  const { page, troubles, context } = await signIn(study.student, { viewport });
  await page.goto('/today');
  await tabTo(page, page.getByRole('link', { name: 'Start mixed set' }));
  await page.keyboard.press('Enter');
  for (let number = 1; number <= asked; number++) {
    await expectFocus(heading(page, `Question ${number} of 4`));
    await answerByKeys(page);
    expect(await page.evaluate(() => document.documentElement.scrollWidth <= innerWidth)).toBe(true);
    if (number === asked) break;
    await tabTo(page, button(page, 'Next question'));
    await page.keyboard.press('Enter');
  }
  await tabTo(page, button(page, asked === 4 ? 'Finish the set' : 'Stop here'));
  await page.keyboard.press('Enter');
  await heading(page, `${asked} questions in 1 minute`).waitFor();
  const table = page.getByRole('table');
  await table
    .getByText(/^(1 of 1|2 of 2|3 of 3)$/)
    .first()
    .waitFor();
  expect(await table.getByRole('row').count()).toBe(3);
  if (asked === 3) await page.getByText('The other question goes back to the pool').waitFor();
  expect(await axe(page)).toEqual([]);
  expect(troubles).toEqual([]);
  expect((await storedAnswers(study.school.id)).map(({ position, mark_events }) => [position, mark_events])).toEqual(
    [1, 2, 3, 4].slice(0, asked).map((position) => [position, 1]),
  );
  expect(await logFaults(study.school.id)).toEqual([]);
  await context.close();
});

test('leaving in the middle of a question comes back to it with what was typed; so does a reload', async () => {
  const study = await aStudy({ subjects: 2, topics: 1, questions: 2 });
  const { page, troubles, context } = await signIn(study.student);
  await openMixedSet(page);
  await write(page, '42');
  await handIn(page);
  await button(page, 'Next question').click();
  await heading(page, 'Question 2 of 4').waitFor();
  await write(page, '41', 'Certain');

  const isAsItWas = async () => {
    await heading(page, 'Question 2 of 4').waitFor();
    expect(await answerField(page).inputValue()).toBe('41');
    expect(await page.getByRole('radio', { name: 'Certain' }).isChecked()).toBe(true);
  };
  await page.getByRole('link', { name: 'Leave the set' }).click();
  await page.getByText('1 of 4 questions answered.').waitFor();
  await page.getByRole('link', { name: 'Continue mixed set' }).click();
  await isAsItWas();
  await page.reload();
  await isAsItWas();
  // Back in the browser is a way of leaving too.
  await page.goBack();
  await heading(page, /^\w+day \d+ \w+/).waitFor();
  await page.goForward();
  await isAsItWas();
  expect(troubles).toEqual([]);

  await handIn(page);
  await button(page, 'Stop here').click();
  await heading(page, /^2 questions in/).waitFor();
  // A finished set is its summary from then on, wherever its address is opened.
  const address = new URL(page.url()).pathname;
  await page.goto(`${address.replace('/summary', '')}?q=2`);
  await page.waitForURL(`**${address}`);
  await heading(page, /^2 questions in/).waitFor();
  await context.close();
});

const STABILITIES = [7, 2, 9, 1, 5, 3];
const DAYS_AGO = 10;

/** Gives each question of the study a memory; the stem tells which. */
async function remember({ school, student }: Study): Promise<{ stem: string; stability: number }[]> {
  return withSchool(school.id, async ({ now }) => {
    const questions = await select<{ id: string; stem: string }>(
      `SELECT q.id, v.body ->> 'stem' AS stem FROM questions q JOIN question_versions v ON v.id = q.live_version_id
       ORDER BY q.number`,
    );
    const lastOn = addDays(now.toISOString().slice(0, 10), -DAYS_AGO);
    for (const [index, { id }] of questions.entries()) {
      await aMemory(school, student, id, { stability: STABILITIES[index] ?? 1, lastOn });
    }
    return questions.map(({ stem }, index) => ({ stem, stability: STABILITIES[index] ?? 0 }));
  });
}

test('the morning set asks the hardest first and closes after the question at fifteen minutes', async () => {
  const study = await aStudy({ subjects: 1, topics: 6, questions: 1 });
  const remembered = await remember(study);
  const hardestFirst = [...remembered].sort((a, b) => a.stability - b.stability);
  const { page, troubles, context } = await signIn(study.student, { viewport: PHONE });
  await page.clock.install();
  await page.goto('/today');
  await page
    .getByText(/hardest first/)
    .first()
    .waitFor();
  await page.getByRole('link', { name: 'Start morning set' }).click();
  for (const [index, { stem }] of hardestFirst.entries()) {
    await heading(page, `Question ${index + 1} of 6`).waitFor();
    await page.getByText(stem, { exact: true }).waitFor();
    if (index === 2) break;
    await write(page, 'A shared pair');
    await button(page, 'Hand in answer').click();
    await page.getByRole('checkbox').first().check({ force: true });
    await button(page, 'Save 1 mark').click();
    await button(page, 'Next question').click();
  }
  await page.clock.fastForward('10:05');
  await page.getByRole('status').filter({ hasText: 'Five minutes left.' }).waitFor({ state: 'attached' });
  await page.clock.fastForward('05:00');
  await page.getByText('Time is up. Take what you need for this question; the set closes after it.').waitFor();
  await page.getByRole('status').filter({ hasText: 'Time is up.' }).waitFor({ state: 'attached' });
  // The question itself is never cut short.
  await write(page, 'Of electrons');
  await button(page, 'Hand in answer').click();
  await page.getByRole('checkbox').last().check({ force: true });
  await button(page, 'Save 1 mark').click();
  await button(page, 'Finish the set').waitFor();
  expect(await button(page, 'Next question').count()).toBe(0);
  await button(page, 'Finish the set').click();
  await heading(page, '3 questions in 15 minutes').waitFor();
  await page.getByText('Morning set, today').waitFor();
  await page.getByText('The other 3 questions go back to the pool').waitFor();
  expect(troubles).toEqual([]);
  expect((await storedAnswers(study.school.id)).map(({ position }) => position)).toEqual([1, 2, 3]);
  await context.close();
});

test('a set whose time is used up closes after the current question, also when it is opened again', async () => {
  const study = await aStudy({ subjects: 2, topics: 1, questions: 2 });
  const { page, troubles, context } = await signIn(study.student);
  await page.clock.install();
  await openMixedSet(page);
  await page.clock.fastForward('26:00');
  await page.getByText(/^26:0\d so far$/).waitFor();
  await page.getByRole('link', { name: 'Leave the set' }).click();
  await page.getByRole('link', { name: 'Continue mixed set' }).click();
  await page.getByText('Time is up. Take what you need for this question').waitFor();
  await write(page, '42');
  await handIn(page);
  await button(page, 'Finish the set').waitFor();
  // Opened again before it was finished: nothing more is asked.
  await page.goto('/today');
  await page.getByRole('link', { name: 'Continue mixed set' }).click();
  await heading(page, 'Your 25 min are up').waitFor();
  await page.getByText('The other 3 questions go back to the pool.').waitFor();
  expect(await axe(page)).toEqual([]);
  await button(page, 'Finish the set').click();
  await heading(page, '1 question in 26 minutes').waitFor();
  expect(troubles).toEqual([]);
  await context.close();
});
