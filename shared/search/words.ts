import { conceptsWithin, findConcepts } from './concepts.ts';

/** Letters that do not come apart into a plain letter and an accent. */
const plainLetters: Readonly<Record<string, string>> = {
  ø: 'o',
  æ: 'ae',
  œ: 'oe',
  ß: 'ss',
  ł: 'l',
  đ: 'd',
  þ: 'th',
  ð: 'd',
};

/** Lower case without accents, so that `Sørvik` and `sorvik` are one; `mm²` becomes `mm2`. */
export function plainText(text: string): string {
  // Most text is plain already.
  if (!/[^\x00-\x7f]/.test(text)) return text.toLowerCase();
  return text
    .normalize('NFKD')
    .replace(/\p{M}+/gu, '')
    .toLowerCase()
    .replace(/[øæœßłđþð]/gu, (letter) => plainLetters[letter] ?? letter);
}

/** A plain word without the `s` of its plural, where it is long enough for that to be one: `fuses` is `fuse`. */
export function singular(word: string): string {
  if (word.length < 4 || !word.endsWith('s') || word.endsWith('ss') || word.endsWith('us')) return word;
  if (word.endsWith('ies') && word.length > 4) return `${word.slice(0, -3)}y`;
  if (/(?:ch|sh|x|ss)es$/.test(word)) return word.slice(0, -2);
  return word.slice(0, -1);
}

const runPattern = /[a-z0-9]+(?:[-/.+'][a-z0-9]+)*/g;
const namePattern = /^([a-z]{2,})(\d{2,})$/;

/** The plain words of a text in order, compounds taken apart, plurals undone. */
export function plainWords(text: string): string[] {
  return (plainText(text).match(/[a-z0-9]+/g) ?? []).map(singular);
}

/** What a text can be found by. */
export interface FindableWords {
  /** What it says itself: its words, and the concepts that they make together. */
  readonly strong: readonly string[];
  /** What is only part of that: words and concepts inside a longer name, compounds joined, names taken apart. */
  readonly weak: readonly string[];
  /** How many things it says: a concept's words together are one. */
  readonly units: number;
}

/**
 * Reads what a text can be found by: plain words; what the trade calls by several names as one concept; compounds joined
 * (`tell-tale` is `telltale` too, `Y/R` is `yr`, `15 A` is `15a`); a name of letters and digits taken apart (`qf550` is
 * `qf` and `550`).
 */
export function findableWords(text: string): FindableWords {
  const weak: string[] = [];
  const words: string[] = [];
  for (const [run] of plainText(text).matchAll(runPattern)) {
    // The halves of a decimal are no numbers of their own.
    const parts = /^\d+\.\d+$/.test(run) ? [run] : run.split(/[-/.+']/).map(singular);
    words.push(...parts);
    if (parts.length > 1 && parts.length < 4) weak.push(parts.join(''));
    for (const part of parts) {
      const name = namePattern.exec(part);
      if (name?.[1] !== undefined && name[2] !== undefined) weak.push(name[1], name[2]);
    }
  }
  words.forEach((word, at) => {
    const unit = words[at + 1] ?? '';
    if (/^[\d.]+$/.test(word) && /^(?:a|v|w|ah)$/.test(unit)) weak.push(word + unit);
  });
  const strong: string[] = [];
  let units = words.length;
  let at = 0;
  for (const { start, length, concept } of findConcepts(words)) {
    strong.push(...words.slice(at, start), concept);
    (length === 1 ? strong : weak).push(...words.slice(start, start + length));
    units -= length - 1;
    at = start + length;
  }
  strong.push(...words.slice(at));
  weak.push(...conceptsWithin(words).filter((concept) => !strong.includes(concept)));
  return { strong, weak, units };
}
