import { expect, test } from 'vitest';
import { aHeadOfYear, aSchoolAdmin } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { expectFocus } from '#tests/support/keyboard.ts';
import { button, heading, survey } from '#tests/support/survey.ts';

const { signIn } = withChromium();

test('a school admin says how many subjects one set mixes', async () => {
  const school = await aSchool();
  const person = await aSchoolAdmin(school);
  const visitor = await signIn(person);
  const { page, look, expectNothing } = survey(visitor);
  const saved = async () => {
    const [row] = await withSchool(school.id, () => select<{ n: number }>('SELECT subjects_per_set AS n FROM schools'));
    return row?.n;
  };
  const count = (n: number) =>
    page.getByRole('group', { name: 'Subjects in one set' }).getByRole('radio', { name: String(n) });
  const says = (n: number) =>
    page
      .getByRole('status')
      .filter({ hasText: `Saved. Sets opened from now on mix up to ${n} subjects.` })
      .waitFor();

  await page.goto('/');
  await heading(page, person.name).waitFor();
  await look('/home of a school admin');
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Settings' }).click();
  await heading(page, 'Settings').waitFor();
  expect(await count(4).isChecked()).toBe(true);
  await look('/settings/practice');

  await page.getByText('6', { exact: true }).click();
  await says(6);
  expect(await saved()).toBe(6);
  await button(page, 'Undo').click();
  await says(4);
  expect(await count(4).isChecked()).toBe(true);
  expect(await saved()).toBe(4);

  // By keyboard; of two in a row the last one counts.
  await count(4).focus();
  await page.keyboard.press('ArrowLeft');
  await page.keyboard.press('ArrowLeft');
  await says(2);
  await expectFocus(count(2));
  expect(await saved()).toBe(2);
  await page.reload();
  await heading(page, 'Settings').waitFor();
  expect(await count(2).isChecked()).toBe(true);
  expectNothing();

  await page.route('**/api/school/practice-settings', (route) => route.abort());
  await page.getByText('7', { exact: true }).click();
  await page.getByRole('alert').filter({ hasText: 'Plait cannot be reached.' }).waitFor();
  expect(await count(2).isChecked()).toBe(true);
  expect(await saved()).toBe(2);
  await look('/settings/practice, not saved');
  visitor.troubles.splice(0, 99, ...visitor.troubles.filter((trouble) => !trouble.includes('net::ERR_FAILED')));
  expectNothing();
  await visitor.context.close();
});

test('for anybody else the page is not open', async () => {
  const visitor = await signIn(await aHeadOfYear(await aSchool()));
  await visitor.page.goto('/settings/practice');
  await heading(visitor.page, 'This page is not open to you').waitFor();
  expect(await visitor.page.getByRole('link', { name: 'Settings' }).count()).toBe(0);
  await visitor.context.close();
});
