import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { aSubject, aTopic, type FactorySubject } from '#seeds/factories/curriculum.ts';
import { aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { expectFocus } from '#tests/support/keyboard.ts';

const { signIn } = withChromium();

const button = (page: Page, name: string | RegExp) =>
  page.getByRole('button', { name, exact: typeof name === 'string' });
const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { name });
const field = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true });
const stem = (page: Page) => field(page, 'Question');
const saved = (page: Page) => page.getByRole('status').filter({ hasText: /^Saved \d/ });
const toast = (page: Page, words: string) => page.getByRole('status').filter({ hasText: words });

interface Department {
  school: FactorySchool;
  subject: FactorySubject;
  topicId: string;
  author: FactoryPerson;
  colleague: FactoryPerson;
}

async function aDepartment(): Promise<Department> {
  const school = await aSchool();
  const subject = await aSubject(school, { name: 'Physics', strand: 'ph' });
  const { id: topicId } = await aTopic(school, subject, { title: 'Speed', number: '5' });
  const author = await aTeacher(school, subject.id);
  return { school, subject, topicId, author, colleague: await aTeacher(school, subject.id) };
}

const aDraft = ({ school, subject, topicId, author }: Department, text = 'Work out $6 \\times 7$.') =>
  aQuestion(school, subject, { author, topicId, status: 'draft', body: aNumberBody(text) });

async function openQuestion(page: Page, id: string): Promise<void> {
  await page.goto(`/questions/${id}`);
  await stem(page).waitFor();
}

/** Makes saves of the draft fail as a lost connection does, until what it gives back is called. */
async function cutOff(page: Page): Promise<() => Promise<void>> {
  await page.route('**/api/questions/*/draft', (route) => route.abort());
  return () => page.unroute('**/api/questions/*/draft');
}

test('a draft is saved as it is typed and on the way out, and leaving asks where that fails', async () => {
  const department = await aDepartment();
  const { page, context, troubles } = await signIn(department.author);
  await page.goto('/questions');
  await page.getByRole('link', { name: 'New question' }).first().click();
  await stem(page).fill('State what is meant by');
  await saved(page).waitFor();
  await page.waitForURL(/\/questions\/[0-9a-f-]{36}$/);
  const address = page.url();
  await stem(page).press('End');
  await page.keyboard.type(' speed.');
  // Leaving at once: saved on the way, without a question.
  await page.getByRole('link', { name: 'Questions', exact: true }).first().click();
  await page.getByRole('link', { name: 'State what is meant by speed.' }).first().click();
  expect(await stem(page).inputValue()).toBe('State what is meant by speed.');
  expect(page.url()).toBe(address);
  expect(troubles).toEqual([]);

  const reconnect = await cutOff(page);
  await field(page, 'Model answer').fill('Distance over time.');
  await page.getByText('You are offline.').or(page.getByText('Plait did not answer.')).waitFor();
  await page.getByRole('link', { name: 'Questions', exact: true }).first().click();
  const asking = page.getByRole('dialog', { name: 'Leave without saving?' });
  await asking.waitFor();
  await button(page, 'Stay here').click();
  await asking.waitFor({ state: 'detached' });
  expect(await field(page, 'Model answer').inputValue()).toBe('Distance over time.');
  // The browser's own question, for closing the tab.
  const asked = page.waitForEvent('dialog');
  await page.close({ runBeforeUnload: true });
  const dialog = await asked;
  expect(dialog.type()).toBe('beforeunload');
  await dialog.dismiss();
  await page.goBack();
  await asking.waitFor();
  await button(page, 'Stay here').click();
  await reconnect();
  await button(page, 'Save now').click();
  await saved(page).waitFor();
  await page.reload();
  expect(await field(page, 'Model answer').inputValue()).toBe('Distance over time.');

  await cutOff(page);
  await field(page, 'Model answer').fill('Lost on purpose.');
  await page.getByText('What you typed is kept on this page').waitFor();
  await page.getByRole('link', { name: 'Questions', exact: true }).first().click();
  await button(page, 'Leave').click();
  await heading(page, 'Questions').waitFor();
  await page.goto(address);
  await stem(page).waitFor();
  expect(await field(page, 'Model answer').inputValue()).toBe('Distance over time.');
  await context.close();
});

