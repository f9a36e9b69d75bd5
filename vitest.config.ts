import { defineConfig } from 'vitest/config';

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
            'tests/reference/**/*.test.ts',
          ],
        },
      },
    ],
  },
});
