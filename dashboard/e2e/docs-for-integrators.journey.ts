import { expect } from 'vitest';
import { expectAccessible } from './harness/accessibility';
import { journey } from './harness/journey';
import { expectNoOverflow } from './harness/overflow';

journey('the API docs, the error catalogue and the schema open without an account', async ({ page }) => {
  await page.goto('/docs');
  await page.getByText('/api/v1/results', { exact: true }).first().waitFor();

  await page.goto('/docs/errors');
  await page.getByRole('heading', { level: 1 }).waitFor();
  await page.getByText('role_not_allowed').waitFor();
  await expectNoOverflow(page);
  await expectAccessible(page);
  await page.setViewportSize({ width: 390, height: 844 });
  await expectNoOverflow(page);

  const schema = await page.request.get('/docs/result.schema.json');
  expect(((await schema.json()) as { required: string[] }).required).toContain('resultId');
});
