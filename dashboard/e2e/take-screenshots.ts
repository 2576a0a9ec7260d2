import { mkdir, stat } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';
import { paths } from '../src/config/paths';
import type { Breach, Today, UnitPage } from '../src/types/api';
import { ask } from './harness/api';
import { journey } from './harness/journey';
import { openPage } from './harness/open-page';
import { signInAs } from './harness/sign-in';
import { postFailingUnit, simulate } from './harness/stations';

const folder = fileURLToPath(new URL('../screenshots/', import.meta.url));
const MOST_BYTES = 250_000;

journey('the pictures of the README', async ({ server, page }) => {
  await mkdir(folder, { recursive: true });
  await simulate(server, { stations: '6', count: '40', rate: '20', seed: 'pictures' });
  await postFailingUnit(server);
  await signInAs(page, 'qualityLead');

  await take(page, paths.today(), 'today-day');
  const unit = await lowImpedanceUnit(page);
  await take(page, unit, 'unit-day');
  await page.emulateMedia({ colorScheme: 'dark' });
  await take(page, unit, 'unit-night');
  await page.emulateMedia({ colorScheme: 'light' });
  await take(page, await mailedBreach(page), 'breach');
  await page.setViewportSize({ width: 390, height: 844 });
  await take(page, paths.today(), 'phone');
});

async function take(page: Page, address: string, name: string): Promise<void> {
  await openPage(page, address);
  const path = `${folder}${name}.png`;
  await page.screenshot({ path, animations: 'disabled' });
  expect((await stat(path)).size, name).toBeLessThan(MOST_BYTES);
}

/** The unit that the stations' program made fail. */
async function lowImpedanceUnit(page: Page): Promise<string> {
  const [unit] = (await ask<UnitPage>(page, '/units?verdict=fail&station=north-1&limit=1')).items;
  if (!unit) throw new Error('No unit failed at north-1');
  return paths.unit(unit.partNumber, unit.serialNumber);
}

async function mailedBreach(page: Page): Promise<string> {
  const { openBreaches } = await ask<Today>(page, '/today');
  const isMailed = ({ partNumber, measure }: Breach) =>
    partNumber === 'FH-R500-W' && measure === 'outputImpedance';
  const breach = openBreaches.find(isMailed);
  if (!breach) throw new Error('The failing unit opened no breach');
  return paths.breach(breach.breachId);
}
