import { expect } from 'vitest';
import { expectAccessible } from './harness/accessibility';
import { everyPage } from './harness/every-page';
import { journey } from './harness/journey';
import { openPage } from './harness/open-page';
import { expectNoOverflow } from './harness/overflow';
import { signInAs } from './harness/sign-in';
import { postFailingUnit } from './harness/stations';

journey(
  'every page loads without complaint and is accessible by day and by night',
  async ({ server, page }) => {
    await postFailingUnit(server);
    await signInAs(page, 'administrator');
    for (const address of await everyPage(page)) {
      await openPage(page, address);
      expect(await page.getByRole('alert').allTextContents(), address).toEqual([]);
      await expectNoOverflow(page);
      await expectAccessible(page);
    }
  },
);
