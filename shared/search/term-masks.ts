import type { LinesIndex } from './lines-index.ts';
import type { ColourWanted } from './read-colour-query.ts';
import type { QueryTerm } from './read-query.ts';
import { slipsBetween, slipsForgiven, swapped } from './spelling.ts';
import { lettersOf, wordsBeginning } from './vocabulary.ts';

/**
 * Which terms each dictionary entry of an index answers, a bit a term: the low half for any answer, the high half where
 * it is said exactly so. With these a line is looked at by a few look-ups and an `or`.
 */
export interface TermMasks {
  /** Texts of the vocabulary, in its one row. */
  readonly texts: Int32Array;
  /** Texts that say the other side of what a term says: right for left, rear for front. */
  readonly against: Int32Array;
  /** Cavities' names, by their place among the names. */
  readonly cavities: Int32Array;
  /** Terminals that lines lead to, by their place among those of the ends. */
  readonly terminals: Int32Array;
  readonly colours: Int32Array;
  readonly sizes: Int32Array;
  /** What was made of the words: a slip mended, a word that nothing says. */
  readonly mended: readonly { readonly written: string; readonly word: string }[];
  /** Terms, by number, that nothing in the index answers. */
  readonly unanswered: ReadonlySet<number>;
}

/** How far the bit of an exact answer stands above the bit of any answer. */
export const exactShift = 15;

/** Finds what each term of a query can mean in an index. */
export function maskTerms(index: LinesIndex, terms: readonly QueryTerm[]): TermMasks {
  const texts = new Int32Array(index.vocabulary.count);
  const against = new Int32Array(index.vocabulary.count);
  const cavities = new Int32Array(index.names.length);
  const terminals = new Int32Array(index.endTerminals.values.length);
  const colours = new Int32Array(index.colours.length);
  const sizes = new Int32Array(index.sizes.values.length);
  const mended: { written: string; word: string }[] = [];
  const unanswered = new Set<number>();
  terms.forEach((term, number) => {
    const any = 1 << number;
    const exact = any | (1 << (number + exactShift));
    let answered = false;
    const mark = (words: readonly string[], best: boolean): boolean => {
      const found = markWords(index, texts, words, any, best ? exact : any);
      answered ||= found;
      return found;
    };
    const markPlaces = (name: string): boolean => {
      const inCavities = markCavities(index, cavities, name, exact);
      return markTerminals(index, terminals, name, exact) || inCavities;
    };
    switch (term.kind) {
      case 'colour':
        answered = markColours(index, colours, term.colours, any, exact);
        if (term.words.length > 0) {
          mark(term.words, true);
          answered = markCavities(index, cavities, term.words[0] ?? '', exact) || answered;
        }
        break;
      case 'cavity':
        answered = markPlaces(term.name);
        break;
      case 'number': {
        if (term.rating !== 'surely') answered = markPlaces(term.name);
        mark(term.words, true);
        if (/^\d+\.\d+$/.test(term.name)) answered = markSizes(index, sizes, Number(term.name), exact) || answered;
        if (term.last && /^[a-z]{2}/.test(term.name)) mark(wordsBeginning(index.vocabulary, term.name), false);
        break;
      }
      case 'size':
        answered = markSizes(index, sizes, term.squareMillimetres, exact);
        break;
      case 'word': {
        const { single } = term;
        mark(term.words, true);
        markWords(index, against, oppositesOf(term.words), any, any);
        if (single !== null && term.last && single.length >= 2) mark(wordsBeginning(index.vocabulary, single), false);
        if (answered || single === null) break;
        for (const word of wordsLike(index, single)) {
          if (mark([word], false)) mended.push({ written: term.written, word });
        }
        break;
      }
      case 'no-colour':
        break;
    }
    if (!answered) unanswered.add(number);
  });
  return { texts, against, cavities, terminals, colours, sizes, mended, unanswered };
}

