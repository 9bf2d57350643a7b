import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';

const MOST_STEPS = 40;

const hasFocus = (target: Locator): Promise<boolean> =>
  target.evaluate((element) => element === element.ownerDocument.activeElement);

/**
 * What is wrong with where the focus is seen, or null. It has to be ringed, by the element itself or by the label or
 * box that stands for a hidden control, inside the window, and on top of whatever could cover it.
 */
const focusFault = (page: Page): Promise<string | null> =>
  page.evaluate(() => {
    const element = document.activeElement;
    if (!element || element === document.body) return 'nothing has the focus';
    const words = element.outerHTML.slice(0, 200);
    const isShown = (one: Element | null | undefined): one is Element => (one?.getBoundingClientRect().width ?? 0) > 4;
    const isRinged = (one: Element) => {
      const { outlineStyle, outlineWidth } = getComputedStyle(one);
      return outlineStyle !== 'none' && Number.parseFloat(outlineWidth) >= 2;
    };
    const above = [element, element.parentElement, element.parentElement?.parentElement];
    const ringed = above.filter(isShown).find(isRinged);
    if (!ringed) return `no focus ring: ${words}`;
    const { left, right, top, bottom } = ringed.getBoundingClientRect();
    const isInside = left >= -1 && top >= -1 && right <= innerWidth + 1 && bottom <= innerHeight + 1;
    if (!isInside) return `out of the window: ${words}`;
    const over = document.elementFromPoint((left + right) / 2, (top + bottom) / 2);
    return over && (ringed.contains(over) || over.contains(ringed)) ? null : `covered: ${words}`;
  });

/** Presses Tab until `target` has the focus; every stop on the way has to be seen. */
export async function tabTo(page: Page, target: Locator, key: 'Tab' | 'Shift+Tab' = 'Tab'): Promise<void> {
  await target.waitFor();
  for (let step = 0; step < MOST_STEPS; step++) {
    await page.keyboard.press(key);
    expect(await focusFault(page)).toBeNull();
    if (await hasFocus(target)) return;
  }
  throw new Error(`${MOST_STEPS} times ${key} did not reach ${target}`);
}

/** Waits until `target` has taken the focus by itself, inside the window. */
export async function expectFocus(target: Locator): Promise<void> {
  await target.waitFor();
  await expect.poll(() => hasFocus(target), { timeout: 10_000, message: `focus on ${target}` }).toBe(true);
  const isInside = await target.evaluate((element) => {
    const { top, bottom } = element.getBoundingClientRect();
    return top >= 0 && bottom <= innerHeight;
  });
  expect(isInside, `${target} is in the window`).toBe(true);
}
