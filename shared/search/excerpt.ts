import { findableWords, singular, plainText } from './words.ts';

const before = 60;
const most = 190;

/**
 * The words of a text around the first of those that were looked for, at most some 190 characters, with an ellipsis
 * where it was cut. Null where the text is empty.
 */
export function excerptOf(text: string, looked: readonly string[]): string | null {
  const line = text.replace(/\s+/g, ' ').trim();
  if (line === '') return null;
  const at = placeOf(line, new Set(looked));
  const start = at <= before ? 0 : line.indexOf(' ', at - before) + 1;
  const rest = line.slice(start);
  const end = rest.length <= most ? rest.length : rest.lastIndexOf(' ', most);
  return `${start > 0 ? '… ' : ''}${rest.slice(0, end < 1 ? most : end)}${end < rest.length ? ' …' : ''}`;
}

/** Where the first word stands that was looked for itself, or that names what was looked for; 0 where none does. */
function placeOf(line: string, looked: ReadonlySet<string>): number {
  for (const word of line.matchAll(/[\p{L}\p{N}]+/gu)) {
    if (looked.has(singular(plainText(word[0])))) return word.index;
  }
  for (const pair of line.matchAll(/[\p{L}\p{N}]+[ -][\p{L}\p{N}]+/gu)) {
    if (findableWords(pair[0]).strong.some((concept) => looked.has(concept))) return pair.index;
  }
  return 0;
}
