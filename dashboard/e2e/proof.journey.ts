import { expect } from 'vitest';
import type { Proof } from '../src/types/api';
import { expectAccessible } from './harness/accessibility';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { pageIsThere } from './harness/open-page';
import { expectNoOverflow } from './harness/overflow';
import { signInAs } from './harness/sign-in';

journey(
  'the quality lead opens the proof: every published figure is computed anew and agrees',
  async ({ page }) => {
    await signInAs(page, 'qualityLead');
    await page.getByRole('link', { name: 'Settings', exact: true }).click();
    await page.getByRole('link', { name: 'Proof' }).click();
    await page.getByRole('heading', { level: 1, name: 'Proof of the computations' }).waitFor();
    const figures = page.getByRole('table', { name: /Published and computed figures/ });
    await figures.waitFor();
    await pageIsThere(page);

    const { passed, failed, rows } = await ask<Proof>(page, '/proof');
    expect(failed).toBe(0);
    expect(passed).toBe(rows.length);
    expect(await figures.getByText('agrees', { exact: true }).count()).toBe(passed);
    expect(await figures.getByText('falls short').count()).toBe(0);
    await expectAccessible(page);
    await expectNoOverflow(page);
    await page.setViewportSize({ width: 390, height: 844 });
    await expectNoOverflow(page);
  },
);
