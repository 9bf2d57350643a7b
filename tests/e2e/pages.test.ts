import { randomUUID } from 'node:crypto';
import { expect, test } from 'vitest';
import { aCarer, aHeadOfYear, aPerson, aSchoolAdmin } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { SIZES } from '#tests/support/inspect.ts';
import { aSchoolInUse } from '#tests/support/school-in-use.ts';
import { button, heading, survey, TODAY } from '#tests/support/survey.ts';

const { visit, signIn } = withChromium();

test('signing in: every state of the form, and addresses that lead nowhere', async () => {
  const { code } = await aSchool();
  const visitor = await visit();
  const { page, look, open, expectNothing } = survey(visitor);
  await open('/sign-in', 'Sign in');
  await button(page, 'Go on').click();
  await page.getByText('A school code has letters').waitFor();
  await look('/sign-in with an error');
  await open(`/sign-in/${code}`, 'Sign in', '/sign-in/:code');
  await button(page, 'Sign in').click();
  await page.getByText('Type your password.').waitFor();
  await look('/sign-in/:code with errors');
  await page.getByLabel('E-mail or school username').fill('nobody');
  await page.getByLabel('Password', { exact: true }).fill('wrong');
  await button(page, 'Sign in').click();
  await page.getByText('do not match').waitFor();
  await look('/sign-in/:code refused');
  await open('/nowhere/at/all', 'There is no such page');
  expectNothing();
  await page.goto('/sign-in/no-such-school');
  await page.getByText('There is no school with the code “no-such-school”.').waitFor();
  await look('/sign-in/:code unknown');
  visitor.troubles.splice(0, 10, ...visitor.troubles.filter((trouble) => !trouble.includes('404')));
  expectNothing();
  await visitor.context.close();
});

test('a student: Today, topics, password, the name menu', async () => {
  const { student } = await aSchoolInUse();
  const visitor = await signIn(student);
  const { page, look, open, expectNothing } = survey(visitor);
  await open('/today', TODAY);
  await button(page, /your settings$/).click();
  await button(page, 'Sign out').waitFor();
  await look('name menu');
  await open('/topics', 'Topics');
  await page
    .getByRole('link', { name: /^FR French$|^French$/ })
    .or(page.getByRole('link', { name: /French/ }))
    .first()
    .click();
  await look('/topics of one subject');
  await open('/password', 'Change password');
  await open('/home', student.name);
  expectNothing();
  await visitor.context.close();
});

test('a student: the runner in each of its states, the summary, a set done today', async () => {
  const { student } = await aSchoolInUse();
  const visitor = await signIn(student);
  const { page, look, open, expectNothing } = survey(visitor);
  const seen = new Set<string>();
  const once = async (name: string) => {
    if (seen.has(name)) return;
    seen.add(name);
    await look(`runner: ${name}`);
  };
  await page.goto('/set/mixed?another=1');
  await heading(page, /^Question 1 of/).waitFor();
  const count = Number((await heading(page, /^Question 1 of/).textContent())?.match(/of (\d+)/)?.[1]);
  for (let number = 1; number <= count; number++) {
    await heading(page, `Question ${number} of ${count}`).waitFor();
    const isMaths = (await page.getByText('A curve is').count()) > 0;
    await once(isMaths ? 'ask, maths' : 'ask');
    if (number === 1) {
      await button(page, 'Hand in answer').click();
      await page.getByText('Say how sure you are.').waitFor();
      await once('how sure is missing');
    }
    for (const field of await page.getByRole('textbox').all()) await field.fill('1');
    await page.getByRole('radio', { name: 'Guess' }).check({ force: true });
    await button(page, 'Hand in answer').click();
    await heading(page, /Mark scheme|Tick each point/).waitFor();
    if (await heading(page, 'Tick each point').isVisible()) {
      await page.getByRole('checkbox').first().check({ force: true });
      await once(isMaths ? 'self-mark beside marks by Plait' : 'self-mark');
      await button(page, /^Save /).click();
      await heading(page, 'Mark scheme').waitFor();
    }
    await once(isMaths ? 'marked, maths' : 'marked');
    if (number < count) await button(page, 'Next question').click();
  }
  expect([...seen].sort()).toEqual(
    [
      'ask',
      'ask, maths',
      'how sure is missing',
      'marked',
      'marked, maths',
      'self-mark',
      'self-mark beside marks by Plait',
    ].sort(),
  );
  await button(page, 'Finish the set').click();
  await heading(page, /questions in/).waitFor();
  await look('summary, just finished');
  await page.reload();
  await heading(page, /questions in/).waitFor();
  await look('summary, later');
  await open('/set/mixed', /^Done at/, 'set done');
  await open('/today', TODAY, '/today, set done');
  expectNothing();

  await page
    .getByRole('link', { name: 'Start morning set' })
    .or(page.getByRole('link', { name: 'Start another mixed set' }))
    .first()
    .click();
  await heading(page, /^Question 1 of/).waitFor();
  await visitor.context.setOffline(true);
  await page.getByText('You are offline.').waitFor();
  await look('runner: offline');
  await visitor.context.setOffline(false);
  await page.getByText('You are offline.').waitFor({ state: 'detached' });
  expectNothing();
  await page.route('**/api/sets/*/answers', (route) => route.abort());
  for (const field of await page.getByRole('textbox').all()) await field.fill('1');
  await page.getByRole('radio', { name: 'Guess' }).check({ force: true });
  await button(page, 'Hand in answer').click();
  await heading(page, /^Kept on this/).waitFor();
  await look('runner: kept');
  await page.getByRole('link', { name: 'Leave the set' }).click();
  await page
    .getByRole('status')
    .filter({ hasText: /^You are offline\. One answer is kept/ })
    .waitFor();
  await look('/today with an answer not sent');
  await page.unroute('**/api/sets/*/answers');
  // The browser's own lines for requests that were cut off.
  visitor.troubles.splice(0, 99, ...visitor.troubles.filter((trouble) => !trouble.includes('net::ERR_FAILED')));
  expectNothing();
  await visitor.context.close();
});

