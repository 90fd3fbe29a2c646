import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    reporters: ['default', './test/plainLine.ts'],
    projects: [
      {
        test: {
          name: 'unit',
          include: ['test/{core,functions,taskpane,workbook,manifest,docs}/**/*.test.{ts,tsx}'],
          testTimeout: 60_000,
          hookTimeout: 180_000,
        },
      },
      {
        test: {
          name: 'browser',
          include: ['test/browser/**/*.test.ts'],
          testTimeout: 120_000,
          hookTimeout: 180_000,
          pool: 'forks',
          poolOptions: { forks: { singleFork: true } },
        },
      },
    ],
  },
});
