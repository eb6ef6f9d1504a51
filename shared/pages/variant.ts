import type { Applicability, Variant, YearSpan } from './applicability.ts';
import { yearsWords } from './applicability-words.ts';
import { believedYears, finish, start } from './years.ts';

/** Whether something holds for the bike that a reader chose, and otherwise why not, in words. */
export type Applies = { readonly applies: true } | { readonly applies: false; readonly why: string };

/** What a reader of several things may choose between: the years that they name from first to last, markets, frames. */
export interface Choices {
  readonly years: { readonly from: number; readonly to: number } | null;
  readonly markets: readonly string[];
  readonly frames: readonly string[];
}

/** A variant as it stands in an address: `?year=1980&market=UK&frame=`. */
export interface WrittenVariant {
  readonly year?: string | number | null | undefined;
  readonly market?: string | null | undefined;
  readonly frame?: string | null | undefined;
}

/** Reads a variant from an address; what is empty or is no year from 1885 to 2100 is not chosen. */
export function parseVariant({ year, market, frame }: WrittenVariant): Variant {
  return { year: parseYear(year), market: parseName(market), frame: parseName(frame) };
}

function parseYear(written: string | number | null | undefined): number | null {
  const text = String(written ?? '').trim();
  const year = /^\d{4}$/.test(text) ? Number(text) : null;
  return year !== null && year >= believedYears.first && year <= believedYears.last ? year : null;
}

function parseName(written: string | null | undefined): string | null {
  const name = (written ?? '').trim();
  return name === '' ? null : name.slice(0, 40);
}

/** Whether something holds for a variant. What the reader has not chosen rules nothing out. */
export function appliesTo({ years, markets, frames }: Applicability, variant: Variant): Applies {
  const { year, market, frame } = variant;
  if (year !== null && years.length > 0 && !years.some((span) => start(span) <= year && year <= finish(span))) {
    return { applies: false, why: `${yearsWords(years)}, not ${year}` };
  }
  if (market !== null && markets.length > 0 && !hasName(markets, market)) {
    return { applies: false, why: `${markets.join(', ')}, not ${market}` };
  }
  if (frame !== null && frames.length > 0 && !hasName(frames, frame)) {
    return { applies: false, why: `frame ${frames.join(', ')}, not ${frame}` };
  }
  return { applies: true };
}

/** True where no bike exists for which both hold: their years, their markets or their frames have nothing in common. */
export function areDisjoint(a: Applicability, b: Applicability): boolean {
  return yearsDisjoint(a.years, b.years) || namesDisjoint(a.markets, b.markets) || namesDisjoint(a.frames, b.frames);
}

function yearsDisjoint(a: readonly YearSpan[], b: readonly YearSpan[]): boolean {
  if (a.length === 0 || b.length === 0) return false;
  return a.every((one) => b.every((other) => finish(one) < start(other) || finish(other) < start(one)));
}

function namesDisjoint(a: readonly string[], b: readonly string[]): boolean {
  return a.length > 0 && b.length > 0 && !a.some((name) => hasName(b, name));
}

function hasName(names: readonly string[], wanted: string): boolean {
  const key = wanted.toLowerCase();
  return names.some((name) => name.toLowerCase() === key);
}

/** What readers may choose between, of everything that a page or subject says that it holds for. */
export function choicesOf(all: readonly Applicability[]): Choices {
  const years = all.flatMap((one) => one.years.flatMap(({ from, to }) => [from, to])).filter((year) => year !== null);
  return {
    years: spanOf(years),
    markets: distinctNames(all.flatMap(({ markets }) => markets)),
    frames: distinctNames(all.flatMap(({ frames }) => frames)),
  };
}

function spanOf(years: readonly number[]): Choices['years'] {
  const [first, ...others] = years;
  if (first === undefined) return null;
  return others.reduce((span, year) => ({ from: Math.min(span.from, year), to: Math.max(span.to, year) }), {
    from: first,
    to: first,
  });
}

function distinctNames(names: readonly string[]): readonly string[] {
  const byKey = new Map<string, string>();
  for (const name of names) {
    const key = name.toLowerCase();
    if (!byKey.has(key)) byKey.set(key, name);
  }
  return [...byKey.values()].toSorted();
}
