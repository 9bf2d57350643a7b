import type { Page } from 'playwright-core';
import { aSubject, aTopic, type FactorySubject } from '#seeds/factories/curriculum.ts';
import { aTeacher, type FactoryPerson } from '#seeds/factories/people.ts';
import { aNumberBody, aQuestion } from '#seeds/factories/question.ts';
import { aSchool, type FactorySchool } from '#seeds/factories/school.ts';

export const button = (page: Page, name: string | RegExp) =>
  page.getByRole('button', { name, exact: typeof name === 'string' });
export const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { name });
export const field = (page: Page, name: string) => page.getByRole('textbox', { name, exact: true });
export const stem = (page: Page) => field(page, 'Question');
export const saved = (page: Page) => page.getByRole('status').filter({ hasText: /^Saved \d/ });
export const toast = (page: Page, words: string) => page.getByRole('status').filter({ hasText: words });

export interface WritingDepartment {
  school: FactorySchool;
  subject: FactorySubject;
  topicId: string;
  author: FactoryPerson;
  colleague: FactoryPerson;
}

export async function aDepartment(): Promise<WritingDepartment> {
  const school = await aSchool();
  const subject = await aSubject(school, { name: 'Physics', strand: 'ph' });
  const { id: topicId } = await aTopic(school, subject, { title: 'Speed', number: '5' });
  const author = await aTeacher(school, subject.id);
  return { school, subject, topicId, author, colleague: await aTeacher(school, subject.id) };
}

export const aDraft = ({ school, subject, topicId, author }: WritingDepartment, text = 'Work out $6 \\times 7$.') =>
  aQuestion(school, subject, { author, topicId, status: 'draft', body: aNumberBody(text) });

export async function openQuestion(page: Page, id: string): Promise<void> {
  await page.goto(`/questions/${id}`);
  await stem(page).waitFor();
}

/** Makes saves of the draft fail as a lost connection does, until what it gives back is called. */
export async function cutOff(page: Page): Promise<() => Promise<void>> {
  await page.route('**/api/questions/*/draft', (route) => route.abort());
  return () => page.unroute('**/api/questions/*/draft');
}
