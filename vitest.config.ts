import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          include: ['tests/{shared,labels,web,scripts}/**/*.test.{ts,tsx}'],
          testTimeout: 20_000,
        },
      },
      {
        test: {
          name: 'api',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/support/database.ts'],
          testTimeout: 30_000,
          hookTimeout: 90_000,
          pool: 'forks',
          maxWorkers: 2,
        },
      },
      {
        test: {
          name: 'browser',
          include: ['tests/e2e/**/*.test.ts'],
          globalSetup: ['tests/support/database.ts'],
          testTimeout: 180_000,
          hookTimeout: 120_000,
          pool: 'forks',
          maxWorkers: 1,
          fileParallelism: false,
        },
      },
    ],
  },
});
