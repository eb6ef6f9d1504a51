import { cpSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { openClubAt, prepareDemoBook } from '../browser/club.ts';

/** How long the watch sleeps between two looks, which is no pause of anything. */
const resolutionMilliseconds = 1;

/** Runs in the server before it: writes down, five times a second, the longest time that its event loop stood still. */
const watch = `
import { appendFileSync } from 'node:fs';
import { monitorEventLoopDelay } from 'node:perf_hooks';
import { isMainThread } from 'node:worker_threads';
if (isMainThread) {
  const delays = monitorEventLoopDelay({ resolution: ${String(resolutionMilliseconds)} });
  delays.enable();
  setInterval(() => {
    appendFileSync(process.env.BENCH_PAUSES, String(delays.max / 1e6) + '\\n');
    delays.reset();
  }, 200).unref();
}
`;

export interface WatchedClub {
  readonly origin: string;
  /** The longest pause of the server's event loop while something was done, in milliseconds. */
  longestPauseDuring(act: () => Promise<void>): Promise<number>;
  close(): Promise<void>;
}

/** A club with the demo's book, in a process of its own whose event loop is watched. */
export async function openWatchedClub(): Promise<WatchedClub> {
  await prepareDemoBook();
  const folder = mkdtempSync(join(tmpdir(), 'earthstrap-bench-'));
  cpSync(join(process.cwd(), '.cache', 'demo-book'), folder, { recursive: true });
  const pausesFile = join(folder, 'pauses');
  const club = await openClubAt(folder, {
    NODE_OPTIONS: `--import data:text/javascript,${encodeURIComponent(watch)}`,
    BENCH_PAUSES: pausesFile,
  });
  const pauses = (): number[] => readFileSync(pausesFile, 'utf8').trim().split('\n').map(Number);

  /** Waits until the watch has written twice more: what came before is then in the file. */
  async function settled(): Promise<number> {
    const before = pauses().length;
    while (pauses().length < before + 2) await new Promise((resolve) => setTimeout(resolve, 50));
    return pauses().length;
  }

  return {
    origin: club.origin,
    async longestPauseDuring(act) {
      const first = await settled();
      await act();
      await settled();
      return Math.max(...pauses().slice(first)) - resolutionMilliseconds;
    },
    async close() {
      await club.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
