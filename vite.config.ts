import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import { defineConfig } from 'vitest/config';

/** Server entries: what Node runs itself, beside the page renderer that is built with it. */
const serverEntries = {
  main: 'server/main.ts',
  'entry-server': 'src/entry-server.tsx',
  'parse-worker': 'server/pages/parse-worker.ts',
  'search-worker': 'server/search/search-worker.ts',
  seed: 'server/scripts/seed.ts',
  'create-admin': 'server/scripts/create-admin.ts',
};

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [react(), tailwindcss()],
  publicDir: 'src/public',
  appType: 'custom',
  resolve: {
    // The browser build of this package wants `document`, which a worker has not.
    alias: { 'decode-named-character-reference': 'decode-named-character-reference/index.js' },
  },
  worker: { format: 'es' },
  build: isSsrBuild
    ? { target: 'node20', outDir: 'dist/server', sourcemap: true, rollupOptions: { input: serverEntries } }
    : { target: 'es2022', outDir: 'dist/client', manifest: true, assetsInlineLimit: 0 },
  test: {
    include: ['shared/**/*.test.ts', 'server/**/*.test.ts', 'src/**/*.test.{ts,tsx}', 'tests/**/*.test.{ts,tsx}'],
    setupFiles: ['tests/setup/unexpected-console.ts'],
    pool: 'forks',
    testTimeout: 30_000,
  },
}));
