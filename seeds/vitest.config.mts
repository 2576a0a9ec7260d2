import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    env: { TZ: 'UTC' },
    // Nest finds its services by their classes: the built server must be loaded once, by Node itself.
    server: { deps: { external: [/\/(ingest-api|station-sim)\/dist\//] } },
  },
});
