import { isIPv6 } from 'node:net';

/** Milliseconds of parsing that one asker may use in any minute. */
const rationMilliseconds = 20_000;
const minuteMilliseconds = 60_000;
/** Askers remembered before those that used nothing in the last minute are forgotten. */
const askersBeforeSweep = 1000;

interface Use {
  readonly at: number;
  readonly milliseconds: number;
}

/** How much parsing time each asker used in the last minute. */
export interface ParsingRation {
  /** Seconds until this asker may ask again; 0 where they may now. */
  secondsToWait(asker: string): number;
  charge(asker: string, milliseconds: number): void;
}

/**
 * Rations parsing time, asker by asker, so that one who sends texts that are slow to read takes nothing from the others.
 * @param now milliseconds of a clock that never goes back
 */
export function createParsingRation(now: () => number): ParsingRation {
  const uses = new Map<string, Use[]>();

  function recent(asker: string): Use[] {
    const since = now() - minuteMilliseconds;
    const kept = (uses.get(asker) ?? []).filter((use) => use.at > since);
    if (kept.length === 0) uses.delete(asker);
    else uses.set(asker, kept);
    return kept;
  }

  return {
    secondsToWait(asker) {
      const kept = recent(asker);
      let used = kept.reduce((sum, use) => sum + use.milliseconds, 0);
      if (used < rationMilliseconds) return 0;
      for (const use of kept) {
        used -= use.milliseconds;
        if (used < rationMilliseconds) return Math.max(1, Math.ceil((use.at + minuteMilliseconds - now()) / 1000));
      }
      return minuteMilliseconds / 1000;
    },
    charge(asker, milliseconds) {
      if (uses.size > askersBeforeSweep) for (const other of [...uses.keys()]) recent(other);
      const kept = recent(asker);
      kept.push({ at: now(), milliseconds });
      uses.set(asker, kept);
    },
  };
}

/**
 * Whom a network address belongs to: itself for IPv4, its /64 for IPv6, of which one visitor has as many addresses as
 * they like.
 */
export function networkOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address);
  if (mapped?.[1] !== undefined) return mapped[1];
  if (!isIPv6(address)) return address;
  const [head = '', tail = ''] = address.toLowerCase().split('%')[0]?.split('::') ?? [];
  const groupsOf = (part: string): string[] => (part === '' ? [] : part.split(':'));
  const [before, after] = [groupsOf(head), groupsOf(tail)];
  const zeros = address.includes('::') ? Array.from({ length: 8 - before.length - after.length }, () => '0') : [];
  return `${[...before, ...zeros, ...after]
    .slice(0, 4)
    .map((group) => group.replace(/^0+(?=.)/, ''))
    .join(':')}::/64`;
}
