import { defineConfig } from 'vitest/config';

// A busy machine is no reason to fail.
export default defineConfig({ test: { env: { TZ: 'UTC' }, testTimeout: 60_000 } });
