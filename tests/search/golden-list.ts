import { readFileSync } from 'node:fs';

/** One entry of the golden list. */
export interface GoldenQuery {
  readonly query: string;
  readonly bench: string | null;
  readonly year: number | null;
  readonly market: string | null;
  readonly first: string | null;
  readonly among: readonly string[];
  readonly last: string | null;
  readonly offers: string | null;
  readonly noLines: boolean;
  readonly says: string | null;
  readonly why: string;
}

const keys = ['query', 'bench', 'year', 'market', 'first', 'among', 'last', 'offers', 'no lines', 'says', 'why'];

/** Reads the golden list; an entry that says nothing to check, or a word that it does not know, is an error of the list. */
export function goldenQueries(): GoldenQuery[] {
  const text = readFileSync(new URL('../fixtures/search/golden.txt', import.meta.url), 'utf8');
  return text
    .split(/\n\s*\n/)
    .map((part) => part.split('\n').filter((line) => line.trim() !== '' && !line.startsWith('#')))
    .filter((lines) => lines.length > 0)
    .map(readEntry);
}

function readEntry(lines: readonly string[]): GoldenQuery {
  const fields = new Map<string, string[]>();
  for (const line of lines) {
    const colon = line.indexOf(':');
    const key = line.slice(0, colon);
    if (!keys.includes(key)) throw new Error(`golden.txt: what is “${line}”?`);
    fields.set(key, [...(fields.get(key) ?? []), line.slice(colon + 1).trim()]);
  }
  const one = (key: string): string | null => fields.get(key)?.[0] ?? null;
  const [query, why] = [one('query'), one('why')];
  const entry: GoldenQuery = {
    query: query ?? '',
    bench: one('bench'),
    year: one('year') === null ? null : Number(one('year')),
    market: one('market'),
    first: one('first'),
    among: fields.get('among') ?? [],
    last: one('last'),
    offers: one('offers'),
    noLines: fields.has('no lines'),
    says: one('says'),
    why: why ?? '',
  };
  const checks = entry.first !== null || entry.among.length > 0 || entry.noLines;
  if (query === null || why === null || !checks) throw new Error(`golden.txt: nothing to check in ${lines.join(' ')}`);
  return entry;
}
