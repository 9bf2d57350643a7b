import type { Locator } from 'playwright-core';
import { expect, test } from 'vitest';
import { aSubject } from '#seeds/factories/curriculum.ts';
import { aHeadOfYear, aSchoolAdmin, aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aMemoryModel, aRecallCheck, type BandValues } from '#seeds/factories/recall-check.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { tabTo } from '#tests/support/keyboard.ts';
import { heading, survey } from '#tests/support/survey.ts';

const { signIn } = withChromium();

/** Twelve students' bands: too hopeful in the middle, right at the top, and one band that few are in. */
const bandsOf = (student: number): BandValues[] => [
  ...(student < 3 ? [{ band: 2, attempts: 4, expected: 0.26, recalled: 1 }] : []),
  { band: 4, attempts: 12, expected: 0.45, recalled: 4 },
  { band: 5, attempts: 20, expected: 0.56, recalled: 8 },
  { band: 6, attempts: 30, expected: 0.66, recalled: 15 },
  { band: 7, attempts: 40, expected: 0.75, recalled: 26 },
  { band: 8, attempts: 60, expected: 0.86, recalled: 48 },
  { band: 9, attempts: 30, expected: 0.95, recalled: 28 },
];

test('a head of year sees how far to trust expected recall', async () => {
  const school = await aSchool();
  const at = new Date('2027-04-20T01:30:00Z');
  const visitor = await signIn(await aHeadOfYear(school));
  const { page, look, open, expectNothing } = survey(visitor);
  await page.goto('/home');
  await tabTo(
    page,
    page.getByRole('navigation', { name: 'Main', exact: true }).getByRole('link', { name: 'Estimates' }),
  );
  await page.keyboard.press('Enter');
  await heading(page, 'No check yet').waitFor();
  await page.getByText('It is made each night once students have answered questions again.').waitFor();
  await look('empty /estimates');

  for (let n = 0; n < 9; n++) await aRecallCheck(school, await aStudent(school), bandsOf(n), at);
  await open('/estimates', 'Estimates', '/estimates of nine students');
  await page.getByText('So far 9 students have given 1,740 answers to questions met before.').waitFor();
  expect(await page.getByRole('img').count()).toBe(0);

  for (let n = 9; n < 12; n++) await aRecallCheck(school, await aStudent(school), bandsOf(n), at);
  for (const version of [1, 2, 3]) await aMemoryModel(school, { version, isAdopted: version < 3, fittedAt: at });
  await open('/estimates', 'Expected and recalled');
  const sentence =
    'Over the last 2,316 answers to questions met before, students recalled 67%; the model expected 76%.';
  await page.getByText(sentence).waitFor();
  await page.getByText('That is 9.1 points too hopeful, past the limit of 8.').waitFor();
  await page.getByText('Last check: 20 April 2027.').waitFor();
  await page.getByRole('img', { name: /^Observed recall against expected recall, in 6 bands\./ }).waitFor();
  const table = page.getByRole('table', { name: /by tenths of expected recall/ });
  const cells = (of: Locator, name: RegExp) => of.getByRole('row', { name }).locator('th, td').allTextContents();
  expect(await cells(table, /^80–90%/)).toEqual(['80–90%', '720', '86%', '80%', '−6']);
  expect(await cells(table, /^60–70%/)).toEqual(['60–70%', '360', '66%', '50%', '−16']);
  expect(await cells(table, /^20–30%/)).toEqual(['20–30%', 'under 10 students']);
  await page.getByText('Students whose own estimates are more than 8 points too hopeful: 12.').waitFor();
  await page.getByText('In use: version 2, fitted on 20 April 2027 to 1,200 attempts of this school.').waitFor();
  const versions = page.getByRole('table', { name: /Versions of the memory model/ });
  expect(await cells(versions, /^3 /)).toEqual([
    '3',
    '20 April 2027',
    '1,200',
    '−9.1',
    '0.612',
    '0.306',
    'Kept as it was',
  ]);
  await page.emulateMedia({ media: 'print' });
  await page.getByRole('img', { name: /^Observed recall/ }).waitFor();
  await page.emulateMedia({ media: 'screen' });
  expectNothing();
  await visitor.context.close();
});

test('estimates are in the menu of those who may read them, and of nobody else', async () => {
  const school = await aSchool();
  const subject = await aSubject(school);
  const [admin, teacher] = [await signIn(await aSchoolAdmin(school)), await signIn(await aTeacher(school, subject.id))];
  await admin.page.goto('/');
  await admin.page.getByRole('link', { name: 'Estimates' }).first().waitFor();
  await teacher.page.goto('/questions');
  await heading(teacher.page, /^No questions/).waitFor();
  expect(await teacher.page.getByRole('link', { name: 'Estimates' }).count()).toBe(0);
  await teacher.page.goto('/estimates');
  await heading(teacher.page, 'This page is not open to you').waitFor();
  for (const { context } of [admin, teacher]) await context.close();
});
