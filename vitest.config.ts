import { defineConfig } from 'vitest/config';

// The suites that need no built files. What drives the built server, the command or the editor has its own runner.
export default defineConfig({
  test: {
    include: ['test/{unit,conformance,notebooks,tidy,protocol}/**/*.test.ts'],
    testTimeout: 60_000,
    hookTimeout: 60_000,
  },
});
