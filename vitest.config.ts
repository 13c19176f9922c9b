import vue from '@vitejs/plugin-vue';
import { defineConfig } from 'vitest/config';

export default defineConfig({
  plugins: [vue()],
  test: {
    include: ['test/**/*.test.ts'],
    exclude: ['**/node_modules/**', 'dist/**'],
    environment: 'node',
    setupFiles: ['test/quiet.ts'],
    // A test that is left out by hand, or a file without a test, is an error and not a pass.
    allowOnly: false,
    passWithNoTests: false,
    testTimeout: 20_000,
  },
});
