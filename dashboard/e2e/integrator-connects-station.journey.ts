import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { paths } from '../src/config/paths';
import { expectAccessible } from './harness/accessibility';
import { journey } from './harness/journey';
import { openPage, pageIsThere } from './harness/open-page';
import { type CommandedRequest, readCommand } from './harness/read-command';
import { scan } from './harness/scan';
import { signInAs } from './harness/sign-in';

interface Answer {
  verdict: string;
  measures: { name: string; value: number | null }[];
}

journey(
  'the integrator makes a key, makes the first post with it, finds the unit by a scan, and revokes the key',
  async ({ page }) => {
    await signInAs(page, 'integrator');
    const key = await makeKey(page, 'north-4');

    const request = await firstPost(page, key);
    const answer = await send(request);
    expect(answer.status).toBe(201);
    const { measures } = (await answer.json()) as Answer;
    const impedance = measures.find(({ name }) => name === 'outputImpedance')?.value;
    expect((impedance ?? 0) / 1e6).toBeCloseTo(12.14, 2);
    await page.getByText('It arrived from north-4.').waitFor();
    await pageIsThere(page);
    await expectAccessible(page);

    const { serialNumber } = JSON.parse(request.body) as { serialNumber: string };
    await openPage(page, paths.today());
    await scan(page, serialNumber);
    await page.getByRole('heading', { level: 1, name: serialNumber }).waitFor();
    await page
      .getByText(/12\.14.*MΩ/)
      .first()
      .waitFor();

    await revokeKey(page, 'north-4');
    const again = await send({
      ...request,
      body: request.body.replace(/"resultId": "[^"]{4}/, '"resultId": "0000'),
    });
    expect(again.status).toBe(403);
  },
  { permissions: ['clipboard-read', 'clipboard-write'] },
);

const send = ({ url, headers, body }: CommandedRequest) => fetch(url, { method: 'POST', headers, body });

const copied = (page: Page) => page.evaluate(() => navigator.clipboard.readText());

/** Makes a key on the station's page; it is to be seen only until it was stored. */
async function makeKey(page: Page, station: string): Promise<string> {
  await openPage(page, paths.stations());
  await page.getByRole('table').getByRole('link', { name: station }).click();
  await page.getByRole('button', { name: 'Create a key' }).click();
  await expectAccessible(page);
  await page.getByRole('textbox', { name: 'Label' }).fill('rack PC, bay 4');
  await page.getByRole('button', { name: 'Create key' }).click();

  await page.getByRole('button', { name: 'Copy key' }).click();
  await page.getByRole('button', { name: 'Copied' }).waitFor();
  await expectAccessible(page);
  const key = await copied(page);
  expect(key).toMatch(/^amk_[^_]{8}_[\w-]{43}$/);
  expect(await page.getByText(key).count()).toBe(1);
  await page.getByRole('button', { name: 'I have stored it' }).click();
  await page.getByRole('row', { name: /rack PC, bay 4.*Active/ }).waitFor();
  await page.getByRole('dialog').waitFor({ state: 'detached' });
  expect(await page.content()).not.toContain(key);
  return key;
}

/** Takes the worked first post of the docs page, with the key in it. */
async function firstPost(page: Page, key: string): Promise<CommandedRequest> {
  await openPage(page, paths.connect());
  await page.getByLabel('Key').fill(key);
  await page.getByLabel('Part number').selectOption('FH-R500-W');
  await page.getByRole('button', { name: 'Copy command' }).click();
  await page.getByRole('button', { name: 'Copied' }).waitFor();
  return readCommand(await copied(page));
}

async function revokeKey(page: Page, station: string): Promise<void> {
  await openPage(page, paths.station(station));
  const row = page.getByRole('row', { name: /rack PC, bay 4/ });
  await row.getByRole('button', { name: 'Revoke' }).click();
  await page.getByText(/The next post with it is refused/).waitFor();
  await expectAccessible(page);
  await page.getByRole('button', { name: 'Revoke key' }).click();
  await row.getByText('Revoked').waitFor();
}
