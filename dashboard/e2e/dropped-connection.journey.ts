import { expect } from 'vitest';
import type { ResultPage } from '../src/types/api';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { signInAs } from './harness/sign-in';
import { postFailingUnit } from './harness/stations';

journey(
  'a page says that it lost its server, and catches up by itself when it is back',
  async ({ server, page, faults }) => {
    await signInAs(page, 'viewer');
    await page.getByRole('heading', { level: 1, name: 'Today' }).waitFor();
    await page.evaluate(() => Object.assign(window, { neverReloaded: true }));

    const endOutage = faults.expect(
      /ERR_(CONNECTION_REFUSED|INCOMPLETE_CHUNKED_ENCODING|CONNECTION_RESET|EMPTY_RESPONSE)/,
    );
    await server.stop('SIGKILL');
    const notice = page.getByText(/^Connection lost\. What you see is as of/);
    await notice.waitFor();

    await server.start();
    await postFailingUnit(server);
    await notice.waitFor({ state: 'detached' });
    endOutage();
    const posted = (await ask<ResultPage>(page, '/results?station=north-1&verdict=fail&limit=1')).items[0];
    await page.getByRole('row', { name: new RegExp(posted?.serialNumber ?? 'none') }).waitFor();
    expect(await page.evaluate(() => 'neverReloaded' in window)).toBe(true);
  },
);
