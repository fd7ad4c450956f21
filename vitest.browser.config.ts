import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));

/** Real Chromium against the built server, two files at a time: each starts a server of its own and waits for it half of the time. */
export default defineConfig({
  resolve: { alias: { '@': root.replace(/\/$/, '') } },
  test: {
    name: 'browser',
    environment: 'node',
    include: ['tests/browser/**/*.test.ts'],
    maxWorkers: 2,
    testTimeout: 90_000,
    hookTimeout: 120_000,
    // What a page shows in the end counts; how soon is measured by npm run bench.
    expect: { poll: { timeout: 20_000 } },
  },
});
