import { findConcepts } from './concepts.ts';
import { readColourAt, type ColourFound, type ColourWanted } from './read-colour-query.ts';
import { fillerWords } from './filler-words.ts';
import { plainText, plainWords, singular } from './words.ts';

/** One thing that a line must have to answer a query. */
export type QueryTerm =
  /** A colour; `words` is what the same letters may be as a word, `names` as a cavity: `sw`, `L`. */
  | {
      readonly kind: 'colour';
      readonly written: string;
      readonly colours: readonly ColourWanted[];
      readonly words: readonly string[];
    }
  /** A cavity or terminal by name. `of` is the id it was written with, as in `headlight.3`. */
  | { readonly kind: 'cavity'; readonly written: string; readonly name: string; readonly of: string | null }
  /**
   * A number, or letters and numbers together: a cavity's name, a terminal, a wire's size, or a word of a name, each
   * exactly. One with its unit is a rating and nothing else; a bare one is a rating only where a fuse is spoken of.
   */
  | {
      readonly kind: 'number';
      readonly written: string;
      readonly name: string;
      readonly words: readonly string[];
      readonly rating: 'no' | 'maybe' | 'surely';
      readonly last: boolean;
    }
  | { readonly kind: 'size'; readonly written: string; readonly squareMillimetres: number }
  /** A word, or several that name one thing. Any of `words` will do; `single` is the plain word, for prefixes and slips. */
  | {
      readonly kind: 'word';
      readonly written: string;
      readonly words: readonly string[];
      readonly single: string | null;
      readonly last: boolean;
    }
  /** What looks like a colour code and is none in any system. */
  | { readonly kind: 'no-colour'; readonly written: string };

/** A query, read without looking at any index. */
export interface ReadQuery {
  readonly text: string;
  readonly terms: readonly QueryTerm[];
  /** A model year that stands in it. */
  readonly year: { readonly written: string; readonly year: number } | null;
}

/** More terms than this say nothing more; the rest are left out. */
export const mostTerms = 14;
const longestQuery = 300;

const cavityMarkers = new Set(['cavity', 'cav', 'pin', 'way', 'position', 'terminal', 'contact', 'no', 'number']);
const yearPattern = /^(?:19[0-9]{2}|20[0-4][0-9])$/;
const sizePattern = /^(\d+(?:[.,]\d+)?)(?:mm2|mm|sqmm|qmm)$/;
const unitWords = /^(?:a|v|w|ah|amps?|amperes?|volts?|watts?|ohms?)$/;
const terminalWithLetter = new Set(['15a', '49a', '56a', '56b', '57a', '87a', '87b', '31b', '30a', '15b', '50a']);

/**
 * Reads a query as somebody at a bench types it: colours in any spelling, cavities, addresses, sizes, a year, and words,
 * with what the trade calls by several names as one. Filler words are dropped, unless there is nothing else.
 * Only the first 300 characters count.
 */
export function readQuery(text: string): ReadQuery {
  const trimmed = text.slice(0, longestQuery).trim();
  const tokens = tokensOf(trimmed);
  const unfinished = tokens.length > 0 && !/[\s,;)]$/.test(text);
  const thorough = readTokens(tokens, unfinished, true);
  const read = thorough.terms.length > 0 || thorough.year !== null ? thorough : readTokens(tokens, unfinished, false);
  return { text: trimmed, terms: read.terms.slice(0, mostTerms), year: read.year };
}

