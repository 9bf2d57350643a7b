import { expect, test } from 'vitest';
import { aClass, aSubject, aTopic, taught } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aStudent, aTeacher } from '#seeds/factories/people.ts';
import { aSchool } from '#seeds/factories/school.ts';
import { axe, withChromium } from '#tests/support/chromium.ts';

const { signIn } = withChromium();

const QUESTION = 'A car travels $150\\ \\text{km}$ in $2.5$ hours. Work out its mean speed.';

test('a teacher writes a question, a colleague puts it live, a student answers it, the department sees how it did', async () => {
  const school = await aSchool();
  const subject = await aSubject(school, { name: 'Physics', strand: 'ph' });
  const topic = await aTopic(school, subject, { title: 'Speed', number: '5' });
  const writer = await aTeacher(school, subject.id);
  const colleague = await aTeacher(school, subject.id);
  const head = await aHeadOfDepartment(school, subject.id);
  const student = await aStudent(school);
  const { id: classId } = await aClass(school, subject, { teachers: [writer], students: [student] });
  await taught(school, classId, topic.id);

  // The teacher writes it, with maths in it and a mark scheme, and tries it as a student.
  const teacher = await signIn(writer);
  await teacher.page.goto('/questions');
  await teacher.page.getByRole('link', { name: 'New question' }).first().click();
  await teacher.page.getByLabel('Topic', { exact: true }).selectOption({ label: '5 Speed' });
  await teacher.page.getByRole('textbox', { name: 'Question', exact: true }).fill(QUESTION);
  await teacher.page.getByLabel('Point 1', { exact: true }).fill('$150 \\div 2.5$');
  await teacher.page.getByRole('button', { name: 'Add a point' }).click();
  await teacher.page.getByLabel('Point 2', { exact: true }).fill('$60$');
  await teacher.page.getByRole('radio', { name: 'A number' }).check({ force: true });
  await teacher.page.getByLabel('Value', { exact: true }).fill('60');
  await teacher.page.getByLabel('Unit', { exact: true }).fill('km/h');
  await teacher.page.getByLabel('Model answer', { exact: true }).fill('60');
  await teacher.page.getByText('Plait gives it full marks').waitFor();
  await teacher.page.locator('.katex').first().waitFor();
  await teacher.page.getByText(/^Saved /).waitFor();
  await teacher.page.waitForURL(/\/questions\/[0-9a-f-]{36}$/);
  const address = new URL(teacher.page.url()).pathname;
  await teacher.page.getByRole('button', { name: 'Try answers' }).click();
  await teacher.page.getByRole('dialog').getByRole('textbox').fill('60 km/h');
  await teacher.page.getByRole('button', { name: 'Mark it' }).click();
  await teacher.page.getByRole('dialog').getByText('2 of 2 marks').waitFor();
  await teacher.page.keyboard.press('Escape');
  await teacher.page.getByRole('button', { name: 'Send for review' }).click();
  await teacher.page
    .getByText(/in review/)
    .first()
    .waitFor();
  // Nobody puts their own question live.
  expect(await teacher.page.getByRole('button', { name: 'Put live' }).count()).toBe(0);

  const reviewer = await signIn(colleague);
  await reviewer.page.goto('/review');
  await reviewer.page.getByRole('link', { name: /^Review \d+$/ }).click();
  await reviewer.page.getByRole('button', { name: 'Put live' }).click();
  await reviewer.page.getByText(/is live\. Students can meet it/).waitFor();

  const learner = await signIn(student);
  await learner.page.goto('/today');
  await learner.page
    .getByRole('link', { name: 'Start mixed set' })
    .or(learner.page.getByRole('button', { name: 'Start mixed set' }))
    .click();
  await learner.page.locator('.katex').first().waitFor();
  // The topic stays hidden until the answer is given.
  expect(await learner.page.getByText('Speed', { exact: true }).count()).toBe(0);
  await learner.page.getByRole('textbox').fill('60');
  await learner.page.getByRole('radio', { name: 'Certain' }).check({ force: true });
  await learner.page.getByRole('button', { name: 'Hand in answer' }).click();
  await learner.page.getByRole('heading', { name: 'Mark scheme' }).waitFor();
  await learner.page.getByText('Speed', { exact: true }).first().waitFor();
  await learner.page.getByText(/comes back about/).waitFor();

  const department = await signIn(head);
  await department.page.goto('/item-statistics');
  const row = department.page.getByRole('row', { name: /A car travels/ });
  await row.getByRole('cell', { name: '1', exact: true }).first().waitFor();
  await row.getByRole('link').first().click();
  await department.page.waitForURL(`**${address}`);

  for (const { page, troubles, context } of [teacher, reviewer, learner, department]) {
    expect(await axe(page)).toEqual([]);
    expect(troubles).toEqual([]);
    await context.close();
  }
});