test('addresses of things that are not there, or are somebody else’s', async () => {
  const { student, teacher } = await aSchoolInUse();
  for (const [person, paths] of [
    [student, ['/sets/:id', '/sets/:id/summary', '/set/evening']],
    [teacher, ['/questions/:id', '/subjects/:id/topics', '/questions/not-an-id']],
  ] as const) {
    const visitor = await signIn(person);
    const { open, expectNothing, troubles } = survey(visitor, SIZES);
    for (const path of paths) await open(path.replace(':id', randomUUID()), 'There is no such page', path);
    troubles.splice(0, 99, ...troubles.filter((trouble) => !trouble.includes('404')));
    expectNothing();
    await visitor.context.close();
  }
});

test('roles whose own pages are still to come', async () => {
  const school = await aSchool();
  const people = [await aHeadOfYear(school), await aCarer(school), await aSchoolAdmin(school), await aPerson(school)];
  for (const [index, person] of people.entries()) {
    const visitor = await signIn(person);
    // One page for all of them: its colours are looked at once.
    const { page, open, expectNothing } = survey(visitor, index === 0 ? undefined : SIZES);
    await page.goto('/');
    await page.waitForURL('**/home');
    await open('/home', person.name, `/home of ${person.name}`);
    expectNothing();
    await visitor.context.close();
  }
});

test('a teacher: questions, the editor, review, topics; a head of department: item statistics', async () => {
  const { subjects, teacher, colleague, head } = await aSchoolInUse();
  const visitor = await signIn(teacher);
  const { page, look, open, expectNothing } = survey(visitor);
  await open('/questions', 'Questions');
  await button(page, 'Menu')
    .or(button(page, /your settings$/))
    .first()
    .click();
  await look('menu of staff');
  await open('/questions?q=nothing-has-this', 'No question matches', '/questions without a match');
  await open('/questions/new', 'New question');
  await page.getByRole('button', { name: 'Send for review' }).click();
  await heading(page, /to put right$/).waitFor();
  await look('/questions/new with faults');
  await page.goto('/questions?status=draft');
  await page
    .getByRole('link', { name: /A curve is/ })
    .first()
    .click();
  await heading(page, 'As the student sees it').waitFor();
  await page.locator('.katex').first().waitFor();
  await look('/questions/:id, draft');
  for (const view of ['Phone', 'Print']) {
    await page.getByRole('radio', { name: view }).check({ force: true });
    await look(`/questions/:id, preview ${view}`);
  }
  await button(page, 'Try answers').click();
  await page.getByRole('dialog').getByRole('textbox').first().fill('1');
  await button(page, 'Mark it').first().click();
  await page.getByRole('dialog').getByText('2 of 2 marks').waitFor();
  await look('Try answers');
  await page.keyboard.press('Escape');
  await button(page, 'Discard draft').click();
  await page.getByRole('dialog').waitFor();
  await look('Discard draft?');
  await page.keyboard.press('Escape');
  await page.goto('/questions?status=live');
  await page
    .getByRole('link', { name: /A curve is/ })
    .first()
    .click();
  await heading(page, 'Versions').waitFor();
  await look('/questions/:id, live');
  await open('/review', 'Review');
  await open(`/subjects/${subjects[0]?.id}/topics`, 'Topics', '/subjects/:id/topics');
  await open('/item-statistics', 'Item statistics', '/item-statistics of a teacher');
  await open('/password', 'Change password', '/password of staff');
  expectNothing();
  await visitor.context.close();

  const reviewer = await signIn(colleague);
  const review = survey(reviewer);
  await review.open('/review', 'Review', '/review with something to do');
  await review.page
    .getByRole('link', { name: /^Review \d+$/ })
    .first()
    .click();
  await button(review.page, 'Put live').waitFor();
  await review.look('/questions/:id, in review');
  await button(review.page, 'Return to author').click();
  await review.page.getByRole('dialog').getByRole('button', { name: 'Return to author' }).click();
  await review.page.getByText('Say what should change.').waitFor();
  await review.look('Return to author with an error');
  review.expectNothing();
  await reviewer.context.close();

  const department = await signIn(head);
  const figures = survey(department);
  await figures.open('/item-statistics', 'Item statistics', '/item-statistics of a head');
  figures.expectNothing();
  await department.context.close();
});
