import { expect } from 'vitest';
import type { ResultPage } from '../src/types/api';
import { expectAccessible } from './harness/accessibility';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { pageIsThere } from './harness/open-page';
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

    await postFailingUnit(server);
    const failed = (await ask<ResultPage>(page, '/results?station=north-1&verdict=fail&limit=1')).items[0];
    const serialNumber = failed?.serialNumber ?? 'none';
    await page.getByRole('row', { name: new RegExp(`${serialNumber}.*Fail`) }).waitFor();
    await page.getByRole('link', { name: breachTitle }).click();

    await page.getByRole('heading', { level: 1, name: breachTitle }).waitFor();
    await pageIsThere(page);
    await expectAccessible(page);

    await page.getByRole('link', { name: serialNumber }).click();
    await page.getByRole('img', { name: /Deviation from the reference current/ }).waitFor();
    await pageIsThere(page);
    await page.getByRole('row', { name: /Output impedance.*Fail/ }).waitFor();
    await expectAccessible(page);
    await page.goBack();

    await page.getByLabel('Note').fill(note);
    await page.getByRole('button', { name: 'Acknowledge' }).click();
    await page.getByText('Acknowledged', { exact: true }).first().waitFor();
    await page.getByText(note).waitFor();
    await expectAccessible(page);
    expect(await page.getByRole('button', { name: 'Acknowledge' }).count()).toBe(0);
  },
);
