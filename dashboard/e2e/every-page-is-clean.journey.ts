import { expect } from 'vitest';
import { expectAccessible } from './harness/accessibility';
import { everyPage } from './harness/every-page';
import { journey } from './harness/journey';
import { openPage } from './harness/open-page';
import { expectNoOverflow } from './harness/overflow';
import { signInAs } from './harness/sign-in';

journey('every page loads without complaint and is accessible by day and by night', async ({ page }) => {
  await signInAs(page, 'administrator');
  const addresses = await everyPage(page);
  for (const address of addresses) {
    await openPage(page, address);
    expect(await page.getByRole('alert').allTextContents(), address).toEqual([]);
    await expectNoOverflow(page);
    await expectAccessible(page);
  }
  const places = await page
    .getByRole('navigation', { name: 'Places' })
    .getByRole('link')
    .evaluateAll((links) => links.map((link) => link.getAttribute('href')));
  expect(addresses).toEqual(expect.arrayContaining(places));
});
