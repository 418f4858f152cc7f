import fs from 'node:fs';

const swc = JSON.parse(fs.readFileSync(new URL('.swcrc', import.meta.url), 'utf8'));

/** @type {import('jest').Config} */
export default {
  testEnvironment: 'node',
  rootDir: import.meta.dirname,
  testMatch: ['<rootDir>/test/**/*.test.ts', '<rootDir>/src/**/*.test.ts'],
  extensionsToTreatAsEsm: ['.ts'],
  transform: { '^.+\\.ts$': ['@swc/jest', { ...swc, swcrc: false }] },
  moduleNameMapper: {
    '^@harkmoor/sync-model/(.*)$': '<rootDir>/../sync-model/src/$1.ts', // its source: no build for tests
    '^(\\.{1,2}/.*)\\.js$': '$1',
  },
  testTimeout: 60_000,
  globalSetup: '<rootDir>/test/global-setup.mjs',
  globalTeardown: '<rootDir>/test/global-teardown.mjs',
};
