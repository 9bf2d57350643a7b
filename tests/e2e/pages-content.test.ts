import { test } from 'vitest';
import { aClass, aSitting, aSubject, aTopic, taught } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import { addDays } from '#shared/domain/time/calendar.ts';
import type { QuestionBody } from '#shared/schemas/question-body.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { SIZES } from '#tests/support/inspect.ts';
import { MATHS } from '#tests/support/school-in-use.ts';
import { button, heading, survey, TODAY } from '#tests/support/survey.ts';

const { visit, signIn } = withChromium();

test('a new school: every page says what will be there', async () => {
  const school = await aSchool();
  const subject = await aSubject(school, { name: 'Geography', strand: 'ge' });
  const student = survey(await signIn(await aStudent(school)));
  await student.open('/today', TODAY, 'empty /today');
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
  await learner.open('/today', TODAY, 'long /today');
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
