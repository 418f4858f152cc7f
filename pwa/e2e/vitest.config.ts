import { defineConfig } from 'vitest/config';

/** The journeys share one server and two cores: one after the other, each with the time that a slow machine needs. */
export default defineConfig({
  test: {
    root: import.meta.dirname,
    include: ['**/*.journey.ts'],
    fileParallelism: false,
    testTimeout: 240_000,
    hookTimeout: 120_000,
  },
});
