import type { BreachPage } from '../src/types/api';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { tabTo } from './harness/keyboard';
import { pageIsThere } from './harness/open-page';
import { postFailingUnit } from './harness/stations';

journey(
  'a production engineer finds a unit and acknowledges a breach without a mouse',
  async ({ server, page }) => {
    await postFailingUnit(server);
    await page.goto('/sign-in');
    await tabTo(page, page.getByRole('button', { name: /^Production engineer/ }));
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: 'Today' }).waitFor();
    await pageIsThere(page);
    const breach = (await ask<BreachPage>(page, '/breaches?state=open')).items[0];

    await page.reload();
    await pageIsThere(page);
    await tabTo(page, page.getByRole('link', { name: 'Skip to the page' }));
    await page.keyboard.press('Enter');
    await tabTo(page, page.getByRole('link', { name: breach?.title ?? 'none' }));
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: breach?.title ?? 'none' }).waitFor();
    await pageIsThere(page);

    await tabTo(page, page.getByLabel('Note'));
    await page.keyboard.type('Fixture 2 is being cleaned.');
    await tabTo(page, page.getByRole('button', { name: 'Acknowledge' }));
    await page.keyboard.press('Enter');
    await page.getByText('Fixture 2 is being cleaned.').waitFor();

    const unit = page
      .getByRole('main')
      .getByRole('listitem')
      .filter({ hasText: 'so it fails' })
      .getByRole('link')
      .first();
    const serialNumber = (await unit.textContent()) ?? '';
    await tabTo(page, unit);
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: serialNumber }).waitFor();
    await pageIsThere(page);
    await tabTo(page, page.getByText('The points as a table'));
    await page.keyboard.press('Enter');
    await page.getByRole('columnheader', { name: /Load voltage/i }).waitFor();
    await tabTo(page, page.getByRole('button', { name: 'Show the post' }));
    await page.keyboard.press('Enter');
    await page.getByText(`"serialNumber":"${serialNumber}"`).waitFor();
  },
);
