import { randomUUID } from 'node:crypto';
import type { Page } from 'playwright-core';
import { expect, test } from 'vitest';
import { aMemory } from '#seeds/factories/answer.ts';
import { aSitting } from '#seeds/factories/curriculum.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, select, withSchool } from '#server/db/scope.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import type { MyTopicListDto } from '#shared/schemas/my-topics.ts';
import type { SetDto } from '#shared/schemas/practice.ts';
import { MOST_CHOSEN_TOPICS } from '#shared/schemas/set-kind.ts';
import { DESK, PHONE, withChromium } from '#tests/support/chromium.ts';
import { tabTo } from '#tests/support/keyboard.ts';
import { button, heading, survey, TODAY } from '#tests/support/survey.ts';

const { signIn } = withChromium();

const today = () => new Date().toISOString().slice(0, 10);

const getJson = async <Dto>(page: Page, path: string): Promise<Dto> => {
  const response = await page.context().request.get(path);
  expect(response.ok()).toBe(true);
  return response.json() as Promise<Dto>;
};

interface Remembered {
  topicId: string;
  /** So many of its questions. */
  count: number;
  /** Days. */
  stability: number;
  /** Of the first attempt at each: 1 missed, 3 recalled. */
  firstGrade?: number;
}

/** Gives some questions of a topic a memory from twenty days ago. */
async function remember({ school, student }: Study, { topicId, count, stability, firstGrade = 3 }: Remembered) {
  const questions = await withSchool(school.id, () =>
    select<{ question_id: string }>(
      'SELECT DISTINCT question_id FROM question_topics WHERE topic_id = $1 ORDER BY question_id LIMIT $2',
      [topicId, count],
    ),
  );
  for (const { question_id } of questions) {
    await aMemory(school, student, question_id, { stability, lastOn: addDays(today(), -20) });
    await withSchool(school.id, () =>
      execute('UPDATE memory_states SET first_grade = $1 WHERE question_id = $2', [firstGrade, question_id]),
    );
  }
}

/**
 * Four topics of one subject, ten questions and a quarter of the paper each, that stand at weak, secure, not enough yet
 * and not started. As many first attempts were missed as recalled, so that of what was not attempted little is known.
 */
async function fourStandings(): Promise<Study & { titles: string[] }> {
  const study = await aStudy({ subjects: 2, topics: 4, questions: 10 });
  const [subject] = study.subjects;
  if (!subject) throw new Error('no subject was made');
  const [weak = '', firm = '', begun = ''] = subject.topicIds;
  await aSitting(study.school, subject, { on: addDays(today(), 40) });
  await remember(study, { topicId: weak, count: 10, stability: 0.3, firstGrade: 1 });
  await remember(study, { topicId: firm, count: 10, stability: 400 });
  await remember(study, { topicId: begun, count: 1, stability: 5 });
  const titles = await withSchool(study.school.id, async () => {
    await execute('UPDATE topic_weights SET marks = 20');
    return select<{ title: string }>('SELECT title FROM topics WHERE id = ANY($1) ORDER BY position', [
      subject.topicIds,
    ]);
  });
  return { ...study, titles: titles.map(({ title }) => title) };
}

const tick = (page: Page, title: string) => page.getByRole('checkbox', { name: `Practise ${title},` });

/** The set on the page, as the server holds it. */
async function shownSet(page: Page): Promise<SetDto> {
  await heading(page, /^Question 1 of/).waitFor();
  return getJson<SetDto>(page, `/api${new URL(page.url()).pathname}`);
}

/** The title of the topic, which the study's stems end with. */
const topicsOf = (set: SetDto): string[] =>
  set.items.map(({ question }) => /(Topic \d+)\.$/.exec(question.stem)?.[1] ?? '');

