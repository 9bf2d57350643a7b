import type { Page } from 'playwright-core';
import { expect, inject, test } from 'vitest';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import { aPerson, aStudent, type FactoryPerson } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { aStudy } from '#seeds/factories/study.ts';
import { axe, PHONE, withChromium } from '#tests/support/chromium.ts';
import { expectFocus, tabTo } from '#tests/support/keyboard.ts';

const { visit, signIn } = withChromium();

const nameField = (page: Page) => page.getByLabel('E-mail or school username');
const passwordField = (page: Page) => page.getByLabel('Password', { exact: true });
const signInButton = (page: Page) => page.getByRole('button', { name: 'Sign in', exact: true });
const today = (page: Page) => page.getByRole('heading', { name: /^\w+day \d+ \w+/ });

async function fillIn(page: Page, { username }: FactoryPerson, password = FACTORY_PASSWORD): Promise<void> {
  await nameField(page).fill(username);
  await passwordField(page).fill(password);
  await signInButton(page).click();
}

const storage = (page: Page) =>
  page.evaluate(() => ({ cookie: document.cookie, local: { ...localStorage }, session: { ...sessionStorage } }));

test('signing in by keyboard alone, from the school code on, at a desk and on a phone', async () => {
  const { student } = await aStudy({ subjects: 1, topics: 1, questions: 2 });
  for (const viewport of [undefined, PHONE]) {
    const { page, context, troubles } = await visit(viewport ? { viewport } : {});
    await page.goto('/');
    await page.waitForURL('**/sign-in');
    await tabTo(page, page.getByLabel('School code'));
    await page.keyboard.type(student.schoolCode.toUpperCase());
    await page.keyboard.press('Enter');
    await tabTo(page, nameField(page));
    await page.keyboard.type(` ${student.username.toUpperCase()} `);
    await tabTo(page, page.getByRole('button', { name: 'Show password' }));
    await tabTo(page, passwordField(page));
    await page.keyboard.type(FACTORY_PASSWORD);
    await tabTo(page, page.getByLabel(/This is my own device/));
    await tabTo(page, signInButton(page));
    await page.keyboard.press('Enter');
    await today(page).waitFor();
    expect(troubles).toEqual([]);
    await context.close();
  }
});

test('one cookie that no script can read, and none before somebody signs in', async () => {
  const student = await aStudent(await aSchool());
  const { page, context } = await visit();
  await page.goto(`/sign-in/${student.schoolCode}`);
  await signInButton(page).waitFor();
  expect(await context.cookies()).toEqual([]);
  await fillIn(page, student);
  await today(page).waitFor();
  const [cookie, ...others] = await context.cookies();
  expect(others).toEqual([]);
  expect(cookie).toMatchObject({ name: 'plait', httpOnly: true, sameSite: 'Lax', path: '/', expires: -1 });
  expect(await storage(page)).toEqual({ cookie: '', local: {}, session: {} });
  await context.close();
});

test('a wrong password is said at the form, many are slowed down, and nothing tells whether the name exists', async () => {
  const student = await aStudent(await aSchool());
  const { page, context, troubles } = await visit();
  await page.goto(`/sign-in/${student.schoolCode}`);
  await signInButton(page).click();
  await page.getByText('Type your username or e-mail address.').waitFor();
  await page.getByText('Type your password.').waitFor();
  await expectFocus(nameField(page));
  expect(await nameField(page).getAttribute('aria-invalid')).toBe('true');

  const alert = page.getByRole('form', { name: 'Sign in' }).getByRole('alert');
  const words = 'That name and password do not match. Your school can give you a new password.';
  await fillIn(page, { ...student, username: 'nobody-here' }, 'wrong');
  await alert.filter({ hasText: words }).waitFor();
  expect(await axe(page)).toEqual([]);
  for (let tries = 0; tries < 5; tries++) {
    const answered = page.waitForResponse('**/api/sign-in');
    await fillIn(page, student, `wrong ${tries}`);
    await answered;
    await alert.filter({ hasText: words }).waitFor();
    // What was typed as the name stays; nobody has to type it again.
    expect(await nameField(page).inputValue()).toBe(student.username);
  }
  await fillIn(page, student);
  await alert.filter({ hasText: /^Too many tries\. Wait \d+ seconds, then try again\.$/ }).waitFor();
  expect(await context.cookies()).toEqual([]);
  expect(troubles.filter((trouble) => !trouble.includes('429'))).toEqual([]);
  await context.close();
});