test('a draft saved in another tab meanwhile loses nothing that was typed here', async () => {
  const department = await aDepartment();
  const { id } = await aDraft(department);
  const { page, context } = await signIn(department.author);
  await context.grantPermissions(['clipboard-read', 'clipboard-write']);
  const tab = await context.newPage();
  await openQuestion(page, id);
  await openQuestion(tab, id);
  await stem(page).fill('Typed in the first tab.');
  await saved(page).waitFor();
  await tab.bringToFront();
  await stem(tab).fill('Typed in the second tab.');
  await field(tab, 'Point 1').fill('$43$');
  const alert = tab.getByRole('alert').filter({ hasText: 'This draft was saved somewhere else meanwhile.' });
  await alert.waitFor();
  await field(tab, 'Model answer').fill('43');
  await button(tab, 'Copy mine').click();
  await toast(tab, 'Copied.').waitFor();
  const copied = await tab.evaluate(() => navigator.clipboard.readText());
  for (const text of ['Typed in the second tab.', '$43$', 'Model answer: 43']) expect(copied).toContain(text);
  // Sending for review is refused too, and still nothing is lost.
  await button(tab, 'Send for review').click();
  await alert.waitFor();
  expect(await stem(tab).inputValue()).toBe('Typed in the second tab.');
  await button(tab, 'Save mine in its place').click();
  await saved(tab).waitFor();
  await alert.waitFor({ state: 'detached' });

  // Now the first tab is the old one; it takes the newer draft.
  await page.bringToFront();
  await stem(page).fill('Typed in the first tab again.');
  await page.getByText('This draft was saved somewhere else meanwhile.').waitFor();
  await button(page, 'Load the newer one').click();
  await expect.poll(() => stem(page).inputValue()).toBe('Typed in the second tab.');
  expect(await field(page, 'Model answer').inputValue()).toBe('43');
  expect(await field(page, 'Point 1').inputValue()).toBe('$43$');
  await field(page, 'Guidance').fill('Both tabs agree.');
  await saved(page).waitFor();
  await openQuestion(tab, id);
  expect(await field(tab, 'Guidance').inputValue()).toBe('Both tabs agree.');
  await context.close();
});

test('parts and points are added, moved, removed and brought back', async () => {
  const department = await aDepartment();
  const { id } = await aDraft(department);
  const { page, context, troubles } = await signIn(department.author);
  await openQuestion(page, id);
  const wording = (letter: string) => field(page, `Wording of part (${letter})`);
  const part = (letter: string) => page.getByRole('region', { name: `Part (${letter})` });

  await button(page, 'Add a part').click();
  await expectFocus(wording('b'));
  await wording('b').fill('Second part');
  await wording('a').fill('First part');
  await part('b').getByLabel('Model answer', { exact: true }).fill('second');
  await button(page, 'Move part (b) up').press('Enter');
  expect(await wording('a').inputValue()).toBe('Second part');
  expect(await part('a').getByLabel('Model answer', { exact: true }).inputValue()).toBe('second');
  await expectFocus(button(page, 'Move part (a) up'));
  // At the top nothing moves, and the focus stays.
  await page.keyboard.press('Enter');
  expect(await wording('a').inputValue()).toBe('Second part');

  await button(page, 'Remove part (a)').click();
  await expectFocus(button(page, 'Add a part'));
  await toast(page, 'Part (a) removed.').waitFor();
  await button(page, 'Undo').click();
  expect(await wording('a').inputValue()).toBe('Second part');
  expect(await wording('b').inputValue()).toBe('First part');
  expect(await part('a').getByLabel('Model answer', { exact: true }).inputValue()).toBe('second');
  expect(await part('b').getByLabel('Model answer', { exact: true }).inputValue()).toBe('42');

  const point = (number: number) => part('b').getByLabel(`Point ${number}`, { exact: true });
  await part('b').getByRole('button', { name: 'Add a point' }).click();
  await expectFocus(point(2));
  await page.keyboard.type('second point');
  await part('b').getByLabel('Marks for point 2', { exact: true }).fill('3');
  await part('b').getByText('4 marks in 2 points').waitFor();
  await part('b').getByRole('button', { name: 'Add reject to point 2' }).click();
  await page.keyboard.type('a wrong way');
  await part('b').getByRole('button', { name: 'Move point 2 up' }).press('Enter');
  expect(await point(1).inputValue()).toBe('second point');
  await page.getByRole('status').filter({ hasText: 'Point 2 is now point 1 of 2.' }).waitFor({ state: 'attached' });
  await part('b').getByRole('button', { name: 'Remove point 1' }).click();
  await part('b').getByText('1 mark in 1 point').waitFor();
  await button(page, 'Undo').click();
  await part('b').getByText('4 marks in 2 points').waitFor();
  expect(await part('b').getByLabel('Reject, point 1', { exact: true }).inputValue()).toBe('a wrong way');
  await saved(page).waitFor();
  // Two saves may have followed each other; the last one holds everything.
  await expect
    .poll(
      async () => {
        const [row] = await withSchool(department.school.id, () =>
          select<{ body: unknown }>('SELECT body FROM question_versions WHERE question_id = $1', [id]),
        );
        return row?.body;
      },
      { timeout: 10_000 },
    )
    .toMatchObject({
      parts: [
        { prompt: 'Second part', modelAnswer: 'second' },
        {
          prompt: 'First part',
          modelAnswer: '42',
          points: [
            { text: 'second point', marks: 3, reject: ['a wrong way'] },
            { text: '$42$', marks: 1 },
          ],
        },
      ],
    });
  await page.reload();
  expect(await wording('a').inputValue()).toBe('Second part');
  expect(await point(1).inputValue()).toBe('second point');
  expect(troubles).toEqual([]);
  await context.close();
});