test('standings with their ranges, what they would mean in a paper, in both colours and at every width', async () => {
  const { student, titles } = await fourStandings();
  const visitor = await signIn(student);
  const { page, look, open, expectNothing } = survey(visitor);
  await open('/topics', 'Topics');
  const list = await getJson<MyTopicListDto>(page, '/api/my-topics');
  const [weak, firm, begun, fresh] = titles.map((title) => list.items.find(({ topic }) => topic.title === title));
  expect([weak?.standing, firm?.standing, begun?.standing, fresh?.standing]).toEqual([
    'weak',
    'secure',
    'notEnough',
    'notStarted',
  ]);

  const row = (title = '') => page.getByRole('row', { name: new RegExp(`${title} `) });
  await row(weak?.topic.title).getByText(`${weak?.range?.low} to ${weak?.range?.high}%`).waitFor();
  await row(begun?.topic.title).getByText('no figure yet').waitFor({ state: 'attached' });
  await row(begun?.topic.title).getByText(`${begun?.range?.low} to ${begun?.range?.high}%`).waitFor();
  await row(fresh?.topic.title).getByText('no range yet').waitFor({ state: 'attached' });
  await page.getByText('1 topic, range over 50 wide').waitFor();

  const forecast = page.getByRole('region', { name: 'What today’s standing would mean' });
  await forecast.getByText('not a predicted grade').waitFor();
  const known = list.papers.find(({ range }) => range !== null);
  expect(known).toBeDefined();
  await forecast.getByText(`${known?.range?.low} to ${known?.range?.high} of 80 marks`).waitFor();
  // The other subject has nothing attempted, so nothing is claimed of its paper.
  expect(list.papers.filter(({ range }) => range === null)).toHaveLength(1);
  await forecast.getByText('Not enough yet').waitFor();

  await page.getByRole('link', { name: 'Practise the weak topic' }).waitFor();
  await tick(page, titles[0] ?? '').check({ force: true });
  await button(page, 'Practise 1 topic').waitFor();
  await look('/topics with a topic ticked');
  await page.setViewportSize(PHONE);
  expect(await tick(page, titles[0] ?? '').isChecked()).toBe(true);
  expectNothing();
  await visitor.context.close();
});

test('estimates that were too high lately are owned up to', async () => {
  const { student } = await fourStandings();
  const visitor = await signIn(student);
  const { page, look, expectNothing } = survey(visitor);
  await page.route('**/api/my-topics', async (route) => {
    const response = await route.fetch();
    const list = (await response.json()) as MyTopicListDto;
    await route.fulfill({ response, json: { ...list, isTooHopeful: true } });
  });
  await page.goto('/topics');
  await page.getByText('Lately you have recalled less than these estimates said').waitFor();
  await page.getByRole('columnheader', { name: 'Perhaps' }).waitFor();
  expect(await page.getByRole('columnheader', { name: 'Probably' }).count()).toBe(0);
  await look('/topics, too hopeful');
  expectNothing();
  await visitor.context.close();
});

test.each([
  { width: 1280, viewport: DESK },
  { width: 390, viewport: PHONE },
])('topics are chosen and their set opened by keyboard alone, $width wide', async ({ viewport }) => {
  const study = await aStudy({ subjects: 2, topics: 3, questions: 4 });
  const { page, troubles, context } = await signIn(study.student, { viewport });
  await page.goto('/topics');
  const { items } = await getJson<MyTopicListDto>(page, '/api/my-topics');
  const [first, second] = items.map(({ topic }) => topic.title);
  await tabTo(page, tick(page, first ?? ''));
  await page.keyboard.press('Space');
  await page.getByRole('status').filter({ hasText: '1 topic. About half of the set is on it;' }).waitFor();
  await tabTo(page, tick(page, second ?? ''));
  await page.keyboard.press('Space');
  await page.getByRole('status').filter({ hasText: '2 topics. About half of the set is on them;' }).waitFor();
  await tabTo(page, button(page, 'Practise 2 topics'));
  await page.keyboard.press('Enter');
  const set = await shownSet(page);
  expect(set.kind).toBe('chosen');
  const topics = topicsOf(set);
  // Four questions of a minute each fit into half of the set: all are asked, among those of other topics.
  expect(topics.filter((title) => title === first || title === second)).toHaveLength(8);
  expect(new Set(topics).size).toBeGreaterThan(2);
  for (const [index, title] of topics.entries()) expect(title, `question ${index + 1}`).not.toBe(topics[index + 1]);
  expect(troubles).toEqual([]);
  await context.close();
});

test('Enter on a tick box opens the set; the same topics go on with it, others make a new one', async () => {
  const study = await aStudy({ subjects: 1, topics: 3, questions: 4 });
  const { page, troubles, context } = await signIn(study.student);
  await page.goto('/topics');
  const { items } = await getJson<MyTopicListDto>(page, '/api/my-topics');
  const [a = '', b = '', c = ''] = items.map(({ topic }) => topic.id);
  await tick(page, items[0]?.topic.title ?? '').focus();
  // With nothing ticked it does nothing.
  await page.keyboard.press('Enter');
  await page.keyboard.press('Space');
  await page.keyboard.press('Enter');
  const opened = await shownSet(page);
  await page.getByRole('link', { name: 'Leave the set' }).click();
  await heading(page, 'Topics').waitFor();
  await page.goto(`/set/chosen?topics=${a}`);
  expect((await shownSet(page)).id).toBe(opened.id);
  await page.goto(`/set/chosen?topics=${a},${b}`);
  const pair = await shownSet(page);
  expect(pair.id).not.toBe(opened.id);
  await page.goto(`/set/chosen?topics=${b},${a}`);
  expect((await shownSet(page)).id).toBe(pair.id);
  await page.goto(`/set/chosen?topics=${a},${b},${c}`);
  expect(
    topicsOf(await shownSet(page))
      .slice(0, 3)
      .sort(),
  ).toEqual(items.map(({ topic }) => topic.title).sort());
  expect(troubles).toEqual([]);
  await context.close();
});

