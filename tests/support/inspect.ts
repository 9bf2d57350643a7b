import type { Page } from 'playwright-core';
import { axe, DESK, PHONE } from './chromium.ts';

const LOOKS = [
  { colorScheme: 'light', viewport: DESK },
  { colorScheme: 'dark', viewport: DESK },
  { colorScheme: 'dark', viewport: PHONE },
  { colorScheme: 'light', viewport: PHONE },
] as const;
type Look = (typeof LOOKS)[number];
/** Where only the sizes matter, because the colours were looked at elsewhere. */
export const SIZES = LOOKS.filter(({ colorScheme }) => colorScheme === 'light');
/** What differs between light and dark; the rest is the same page and is looked at once a width. */
const COLOUR_RULES = ['color-contrast', 'link-in-text-block'];
/** 400 % zoom of a 1280 window, where WCAG 1.4.10 asks for no sideways scrolling. */
const NARROW = { width: 320, height: 568 };

/** What hangs out of the page at the right, or null where nothing does. */
const overhang = (page: Page): Promise<string | null> =>
  page.evaluate(() => {
    const { scrollWidth, clientWidth } = document.documentElement;
    if (scrollWidth <= clientWidth) return null;
    const isOpen = (element: Element) => getComputedStyle(element).overflowX === 'visible';
    const isSeen = (element: Element): boolean =>
      element.parentElement === null || (isOpen(element.parentElement) && isSeen(element.parentElement));
    const outside = [...document.body.querySelectorAll('*')].filter((element) => {
      const { left, right } = element.getBoundingClientRect();
      const end = isOpen(element) ? Math.max(right, left + element.scrollWidth) : right;
      return end > clientWidth + 1 && isSeen(element);
    });
    const words = outside.slice(-3).map((element) => element.outerHTML.slice(0, 120));
    return `${scrollWidth} px on ${clientWidth}: ${words.join(' … ')}`;
  });

/**
 * Everything wrong with a page as it stands, light and dark, at a desk, on a phone and at 320 px: what axe finds and
 * what scrolls sideways. The page is left at its own size.
 */
export async function inspect(page: Page, name: string, looks: readonly Look[] = LOOKS): Promise<string[]> {
  const faults: string[] = [];
  const viewport = page.viewportSize() ?? DESK;
  for (const look of looks) {
    await page.emulateMedia({ colorScheme: look.colorScheme });
    await page.setViewportSize(look.viewport);
    // Colours that are still on their way from the look before are nobody's colours.
    await page.evaluate(() => {
      for (const animation of document.getAnimations()) animation.finish();
    });
    const where = `${name}, ${look.colorScheme}, ${look.viewport.width}`;
    for (const { id, nodes } of await axe(page, look.colorScheme === 'dark' ? COLOUR_RULES : undefined))
      faults.push(`${where}: ${id}: ${nodes.join(' | ').slice(0, 700)}`);
    const wide = await overhang(page);
    if (wide) faults.push(`${where}: scrolls sideways: ${wide}`);
  }
  await page.setViewportSize(NARROW);
  const wide = await overhang(page);
  if (wide) faults.push(`${name}, 320: scrolls sideways: ${wide}`);
  const titles = await page.getByRole('heading', { level: 1 }).count();
  if (titles !== 1) faults.push(`${name}: ${titles} headings of level 1`);
  await page.setViewportSize(viewport);
  return faults;
}
