import type { Page } from 'playwright-core';
import { expect, inject, test } from 'vitest';
import { anAnswerGiven } from '#seeds/factories/answer.ts';
import { aClass, aSitting, aSubject, aTopic, type FactorySubject, taught } from '#seeds/factories/curriculum.ts';
import {
  aCarer,
  aHeadOfDepartment,
  aHeadOfYear,
  aPerson,
  aSchoolAdmin,
  aStudent,
  aTeacher,
  type FactoryPerson,
} from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion, aRecallBody } from '#seeds/factories/question.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import type { QuestionBody } from '#shared/schemas/question-body.ts';
import { type Visitor, withChromium } from '#tests/support/chromium.ts';
import { inspect, SIZES } from '#tests/support/inspect.ts';

const { visit, signIn } = withChromium();

const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { name });
const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name });
const today = /^\w+day \d+ \w+/;

/** Looks at pages one after the other and gathers what is wrong with them. */
function survey({ page, troubles }: Visitor, looks?: typeof SIZES) {
  const faults: string[] = [];
  const look = async (name: string) => {
    // Maths and icons come with their own code; a page is looked at once it is whole.
    await page.waitForLoadState('networkidle');
    faults.push(...(await inspect(page, name, looks)));
  };
  const open = async (path: string, title: string | RegExp, name = path) => {
    await page.goto(path);
    await heading(page, title).first().waitFor();
    await look(name);
  };
  /** Nothing was wrong, on the pages or under them. */
  const expectNothing = () => expect([...faults, ...troubles]).toEqual([]);
  return { page, look, open, expectNothing, troubles };
}

const MATHS: QuestionBody = {
  stem: 'A curve is $y = \\frac{x^2 - 4x + 3}{\\sqrt{x + 5}}$.\n\n$$\\int_0^4 \\left(x^2 - 4x + 3\\right)\\,\\mathrm{d}x$$',
  parts: [
    {
      prompt: 'Work out $y$ when $x = 4$.',
      lines: 3,
      answerLabel: '$y =$',
      answer: { kind: 'number', value: 1 },
      points: [
        { code: 'M', text: '$\\frac{16 - 16 + 3}{3}$', marks: 1 },
        { code: 'A', text: '$1$', marks: 1, allow: ['$\\frac{3}{3}$'] },
      ],
      modelAnswer: '1',
    },
    {
      prompt: 'Name the curve’s *other* property.',
      lines: 4,
      answer: { kind: 'selfMarked' },
      points: [
        { code: 'B', text: 'it crosses the axis twice', marks: 1, ignore: ['where'], reject: ['once'] },
        { code: 'B', text: 'at $x = 1$ and $x = 3$', marks: 1 },
      ],
      modelAnswer: 'It crosses the axis at 1 and 3.',
    },
  ],
};

interface FullSchool {
  school: FactorySchool;
  subjects: FactorySubject[];
  teacher: FactoryPerson;
  colleague: FactoryPerson;
  head: FactoryPerson;
  student: FactoryPerson;
}

/** Three subjects with papers ahead, memory of some topics, and questions in every state. */
async function aFullSchool(): Promise<FullSchool> {
  const school = await aSchool();
  const names = [
    { name: 'Mathematics', strand: 'ma' },
    { name: 'French', strand: 'fr' },
    { name: 'Physics', strand: 'ph' },
  ];
  const student = await aStudent(school);
  const subjects: FactorySubject[] = [];
  let staff: Pick<FullSchool, 'teacher' | 'colleague' | 'head'> | undefined;
  const day = new Date().toISOString().slice(0, 10);
  for (const [index, values] of names.entries()) {
    const subject = await aSubject(school, values);
    subjects.push(subject);
    const teacher = await aTeacher(school, subject.id);
    const colleague = await aTeacher(school, subject.id);
    staff ??= { teacher, colleague, head: await aHeadOfDepartment(school, subject.id) };
    const { id: classId } = await aClass(school, subject, { teachers: [teacher], students: [student] });
    await aSitting(school, subject, { on: addDays(day, 20 + index) });
    for (let n = 1; n <= 3; n++) {
      const topic = await aTopic(school, subject, { title: `${values.name} topic ${n}`, number: String(n) });
      if (n < 3) await taught(school, classId, topic.id);
      const at = { author: teacher, topicId: topic.id };
      const body = n === 1 ? MATHS : aRecallBody(`State fact ${n} of ${values.name}.`);
      const question = await aQuestion(school, subject, { ...at, body, kind: n === 1 ? 'shortAnswer' : 'recallCard' });
      await aQuestion(school, subject, { ...at, body: aNumberBody(`Work out item ${n} of ${values.name}.`) });
      await aQuestion(school, subject, { ...at, status: 'inReview', body });
      await aQuestion(school, subject, { ...at, status: 'draft', body });
      await anAnswerGiven(school, subject, { student, question, topicId: topic.id, marks: [1], maxMarks: 4 });
      await withSchool(school.id, () =>
        execute(
          `INSERT INTO memory_states
             (school_id, user_id, question_id, stability, difficulty, last_on, attempts, last_grade, last_share)
           VALUES ($1, $2, $3, $4, 5, $5, 2, 3, 0.25)`,
          [school.id, student.id, question.id, [2, 12, 90][n - 1], addDays(day, -15)],
        ),
      );
    }
  }
  if (!staff) throw new Error('no subject was made');
  return { school, subjects, student, ...staff };
}

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
  const { student } = await aFullSchool();
  const visitor = await signIn(student);
  const { page, look, open, expectNothing } = survey(visitor);
  await open('/today', today);
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
  const { student } = await aFullSchool();
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
  await open('/today', today, '/today, set done');
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

