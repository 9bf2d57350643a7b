import type { Page } from 'playwright-core';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';
import type { FactoryPerson } from '#seeds/factories/people.ts';
import { aStudy, type Study } from '#seeds/factories/study.ts';
import { execute, withSchool } from '#server/db/scope.ts';
import { storedAnswers } from './practice-log.ts';

export const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name });
export const question = (page: Page, number: number) => page.getByRole('heading', { name: `Question ${number} of` });
export const marked = (page: Page) => page.getByRole('heading', { name: 'Mark scheme' });
export const status = (page: Page, words: string | RegExp) => page.getByRole('status').filter({ hasText: words });

/** Three questions that Plait marks, in as many subjects, none a recall card. */
export async function threeQuestions(): Promise<Study> {
  const study = await aStudy({ subjects: 3, topics: 1, questions: 2 });
  await withSchool(study.school.id, () =>
    execute(
      `WITH retired AS (
         UPDATE question_versions SET status = 'retired' WHERE kind = 'recallCard' RETURNING question_id
       )
       UPDATE questions SET live_version_id = NULL, retired_at = now()
       WHERE id IN (SELECT question_id FROM retired)`,
    ),
  );
  return study;
}

/** Puts another student into every class of the study. */
export const enrol = ({ school, subjects }: Study, { id }: FactoryPerson): Promise<void> =>
  withSchool(school.id, async () => {
    for (const { classId } of subjects) {
      await execute(
        `INSERT INTO enrolments (school_id, id, class_id, user_id, valid_from)
         VALUES ($1, gen_random_uuid(), $2, $3, '2020-01-01')`,
        [school.id, classId, id],
      );
    }
  });

export async function openSet(page: Page): Promise<void> {
  await page.goto('/today');
  await page.getByRole('link', { name: /(Start|Continue) mixed set/ }).click();
  await question(page, 1).waitFor();
}

export async function write(page: Page, text: string): Promise<void> {
  await page.getByRole('textbox').fill(text);
  await page.getByRole('radio', { name: 'Certain' }).check({ force: true });
}

/** Fills in the form of the sign-in page that is open. */
export async function signInOn(page: Page, { username }: FactoryPerson): Promise<void> {
  await page.getByLabel('E-mail or school username').fill(username);
  await page.getByLabel('Password', { exact: true }).fill(FACTORY_PASSWORD);
  await button(page, 'Sign in').click();
}

/** Ends every session of a person on the server, as its time running out would. */
export const endSessions = ({ schoolId, id }: FactoryPerson): Promise<unknown> =>
  withSchool(schoolId, () => execute(`DELETE FROM session WHERE sess -> 'passport' -> 'user' ->> 'userId' = $1`, [id]));

/** What is kept on the device and not sent, as the browser holds it. */
export const kept = (page: Page): Promise<string[]> =>
  page.evaluate(() => Object.keys(sessionStorage).filter((key) => key.startsWith('plait.answers.')));

export const counted = async (schoolId: string) =>
  (await storedAnswers(schoolId)).map(({ position, responses, mark_events }) => [position, responses[0], mark_events]);
