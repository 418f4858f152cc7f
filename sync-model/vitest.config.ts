import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    environment: 'node',
    include: ['src/**/*.test.ts', 'simulation/**/*.test.ts'],
    testTimeout: 60_000,
    maxWorkers: 2,
  },
});
