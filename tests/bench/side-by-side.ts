import { performance } from 'node:perf_hooks';
import type { Pace } from './pace.ts';
import { median } from './row.ts';

/** What one side does once; whatever it gives is thrown away. */
export type Work = () => unknown;

/**
 * What is counted: the time that the process had a processor, which other programs on the machine do not lengthen, or
 * the time that passed, where a disk or another process is waited for.
 */
export type Clock = 'processor' | 'wall';

export interface SideBySide {
  /** Milliseconds of one time, the middle of all rounds. */
  readonly ours: number;
  readonly yardstick: number;
  /** Ours over the yardstick, in time: the middle of the rounds' own ratios, so that a slow moment touches both sides. */
  readonly timeRatio: number;
}

function readClock(clock: Clock): number {
  if (clock === 'wall') return performance.now();
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

/** Runs a side until the time is over, at least once; gives the milliseconds of one time. */
async function timeOf(work: Work, milliseconds: number, clock: Clock): Promise<number> {
  const until = performance.now() + milliseconds;
  const start = readClock(clock);
  let times = 0;
  do {
    const outcome = work();
    if (outcome instanceof Promise) await outcome;
    times += 1;
  } while (performance.now() < until);
  return (readClock(clock) - start) / times;
}

/** Measures both sides in turns; who goes first changes every round. */
export async function inTurns(
  rounds: number,
  measureOurs: () => Promise<number>,
  measureYardstick: () => Promise<number>,
): Promise<SideBySide> {
  const times: { ours: number; yardstick: number }[] = [];
  for (let round = 0; round < rounds; round += 1) {
    const early = round % 2 === 0 ? null : await measureYardstick();
    const ours = await measureOurs();
    times.push({ ours, yardstick: early ?? (await measureYardstick()) });
  }
  return {
    ours: median(times.map((time) => time.ours)),
    yardstick: median(times.map((time) => time.yardstick)),
    timeRatio: median(times.map((time) => time.ours / time.yardstick)),
  };
}

/** Times ours beside a yardstick, both warmed up first. */
export async function sideBySide(pace: Pace, clock: Clock, ours: Work, yardstick: Work): Promise<SideBySide> {
  const { rounds, roundMilliseconds } = pace;
  await timeOf(ours, roundMilliseconds * 3, clock);
  await timeOf(yardstick, roundMilliseconds * 3, clock);
  return inTurns(
    rounds,
    () => timeOf(ours, roundMilliseconds, clock),
    () => timeOf(yardstick, roundMilliseconds, clock),
  );
}

/** A time as people read it: 0.34 ms, 12.5 ms, 310 ms. */
export function milliseconds(time: number): string {
  const digits = time < 1 ? 3 : time < 10 ? 2 : time < 100 ? 1 : 0;
  return `${time.toFixed(digits)} ms`;
}

/** An amount of bytes as people read it. */
export function kilobytes(bytes: number): string {
  return `${(bytes / 1000).toFixed(bytes < 10_000 ? 1 : 0)} kB`;
}
