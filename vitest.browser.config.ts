import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));

/** Real Chromium against the built server. One file at a time: each starts a server of its own, and the machine has two cores. */
export default defineConfig({
  resolve: { alias: { '@': root.replace(/\/$/, '') } },
  test: {
    name: 'browser',
    environment: 'node',
    include: ['tests/browser/**/*.test.ts'],
    fileParallelism: false,
    testTimeout: 90_000,
    hookTimeout: 120_000,
  },
});
