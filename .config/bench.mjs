/* Measures what the budgets speak of, each beside its yardstick in the same run, and prints one table. */
import { spawnSync } from 'node:child_process';
import { existsSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild, ensureChromium, ensurePackages, root, run } from './ensure.mjs';

ensurePackages();
ensureChromium();
ensureBuild();
if (!existsSync('/usr/sbin/nginx')) {
  console.log('Installing nginx to measure beside …');
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  run('apt-get', ['install', '-y', '-qq', 'nginx-light'], { env });
}

// Built as the server is: what translates TypeScript while it runs would be measured as well.
const folder = join(root, '.cache', 'bench');
rmSync(folder, { recursive: true, force: true });
const { build } = await import('vite');
await build({
  configFile: false,
  root,
  logLevel: 'warn',
  publicDir: false,
  build: {
    ssr: join(root, 'tests', 'bench', 'bench.ts'),
    target: 'node20',
    outDir: folder,
    rollupOptions: { output: { entryFileNames: '[name].mjs', chunkFileNames: '[name]-[hash].mjs' } },
  },
});
const done = spawnSync(process.execPath, [join(folder, 'bench.mjs'), ...process.argv.slice(2)], {
  cwd: root,
  stdio: 'inherit',
  env: { ...process.env, NODE_ENV: 'production' },
});
process.exit(done.status ?? 1);
