import js from '@eslint/js';
import tseslint from 'typescript-eslint';

const nodeGlobals = Object.fromEntries(
  ['process', 'console', 'setTimeout', 'clearTimeout', 'setInterval', 'clearInterval', 'URL', 'fetch', 'Buffer', 'performance', 'crypto', 'document', 'window', 'navigator', 'indexedDB', 'getComputedStyle', 'localStorage', 'location', 'caches', 'requestAnimationFrame', 'AbortSignal', 'TextEncoder', 'TextDecoder', 'CompressionStream', 'Response', 'Blob'].map(
    (name) => [name, 'readonly'],
  ),
);

export default tseslint.config(
  { ignores: ['**/dist/', '**/node_modules/', '.data/', '.screens/', '.bench/'] },
  js.configs.recommended,
  tseslint.configs.recommended,
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/no-explicit-any': 'error',
      'no-console': ['error', { allow: ['error'] }],
    },
  },
  { files: ['**/*.mjs'], languageOptions: { globals: nodeGlobals } },
  { rules: { '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }] } },
);
