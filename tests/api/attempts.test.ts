import { beforeEach, describe, expect, test } from 'vitest';
import { createAttempts, type Attempts } from '../../server/members/attempts.ts';

const limits = { free: 3, firstPauseSeconds: 2, longestPauseSeconds: 60, forgetSeconds: 3600 };

describe('attempts', () => {
  let now: number;
  let attempts: Attempts;

  beforeEach(() => {
    now = 1_000_000;
    attempts = createAttempts(limits, () => now);
  });

  function countTimes(times: number): void {
    for (let time = 0; time < times; time += 1) attempts.count('key');
  }

  test('cost nothing while they are few', () => {
    countTimes(2);
    expect(attempts.pauseOf('key')).toBe(0);
  });

  test.each([
    [3, 2],
    [4, 4],
    [5, 8],
    [7, 32],
    [8, 60],
    [500, 60],
  ])('after %i the pause is %i s', (times, pause) => {
    countTimes(times);
    expect(attempts.pauseOf('key')).toBe(pause);
  });

  test('wait until the pause has passed, and no longer', () => {
    countTimes(3);
    now += 1999;
    expect(attempts.pauseOf('key')).toBe(1);
    now += 1;
    expect(attempts.pauseOf('key')).toBe(0);
  });

  test('are counted apart by key', () => {
    countTimes(10);
    expect(attempts.pauseOf('another')).toBe(0);
  });

  test('are forgotten by a success', () => {
    countTimes(10);
    attempts.clear('key');
    expect(attempts.pauseOf('key')).toBe(0);
    attempts.count('key');
    expect(attempts.pauseOf('key')).toBe(0);
  });

  test('are forgotten after the time for it', () => {
    countTimes(10);
    now += limits.forgetSeconds * 1000;
    attempts.count('key');
    expect(attempts.pauseOf('key')).toBe(0);
  });

  test('of ten thousand other keys push out the oldest, so that memory has an end', () => {
    countTimes(10);
    for (let other = 0; other < 10_000; other += 1) attempts.count(`other ${String(other)}`);
    expect(attempts.pauseOf('key')).toBe(0);
  });
});
