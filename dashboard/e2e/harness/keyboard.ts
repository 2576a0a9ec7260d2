import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';

const MOST_STEPS = 150;

/** Goes on by Tab until this has the focus, as somebody without a mouse does; the focus must be seen on the way's end. */
export async function tabTo(page: Page, wanted: Locator): Promise<void> {
  for (let step = 0; step < MOST_STEPS; step += 1) {
    await page.keyboard.press('Tab');
    if (await hasFocus(wanted)) {
      expect(await wanted.evaluate(showsFocus), `focus of ${String(wanted)}`).toBe(true);
      return;
    }
  }
  throw new Error(`${String(wanted)} is not reached by ${MOST_STEPS} steps of Tab`);
}

const hasFocus = (wanted: Locator) => wanted.evaluate((element) => element === document.activeElement);

/** A ring, a frame or a shadow that stands there only while it has the focus. */
function showsFocus(element: Element): boolean {
  const look = () => {
    const { outline, outlineStyle, boxShadow, border, backgroundColor } = getComputedStyle(element);
    return JSON.stringify([outlineStyle === 'none' ? '' : outline, boxShadow, border, backgroundColor]);
  };
  const focused = look();
  (element as HTMLElement).blur();
  const blurred = look();
  (element as HTMLElement).focus({ preventScroll: true });
  return focused !== blurred;
}
