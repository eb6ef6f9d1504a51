import { spawn, type ChildProcess } from 'node:child_process';
import { cpSync, existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const root = fileURLToPath(new URL('../..', import.meta.url));
const base = join(root, '.cache', 'demo-book');

/** A club's server of its own for one test: its own folder of data, its own port. */
export interface Club {
  readonly origin: string;
  readonly dataFolder: string;
  close(): Promise<void>;
}

/** The demo's sign-ins, as the README gives them. */
export const demoPassword = 'bench-lamp-42';

async function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => {
        if (address === null || typeof address === 'string') reject(new Error('no port'));
        else resolve(address.port);
      });
    });
  });
}

async function answers(origin: string, server: ChildProcess): Promise<void> {
  const until = Date.now() + 240_000;
  while (Date.now() < until) {
    if (server.exitCode !== null) throw new Error(`the server ended with ${String(server.exitCode)}`);
    const up = await fetch(`${origin}/healthz`).then(
      (response) => response.ok,
      () => false,
    );
    if (up) return;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('the server did not answer within four minutes');
}

/** Opens a club on a folder of data that stays where it is. */
export async function openClubAt(dataFolder: string, settings: Record<string, string> = {}): Promise<Club> {
  const port = await freePort();
  const origin = `http://127.0.0.1:${String(port)}`;
  const server = spawn(process.execPath, [join(root, 'dist/server/main.js')], {
    cwd: root,
    stdio: ['ignore', 'ignore', 'inherit'],
    env: {
      ...process.env,
      PORT: String(port),
      BASE_URL: origin,
      DATA_DIR: dataFolder,
      LOG_LEVEL: 'error',
      ...settings,
    },
  });
  const ended = new Promise<void>((resolve) => server.once('exit', () => resolve()));
  await answers(origin, server);
  return {
    origin,
    dataFolder,
    async close() {
      server.kill('SIGTERM');
      await ended;
    },
  };
}

/** Seeds the demo once a build, for every test to start from a copy. */
export async function prepareDemoBook(): Promise<void> {
  const stampFile = join(root, '.cache', 'build');
  const stamp = existsSync(stampFile) ? readFileSync(stampFile, 'utf8') : '';
  const made = join(base, 'made-from');
  if (existsSync(made) && readFileSync(made, 'utf8') === stamp) return;
  rmSync(base, { recursive: true, force: true });
  const club = await openClubAt(base, { SEED: 'demo' });
  await club.close();
  writeFileSync(made, stamp);
}

/** Opens a club that has the demo's book and nothing else. */
export async function openClub(settings: Record<string, string> = {}): Promise<Club> {
  const folder = mkdtempSync(join(tmpdir(), 'earthstrap-club-'));
  cpSync(base, folder, { recursive: true });
  const club = await openClubAt(folder, settings);
  return {
    ...club,
    async close() {
      await club.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
