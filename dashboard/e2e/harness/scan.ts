import type { Page } from 'playwright-core';

/** A scanner's pace, in seconds between two keys. */
const PACE = 0.005;

/** What a barcode scanner does: real key events a few milliseconds apart, then Enter, at whatever has the focus. */
export async function scan(page: Page, code: string): Promise<void> {
  const devTools = await page.context().newCDPSession(page);
  const startedAt = Date.now() / 1000;
  const keys = [...[...code].map((text) => ({ key: text, text })), { key: 'Enter', text: '\r' }];
  for (const [place, { key, text }] of keys.entries()) {
    const timestamp = startedAt + place * PACE;
    await devTools.send('Input.dispatchKeyEvent', { type: 'keyDown', key, text, timestamp });
    await devTools.send('Input.dispatchKeyEvent', { type: 'keyUp', key, timestamp });
  }
  await devTools.detach();
}
