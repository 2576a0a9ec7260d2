import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';
import { semiLayer } from './vite/semi-layer.ts';

const api = process.env.AMPKEEP_API ?? 'http://localhost:4780';

export default defineConfig({
  plugins: [react(), semiLayer()],
  resolve: { alias: { '@': fileURLToPath(new URL('./src', import.meta.url)) } },
  server: { port: 5173, proxy: { '/api': api, '/docs': api } },
  build: {
    outDir: 'dist',
    target: 'es2022',
    chunkSizeWarningLimit: 800,
    // Nothing inline: the server's content security policy allows files of its own only.
    assetsInlineLimit: 0,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            {
              name: 'react',
              test: /node_modules[\\/](react|react-dom|scheduler|react-router|react-router-dom|@tanstack)[\\/]/,
            },
            { name: 'echarts', test: /node_modules[\\/](echarts|zrender|echarts-for-react)[\\/]/ },
          ],
        },
      },
    },
  },
  test: {
    environment: 'jsdom',
    setupFiles: ['src/testing/setup.ts'],
    css: false,
    testTimeout: 30_000,
    env: { TZ: 'UTC' },
    include: ['src/**/*.test.{ts,tsx}'],
  },
});
