import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { TestProject } from 'vitest/node';
import { programs, requireBuiltProduct, runProgram } from './built-product';
import { findBrowser } from './find-browser';

declare module 'vitest' {
  interface ProvidedContext {
    /** Chromium's path; `null` when there is none and the journeys are skipped. */
    browserPath: string | null;
    /** A seeded demonstration that every journey takes a copy of. */
    demonstration: string;
  }
}

/** Seeds the demonstration once for all journeys. */
export default async function setUp(project: TestProject): Promise<(() => Promise<void>) | undefined> {
  const browserPath = findBrowser();
  project.provide('browserPath', browserPath);
  project.provide('demonstration', '');
  if (browserPath === null) {
    const words = 'No Chromium found: set CHROMIUM_PATH or install it.';
    if (process.env.CI === 'true') throw new Error(words);
    console.warn(`${words} The journeys are skipped.`);
    return undefined;
  }
  requireBuiltProduct();
  const dataDir = await mkdtemp(join(tmpdir(), 'ampkeep-journeys-'));
  project.provide('demonstration', dataDir);
  const removeAll = () => rm(dataDir, { recursive: true, force: true });
  try {
    await runProgram(programs.seeds, ['--days', '7'], { AMPKEEP_DATA_DIR: dataDir, AMPKEEP_PORT: '0' });
  } catch (error) {
    await removeAll();
    throw error;
  }
  return removeAll;
}