test('roles whose own pages are still to come', async () => {
  const school = await aSchool();
  for (const person of [
    await aHeadOfYear(school),
    await aCarer(school),
    await aSchoolAdmin(school),
    await aPerson(school),
  ]) {
    const visitor = await signIn(person);
    const { page, open, expectNothing } = survey(visitor);
    await page.goto('/');
    await page.waitForURL('**/home');
    await open('/home', person.name, `/home of ${person.name}`);
    expectNothing();
    await visitor.context.close();
  }
});

test('a teacher: questions, the editor, review, topics; a head of department: item statistics', async () => {
  const { subjects, teacher, colleague, head } = await aFullSchool();
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

test('a new school: every page says what will be there', async () => {
  const school = await aSchool();
  const subject = await aSubject(school, { name: 'Geography', strand: 'ge' });
  const student = survey(await signIn(await aStudent(school)));
  await student.open('/today', today, 'empty /today');
  await student.page.getByText('Nothing to practise today').waitFor();
  await student.page.getByText('Your papers and their dates appear here').waitFor();
  await student.open('/topics', 'No topics yet', 'empty /topics');
  await student.open('/set/mixed', 'Nothing to practise', 'empty /set/mixed');
  // The refusal that the page turns into words.
  student.troubles.splice(0, 1, ...student.troubles.slice(0, 1).filter((trouble) => !trouble.includes('409')));
  student.expectNothing();

  const teacher = survey(await signIn(await aHeadOfDepartment(school, subject.id)));
  await teacher.open('/questions', 'No questions in geography yet', 'empty /questions');
  await teacher.open('/review', 'Nothing to review', 'empty /review');
  await teacher.open('/item-statistics', 'No statistics yet', 'empty /item-statistics');
  await teacher.open('/questions/new', 'New question', '/questions/new without topics');
  await teacher.open(`/subjects/${subject.id}/topics`, 'Geography specification', 'empty topics of a head');
  await teacher.page.getByText('No topics yet.').waitFor();
  await button(teacher.page, 'Add a topic').click();
  const dialog = teacher.page.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Add topic' }).click();
  await dialog.locator('[aria-invalid]').first().waitFor();
  await teacher.look('Add a topic, with errors');
  await dialog.getByLabel('Number').fill('4.2');
  await dialog.getByLabel('Title').fill('Rivers');
  await dialog.getByRole('button', { name: 'Add topic' }).click();
  await teacher.page.getByRole('status').filter({ hasText: 'Added. 4.2 Rivers is in the list.' }).waitFor();
  await teacher.page.getByRole('row', { name: /4\.2 Rivers/ }).waitFor();
  teacher.expectNothing();

  const other = await aSubject(school, { name: 'History', strand: 'hi' });
  const reader = survey(await signIn(await aTeacher(school, other.id)));
  await reader.open(`/subjects/${other.id}/topics`, 'No topics in history yet', 'empty topics of a teacher');
  reader.expectNothing();
  for (const { page } of [student, teacher, reader]) await page.context().close();
});

const LONG_WORD = 'Donaudampfschifffahrtselektrizitätenhauptbetriebswerkbauunterbeamtengesellschaft';
const LONG_NAME = `Wilhelmina-Alexandra ${LONG_WORD} Featherstonehaugh-Cholmondeley of Llanfairpwllgwyngyllgogerychwyrndrobwll`;
const LONG_STEM = `${'A long account of what was measured, where and by whom. '.repeat(33)}${LONG_WORD}`.slice(0, 2000);
const LONG_FORMULA = `$$${Array.from({ length: 16 }, (_, n) => `\\frac{x_{${n}}^{2}}{${n + 1}}`).join(' + ')}$$ and in the line $${'abc = '.repeat(25)}d$`;

test('very long names, questions and formulae stay inside their pages', async () => {
  const school = await aSchool();
  const subject = await aSubject(school, { name: `Mathematics and ${LONG_WORD}`, strand: 'ma' });
  const topic = await aTopic(school, subject, { title: `${LONG_WORD} and ${LONG_NAME}`, number: '12.13.14' });
  const teacher = await aTeacher(school, subject.id);
  const colleague = await aTeacher(school, subject.id);
  const student = await aStudent(school);
  const { id: classId } = await aClass(school, subject, { teachers: [teacher], students: [student] });
  await taught(school, classId, topic.id);
  await aSitting(school, subject, { on: addDays(new Date().toISOString().slice(0, 10), 5) });
  await withSchool(school.id, async () => {
    await execute('UPDATE users SET name = $1', [LONG_NAME]);
    await execute('UPDATE schools SET name = $1', [`The ${LONG_NAME} School`]);
    await execute('UPDATE classes SET name = $1', [LONG_WORD]);
    await execute('UPDATE papers SET title = $1', [`Paper of ${LONG_NAME}`]);
  });
  const body: QuestionBody = {
    ...MATHS,
    stem: `${LONG_STEM}\n\n${LONG_FORMULA}`,
    parts: [
      {
        prompt: LONG_FORMULA,
        lines: 3,
        answer: { kind: 'selfMarked' },
        points: [{ code: 'B', text: `${LONG_STEM.slice(0, 400)} ${LONG_WORD}`, marks: 1 }],
        modelAnswer: LONG_STEM,
      },
    ],
  };
  for (const status of ['live', 'inReview', 'draft'] as const) {
    await aQuestion(school, subject, { author: teacher, topicId: topic.id, status, body });
  }

  const learner = survey(await signIn(student), SIZES);
  await learner.open('/today', today, 'long /today');
  await button(learner.page, /your settings$/).click();
  await button(learner.page, 'Sign out').waitFor();
  await learner.look('long name menu');
  await learner.open('/topics', 'Topics', 'long /topics');
  await learner.page.goto('/set/mixed');
  await heading(learner.page, 'Question 1 of 1').waitFor();
  await learner.look('long runner: ask');
  await learner.page.getByRole('textbox').fill(`${LONG_WORD}${LONG_WORD} ${'and so on '.repeat(60)}`);
  await learner.page.getByRole('radio', { name: 'Guess' }).check({ force: true });
  await button(learner.page, 'Hand in answer').click();
  await heading(learner.page, 'Tick each point').waitFor();
  await learner.look('long runner: self-mark');
  await button(learner.page, /^Save/).click();
  await heading(learner.page, 'Mark scheme').waitFor();
  await learner.look('long runner: marked');
  await button(learner.page, 'Finish the set').click();
  await heading(learner.page, '1 question in').waitFor();
  await learner.look('long summary');
  learner.expectNothing();

  const writer = survey(await signIn(teacher), SIZES);
  await writer.open('/questions', 'Questions', 'long /questions');
  await writer.page.goto('/questions?status=draft');
  await writer.page
    .getByRole('link', { name: /A long account/ })
    .first()
    .click();
  await heading(writer.page, 'As the student sees it').waitFor();
  await writer.look('long editor');
  await writer.open(`/subjects/${subject.id}/topics`, 'Topics', 'long /subjects/:id/topics');
  await writer.open('/item-statistics', 'Item statistics', 'long /item-statistics');
  writer.expectNothing();

  const reviewer = survey(await signIn(colleague), SIZES);
  await reviewer.open('/review', 'Review', 'long /review');
  await reviewer.page
    .getByRole('link', { name: /^Review \d+$/ })
    .first()
    .click();
  await heading(reviewer.page, 'Versions').waitFor();
  await reviewer.look('long review of a question');
  reviewer.expectNothing();

  const guest = survey(await visit(), SIZES);
  await guest.open(`/sign-in/${school.code}`, 'Sign in', 'long /sign-in/:code');
  guest.expectNothing();
  for (const { page } of [learner, writer, reviewer, guest]) await page.context().close();
});

const BROKEN = JSON.stringify({ type: '/problems/broken', title: 'Broken', status: 500, detail: 'Broken.' });

interface Broken {
  path: string;
  api: string;
  title: RegExp;
  whole: RegExp;
}

type Way = 'refused' | 'unreachable';

/** Fails one request, reads the words, then lets it through and tries again. */
async function failsInWords({ page }: Visitor, { path, api, title, whole }: Broken, ways: Way[]): Promise<string[]> {
  const faults: string[] = [];
  for (const way of ways) {
    await page.route(api, (route) =>
      way === 'refused'
        ? route.fulfill({ status: 500, contentType: 'application/problem+json', body: BROKEN })
        : route.abort(),
    );
    await page.goto(path);
    await page.getByRole('alert').getByRole('heading', { name: title }).waitFor();
    if (way === 'refused') faults.push(...(await inspect(page, `${path} failed`)));
    await page.unroute(api);
    await button(page, 'Try again').click();
    await heading(page, whole).first().waitFor();
    await page.getByRole('alert').waitFor({ state: 'detached' });
  }
  return faults;
}

test('a request that fails is said in words, and trying again works', async () => {
  const { student, teacher, subjects } = await aFullSchool();
  const page = /This page could not be shown|Plait cannot be reached/;
  const own: Broken[] = [
    { path: '/today', api: '**/api/today', title: page, whole: today },
    { path: '/topics', api: '**/api/my-topics', title: page, whole: /^Topics$/ },
  ];
  const staff: Broken[] = [
    { path: '/questions', api: '**/api/questions?*', title: /The questions could not be read/, whole: /^Questions$/ },
    {
      path: '/review',
      api: '**/api/review-queue*',
      title: /The review queue could not be read/,
      whole: /^For you to review/,
    },
    {
      path: '/item-statistics',
      api: '**/api/item-statistics?*',
      title: /The statistics could not be read/,
      whole: /^Item statistics$/,
    },
    { path: `/subjects/${subjects[0]?.id}/topics`, api: '**/api/subjects', title: page, whole: /^Topics$/ },
  ];
  for (const [person, list] of [
    [student, own],
    [teacher, staff],
  ] as const) {
    const visitor = await signIn(person);
    const faults: string[] = [];
    for (const [index, broken] of list.entries()) {
      faults.push(...(await failsInWords(visitor, broken, index === 0 ? ['refused', 'unreachable'] : ['refused'])));
    }
    expect(faults).toEqual([]);
    await visitor.context.close();
  }
});

test('on a slow network a page shows that it is coming, and quick answers never flicker', async () => {
  const { student, teacher } = await aFullSchool();
  for (const { person, path, api, words, whole } of [
    { person: student, path: '/today', api: '**/api/today', words: 'Loading this page', whole: today },
    { person: student, path: '/topics', api: '**/api/my-topics', words: 'Loading this page', whole: 'Topics' },
    { person: teacher, path: '/questions', api: '**/api/questions?*', words: 'Loading questions', whole: 'Questions' },
    {
      person: teacher,
      path: '/review',
      api: '**/api/review-queue*',
      words: 'Loading questions to review',
      whole: 'Review',
    },
  ]) {
    const visitor = await signIn(person);
    const { page, look, expectNothing } = survey(visitor);
    let answer: (() => void) | undefined;
    const asked = new Promise<void>((resolve) => {
      void page.route(api, async (route) => {
        resolve();
        await new Promise<void>((go) => {
          answer = go;
        });
        await route.continue();
      });
    });
    await page.goto(path);
    await asked;
    const coming = page.getByRole('status').filter({ hasText: words });
    await coming.waitFor();
    expect(await coming.getAttribute('aria-busy')).toBe('true');
    answer?.();
    await coming.waitFor({ state: 'detached' });
    await heading(page, whole).first().waitFor();
    await page.unroute(api);
    if (path === '/today') await look('/today after waiting');
    expectNothing();
    await visitor.context.close();
  }
  expect(inject('origin')).toContain('127.0.0.1');
});
