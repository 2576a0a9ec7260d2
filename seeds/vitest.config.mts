import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    env: { TZ: 'UTC' },
    // A busy machine is no reason to fail.
    testTimeout: 60_000,
    // Nest finds its services by their classes: the built server must be loaded once, by Node itself.
    server: { deps: { external: [/\/(ingest-api|station-sim)\/dist\//] } },
  },
});
