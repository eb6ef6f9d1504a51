import type { YearSpan } from './applicability.ts';

/** The years that a motorcycle page may speak of. */
export const believedYears = { first: 1885, last: 2100 } as const;

/** No model was built for longer: `1981-78` is a slip and not 1981 to 2078. */
const longestShortSpan = 50;

const spanPattern = /^(\d{4})?\s*(?:(-|–|—|~|to|until)\s*(\d{4}|\d{2})?)?$/i;

/**
 * Reads model years: `1978`, `1978-1981`, `1978–81`, `1980-`, `-1979`, and several with commas between them.
 * Spans that touch are joined, earliest first. An empty text holds for all years and gives none. Null where it cannot
 * be read, a span runs backwards, or a year lies outside 1885 to 2100.
 */
export function parseYears(text: string): readonly YearSpan[] | null {
  const parts = text
    .split(/[,;]/)
    .map((part) => part.trim())
    .filter((part) => part !== '');
  const spans: YearSpan[] = [];
  for (const part of parts) {
    const span = parseSpan(part);
    if (span === null) return null;
    spans.push(span);
  }
  return joinSpans(spans);
}

function parseSpan(text: string): YearSpan | null {
  const plain = text.replace(/^from\s+(\d{4})$/i, '$1-').replace(/^(\d{4})(?:\s+on(?:wards?)?|\s*\+)$/i, '$1-');
  const match = spanPattern.exec(plain.replace(/^(?:until|up to|to)\s+/i, '-'));
  if (match === null) return null;
  const [, start, dash, end] = match;
  const from = start === undefined ? null : Number(start);
  const to = dash === undefined ? from : endYear(from, end);
  if (from === null && to === null) return null;
  if (!isBelieved(from) || !isBelieved(to)) return null;
  return from !== null && to !== null && from > to ? null : { from, to };
}

function endYear(from: number | null, end: string | undefined): number | null {
  if (end === undefined) return null;
  if (end.length === 4 || from === null) return Number(end);
  // `1978-81` is how parts lists write it: the next year after the first that ends so, or no year for a span run backwards.
  const year = Math.floor(from / 100) * 100 + Number(end);
  const next = year < from ? year + 100 : year;
  return next - from > longestShortSpan ? Number.NaN : next;
}

function isBelieved(year: number | null): boolean {
  return year === null || (year >= believedYears.first && year <= believedYears.last);
}

function joinSpans(spans: readonly YearSpan[]): readonly YearSpan[] {
  const sorted = spans.toSorted((a, b) => start(a) - start(b) || finish(a) - finish(b));
  const joined: YearSpan[] = [];
  for (const span of sorted) {
    const last = joined.at(-1);
    if (last === undefined || start(span) > finish(last) + 1) joined.push(span);
    else if (finish(span) > finish(last)) joined[joined.length - 1] = { from: last.from, to: span.to };
  }
  return joined;
}

/** The first year of a span as a number to compare: an open one begins before all others. */
export function start({ from }: YearSpan): number {
  return from ?? Number.NEGATIVE_INFINITY;
}

/** The last year of a span as a number to compare: an open one ends after all others. */
export function finish({ to }: YearSpan): number {
  return to ?? Number.POSITIVE_INFINITY;
}

/** Writes model years as an address has them: `1978`, `1978-1979`, `1980-`, `-1979`, `1978,1980-`. */
export function formatYears(spans: readonly YearSpan[]): string {
  return spans
    .map(({ from, to }) => (from !== null && from === to ? `${from}` : `${from ?? ''}-${to ?? ''}`))
    .join(',');
}