test('the end of a chosen set leads back to the topics', async () => {
  const study = await aStudy({ subjects: 1, topics: 1, questions: 10 });
  const visitor = await signIn(study.student);
  const { page, look, expectNothing } = survey(visitor);
  await page.goto(`/set/chosen?topics=${study.subjects[0]?.topicIds[0]}`);
  await heading(page, 'Question 1 of 10').waitFor();
  await page.getByRole('textbox').fill('42');
  await page.getByRole('radio', { name: 'Certain' }).check({ force: true });
  await button(page, 'Hand in answer').click();
  await heading(page, /Mark scheme|Tick each point/).waitFor();
  if (await heading(page, 'Tick each point').isVisible()) {
    for (const box of await page.getByRole('checkbox').all()) await box.check({ force: true });
    await button(page, 'Save 2 marks').click();
    await heading(page, 'Mark scheme').waitFor();
  }
  await page.getByText('You chose to practise').waitFor();
  await button(page, 'Stop here').click();
  await heading(page, '1 question in 1 minute').waitFor();
  await page.getByText('Set from chosen topics, today').waitFor();
  // One right answer of ten is too little to say where the topic stands.
  await page.getByText('First look: not enough yet').waitFor();
  await look('summary of a chosen set');
  await page.getByRole('link', { name: 'Choose topics for another set' }).click();
  await heading(page, 'Topics').waitFor();
  expectNothing();
  await visitor.context.close();
});

test('where nothing can be asked the page says why and when; a mangled address is no page', async () => {
  const study = await aStudy({ subjects: 1, topics: 2, questions: 2 });
  await withSchool(study.school.id, () => execute('DELETE FROM topic_teachings'));
  const visitor = await signIn(study.student);
  const { page, look, open, expectNothing, troubles } = survey(visitor);
  await open(`/set/chosen?topics=${study.subjects[0]?.topicIds.join(',')}`, 'Nothing to practise', 'nothing chosen');
  await page.getByText('Your class has not been taught these topics yet.').waitFor();
  await page.getByRole('link', { name: 'Choose other topics' }).click();
  await heading(page, 'Topics').waitFor();
  expect(await page.getByRole('checkbox').count()).toBe(0);
  await page.getByText('Not taught yet').first().waitFor();
  await look('/topics, nothing taught');
  await page.goto(`/set/chosen?topics=${randomUUID()}`);
  await page.getByText('This topic is not among yours any more.').waitFor();
  await page.goto('/set/chosen?topics=not-an-id');
  await heading(page, 'There is no such page').waitFor();
  await page.goto('/set/chosen');
  await page.waitForURL('**/topics');
  // The refusal that the page turns into words.
  troubles.splice(0, 9, ...troubles.filter((trouble) => !/409|404|422/.test(trouble)));
  expectNothing();
  await visitor.context.close();
});

test('one set takes no more topics than it can; long groups open on request', async () => {
  const study = await aStudy({ subjects: 1, topics: MOST_CHOSEN_TOPICS + 1, questions: 1 });
  const { page, troubles, context } = await signIn(study.student);
  await page.goto('/topics');
  await button(page, /^Show the other \d+ not started topics$/).click();
  const boxes = page.getByRole('checkbox');
  expect(await boxes.count()).toBe(MOST_CHOSEN_TOPICS + 1);
  for (let index = 0; index < MOST_CHOSEN_TOPICS; index++) await boxes.nth(index).check({ force: true });
  await page.getByText(`${MOST_CHOSEN_TOPICS} is the most for one set.`).waitFor();
  expect(await boxes.last().isDisabled()).toBe(true);
  await button(page, 'Clear').click();
  expect(await boxes.last().isDisabled()).toBe(false);
  expect(await button(page, /^Practise/).count()).toBe(0);
  expect(troubles).toEqual([]);
  await context.close();
});

test('Today says why these questions, each counted once', async () => {
  const study = await aStudy({ subjects: 2, topics: 2, questions: 3 });
  await remember(study, { topicId: study.subjects[0]?.topicIds[0] ?? '', count: 2, stability: 0.3 });
  const visitor = await signIn(study.student);
  const { page, look, open, expectNothing } = survey(visitor);
  await open('/today', TODAY);
  await page.getByText('Why these questions').click();
  const reasons = page.getByRole('group').getByRole('listitem');
  await reasons.getByText('First look at a question').waitFor();
  const counts = (await reasons.allTextContents()).map((words) => Number.parseInt(words, 10));
  expect(counts.length).toBeGreaterThan(1);
  expect(counts.reduce((sum, count) => sum + count, 0)).toBe(12);
  await look('/today with its reasons');
  expectNothing();
  await visitor.context.close();
});
