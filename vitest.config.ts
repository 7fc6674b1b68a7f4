import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    include: ['test/**/*.test.ts'],
    disableConsoleIntercept: true, // oclif writes to the real stdout
    testTimeout: 60_000,
    hookTimeout: 120_000,
    coverage: { include: ['src/**/*.ts'] },
  },
});