test('what keeps a question from review is listed, led to and taken off the list once put right', async () => {
  const department = await aDepartment();
  const { page, context, troubles } = await signIn(department.author);
  await page.goto(`/questions/new?subject=${department.subject.id}`);
  await button(page, 'Send for review').click();
  const summary = page.getByRole('alert').filter({ has: page.getByRole('heading', { name: /to put right$/ }) });
  await expectFocus(summary);
  const links = summary.getByRole('link');
  const faults = await links.allTextContents();
  expect(faults.length).toBeGreaterThan(3);
  for (const [index, words] of faults.entries()) {
    await links.nth(index).click();
    const focused = page.locator(':focus');
    const said = await focused.evaluate((element) => {
      const ids = (element.getAttribute('aria-describedby') ?? '').split(' ');
      return `${ids.map((id) => document.getElementById(id)?.textContent ?? '').join(' ')} ${element.textContent}`;
    });
    expect(said, `the field that “${words}” leads to`).toContain(words);
  }
  await page.getByLabel('Topic', { exact: true }).selectOption({ label: '5 Speed' });
  await stem(page).fill('State what is meant by speed.');
  await page.getByRole('radio', { name: 'The student marks it' }).check({ force: true });
  await field(page, 'Point 1').fill('distance over time');
  await field(page, 'Model answer').fill('Distance over time.');
  await summary.waitFor({ state: 'detached' });
  await button(page, 'Send for review').click();
  await toast(page, 'Sent for review.').waitFor();
  await page.getByText('You wrote this, so you cannot put it live.').waitFor();
  expect(troubles).toEqual([]);
  await context.close();
});

test('returned with a comment, sent again, put live, superseded by a new version, retired', async () => {
  const department = await aDepartment();
  const { id, number } = await aDraft(department, 'Work out $6 \\times 7$, quickly.');
  const author = await signIn(department.author);
  const colleague = await signIn(department.colleague);
  const versions = () =>
    withSchool(department.school.id, () =>
      select<{ version: number; status: string; stem: string }>(
        `SELECT version, status, body ->> 'stem' AS stem FROM question_versions WHERE question_id = $1 ORDER BY version`,
        [id],
      ),
    );
  const send = async () => {
    await button(author.page, 'Send for review').click();
    await toast(author.page, 'Sent for review.').waitFor();
  };
  const review = async () => {
    await colleague.page.goto('/review');
    await colleague.page.getByRole('link', { name: `Review ${number}` }).click();
    await button(colleague.page, 'Put live').waitFor();
  };

  await openQuestion(author.page, id);
  await send();
  await review();
  await button(colleague.page, 'Return to author').click();
  const dialog = colleague.page.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Return to author' }).click();
  await dialog.getByText('Say what should change.').waitFor();
  await dialog.getByLabel('What should change').fill('Leave out\n“quickly”.');
  await dialog.getByRole('button', { name: 'Return to author' }).click();
  await toast(colleague.page, `Question ${number} is back with`).waitFor();
  await heading(colleague.page, 'Nothing to review').waitFor();

  await openQuestion(author.page, id);
  await author.page.getByText(`${department.colleague.name} returned this:`).waitFor();
  await author.page.getByText('“quickly”.').waitFor();
  await stem(author.page).fill('Work out $6 \\times 7$.');
  await saved(author.page).waitFor();
  await send();
  await review();
  await button(colleague.page, 'Put live').click();
  await toast(colleague.page, `Question ${number} is live.`).waitFor();

  await author.page.goto(`/questions/${id}`);
  await button(author.page, 'Start a new version').click();
  await stem(author.page).fill('Work out $7 \\times 6$.');
  await saved(author.page).waitFor();
  await author.page.getByText('Version 1 is live.').waitFor();
  expect(await versions()).toMatchObject([
    { version: 1, status: 'live', stem: 'Work out $6 \\times 7$.' },
    { version: 2, status: 'draft', stem: 'Work out $7 \\times 6$.' },
  ]);
  await send();
  await review();
  await button(colleague.page, 'Put live').click();
  await toast(colleague.page, `Question ${number} is live.`).waitFor();
  expect((await versions()).map(({ status }) => status)).toEqual(['superseded', 'live']);
  await colleague.page.getByRole('listitem').filter({ hasText: 'Superseded' }).waitFor();

  await author.page.goto(`/questions/${id}`);
  await button(author.page, 'Retire').click();
  await author.page.getByRole('dialog', { name: `Retire question ${number}?` }).waitFor();
  // Escape keeps it and gives the focus back.
  await author.page.keyboard.press('Escape');
  await expectFocus(button(author.page, 'Retire'));
  await author.page.keyboard.press('Enter');
  await author.page.getByRole('dialog').getByRole('button', { name: 'Retire' }).click();
  await toast(author.page, `Question ${number} is retired.`).waitFor();
  expect((await versions()).map(({ status }) => status)).toEqual(['superseded', 'retired']);
  await author.page.goto('/questions?status=live');
  await heading(author.page, 'No question matches').waitFor();
  await author.page.goto('/questions?status=retired');
  await author.page
    .getByRole('link', { name: /Work out/ })
    .first()
    .waitFor();
  for (const { context, troubles } of [author, colleague]) {
    expect(troubles).toEqual([]);
    await context.close();
  }
});