const opposites: ReadonlyMap<string, string> = new Map([
  ['~left', '~right'],
  ['~right', '~left'],
  ['~front', '~rear'],
  ['~rear', '~front'],
]);

function oppositesOf(words: readonly string[]): readonly string[] {
  return words.map((word) => opposites.get(word)).filter((word) => word !== undefined);
}

function markWords(
  { vocabulary }: LinesIndex,
  texts: Int32Array,
  words: readonly string[],
  weak: number,
  strong: number,
): boolean {
  let found = false;
  for (const word of words) {
    for (const posting of vocabulary.postings.get(word) ?? []) {
      texts[posting >> 1] = (texts[posting >> 1] ?? 0) | ((posting & 1) === 1 ? strong : weak);
      found = true;
    }
  }
  return found;
}

/** Words of the index that differ from one by the slips it is forgiven: swapped neighbours first, else the fewest slips. */
function wordsLike({ vocabulary }: LinesIndex, word: string): readonly string[] {
  let fewest = slipsForgiven(word);
  if (fewest === 0) return [];
  const swaps = swapped(word).filter((variant) => vocabulary.postings.has(variant));
  if (swaps.length > 0) return swaps;
  const letters = lettersOf(word);
  let likely: string[] = [];
  vocabulary.words.forEach((candidate, place) => {
    if (candidate.length < 4 || Math.abs(candidate.length - word.length) > fewest) return;
    // Each slip changes at most one letter into another: two bits.
    if (bitCount(letters ^ (vocabulary.letters[place] ?? 0)) > 2 * fewest) return;
    const slips = slipsBetween(word, candidate, fewest);
    if (slips > fewest || /\d/.test(candidate)) return;
    if (slips < fewest) likely = [];
    fewest = slips;
    likely.push(candidate);
  });
  return likely;
}

/** How many bits of a 32-bit number are set. */
export function bitCount(bits: number): number {
  let pairs = bits - ((bits >>> 1) & 0x55555555);
  pairs = (pairs & 0x33333333) + ((pairs >>> 2) & 0x33333333);
  return (((pairs + (pairs >>> 4)) & 0x0f0f0f0f) * 0x01010101) >>> 24;
}

function markCavities({ cavities }: LinesIndex, masks: Int32Array, wanted: string, bits: number): boolean {
  const places = cavities.get(wanted) ?? [];
  for (const place of places) masks[place] = (masks[place] ?? 0) | bits;
  return places.length > 0;
}

function markTerminals({ endTerminals }: LinesIndex, masks: Int32Array, wanted: string, bits: number): boolean {
  let found = false;
  endTerminals.values.forEach((terminal, place) => {
    if (terminal.toLowerCase() !== wanted) return;
    masks[place] = (masks[place] ?? 0) | bits;
    found = true;
  });
  return found;
}

function markColours(
  { colours }: LinesIndex,
  masks: Int32Array,
  wanted: readonly ColourWanted[],
  any: number,
  exact: number,
): boolean {
  let found = false;
  colours.forEach((colour, place) => {
    if (colour === null) return;
    for (const { base, tracer } of colour.readings) {
      for (const one of wanted) {
        if (one.base !== 'any' && one.base !== base) continue;
        if (one.tracer !== 'any' && one.tracer !== tracer) continue;
        const best = one.tracer !== 'any' || tracer === null;
        masks[place] = (masks[place] ?? 0) | (best ? exact : any);
        found = true;
      }
    }
  });
  return found;
}

function markSizes({ sizes }: LinesIndex, masks: Int32Array, wanted: number, bits: number): boolean {
  let found = false;
  sizes.values.forEach((written, place) => {
    const number = /^\d+(?:\.\d+)?(?=\s*(?:mm²|mm2|mm)?$)/.exec(written)?.[0];
    if (number === undefined || Number(number) !== wanted) return;
    masks[place] = (masks[place] ?? 0) | bits;
    found = true;
  });
  return found;
}
