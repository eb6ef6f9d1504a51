/** How many attempts one may make in vain before the pauses begin, and how long these may become. */
export interface AttemptLimits {
  readonly free: number;
  readonly firstPauseSeconds: number;
  readonly longestPauseSeconds: number;
  /** After so long without an attempt all is forgotten. */
  readonly forgetSeconds: number;
}

/** Slows down whoever guesses, by a key. Nobody is locked out for good: a pause ends by itself. */
export interface Attempts {
  /** Seconds to wait before the next attempt; 0 where it may be made now. */
  pauseOf(key: string): number;
  /** Counts an attempt. Called before its outcome is known, so that many at once are counted as many. */
  count(key: string): void;
  /** Forgets a key whose attempt succeeded. */
  clear(key: string): void;
}

interface Tally {
  readonly attempts: number;
  readonly at: number;
  readonly pausedUntil: number;
}

/** Nobody can fill the memory with keys: beyond these the longest unused are forgotten. */
const mostKeys = 10_000;

/**
 * Counts attempts by key; from the first beyond the free ones each doubles the pause.
 * @param now the clock, in milliseconds
 */
export function createAttempts(limits: AttemptLimits, now: () => number): Attempts {
  // A map keeps the order in which keys were last counted, the oldest first.
  const tallies = new Map<string, Tally>();

  function tallyOf(key: string): Tally | undefined {
    const tally = tallies.get(key);
    if (tally === undefined || now() - tally.at < limits.forgetSeconds * 1000) return tally;
    tallies.delete(key);
    return undefined;
  }

  return {
    pauseOf(key) {
      const tally = tallyOf(key);
      return tally === undefined ? 0 : Math.max(0, Math.ceil((tally.pausedUntil - now()) / 1000));
    },
    count(key) {
      const attempts = (tallyOf(key)?.attempts ?? 0) + 1;
      const beyond = attempts - limits.free;
      const pauseSeconds =
        beyond < 0 ? 0 : Math.min(limits.longestPauseSeconds, limits.firstPauseSeconds * 2 ** Math.min(beyond, 30));
      tallies.delete(key);
      tallies.set(key, { attempts, at: now(), pausedUntil: now() + pauseSeconds * 1000 });
      for (const oldest of tallies.keys()) {
        if (tallies.size <= mostKeys) break;
        tallies.delete(oldest);
      }
    },
    clear(key) {
      tallies.delete(key);
    },
  };
}
