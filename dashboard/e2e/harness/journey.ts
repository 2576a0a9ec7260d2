import { cp, mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { type Browser, type BrowserContextOptions, chromium, type Page } from 'playwright-core';
import { expect, inject, test } from 'vitest';
import { freePort } from './free-port';
import { type PageFaults, watchPage } from './page-faults';
import { aServer, type Server } from './server';

/** What a journey starts with: the demonstration served for it alone, and an empty browser window. */
export interface Journey {
  server: Server;
  page: Page;
  faults: PageFaults;
}

const browserArguments = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

const PATIENCE_MS = 30_000;

/** A test in a real browser against the built product. It fails on any complaint of the page or the server. */
export function journey(
  name: string,
  walk: (journey: Journey) => Promise<void>,
  options: BrowserContextOptions = {},
): void {
  const browserPath = inject('browserPath');
  test.skipIf(browserPath === null)(name, async () => {
    const dataDir = await mkdtemp(join(tmpdir(), 'ampkeep-journey-'));
    const server = aServer(dataDir, await freePort());
    let browser: Browser | null = null;
    try {
      await cp(inject('demonstration'), dataDir, { recursive: true });
      [browser] = await Promise.all([launchBrowser(browserPath), server.start()]);
      await walkIn(browser, server, walk, options);
    } finally {
      await browser?.close();
      await server.stop();
      await rm(dataDir, { recursive: true, force: true });
    }
  });
}

const launchBrowser = (browserPath: string | null): Promise<Browser> =>
  chromium.launch({ executablePath: browserPath ?? '', args: browserArguments });

async function walkIn(
  browser: Browser,
  server: Server,
  walk: (journey: Journey) => Promise<void>,
  options: BrowserContextOptions,
): Promise<void> {
  const context = await browser.newContext({
    baseURL: server.url,
    viewport: { width: 1440, height: 900 },
    colorScheme: 'light',
    locale: 'en-GB',
    ...options,
  });
  context.setDefaultTimeout(PATIENCE_MS);
  const page = await context.newPage();
  const faults = watchPage(page);
  try {
    await walk({ server, page, faults });
  } catch (error) {
    throw new Error(await whereItEnded(page, faults, server), { cause: error });
  }
  expect([...faults.all, ...server.loggedErrors]).toEqual([]);
}

/** What a person needs to see why a journey ended where it did. */
async function whereItEnded(page: Page, faults: PageFaults, server: Server): Promise<string> {
  const picture = join(tmpdir(), `ampkeep-journey-${Date.now()}.png`);
  await page.screenshot({ path: picture }).catch(() => undefined);
  return [`The journey ended at ${page.url()}, see ${picture}`, ...faults.all, ...server.loggedErrors].join(
    '\n',
  );
}
