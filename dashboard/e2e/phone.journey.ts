import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { expectAccessible } from './harness/accessibility';
import { everyPage } from './harness/every-page';
import { journey } from './harness/journey';
import { openPage, pageIsThere } from './harness/open-page';
import { expectNoOverflow } from './harness/overflow';
import { signInAs } from './harness/sign-in';
import { postFailingUnit } from './harness/stations';

const phone = { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true, deviceScaleFactor: 2 };

journey(
  'on a phone every page fits, places are behind the menu, and the chosen light stays',
  async ({ server, page }) => {
    await postFailingUnit(server);
    await signInAs(page, 'productionEngineer');
    await pageIsThere(page);
    await expectAccessible(page);

    await page.getByRole('button', { name: 'Menu' }).tap();
    await expectAccessible(page);
    await page.getByRole('link', { name: 'Units', exact: true }).tap();
    await page.getByRole('heading', { level: 1, name: 'Units' }).waitFor();
    await pageIsThere(page);
    await page.getByRole('table').getByRole('link').first().tap();
    await page.getByRole('img', { name: /Deviation from the reference current/ }).waitFor();
    await pageIsThere(page);
    await expectAccessible(page);

    await choose(page, 'Night');
    await page.reload();
    expect(await light(page)).toBe('night');
    await choose(page, 'Day');
    await page.reload();
    expect(await light(page)).toBe('day');

    for (const address of await everyPage(page)) {
      await openPage(page, address);
      await expectNoOverflow(page);
    }
  },
  phone,
);

/** Presses the day or night switch at the foot of the menu. */
async function choose(page: Page, label: 'Day' | 'Night'): Promise<void> {
  await page.getByRole('button', { name: 'Menu' }).tap();
  await page.getByRole('radio', { name: label }).tap();
  expect(await light(page)).toBe(label.toLowerCase());
}

const light = (page: Page) => page.evaluate(() => document.documentElement.dataset.theme);
