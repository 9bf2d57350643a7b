import { expect, test } from 'vitest';
import { select, withSchool } from '#server/db/scope.ts';
import { withChromium } from '#tests/support/chromium.ts';
import {
  aDepartment,
  aDraft,
  button,
  cutOff,
  field,
  heading,
  openQuestion,
  saved,
  stem,
  toast,
} from '#tests/support/editor-page.ts';
import { expectFocus } from '#tests/support/keyboard.ts';

const { signIn } = withChromium();

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
