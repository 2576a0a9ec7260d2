import type { Page } from 'playwright-core';
import { expect } from 'vitest';

/** Fails, naming what stands out, when the page as a whole can be moved sideways. */
export async function expectNoOverflow(page: Page): Promise<void> {
  const standingOut = await page.evaluate(() => {
    const width = document.documentElement.clientWidth;
    if ((document.scrollingElement?.scrollWidth ?? 0) <= width) return [];
    return [...document.body.querySelectorAll('*')]
      .filter((element) => element.getBoundingClientRect().right > width + 1)
      .map((element) => element.outerHTML.slice(0, 120));
  });
  expect(standingOut, page.url()).toEqual([]);
}