/** What white space and the marks of sentences divide; a `#` divides a page's address from a line's. */
function tokensOf(text: string): string[] {
  return text
    .replace(/mm²/gi, 'mm2')
    .replace(/[\s,;:!?"“”‘’()[\]{}<>|=*`#]+/g, ' ')
    .split(' ')
    .map((token) => token.replace(/^[./\\'-]+|[./\\'_]+$/g, ''))
    .filter((token) => token !== '' && token !== '-' && token !== '–');
}

interface Reading {
  terms: QueryTerm[];
  year: ReadQuery['year'];
}

function readTokens(tokens: readonly string[], unfinished: boolean, dropFillers: boolean): Reading {
  const terms: QueryTerm[] = [];
  let year: ReadQuery['year'] = null;
  const plain = tokens.map(plainText);
  const speaksOfFuse = plain.some((token) => /^(?:fuse|fuses|breaker)$/.test(token));
  let waiting: { written: string; word: string }[] = [];
  const flush = (atEnd: boolean): void => {
    terms.push(...readWords(waiting, atEnd && unfinished, dropFillers));
    waiting = [];
  };
  for (let at = 0; at < tokens.length;) {
    const token = tokens[at] ?? '';
    const word = plain[at] ?? '';
    const cavity = readCavityAt(plain, at);
    if (cavity !== null) {
      flush(false);
      terms.push({
        kind: 'cavity',
        written: tokens.slice(at, at + cavity.length).join(' '),
        name: cavity.name,
        of: null,
      });
      at += cavity.length;
      continue;
    }
    const address = /^([a-z][a-z0-9]*(?:-[a-z0-9]+)*)\.([a-z0-9]{1,12}\+*|[+-])(?:~.*)?$/.exec(word);
    if (address?.[1] !== undefined && address[2] !== undefined) {
      flush(false);
      terms.push(
        ...readWords(
          plainWords(address[1]).map((part) => ({ written: part, word: part })),
          false,
          false,
        ),
      );
      terms.push({ kind: 'cavity', written: token, name: address[2], of: address[1] });
      at += 1;
      continue;
    }
    const colour = readColourAt(tokens, at);
    if (colour !== null) {
      flush(false);
      const written = tokens.slice(at, at + colour.length).join(' ');
      terms.push(
        colour.colours.length === 0
          ? { kind: 'no-colour', written }
          : {
              kind: 'colour',
              written,
              colours: colour.colours,
              words: isShortCode(word, colour) ? wordsFor(word) : [],
            },
      );
      at += colour.length;
      continue;
    }
    const size =
      sizePattern.exec(word) ?? (/^(?:mm2|mm|sq)$/.test(plain[at + 1] ?? '') ? sizePattern.exec(`${word}mm2`) : null);
    if (size?.[1] !== undefined) {
      flush(false);
      terms.push({ kind: 'size', written: token, squareMillimetres: Number(size[1].replace(',', '.')) });
      at += /^(?:mm2|mm|sq)$/.test(plain[at + 1] ?? '') ? 2 : 1;
      continue;
    }
    if (yearPattern.test(word) && year === null) {
      flush(false);
      year = { written: token, year: Number(word) };
      at += 1;
      continue;
    }
    const number = readNumber(word, speaksOfFuse, plain[at + 1] ?? '');
    if (number !== null) {
      const length = number.rating === 'surely' && unitWords.test(plain[at + 1] ?? '') ? 2 : 1;
      flush(false);
      terms.push({
        kind: 'number',
        written: tokens.slice(at, at + length).join(' '),
        ...number,
        last: unfinished && at === tokens.length - 1,
      });
      at += length;
      continue;
    }
    for (const part of word.match(/[a-z0-9]+/g) ?? []) {
      const numeric = readNumber(part, speaksOfFuse, '');
      if (numeric === null) waiting.push({ written: token, word: part });
      else {
        flush(false);
        terms.push({ kind: 'number', written: part, ...numeric, last: false });
      }
    }
    at += 1;
  }
  flush(true);
  return { terms, year };
}

/** `cavity 3`, `pin no 3`, `pin B`: how many tokens it takes, and the name; null where it is none. */
function readCavityAt(plain: readonly string[], at: number): { length: number; name: string } | null {
  if (!cavityMarkers.has(singular(plain[at] ?? ''))) return null;
  let next = at + 1;
  while (/^(?:no|number|nr)$/.test(plain[next] ?? '')) next += 1;
  const name = plain[next] ?? '';
  return /^(?:\d{1,3}[a-z]?|[a-z]|[a-z]\d{1,2})\+*$/.test(name) ? { length: next - at + 1, name } : null;
}

/** A number by itself or with its unit. A bare one below 5 before a single letter is a cavity before a colour: `3 W`. */
function readNumber(
  word: string,
  speaksOfFuse: boolean,
  following: string,
): Pick<Extract<QueryTerm, { kind: 'number' }>, 'name' | 'words' | 'rating'> | null {
  if (!/^(?:\d+(?:\.\d+)?[a-z]{0,2}|[a-z]{1,2}\d*)\+*$/.test(word) || /^[a-z]+$/.test(word)) return null;
  const attached = /^(\d+(?:\.\d+)?)(a|v|w|ah)$/.exec(word);
  if (attached?.[1] !== undefined && attached[2] !== undefined && (speaksOfFuse || !terminalWithLetter.has(word))) {
    return { name: attached[1], words: [word], rating: 'surely' };
  }
  if (!/^[\d.]+$/.test(word)) return { name: word, words: [word], rating: 'no' };
  if (unitWords.test(following) && (following.length > 1 || Number(word) >= 5)) {
    return { name: word, words: [word + unitOf(following)], rating: 'surely' };
  }
  return speaksOfFuse
    ? { name: word, words: [`${word}a`, word], rating: 'maybe' }
    : { name: word, words: [word], rating: 'no' };
}

function unitOf(written: string): string {
  return written === 'ah' ? 'ah' : written.charAt(0);
}

/** True where the letters of a code may as well be a word: `sw` is black, and short for switch. */
function isShortCode(word: string, { length, colours }: ColourFound): boolean {
  return length === 1 && /^[a-z]{1,3}$/.test(word) && colours.every(({ tracer }) => tracer !== 'any');
}

/** The words that will do for one word: itself, and the concept that it names. */
function wordsFor(word: string): string[] {
  return [singular(word), ...findConcepts([singular(word)]).map(({ concept }) => concept)];
}

function readWords(
  words: readonly { readonly written: string; readonly word: string }[],
  endsQuery: boolean,
  dropFillers: boolean,
): QueryTerm[] {
  const kept = words.map(({ written, word }) => ({
    written,
    word: singular(word),
    filler: fillerWords.has(word) || fillerWords.has(singular(word)),
  }));
  const terms: QueryTerm[] = [];
  const concepts = findConcepts(kept.map(({ word }) => word));
  let at = 0;
  const take = (until: number): void => {
    for (; at < until; at += 1) {
      const entry = kept[at];
      if (entry === undefined || (dropFillers && entry.filler)) continue;
      const last = endsQuery && at === kept.length - 1;
      if (last && dropFillers && entry.word.length === 1) continue;
      terms.push({ kind: 'word', written: entry.word, words: [entry.word], single: entry.word, last });
    }
  };
  for (const { start, length, concept } of concepts) {
    take(start);
    const named = kept.slice(start, start + length).map(({ word }) => word);
    const single = length === 1 ? (named[0] ?? null) : null;
    terms.push({
      kind: 'word',
      written: named.join(' '),
      words: single === null ? [concept] : [single, concept],
      single,
      last: endsQuery && start + length === kept.length,
    });
    at = start + length;
  }
  take(kept.length);
  return terms;
}
