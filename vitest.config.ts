import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const TESTS = '**/*.test.{ts,tsx}';

/**
 * Three projects: what runs in Node, what needs a document (jsdom), and the browser
 * tests, which come last and one file at a time, since each drives a real browser.
 */
export default defineConfig({
  plugins: [react()],
  test: {
    allowOnly: false,
    setupFiles: ['tests/setup/console.ts'],
    testTimeout: 20_000,
    projects: [
      {
        extends: true,
        test: {
          name: 'node',
          environment: 'node',
          include: [`tests/${TESTS}`],
          exclude: [`tests/app/${TESTS}`, `tests/e2e/${TESTS}`],
        },
      },
      {
        extends: true,
        test: { name: 'app', environment: 'jsdom', include: [`tests/app/${TESTS}`] },
      },
      {
        extends: true,
        test: {
          name: 'e2e',
          environment: 'node',
          include: [`tests/e2e/${TESTS}`],
          fileParallelism: false,
          testTimeout: 180_000,
          hookTimeout: 120_000,
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
