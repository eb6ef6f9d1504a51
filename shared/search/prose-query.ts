import type { QueryCombination, SearchOptions } from 'minisearch';
import type { ColourWanted } from './read-colour-query.ts';
import type { QueryTerm, ReadQuery } from './read-query.ts';
import { slipsForgiven, swapped } from './spelling.ts';
import { plainText, singular } from './words.ts';

/** The fuzziness that a word of five letters and more is given: one slip, two from ten letters. */
const fuzziness = 0.2;
const shortestPrefix = 2;
/** Two letters begin too many words to look for all of them in every text: they are completed in headings and titles. */
const shortestPrefixInText = 3;

type Part = QueryCombination;
type PartOptions = Pick<SearchOptions, 'prefix' | 'fuzzy' | 'fields'>;

/**
 * What of a query the prose is asked for, a part a term; null where there is nothing to ask. Cavities, sizes and short
 * numbers are the lines' business, unless there is nothing else.
 * @param known every word that the prose has
 */
export function proseQuery(query: ReadQuery, known: ReadonlySet<string>): Part[] | null {
  const words = query.terms.filter((term) => !isForLines(term));
  const terms = words.length > 0 ? words : query.terms;
  const parts = terms.map((term) => partOf(term, known)).filter((part) => part !== null);
  return parts.length === 0 ? null : parts;
}

function isForLines(term: QueryTerm): boolean {
  if (term.kind === 'number') return /^\d{1,2}\+*$/.test(term.name) || /^\d+\.\d+$/.test(term.name);
  return term.kind === 'cavity' || term.kind === 'size' || term.kind === 'no-colour';
}

function partOf(term: QueryTerm, known: ReadonlySet<string>): Part | null {
  switch (term.kind) {
    case 'word': {
      const { single } = term;
      if (single === null || known.has(single)) {
        // Wherever the word stands its concept stands too: asking for both would count everything twice.
        const concepts = term.words.filter((word) => word.startsWith('~'));
        const words = concepts.length > 0 ? concepts : term.words;
        // A word that is there is not misspelt: only the last one, which may be unfinished, is taken further.
        return anyOf(words, {}, term.last && single !== null ? beginningWith(single) : []);
      }
      if (slipsForgiven(single) === 0) return anyOf(term.words, {}, term.last ? beginningWith(single) : []);
      const likely = swapped(single).filter((variant) => known.has(variant));
      return anyOf([...term.words, ...likely], {
        prefix: term.last,
        fuzzy: (word) => (likely.length === 0 && word === single ? fuzziness : false),
      });
    }
    case 'colour':
      return anyOf(
        [...term.words, plainText(term.written).replace(/[^a-z0-9]+/g, '')],
        {},
        term.colours.map(colourPart),
      );
    case 'number':
      return anyOf(term.words, {});
    case 'cavity':
      return anyOf([term.name], {});
    case 'size':
      return anyOf([String(term.squareMillimetres)], {});
    case 'no-colour':
      return null;
  }
}

/** What an unfinished word may become. */
function beginningWith(word: string): Part[] {
  if (word.length < shortestPrefix) return [];
  const inTitles = word.length < shortestPrefixInText ? { fields: ['heading', 'title'] } : {};
  return [{ combineWith: 'OR', queries: [word], prefix: true, ...inTitles }];
}

function anyOf(words: readonly string[], options: PartOptions, more: readonly Part[] = []): Part {
  return { combineWith: 'OR', queries: [...new Set(words), ...more], ...options };
}

function colourPart({ base, tracer }: ColourWanted): Part {
  const names = [base, tracer].filter((name) => name !== 'any' && name !== null);
  return { combineWith: 'AND', queries: names.flatMap((name) => name.split(' ').map(singular)) };
}
