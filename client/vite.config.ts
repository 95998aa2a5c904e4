import { fileURLToPath } from 'node:url';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

const file = (path: string) => fileURLToPath(new URL(path, import.meta.url));

/** Where a development server finds the service; the built client is served by the service itself. */
const service = process.env['DIFFOLIO_SERVICE'] ?? 'http://127.0.0.1:4280';

export default defineConfig({
  root: file('.'),
  plugins: [react()],
  // Under test one package takes graphql's CommonJS build and another its modules, and each refuses the other's documents.
  resolve: { alias: process.env['VITEST'] ? [{ find: /^graphql$/, replacement: 'graphql/index.js' }] : [] },
  server: {
    proxy: Object.fromEntries(
      ['/graphql', '/api/', '/releases/', '/health/', '^/sheets/.*\\.(json|csv|pdf)$'].map((path) => [path, service]),
    ),
  },
  build: {
    outDir: 'dist',
    // The benchmark of the first load follows the imports in it.
    manifest: true,
    assetsInlineLimit: 0,
    chunkSizeWarningLimit: 4000,
    rolldownOptions: {
      input: { index: file('index.html'), graphql: file('graphql.html') },
      // The explorer's packages carry hints for a compiler that is not used here.
      checks: { moduleLevelDirective: false },
    },
  },
  test: {
    environment: 'jsdom',
    include: ['src/**/*.spec.{ts,tsx}'],
    setupFiles: [file('src/test-setup.ts')],
    restoreMocks: true,
    testTimeout: 20_000,
    // One document for all files of a worker: making one costs more than most of the tests.
    pool: 'threads',
    isolate: false,
    maxWorkers: 2,
  },
});
