import tailwindcss from '@tailwindcss/vite';
import react from '@vitejs/plugin-react';
import type { Plugin } from 'vite';
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

/**
 * Puts the site's scripts after the page's text, at low priority: on a slow line the text, its style and its letters
 * come first. Vite would put them into the head.
 */
function scriptsLast(): Plugin {
  const scripts = /\s*<(?:script type="module"[^>]*><\/script>|link rel="modulepreload"[^>]*>)/g;
  return {
    name: 'scripts-last',
    apply: 'build',
    transformIndexHtml: {
      order: 'post',
      handler(html) {
        const found = (html.match(scripts) ?? []).map((tag) => tag.trim().replace(' ', ' fetchpriority="low" '));
        return html
          .replace(scripts, '')
          .replace('</body>', () => `${found.map((tag) => `  ${tag}\n  `).join('')}</body>`);
      },
    },
  };
}

/** How long each plugin took is of no use to whoever starts the book. */
const checks = { bundlerTimings: false };

export default defineConfig(({ isSsrBuild }) => ({
  plugins: [react(), tailwindcss(), scriptsLast()],
  publicDir: 'src/public',
  appType: 'custom',
  resolve: {
    // The browser build of this package wants `document`, which a worker has not.
    alias: { 'decode-named-character-reference': 'decode-named-character-reference/index.js' },
  },
  worker: { format: 'es' },
  build: isSsrBuild
    ? {
        target: 'node20',
        outDir: 'dist/server',
        sourcemap: true,
        copyPublicDir: false,
        rollupOptions: { input: serverEntries, checks },
      }
    : {
        target: 'es2022',
        outDir: 'dist/client',
        manifest: true,
        assetsInlineLimit: 0,
        rollupOptions: {
          checks,
          // What a reader's first page needs in one file, what is rarer in a file of its own.
          output: { codeSplitting: { groups: [{ name: 'reading', tags: ['$initial'] }] } },
        },
      },
  test: {
    include: ['shared/**/*.test.ts', 'server/**/*.test.ts', 'src/**/*.test.{ts,tsx}', 'tests/**/*.test.{ts,tsx}'],
    setupFiles: ['tests/setup/unexpected-console.ts'],
    pool: 'forks',
    testTimeout: 30_000,
  },
}));
