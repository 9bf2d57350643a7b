import { expect, test } from 'vitest';
import { select, withSchool } from '#server/db/scope.ts';
import { withChromium } from '#tests/support/chromium.ts';
import { aDepartment, aDraft, button, heading, openQuestion, saved, stem, toast } from '#tests/support/editor-page.ts';
import { expectFocus } from '#tests/support/keyboard.ts';

const { signIn } = withChromium();

test('returned with a comment, sent again, put live, superseded by a new version, retired', async () => {
  const department = await aDepartment();
  const { id, number } = await aDraft(department, 'Work out $6 \\times 7$, quickly.');
  const author = await signIn(department.author);
  const colleague = await signIn(department.colleague);
  const versions = () =>
    withSchool(department.school.id, () =>
      select<{ version: number; status: string; stem: string }>(
        `SELECT version, status, body ->> 'stem' AS stem FROM question_versions WHERE question_id = $1 ORDER BY version`,
        [id],
      ),
    );
  const send = async () => {
    await button(author.page, 'Send for review').click();
    await toast(author.page, 'Sent for review.').waitFor();
  };
  const review = async () => {
    await colleague.page.goto('/review');
    await colleague.page.getByRole('link', { name: `Review ${number}` }).click();
    await button(colleague.page, 'Put live').waitFor();
  };

  await openQuestion(author.page, id);
  await send();
  await review();
  await button(colleague.page, 'Return to author').click();
  const dialog = colleague.page.getByRole('dialog');
  await dialog.getByRole('button', { name: 'Return to author' }).click();
  await dialog.getByText('Say what should change.').waitFor();
  await dialog.getByLabel('What should change').fill('Leave out\n“quickly”.');
  await dialog.getByRole('button', { name: 'Return to author' }).click();
  await toast(colleague.page, `Question ${number} is back with`).waitFor();
  await heading(colleague.page, 'Nothing to review').waitFor();

  await openQuestion(author.page, id);
  await author.page.getByText(`${department.colleague.name} returned this:`).waitFor();
  await author.page.getByText('“quickly”.').waitFor();
  await stem(author.page).fill('Work out $6 \\times 7$.');
  await saved(author.page).waitFor();
  await send();
  await review();
  await button(colleague.page, 'Put live').click();
  await toast(colleague.page, `Question ${number} is live.`).waitFor();

  await author.page.goto(`/questions/${id}`);
  await button(author.page, 'Start a new version').click();
  await stem(author.page).fill('Work out $7 \\times 6$.');
  await saved(author.page).waitFor();
  await author.page.getByText('Version 1 is live.').waitFor();
  expect(await versions()).toMatchObject([
    { version: 1, status: 'live', stem: 'Work out $6 \\times 7$.' },
    { version: 2, status: 'draft', stem: 'Work out $7 \\times 6$.' },
  ]);
  await send();
  await review();
  await button(colleague.page, 'Put live').click();
  await toast(colleague.page, `Question ${number} is live.`).waitFor();
  expect((await versions()).map(({ status }) => status)).toEqual(['superseded', 'live']);
  await colleague.page.getByRole('listitem').filter({ hasText: 'Superseded' }).waitFor();

  await author.page.goto(`/questions/${id}`);
  await button(author.page, 'Retire').click();
  await author.page.getByRole('dialog', { name: `Retire question ${number}?` }).waitFor();
  // Escape keeps it and gives the focus back.
  await author.page.keyboard.press('Escape');
  await expectFocus(button(author.page, 'Retire'));
  await author.page.keyboard.press('Enter');
  await author.page.getByRole('dialog').getByRole('button', { name: 'Retire' }).click();
  await toast(author.page, `Question ${number} is retired.`).waitFor();
  expect((await versions()).map(({ status }) => status)).toEqual(['superseded', 'retired']);
  await author.page.goto('/questions?status=live');
  await heading(author.page, 'No question matches').waitFor();
  await author.page.goto('/questions?status=retired');
  await author.page
    .getByRole('link', { name: /Work out/ })
    .first()
    .waitFor();
  for (const { context, troubles } of [author, colleague]) {
    expect(troubles).toEqual([]);
    await context.close();
  }
});