test('the list: search as you type, filters, pages, and Back through all of them', async () => {
  const department = await aDepartment();
  const { school, subject, topicId, author, colleague } = department;
  const other = await aTopic(school, subject, { title: 'Forces', number: '6' });
  for (let n = 1; n <= 30; n++) {
    await aQuestion(school, subject, { author, topicId, body: aNumberBody(`Work out the speed of car ${n}.`) });
  }
  await aQuestion(school, subject, {
    author: colleague,
    topicId: other.id,
    kind: 'recallCard',
    status: 'draft',
    body: aRecallBody('State what is meant by a resultant force.'),
  });
  const { page, context, troubles } = await signIn(author);
  const count = (words: string) => page.getByRole('status').filter({ hasText: words }).waitFor();
  const chosen = (name: string) => page.getByRole('combobox', { name, exact: true });
  await page.goto('/questions');
  await count('1 to 25 of 31');
  await page.getByRole('link', { name: 'Next', exact: true }).click();
  await count('26 to 31 of 31');
  await page.getByRole('link', { name: 'Previous', exact: true }).click();
  await count('1 to 25 of 31');
  await page.goBack();
  await count('26 to 31 of 31');
  await page.goBack();
  await count('1 to 25 of 31');

  const search = page.getByRole('searchbox', { name: 'Search wording or mark scheme' });
  await search.click();
  await page.keyboard.type('car');
  await count('1 to 25 of 30');
  await page.getByRole('link', { name: 'Next', exact: true }).click();
  await count('26 to 30 of 30');
  // Typing on keeps the focus and starts at the first page.
  await search.fill('car 17');
  await count('1 of 1');
  await expectFocus(search);
  expect(new URL(page.url()).searchParams.get('q')).toBe('car 17');
  await page.getByRole('link', { name: 'Work out the speed of car 17.' }).first().click();
  await heading(page, 'Versions').waitFor();
  await page.goBack();
  await count('1 of 1');
  expect(await search.inputValue()).toBe('car 17');
  // A filter chosen before the search has started: both hold.
  await search.fill('resultant');
  await chosen('Kind').selectOption('Short answer');
  await heading(page, 'No question matches').waitFor();
  await chosen('Kind').selectOption('Recall card');
  await count('1 of 1');
  await chosen('Status').selectOption('Live');
  await heading(page, 'No question matches').waitFor();
  await page.goBack();
  await count('1 of 1');
  expect(await chosen('Status').inputValue()).toBe('');
  expect(await chosen('Kind').inputValue()).toBe('recallCard');
  await page.goBack();
  await heading(page, 'No question matches').waitFor();
  await page.getByRole('link', { name: 'Clear search and filters' }).click();
  await count('1 to 25 of 31');
  expect(await search.inputValue()).toBe('');
  await chosen('Author').selectOption(colleague.name);
  await count('1 of 1');
  await chosen('Author').selectOption('Any author');
  await page
    .getByRole('navigation', { name: 'Topics' })
    .getByRole('link', { name: /Forces/ })
    .click();
  await count('1 of 1');
  await page.getByRole('link', { name: 'State what is meant by a resultant force.' }).first().waitFor();
  // The address alone brings all of it back.
  await page.reload();
  await count('1 of 1');
  expect(troubles).toEqual([]);
  await context.close();
});
