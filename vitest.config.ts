import vue from '@vitejs/plugin-vue';
import { defineConfig } from 'vitest/config';

const SETUP = ['test/quiet.ts'];

export default defineConfig({
  test: {
    // A test that is left out by hand, or a file without a test, is an error and not a pass.
    allowOnly: false,
    passWithNoTests: false,
    projects: [
      {
        plugins: [vue()],
        test: {
          name: 'parts',
          include: ['test/**/*.test.ts'],
          exclude: ['**/node_modules/**', 'dist/**', 'test/e2e/**'],
          environment: 'node',
          setupFiles: SETUP,
          testTimeout: 20_000,
        },
      },
      {
        test: {
          name: 'window',
          include: ['test/e2e/**/*.test.ts'],
          environment: 'node',
          setupFiles: SETUP,
          // the built window, which every file of these looks at
          globalSetup: ['test/e2e/built.ts'],
          // one browser at a time, and when the others are done: what a person would see does not wait for a busy machine
          fileParallelism: false,
          sequence: { groupOrder: 1 },
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
    ],
  },
});
