import { expect, test } from 'vitest';
import { aClass, aSpecification } from '#seeds/factories/curriculum.ts';
import { aHeadOfDepartment, aStudent } from '#seeds/factories/people.ts';
import { aQuestion } from '#seeds/factories/question.ts';
import { select, withSchool } from '#server/db/scope.ts';
import { SchoolClass } from '#server/models/school-class.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { aDepartment, button, heading, toast, type WritingDepartment } from '#tests/support/editor-page.ts';
import { expectFocus } from '#tests/support/keyboard.ts';
import { survey } from '#tests/support/survey.ts';

const { signIn } = withChromium();

const chosenIn = ({ school }: WritingDepartment) =>
  withSchool(school.id, () => select<{ choice: string }>('SELECT choice FROM class_questions'));

/** A class of the subject that takes a specification of its own. */
async function aClassElsewhere({ school, subject, author }: WritingDepartment): Promise<string> {
  const { id: specificationId } = await aSpecification(school, subject);
  const { id, name } = await aClass(school, subject, { teachers: [author] });
  await withSchool(school.id, () => SchoolClass.update({ specificationId }, { where: { id } }));
  return name;
}

test('a teacher sets a live question for a class, takes it back and keeps it out', async () => {
  const department = await aDepartment();
  const { school, subject, author, topicId } = department;
  const question = await aQuestion(school, subject, { author, topicId });
  const students = [await aStudent(school), await aStudent(school)];
  const { name } = await aClass(school, subject, { teachers: [author], students });
  const elsewhere = await aClassElsewhere(department);
  const visitor = await signIn(author);
  const { page, open, look, expectNothing } = survey(visitor);
  const choice = (className: string, label: string) =>
    page.getByRole('group', { name: `in the sets of ${className}` }).getByRole('radio', { name: label });
  const pick = (label: string) =>
    page
      .getByRole('group', { name: `in the sets of ${name}` })
      .getByText(label, { exact: true })
      .click();
  const says = (words: string) => toast(page, `Saved. Question ${question.number} ${words} ${name}.`).waitFor();

  await open(`/questions/${question.id}`, 'In your classes’ sets');
  await choice(name, 'As usual').focus();
  expect(await choice(name, 'As usual').isChecked()).toBe(true);
  await page.keyboard.press('ArrowRight');
  await says('goes into the next sets of');
  await expectFocus(choice(name, 'Next set'));
  await page.getByText(`Set by ${author.name}, `).waitFor();
  await page.getByText('0 of 2 students have answered it since.').waitFor();
  expect(await chosenIn(department)).toEqual([{ choice: 'set' }]);

  await button(page, 'Undo').click();
  await says('comes as usual for');
  expect(await choice(name, 'As usual').isChecked()).toBe(true);
  expect(await chosenIn(department)).toEqual([]);

  await pick('Keep out');
  await says('stays out of the sets of');
  await page.getByText(`Kept out by ${author.name}, `).waitFor();
  await look('/questions/:id, kept out of a class’s sets');
  await page.reload();
  await heading(page, 'In your classes’ sets').waitFor();
  await page.getByText(`Kept out by ${author.name}, `).waitFor();
  expect(await choice(name, 'Keep out').isChecked()).toBe(true);
  expect(await chosenIn(department)).toEqual([{ choice: 'excluded' }]);

  // What cannot be chosen says why.
  expect(await choice(elsewhere, 'Next set').isDisabled()).toBe(true);
  await page.getByText('This question is in none of the topics of the class’s specification.').waitFor();
  expectNothing();

  // A save that does not arrive goes back, in words.
  await page.route('**/api/questions/*/classes/*', (route) => route.abort());
  await pick('As usual');
  await page.getByRole('alert').filter({ hasText: 'Plait cannot be reached.' }).waitFor();
  expect(await choice(name, 'Keep out').isChecked()).toBe(true);
  await look('/questions/:id, a choice that was not saved');
  visitor.troubles.splice(0, 99, ...visitor.troubles.filter((trouble) => !trouble.includes('net::ERR_FAILED')));
  expectNothing();
  await visitor.context.close();
});

test('whoever has no class is told what will be there; a head of department has them all', async () => {
  const department = await aDepartment();
  const { school, subject, author, colleague, topicId } = department;
  const question = await aQuestion(school, subject, { author, topicId });
  const classes = [await aClass(school, subject, { teachers: [author] }), await aClass(school, subject)];
  for (const [person, count] of [
    [colleague, 0],
    [await aHeadOfDepartment(school, subject.id), classes.length],
  ] as const) {
    const visitor = await signIn(person);
    const { page, look, expectNothing } = survey(visitor);
    await page.goto(`/questions/${question.id}`);
    await heading(page, 'In your classes’ sets').waitFor();
    const words = count === 0 ? /^You have no class in physics yet\./ : /^\d students?\.|^No student of this class/;
    await page.getByText(words).first().waitFor();
    await page.waitForLoadState('networkidle');
    expect(await page.getByRole('group', { name: /in the sets of/ }).count()).toBe(count);
    await look(`/questions/:id with ${count} classes`);
    expectNothing();
    await visitor.context.close();
  }
});