test('the page asked for comes after signing in, and never one elsewhere', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 2 });
  const { student } = study;
  const { page, context, troubles } = await visit();
  const wanted = `/topics?subject=${study.subjects[0]?.id}`;
  await page.goto(wanted);
  await page.waitForURL(`**/sign-in?next=${encodeURIComponent(wanted)}`);
  await page.getByLabel('School code').fill(student.schoolCode);
  await page.getByRole('button', { name: 'Go on' }).click();
  await page.getByText('Sign in to go on where you were.').waitFor();
  await fillIn(page, student);
  await page.waitForURL(`**${wanted}`);
  await page.getByRole('heading', { name: 'Topics', exact: true }).waitFor();
  for (const next of [
    '//example.org/today',
    'https://example.org/today',
    '/\\example.org',
    '/today/../../\\example.org',
    'javascript:alert(1)',
    '/api/me',
    '/%2F/example.org',
    '/today#@example.org',
  ]) {
    await context.clearCookies();
    await page.goto(`/sign-in/${student.schoolCode}?next=${encodeURIComponent(next)}`);
    await fillIn(page, student);
    await page.waitForURL(`${inject('origin')}/today`);
    await today(page).waitFor();
  }
  expect(troubles).toEqual([]);
  await context.close();
});

test('signing out clears what the browser kept, and Back shows nothing', async () => {
  const { student } = await aStudy({ subjects: 1, topics: 1, questions: 2 });
  const { page, context, troubles } = await signIn(student);
  await page.goto('/today');
  await page.getByRole('link', { name: 'Start mixed set' }).click();
  await page.getByRole('textbox').fill('a draft of mine');
  expect(JSON.stringify(await storage(page))).toContain('a draft of mine');
  await page.getByRole('link', { name: 'Leave the set' }).click();
  await page.getByRole('button', { name: /your settings$/ }).click();
  await page.getByText('Dark', { exact: true }).click();
  await page.getByRole('button', { name: 'Sign out' }).click();
  await signInButton(page).waitFor();
  // How the page looks says nothing about anybody, and stays.
  expect(await storage(page)).toEqual({ cookie: '', local: { 'plait.theme': 'dark' }, session: {} });
  expect(await context.cookies()).toEqual([]);
  for (let step = 0; step < 3; step++) {
    await page.goBack();
    await signInButton(page).or(page.getByLabel('School code')).waitFor();
    expect(await page.getByText(student.name).count()).toBe(0);
  }
  await page.goto('/today');
  await page.waitForURL('**/sign-in?next=%2Ftoday');
  expect(troubles).toEqual([]);
  await context.close();
});

test('changing the password: faults at their fields, other devices signed out, the new one works', async () => {
  const school = await aSchool();
  const student = await aPerson(school, { role: 'student', yearGroupId: school.yearGroupId });
  const { page, context, troubles } = await signIn(student);
  const elsewhere = await signIn(student);
  await elsewhere.page.goto('/today');
  await page.goto('/today');
  await page.getByRole('button', { name: /your settings$/ }).click();
  await page.getByRole('link', { name: 'Change password' }).click();
  const now = page.getByLabel('Password now', { exact: true });
  const next = page.getByLabel('New password', { exact: true });
  const save = page.getByRole('button', { name: 'Change password' });
  await save.click();
  await page.getByText('Type your password as it is now.').waitFor();
  await page.getByText('Type a new password.').waitFor();

  const says = async (field: typeof now, words: string) => {
    await page.getByText(words).waitFor();
    await expectFocus(field);
    const described = (await field.getAttribute('aria-describedby')) ?? '';
    const texts = await Promise.all(described.split(' ').map((id) => page.locator(`[id="${id}"]`).textContent()));
    expect(texts.join(' ')).toContain(words);
    expect(await field.getAttribute('aria-invalid')).toBe('true');
  };
  await now.fill('not my password');
  await next.fill('four quiet green herons');
  await save.click();
  await says(now, 'That is not your password.');
  await now.fill(FACTORY_PASSWORD);
  await next.fill('short');
  await save.click();
  await says(next, 'Use at least 10 characters.');
  await next.fill('1234567890');
  await save.click();
  await says(next, 'That password is used by many people.');
  expect(await axe(page)).toEqual([]);

  // Showing it is the reader's choice, and the field stays the same one.
  expect(await next.getAttribute('type')).toBe('password');
  await page.getByRole('button', { name: 'Show new password' }).click();
  expect(await next.getAttribute('type')).toBe('text');
  expect(await next.inputValue()).toBe('1234567890');
  await page.getByRole('button', { name: 'Hide new password' }).click();
  expect(await next.getAttribute('type')).toBe('password');

  await next.fill('four quiet green herons');
  await save.click();
  await page.getByRole('status').filter({ hasText: 'Saved. Use the new password from now on.' }).waitFor();
  expect([await now.inputValue(), await next.inputValue()]).toEqual(['', '']);
  await elsewhere.page.reload();
  await elsewhere.page.waitForURL('**/sign-in?next=%2Ftoday');
  await elsewhere.page.goto(`/sign-in/${student.schoolCode}`);
  await fillIn(elsewhere.page, student);
  await elsewhere.page.getByText('That name and password do not match.').waitFor();
  await fillIn(elsewhere.page, student, 'four quiet green herons');
  await today(elsewhere.page).waitFor();
  // This device stayed signed in.
  await page.goto('/today');
  await today(page).waitFor();
  expect(troubles.filter((trouble) => !trouble.includes('422'))).toEqual([]);
  await context.close();
  await elsewhere.context.close();
});
