import type { Page } from 'playwright-core';

/** Goes to an address and waits until all of it is there. */
export async function openPage(page: Page, address: string): Promise<void> {
  await page.goto(address);
  await pageIsThere(page);
}

/** Waits until the page has its heading and nothing on it is still being loaded. */
export async function pageIsThere(page: Page): Promise<void> {
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.waitForFunction(
    () =>
      ![...document.querySelectorAll('[role=status], [role=img]')].some((place) =>
        /^(Loading |Drawing the chart)/.test(place.textContent.trim()),
      ),
  );
}
