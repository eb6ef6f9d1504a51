import { anyVariant, type Variant } from '../pages/applicability.ts';
import type { LineFound } from './best-lines.ts';
import type { LinesIndex } from './lines-index.ts';
import type { QueryTerm, ReadQuery } from './read-query.ts';
import { createScan, type LinesQueryOptions } from './scan-lines.ts';
import { maskTerms, type TermMasks } from './term-masks.ts';

/** What a query found among the lines. */
export interface LinesAnswer {
  readonly lines: readonly LineFound[];
  /** How many lines answer in all. */
  readonly count: number;
  /** True where a colour, a cavity, a size or a circuit is named, so that lines are what is asked for. */
  readonly namesLine: boolean;
  /** True where no line has all of it, and these have only some of its words. */
  readonly someWordsOnly: boolean;
  /** The words and codes that nothing in the book has. */
  readonly unanswered: readonly QueryTerm[];
  /** True where one of those is so short that it may be a code, and no line is shown for the rest without it. */
  readonly barred: boolean;
  readonly mended: TermMasks['mended'];
  /** Blocks that the words alone lead to, where the colour or cavity that is asked for is not there. */
  readonly elsewhere: readonly number[];
  /** True where the query names a subject: alone (`only`), or some other one than that on the bench (`other`). */
  readonly namesSubject: 'only' | 'other' | null;
  /** The terms that are part of a subject's name. */
  readonly subjectTerms: readonly QueryTerm[];
  /** The bike that was meant: what was chosen, and a year or market that the query names. */
  readonly variant: Variant;
  readonly variantElsewhere: Variant;
}

/** Terms that name something exactly: no line that lacks one is ever shown in its place. */
export function isCode({ kind }: QueryTerm): boolean {
  return kind === 'colour' || kind === 'cavity' || kind === 'size' || kind === 'no-colour' || kind === 'number';
}

/** A word that is a code for all one can tell, such as `YQ`: at most two letters, or three that cannot be said. */
function isShort(term: QueryTerm): boolean {
  return (
    term.kind === 'word' &&
    term.single !== null &&
    !term.last &&
    /^(?:[a-z]{1,2}|[^aeiou][^aeiouy]{2})$/.test(term.single)
  );
}

/**
 * Finds the lines that answer a query, best first. A colour, cavity, size or number must be there exactly; words that
 * nothing in the book has are left out and said; only a query of nothing but words may find lines that have some of them.
 */
export function queryLines(
  index: LinesIndex,
  query: ReadQuery,
  options: Partial<Omit<LinesQueryOptions, 'variantElsewhere'>> = {},
): LinesAnswer {
  const { bench = null, limit = 15 } = options;
  const { terms } = query;
  const masks = maskTerms(index, terms);
  const market = marketAmong(index, terms, masks.unanswered);
  const variant = variantOf(query, market?.market ?? null, options.variant ?? anyVariant);
  const variantElsewhere = bench === null ? variant : variantOf(query, market?.market ?? null, anyVariant);
  const unanswered = terms.filter((_, number) => masks.unanswered.has(number) && number !== market?.number);
  const barred = unanswered.some((term) => isCode(term) || isShort(term));
  const required = bitsOf(terms, (term, number) => isCode(term) || !masks.unanswered.has(number));
  const scan = createScan(index, terms, masks, { bench, variant, variantElsewhere, limit });
  const nothing = {
    lines: [],
    count: 0,
    namesLine: false,
    someWordsOnly: false,
    unanswered,
    barred,
    mended: masks.mended,
    elsewhere: [],
    variant,
    variantElsewhere,
    subjectTerms: terms.filter((_, number) => (scan.subjectTerms & (1 << number)) !== 0),
    namesSubject: scan.namesOtherSubject() ? ('other' as const) : null,
  };
  if (required === 0) return nothing;
  if (scan.namesOnlySubject(required)) return { ...nothing, namesSubject: 'only' };
  const hasCode = terms.some(isCode);
  const all = barred ? { lines: [], count: 0, inLine: false } : scan.run(required, required);
  if (all.count > 0) return { ...nothing, ...all, namesLine: hasCode || all.inLine };
  if (hasCode) {
    // A model's number is a word of its name, and leads to its pages.
    const isWord = (term: QueryTerm, number: number): boolean =>
      term.kind === 'number' ? (scan.subjectTerms & (1 << number)) !== 0 : !isCode(term);
    const words = bitsOf(terms, (term, number) => isWord(term, number) && !masks.unanswered.has(number));
    return { ...nothing, namesLine: true, elsewhere: scan.holdersNamed(words) };
  }
  if (barred) return nothing;
  const some = scan.run(required, 0);
  return { ...nothing, ...some, namesLine: false, someWordsOnly: some.count > 0 };
}

function bitsOf(terms: readonly QueryTerm[], counts: (term: QueryTerm, number: number) => boolean): number {
  return terms.reduce((bits, term, number) => (counts(term, number) ? bits | (1 << number) : bits), 0);
}

/** A market that the query names and that nothing else in the book is called. */
function marketAmong(
  { applicabilities }: LinesIndex,
  terms: readonly QueryTerm[],
  unanswered: ReadonlySet<number>,
): { number: number; market: string } | null {
  for (const number of unanswered) {
    const term = terms[number];
    if (term?.kind !== 'word' || term.single === null) continue;
    const market = applicabilities.flatMap(({ markets }) => markets).find((name) => name.toLowerCase() === term.single);
    if (market !== undefined) return { number, market };
  }
  return null;
}

/** The bike that is meant: what the query names goes before what was chosen. */
function variantOf(query: ReadQuery, market: string | null, chosen: Variant): Variant {
  return { ...chosen, year: query.year?.year ?? chosen.year, market: market ?? chosen.market };
}
