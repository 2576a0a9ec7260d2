import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { paths } from '../src/config/paths';
import type { Breach, BreachPage, Problem } from '../src/types/api';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { openPage } from './harness/open-page';
import { signInAs } from './harness/sign-in';
import { postFailingUnit } from './harness/stations';

journey('a viewer may look at everything on the line but change nothing', async ({ server, page }) => {
  await postFailingUnit(server);
  await signInAs(page, 'viewer');
  const breach = (await ask<BreachPage>(page, '/breaches?state=open')).items[0];
  const breachId = breach?.breachId ?? 0;

  await openPage(page, paths.stations());
  await page.getByText(/Integrators and administrators may add stations/).waitFor();
  expect(await buttons(page)).not.toContain('Add a station');
  await openPage(page, paths.station('north-1'));
  await page.getByText(/may see a station’s keys/).waitFor();
  expect(await buttons(page)).not.toContain('Create a key');
  await openPage(page, paths.breach(breachId));
  await page.getByText(/may acknowledge a breach/).waitFor();
  expect(await buttons(page)).not.toContain('Acknowledge');

  const post = (path: string, data: object) =>
    page.request.post(`/api/v1${path}`, { data, headers: { Origin: server.url } });
  for (const refused of [
    await post('/stations/north-1/keys', { label: 'rack PC', practice: true, expiresAt: null }),
    await post('/stations', { station: 'north-9', line: 'north' }),
    await post(`/breaches/${breachId}/acknowledge`, { note: 'Mine.' }),
    await page.request.get('/api/v1/stations/north-1/keys'),
    await page.request.get('/api/v1/users'),
  ]) {
    expect({ url: refused.url(), status: refused.status() }).toEqual({ url: refused.url(), status: 403 });
    expect(((await refused.json()) as Problem).code).toBe('role_not_allowed');
  }
  expect((await ask<Breach>(page, `/breaches/${breachId}`)).state).toBe('open');
});

/** What the buttons on the page say. */
const buttons = (page: Page) => page.getByRole('main').getByRole('button').allTextContents();
