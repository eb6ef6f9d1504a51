/* What every command of this project needs first, with nothing but Node: its packages, its build, a browser for the tests. */
import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { compressFiles } from './compress.mjs';

export const root = fileURLToPath(new URL('..', import.meta.url));
const stamps = join(root, '.cache');

/** Runs a command in the project's folder, showing what it says; ends the process where it fails. */
export function run(command, args, options = {}) {
  const done = spawnSync(command, args, { cwd: root, stdio: 'inherit', ...options });
  if (done.status !== 0) {
    console.error(`\n${command} ${args.join(' ')} did not succeed.`);
    process.exit(done.status ?? 1);
  }
}

function stampOf(name) {
  const file = join(stamps, name);
  return existsSync(file) ? readFileSync(file, 'utf8') : '';
}

function setStamp(name, value) {
  mkdirSync(stamps, { recursive: true });
  writeFileSync(join(stamps, name), value);
}

/** Ends with a clear word where this Node is not the one that the packages were tried with. */
export function ensureNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    console.error(`Earthstrap needs Node 20.19 or a later Node 20; this is ${process.versions.node}.`);
    process.exit(1);
  }
}

function readJson(...path) {
  const file = join(root, ...path);
  return existsSync(file) ? JSON.parse(readFileSync(file, 'utf8')) : null;
}

/** True where npm has installed what the lock file names: it keeps a lock file of its own, written when all is in place. */
function arePackagesInstalled() {
  const wanted = readJson('package-lock.json').packages;
  const installed = readJson('node_modules', '.package-lock.json')?.packages;
  if (installed === undefined) return false;
  return Object.entries(wanted).every(([path, { version, integrity, optional, devOptional }]) => {
    const found = installed[path];
    if (path === '' || (found === undefined && (optional || devOptional))) return true;
    return found?.version === version && found.integrity === integrity;
  });
}

/** Installs the packages of the lock file where they are missing or the lock has changed. */
export function ensurePackages() {
  ensureNode();
  if (arePackagesInstalled()) return;
  console.log('Installing packages (a few minutes the first time) …');
  run('npm', ['ci', '--no-audit', '--no-fund']);
}

const sourceFolders = ['shared', 'server', 'src', 'drizzle', '.config'];
const sourceFiles = ['package-lock.json', 'vite.config.ts', 'tailwind.config.ts', 'index.html'];

function* filesBelow(folder) {
  for (const entry of readdirSync(folder, { withFileTypes: true })) {
    const path = join(folder, entry.name);
    if (entry.isDirectory()) yield* filesBelow(path);
    else if (!/\.test\.tsx?$/.test(entry.name)) yield path;
  }
}

function sourcesHash() {
  const hash = createHash('sha256');
  const files = [
    ...sourceFolders.flatMap((folder) => [...filesBelow(join(root, folder))]),
    ...sourceFiles.map((f) => join(root, f)),
  ];
  for (const file of files.sort()) {
    if (statSync(file).isFile()) hash.update(file.slice(root.length)).update(readFileSync(file));
  }
  return hash.digest('hex');
}

/** Builds the site and the server where a source has changed since the last build. */
export function ensureBuild() {
  const sources = sourcesHash();
  if (existsSync(join(root, 'dist', 'server', 'main.js')) && stampOf('build') === sources) return;
  console.log('Building …');
  const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
  run(process.execPath, [vite, 'build', '--logLevel', 'warn']);
  compressFiles(join(root, 'dist', 'client'));
  run(process.execPath, [vite, 'build', '--ssr', '--logLevel', 'warn']);
  setStamp('build', sources);
}

/** Gives the path of Debian's Chromium, installing it where it is missing. */
export function ensureChromium() {
  const path = '/usr/bin/chromium';
  if (existsSync(path)) return path;
  console.log('Installing Chromium for the browser tests …');
  run('apt-get', ['update', '-qq']);
  run('apt-get', ['install', '-y', '-qq', 'chromium'], { env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' } });
  execFileSync(path, ['--version']);
  return path;
}
