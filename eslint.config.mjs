import js from '@eslint/js';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

// scripts run in Node, and the functions that journeys hand to a page run in the browser
const GLOBALS = [
  ...[
    'process',
    'console',
    'Buffer',
    'performance',
    'crypto',
    'fetch',
    'Response',
    'Blob',
    'URL',
    'URLSearchParams',
  ],
  ...[
    'setTimeout',
    'clearTimeout',
    'setInterval',
    'clearInterval',
    'AbortSignal',
    'AbortController',
    'structuredClone',
  ],
  ...[
    'TextEncoder',
    'TextDecoder',
    'CompressionStream',
    'DecompressionStream',
    'globalThis',
    'indexedDB',
    'IDBKeyRange',
  ],
  ...[
    'document',
    'window',
    'navigator',
    'location',
    'localStorage',
    'sessionStorage',
    'caches',
    'getComputedStyle',
  ],
  ...[
    'requestAnimationFrame',
    'PerformanceObserver',
    'MutationObserver',
    'Event',
    'KeyboardEvent',
    'PointerEvent',
  ],
  ...['HTMLElement', 'Node', 'NodeFilter', 'createImageBitmap', 'OffscreenCanvas'],
];

export default tseslint.config(
  { ignores: ['**/dist/', '**/node_modules/', '.data/', '.screens/', '.bench/'] },
  js.configs.recommended,
  tseslint.configs.recommended,
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: {
      parserOptions: {
        projectService: { allowDefaultProject: ['sync-model/vitest.config.ts'] },
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/no-explicit-any': 'error',
      'no-console': ['error', { allow: ['error'] }],
    },
  },
  {
    files: ['*/src/**/*.{ts,tsx}'],
    ignores: ['**/*.test.{ts,tsx}'],
    rules: { 'max-lines-per-function': ['error', { max: 70, skipBlankLines: true, skipComments: true }] },
  },
  {
    files: ['pwa/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: {
      'react-hooks/rules-of-hooks': 'error',
      'react-hooks/exhaustive-deps': 'error',
      'react-hooks/static-components': 'error',
      'react-hooks/set-state-in-render': 'error',
      'react-hooks/use-memo': 'error',
      'react-hooks/error-boundaries': 'error',
      'react-hooks/globals': 'error',
    },
  },
  {
    files: ['**/*.mjs'],
    languageOptions: { globals: Object.fromEntries(GLOBALS.map((name) => [name, 'readonly'])) },
  },
  {
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    },
  },
);
