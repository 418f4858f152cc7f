/// <reference types="vitest/config" />
import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import browserslistToEsbuild from 'browserslist-to-esbuild';
import { defineConfig, type Plugin } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';

const api = process.env.API_URL ?? 'http://127.0.0.1:3000';
const syncModelSource = fileURLToPath(new URL('../sync-model/src/', import.meta.url));

/** @ionic/react's tab bar is held by an unmarked `React.memo` call; marked as pure, it goes where nobody uses it. */
const markIonicMemosPure: Plugin = {
  name: 'mark-ionic-memos-pure',
  enforce: 'pre',
  transform: {
    filter: { id: /@ionic[\\/]react[\\/]dist[\\/]index\.js$/ },
    handler: (code) => ({ code: code.replaceAll('= React.memo(', '= /*@__PURE__*/ React.memo('), map: null }),
  },
};

export default defineConfig({
  resolve: {
    // the shared model straight from its source: no build step in dev and test, and hot reload
    alias: [{ find: /^@harkmoor\/sync-model\/(.*)$/, replacement: `${syncModelSource}$1.ts` }],
  },
  build: {
    target: browserslistToEsbuild(), // reads ../.browserslistrc
    sourcemap: true,
    manifest: true,
    rolldownOptions: {
      // @ionic/core and @ionic/react have no sideEffects field: without this every component ships
      treeshake: {
        moduleSideEffects: [{ test: /@ionic[\\/](core|react|react-router)[\\/].*\.js$/, sideEffects: false }],
        // @ionic/react makes its components by calls that carry no mark of being pure: tabs, navigation and icons
        // came along unused (21 kB gzip)
        manualPureFunctions: [
          'createForwardRef',
          'createReactComponent',
          'React.memo',
          'React.createContext',
        ],
        propertyReadSideEffects: false,
      },
    },
  },
  server: { proxy: { '/api': api } },
  plugins: [
    markIonicMemosPure,
    react(),
    VitePWA({
      strategies: 'injectManifest',
      srcDir: 'src',
      filename: 'sw.ts',
      injectRegister: false, // app/updates registers it with workbox-window
      injectManifest: {
        globPatterns: ['**/*.{js,css,html,woff2,json,svg,png,webmanifest}'],
        globIgnores: ['.vite/**', '**/countries-10m*.json', '**/land-10m*.json', '**/*.map'],
        maximumFileSizeToCacheInBytes: 4_000_000,
      },
      manifest: {
        name: 'Harkmoor field logbook',
        short_name: 'Harkmoor',
        description: 'Log what you hear, and what you do not, with no signal.',
        start_url: '/field',
        id: '/',
        display: 'standalone',
        // the system's splash comes before our first frame and knows no theme: black spares dark-adapted eyes
        background_color: '#000000',
        theme_color: '#000000',
        icons: [
          { src: '/icons/harkmoor-192.png', sizes: '192x192', type: 'image/png', purpose: 'any' },
          { src: '/icons/harkmoor-512.png', sizes: '512x512', type: 'image/png', purpose: 'any' },
          {
            src: '/icons/harkmoor-maskable-512.png',
            sizes: '512x512',
            type: 'image/png',
            purpose: 'maskable',
          },
        ],
      },
    }),
  ],
  test: {
    environment: 'node',
    include: ['src/**/*.test.{ts,tsx}'],
    setupFiles: ['src/test-setup.ts'],
    css: { include: [/tokens\.css/] },
  },
});
