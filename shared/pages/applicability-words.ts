import type { Applicability, YearSpan } from './applicability.ts';
import { formatYears } from './years.ts';

/** What something holds for, in words: `1978 to 1979, UK and EU only`; null where it holds for all. */
export function applicabilityWords({ years, markets, frames }: Applicability): string | null {
  const parts = [
    years.length === 0 ? null : yearsWords(years),
    markets.length === 0 ? null : `${list(markets)} only`,
    frames.length === 0 ? null : `${frames.length === 1 ? 'frame' : 'frames'} ${list(frames)}`,
  ].filter((part) => part !== null);
  return parts.length === 0 ? null : parts.join(', ');
}

/** Model years in words: `1978 to 1979`, `from 1980`, `up to 1979`. */
export function yearsWords(spans: readonly YearSpan[]): string {
  return list(spans.map(spanWords));
}

function spanWords({ from, to }: YearSpan): string {
  if (from === null) return `up to ${to ?? ''}`.trim();
  if (to === null) return `from ${from}`;
  return from === to ? `${from}` : `${from} to ${to}`;
}

function list(words: readonly string[]): string {
  const last = words.at(-1) ?? '';
  return words.length < 2 ? last : `${words.slice(0, -1).join(', ')} and ${last}`;
}

/**
 * What a line's address ends with: years, markets and frames, each after a `~`, empty ones at the end dropped:
 * `~1980-`, `~~UK`, `~1978-1979~UK,EU`. Empty where it holds for all. White space becomes a hyphen, for an address has none.
 */
export function addressSuffix({ years, markets, frames }: Applicability): string {
  return ['', formatYears(years), markets.join(','), frames.join(',')]
    .join('~')
    .replace(/~+$/, '')
    .replace(/\s+/g, '-');
}
