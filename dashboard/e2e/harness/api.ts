import type { Page } from 'playwright-core';

/** What the API answers the person who is signed in on this page. */
export async function ask<Answer>(page: Page, path: string): Promise<Answer> {
  const response = await page.request.get(`/api/v1${path}`);
  if (!response.ok()) throw new Error(`GET ${path} answered ${response.status()}: ${await response.text()}`);
  return (await response.json()) as Answer;
}
