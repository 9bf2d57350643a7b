import { expect, test } from 'vitest';
import { aSubject, aTopic } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aTeacher } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { expectFocus, tabTo } from '#tests/support/keyboard.ts';
import { button, heading, survey } from '#tests/support/survey.ts';

const { signIn } = withChromium();

test('a head of department merges a topic that is listed twice, by keyboard', async () => {
  const school = await aSchool();
  const subject = await aSubject(school, { name: 'Geography', strand: 'ge' });
  const rivers = await aTopic(school, subject, { title: 'Rivers', number: '4.1', marks: 20 });
  const double = await aTopic(school, subject, { title: 'River landforms', number: '4.2', marks: 6 });
  const coasts = await aTopic(school, subject, { title: 'Coasts', number: '4.3' });
  await aTopic(school, subject, { title: 'Ice', number: '4.4', tier: 'higher' });
  const head = await aHeadOfDepartment(school, subject.id);
  const teacher = await aTeacher(school, subject.id);
  for (const status of ['live', 'live', 'draft'] as const) {
    await aQuestion(school, subject, { author: teacher, topicId: double.id, status });
  }

  const visitor = await signIn(head);
  const { page, look, expectNothing, troubles } = survey(visitor);
  await page.goto(`/subjects/${subject.id}/topics`);
  const opener = button(page, 'Merge 4.2 River landforms into another topic');
  await tabTo(page, opener);
  await page.keyboard.press('Enter');
  const dialog = page.getByRole('dialog', { name: 'Merge 4.2 River landforms into another topic?' });
  const field = dialog.getByLabel('Merge into');
  await dialog.getByText('This cannot be undone.').waitFor();

  // Nothing chosen, then chosen: what it will do is said before it is done.
  await button(page, 'Merge topics').press('Enter');
  await dialog.getByText('Choose the topic to merge into.').waitFor();
  await expectFocus(field);
  await look('merge without a choice');
  expect(await field.locator('option').allInnerTexts()).toEqual(['Choose a topic', '4.1 Rivers', '4.3 Coasts']);
  await field.selectOption(rivers.id);
  await dialog.getByText('3 questions, 2 of them live, come under 4.1 Rivers.').waitFor();
  await dialog.getByText('Paper 1: 20 + 6 marks become 26.').waitFor();
  await look('merge with a choice');

  // Left as it was: the focus goes back to where it came from.
  await page.keyboard.press('Escape');
  await expectFocus(opener);

  // Refused at the field, where a colleague was quicker with the other topic.
  await opener.press('Enter');
  await field.selectOption(coasts.id);
  const quicker = await page.request.post(`/api/topics/${coasts.id}/merge`, {
    headers: { 'Sec-Fetch-Site': 'same-origin' },
    data: { intoTopicId: rivers.id },
  });
  expect(quicker.status()).toBe(200);
  await button(page, 'Merge topics').press('Enter');
  await dialog.getByText('Choose a topic of the same specification.').waitFor();
  await expectFocus(field);
  await field.selectOption(rivers.id);
  await button(page, 'Merge topics').press('Enter');
  await page
    .getByRole('status')
    .filter({ hasText: 'Merged. 4.2 River landforms is now part of 4.1 Rivers.' })
    .waitFor();
  await expectFocus(heading(page, 'Geography specification'));
  const row = page.getByRole('row', { name: /4\.1 Rivers/ });
  // The marks of the colleague's topic came along too.
  await row.getByRole('cell', { name: '36', exact: true }).waitFor();
  await row.getByRole('link', { name: /^2/ }).waitFor();
  expect(await page.getByRole('row', { name: /River landforms|Coasts/ }).count()).toBe(0);
  // No other topic has the tier and option of either that is left.
  expect(await button(page, /into another topic$/).count()).toBe(0);
  await look('topics after merging');
  // The refusal that the field turned into words.
  troubles.splice(0, troubles.length, ...troubles.filter((trouble) => !trouble.includes('422')));
  expectNothing();
  await visitor.context.close();

  const reader = survey(await signIn(teacher));
  await reader.open(`/subjects/${subject.id}/topics`, 'Topics', 'topics of a teacher');
  expect(await reader.page.getByRole('button', { name: /^Merge/ }).count()).toBe(0);
  reader.expectNothing();
  await reader.page.context().close();
});
