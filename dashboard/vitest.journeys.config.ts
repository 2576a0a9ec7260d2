import { defineConfig } from 'vitest/config';

/** Journeys in a real browser (`npm run journeys`); with `--mode screenshots` the pictures for the README. */
export default defineConfig(({ mode }) => ({
  test: {
    environment: 'node',
    globalSetup: ['e2e/harness/global-setup.ts'],
    include: [mode === 'screenshots' ? 'e2e/take-screenshots.ts' : 'e2e/*.journey.ts'],
    testTimeout: 300_000,
    hookTimeout: 120_000,
    // Each journey runs a server and a browser of its own.
    maxWorkers: 2,
  },
}));
