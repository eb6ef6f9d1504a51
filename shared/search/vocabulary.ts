import { findableWords } from './words.ts';

/** The texts of an index by where they stand, each list in the order of its dictionary. */
export interface VocabularyTexts {
  readonly subjects: readonly string[];
  readonly pages: readonly string[];
  readonly holders: readonly string[];
  readonly zones: readonly string[];
  readonly names: readonly string[];
  readonly texts: readonly string[];
  readonly details: readonly string[];
  readonly ends: readonly string[];
}

/** Where a text of the index stands. */
export type TextPlace = keyof VocabularyTexts;

/**
 * Every word of an index with the texts that have it. All texts are numbered in one row, place after place, so that one
 * array of masks answers for them all.
 */
export interface Vocabulary {
  /** Where each place's texts begin in the one row. */
  readonly offsets: Readonly<Record<TextPlace, number>>;
  readonly count: number;
  /** How many things each text says. */
  readonly units: Uint8Array;
  /** The texts that have a word: twice its number, and one more where the word is the text's own and not part of a name. */
  readonly postings: ReadonlyMap<string, readonly number[]>;
  /** All words in order, concepts left out: for prefixes and for slips. */
  readonly words: readonly string[];
  /** The letters that each word has, a bit a letter: words that share too few cannot be each other's slips. */
  readonly letters: Int32Array;
}

const order = [
  'subjects',
  'pages',
  'holders',
  'zones',
  'names',
  'texts',
  'details',
  'ends',
] as const satisfies readonly TextPlace[];

/** Reads every text of an index once. */
export function createVocabulary(texts: VocabularyTexts): Vocabulary {
  const offsets: Record<TextPlace, number> = {
    subjects: 0,
    pages: 0,
    holders: 0,
    zones: 0,
    names: 0,
    texts: 0,
    details: 0,
    ends: 0,
  };
  const read = new Map<string, ReturnType<typeof findableWords>>();
  const postings = new Map<string, number[]>();
  const all: string[] = [];
  for (const place of order) {
    offsets[place] = all.length;
    all.push(...texts[place]);
  }
  const units = new Uint8Array(all.length);
  all.forEach((text, number) => {
    if (text === '') return;
    let words = read.get(text);
    if (words === undefined) {
      words = findableWords(text);
      read.set(text, words);
    }
    units[number] = Math.min(255, words.units);
    // A subject is called by its own name: `Reg-35` is not every regulator.
    const isName = number >= offsets.subjects && number < offsets.subjects + texts.subjects.length;
    const strong = new Set(words.strong.filter((word) => !isName || !word.startsWith('~')));
    for (const word of strong) add(postings, word, number * 2 + 1);
    for (const word of new Set(words.weak))
      if (!strong.has(word) && !(isName && word.startsWith('~'))) add(postings, word, number * 2);
  });
  const words = [...postings.keys()].filter((word) => !word.startsWith('~')).sort();
  return { offsets, count: all.length, units, postings, words, letters: Int32Array.from(words, lettersOf) };
}

/** The letters of a word, a bit a letter; digits have none. */
export function lettersOf(word: string): number {
  let letters = 0;
  for (let at = 0; at < word.length; at += 1) {
    const letter = word.charCodeAt(at) - 97;
    if (letter >= 0 && letter < 26) letters |= 1 << letter;
  }
  return letters;
}

function add(postings: Map<string, number[]>, word: string, posting: number): void {
  const list = postings.get(word);
  if (list === undefined) postings.set(word, [posting]);
  else list.push(posting);
}

/** The words that begin so, in order. */
export function wordsBeginning({ words }: Vocabulary, beginning: string): readonly string[] {
  let low = 0;
  let high = words.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((words[middle] ?? '') < beginning) low = middle + 1;
    else high = middle;
  }
  let end = low;
  while (words[end]?.startsWith(beginning) === true) end += 1;
  return words.slice(low, end);
}
