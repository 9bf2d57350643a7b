import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import type { Visitor } from './chromium.ts';
import { inspect, type SIZES } from './inspect.ts';

export const heading = (page: Page, name: string | RegExp) => page.getByRole('heading', { name });
export const button = (page: Page, name: string | RegExp) => page.getByRole('button', { name });
/** The title of Today: "Tuesday 1 December". */
export const TODAY = /^\w+day \d+ \w+/;

/** Looks at pages one after the other and gathers what is wrong with them. */
export function survey({ page, troubles }: Visitor, looks?: typeof SIZES) {
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
