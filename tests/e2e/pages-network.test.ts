import { expect, test } from 'vitest';
import { type Visitor, withChromium } from '#tests/support/chromium.ts';
import { inspect, SIZES } from '#tests/support/inspect.ts';
import { aSchoolInUse } from '#tests/support/school-in-use.ts';
import { button, heading, survey, TODAY } from '#tests/support/survey.ts';

const { signIn } = withChromium();

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
    if (way === 'refused') faults.push(...(await inspect(page, `${path} failed`, ways.length > 1 ? undefined : SIZES)));
    await page.unroute(api);
    await button(page, 'Try again').click();
    await heading(page, whole).first().waitFor();
    await page.getByRole('alert').waitFor({ state: 'detached' });
  }
  return faults;
}

test('a request that fails is said in words, and trying again works', async () => {
  const { student, teacher, subjects } = await aSchoolInUse();
  const page = /This page could not be shown|Plait cannot be reached/;
  const own: Broken[] = [
    { path: '/today', api: '**/api/today', title: page, whole: TODAY },
    { path: '/set/mixed?another=1', api: '**/api/sets', title: page, whole: /^Question 1 of/ },
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
  const { student, teacher } = await aSchoolInUse();
  for (const { person, path, api, words, whole } of [
    { person: student, path: '/today', api: '**/api/today', words: 'Loading this page', whole: TODAY },
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
});
