/* Serves the book for whoever works on it: the site reloads as it is edited, the server starts again when its own code changes. */
import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { ensurePackages, root } from './ensure.mjs';

ensurePackages();
const tsx = join(root, 'node_modules', 'tsx', 'dist', 'cli.mjs');
const server = spawn(process.execPath, [tsx, 'watch', '--clear-screen=false', 'server/main.ts'], {
  cwd: root,
  stdio: 'inherit',
  env: { ...process.env, NODE_ENV: 'development' },
});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('exit', (code) => process.exit(code ?? 0));
