import type { Page } from 'playwright-core';
import type { Role, Site } from '../../src/types/api';

/** Signs in as a demo account by the form, as a person does; ends on the page that was asked for. */
export async function signInAs(page: Page, role: Role, address = '/'): Promise<void> {
  const site = (await (await page.request.get('/api/v1/site')).json()) as Site;
  const account = site.demoAccounts.find((one) => one.role === role);
  if (!account) throw new Error(`The demonstration has no ${role}`);
  await page.goto(address);
  await page.getByLabel('Email').fill(account.email);
  await page.getByLabel('Password').fill(account.password);
  await page.getByRole('button', { name: 'Sign in', exact: true }).click();
  // On a phone it is behind the menu.
  await page.getByRole('button', { name: 'Sign out', includeHidden: true }).waitFor({ state: 'attached' });
}
