import { defineConfig } from 'vitest/config';

/** Tests that need PostgreSQL, and those that need a browser too; all others are plain functions. */
const withDatabase = ['tests/api/**/*.test.{ts,tsx}', 'tests/faults/**/*.test.{ts,tsx}'];
const withBrowser = ['tests/browser/**/*.test.{ts,tsx}'];

// No test may hang on a zone or a language of the machine it runs on.
process.env.TZ = 'UTC';

export default defineConfig({
  test: {
    maxWorkers: 2,
    projects: [
      {
        test: {
          name: 'unit',
          include: ['tests/**/*.test.{ts,tsx}'],
          exclude: [...withDatabase, ...withBrowser],
          testTimeout: 20_000,
        },
      },
      {
        test: {
          name: 'api',
          include: withDatabase,
          globalSetup: 'tests/support/global-database.ts',
          pool: 'forks',
          testTimeout: 30_000,
          hookTimeout: 120_000,
        },
      },
      {
        test: {
          name: 'browser',
          include: withBrowser,
          globalSetup: 'tests/support/global-database.ts',
          pool: 'forks',
          testTimeout: 120_000,
          hookTimeout: 300_000,
        },
      },
    ],
  },
});
