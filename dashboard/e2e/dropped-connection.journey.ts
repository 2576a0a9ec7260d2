import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import type { ResultPage } from '../src/types/api';
import { expectAccessible } from './harness/accessibility';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { pageIsThere } from './harness/open-page';
import { signInAs } from './harness/sign-in';
import { postFailingUnit } from './harness/stations';

/** What the browser itself writes into its console while nothing answers. */
const nothingAnswers =
  /net::ERR_(CONNECTION_REFUSED|CONNECTION_RESET|SOCKET_NOT_CONNECTED|EMPTY_RESPONSE|INCOMPLETE_CHUNKED_ENCODING)/;

const notice = (page: Page) => page.getByText(/^Connection lost\. What you see is as of/);

journey(
  'a page says that it lost its server, and catches up by itself when it is back',
  async ({ server, page, faults }) => {
    await signInAs(page, 'viewer');
    await page.getByRole('heading', { level: 1, name: 'Today' }).waitFor();
    await pageIsThere(page);
    await page.evaluate(() => Object.assign(window, { neverReloaded: true }));

    const endOutage = faults.expect(nothingAnswers);
    await server.stop('SIGKILL');
    await notice(page).waitFor();
    await expectAccessible(page);
    await server.start();
    await postFailingUnit(server);
    await notice(page).waitFor({ state: 'detached' });
    const posted = (await ask<ResultPage>(page, '/results?station=north-1&verdict=fail&limit=1')).items[0];
    await page.getByRole('row', { name: new RegExp(posted?.serialNumber ?? 'none') }).waitFor();
    expect(await page.evaluate(() => 'neverReloaded' in window)).toBe(true);

    await server.stop('SIGKILL');
    await notice(page).waitFor();
    await page.getByRole('link', { name: 'Breaches', exact: true }).click();
    await page.getByText('This page could not be fetched').waitFor();
    await server.start();
    await page.getByRole('heading', { level: 1, name: 'Breaches' }).waitFor();
    await pageIsThere(page);
    endOutage();
  },
);
