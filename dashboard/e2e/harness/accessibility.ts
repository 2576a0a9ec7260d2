import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { AxeResults, RunOptions } from 'axe-core';
import type { Page } from 'playwright-core';
import { expect } from 'vitest';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

const rules: RunOptions = {
  runOnly: { type: 'tag', values: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'] },
  resultTypes: ['violations'],
};

/** Checks what is on screen against WCAG 2.2 AA by day and by night; ends by day. */
export async function expectAccessible(page: Page): Promise<void> {
  const found: string[] = [];
  for (const colorScheme of ['dark', 'light'] as const) {
    await page.emulateMedia({ colorScheme });
    await settle(page);
    found.push(...(await violations(page)).map((words) => `${colorScheme}, ${page.url()}: ${words}`));
  }
  expect(found).toEqual([]);
}

/** Waits until nothing moves any more: colours on their way from one theme to the other have no contrast to speak of. */
async function settle(page: Page): Promise<void> {
  await page.evaluate(async () => {
    const ending = document
      .getAnimations()
      .filter((animation) => animation.effect?.getComputedTiming().endTime !== Infinity);
    await Promise.allSettled(ending.map((animation) => animation.finished));
  });
}

async function violations(page: Page): Promise<string[]> {
  // Through the debugger, because the page's own policy lets no foreign script in.
  await page.evaluate(`window.axe ??= (() => { ${axeSource}; return window.axe; })()`);
  const results = await page.evaluate(
    (options) => (window as unknown as { axe: { run(o: RunOptions): Promise<AxeResults> } }).axe.run(options),
    rules,
  );
  return results.violations.map(
    ({ id, help, nodes }) =>
      `${id} (${help}): ${nodes.map(({ html, any }) => `${html} ${any[0]?.message ?? ''}`).join(' | ')}`,
  );
}
