import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import type { ResultPage } from '../src/types/api';
import { expectAccessible } from './harness/accessibility';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { pageIsThere } from './harness/open-page';
import { expectNoOverflow } from './harness/overflow';
import { signInAs } from './harness/sign-in';
import { postFailingUnit } from './harness/stations';

const breachTitle = 'Output impedance out of limits: FH-R500-W at board';
const note = 'North-1 has the lot in quarantine; retest on north-2 at noon.';

journey(
  'the quality lead sees a breach come in, follows its mail to the curve and acknowledges it',
  async ({ server, page }) => {
    await page.goto('/sign-in');
    await expectAccessible(page);
    await signInAs(page, 'qualityLead');
    await page.getByRole('heading', { level: 1, name: 'Today' }).waitFor();
    await pageIsThere(page);
    await page.evaluate(() => Object.assign(window, { neverReloaded: true }));

    await postFailingUnit(server);
    const serialNumber = await newestFailAt(page, 'north-1');
    await page.getByRole('row', { name: new RegExp(`${serialNumber}.*Fail`) }).waitFor();
    await page.getByRole('link', { name: breachTitle }).waitFor();
    expect(await page.evaluate(() => 'neverReloaded' in window)).toBe(true);

    await page.getByRole('link', { name: 'Mailbox' }).click();
    await openItsOnlyMail(page, serialNumber);
    await mailBody(page).getByRole('link', { name: "See the unit's curve" }).click();
    await seeCurveAndJudging(page, serialNumber);

    await page.getByRole('link', { name: 'Mailbox' }).click();
    await openItsOnlyMail(page, serialNumber);
    await mailBody(page).getByRole('link', { name: 'Open the breach' }).click();
    await acknowledge(page);
  },
);

async function newestFailAt(page: Page, station: string): Promise<string> {
  const { items } = await ask<ResultPage>(page, `/results?station=${station}&verdict=fail&limit=1`);
  if (!items[0]) throw new Error(`${station} posted no failing unit`);
  return items[0].serialNumber;
}

const mailBody = (page: Page) => page.frameLocator('iframe[title^="The mail"]');

async function openItsOnlyMail(page: Page, serialNumber: string): Promise<void> {
  const mails = page.getByRole('list', { name: 'Mails' }).getByRole('link', { name: serialNumber });
  await mails.first().waitFor();
  expect(await mails.count()).toBe(1);
  await mails.click();
  await mailBody(page).getByRole('heading', { name: breachTitle }).waitFor();
  await expectAccessible(page);
  await expectNoOverflow(page);
}

async function seeCurveAndJudging(page: Page, serialNumber: string): Promise<void> {
  await page.getByRole('heading', { level: 1, name: serialNumber }).waitFor();
  await page.getByRole('img', { name: /Deviation from the reference current/ }).waitFor();
  await pageIsThere(page);
  const judging = page.getByRole('row', { name: /^Output impedance .*Fail/ });
  await judging.getByText(/at least 7\.5 MΩ is required, so it fails/).waitFor();
  await expectAccessible(page);
}

async function acknowledge(page: Page): Promise<void> {
  await page.getByRole('heading', { level: 1, name: breachTitle }).waitFor();
  await pageIsThere(page);
  await expectAccessible(page);
  await page.getByLabel('Note').fill(note);
  await page.getByRole('button', { name: 'Acknowledge' }).click();
  await page.getByRole('main').getByText('Acknowledged', { exact: true }).first().waitFor();
  await page.getByText(note).waitFor();
  expect(await page.getByRole('button', { name: 'Acknowledge' }).count()).toBe(0);
  await expectAccessible(page);
}
