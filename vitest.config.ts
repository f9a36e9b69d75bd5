import { defineConfig } from 'vitest/config';

const needsDatabase = {
  globalSetup: ['tests/global-setup.ts'],
  // A slow machine makes a database in a second or two.
  hookTimeout: 60_000,
};

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          include: [
            'shared/**/*.test.ts',
            'server/**/*.test.ts',
            'src/**/*.test.{ts,tsx}',
            'scripts/**/*.test.ts',
            'tests/reference/**/*.test.ts',
          ],
          testTimeout: 30_000,
        },
      },
      { test: { name: 'api', include: ['tests/api/**/*.test.ts'], testTimeout: 30_000, ...needsDatabase } },
      { test: { name: 'crash', include: ['tests/crash/**/*.test.ts'], testTimeout: 600_000 } },
      {
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          testTimeout: 120_000,
          // One Chromium at a time: two cores serve the page, the database and the browser.
          fileParallelism: false,
          ...needsDatabase,
        },
      },
    ],
  },
});
