/* Measures what the budgets speak of, each beside its yardstick in the same run, and prints one table. */
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild, ensureChromium, ensurePackages, root, run } from './ensure.mjs';

ensurePackages();
ensureChromium();
ensureBuild();
if (!existsSync('/usr/sbin/nginx')) {
  console.log('Installing nginx to measure beside …');
  run('apt-get', ['install', '-y', '-qq', 'nginx-light'], { env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } });
}
const done = spawnSync(process.execPath, ['--import', 'tsx', join(root, 'tests/bench/bench.ts'), ...process.argv.slice(2)], {
  cwd: root,
  stdio: 'inherit',
  env: { ...process.env, NODE_ENV: 'production' },
});
process.exit(done.status ?? 1);
