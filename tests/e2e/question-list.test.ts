import { expect, test } from 'vitest';
import { aTopic } from '#seeds/factories/curriculum.ts';
import { aNumberBody, aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { aDepartment, heading } from '#tests/support/editor-page.ts';
import { expectFocus } from '#tests/support/keyboard.ts';

const { signIn } = withChromium();

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
