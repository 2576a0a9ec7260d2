import { expect } from 'vitest';
import { paths } from '../src/config/paths';
import { aPost } from './harness/a-post';
import { expectAccessible } from './harness/accessibility';
import { journey } from './harness/journey';
import { openPage, pageIsThere } from './harness/open-page';
import { signInAs } from './harness/sign-in';
import { post, stationKeys } from './harness/stations';

const misspelt = [
  { loadVolts: 0, outputAmps: 0.00050188 },
  { loadVolts: 2.4, outputAmp: 0.00050167 },
  { loadVolts: 8, outputAmps: 0.00050122 },
];

journey('a misspelt property is refused, and the intake shows where it stands', async ({ server, page }) => {
  await signInAs(page, 'integrator');
  await openPage(page, paths.intake());

  const keys = await stationKeys(server);
  const refused = await post(
    server,
    keys['north-2'] ?? '',
    JSON.stringify(aPost({ serialNumber: 'MISSPELT-7', points: misspelt })),
  );
  expect(refused.status).toBe(422);

  const row = page.getByRole('row', { name: /MISSPELT-7/ });
  await row.getByText(/\/points\/1\/outputAmp/).waitFor();
  await expectAccessible(page);
  await row.getByRole('link', { name: 'MISSPELT-7' }).click();
  await page.getByRole('heading', { name: 'Why it was refused' }).waitFor();
  await pageIsThere(page);
  await expectAccessible(page);

  const place = page
    .getByRole('region', { name: 'The posted body' })
    .locator('mark', { hasText: 'outputAmp' });
  await place.waitFor();
  const reason = page.getByRole('listitem').filter({ hasText: 'is no property of this contract' });
  await reason.getByRole('button', { name: /^Go to place/ }).click();
  expect(await page.evaluate(() => document.activeElement?.textContent)).toContain('outputAmp');
});
