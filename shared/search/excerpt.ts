import { findConcepts } from './concepts.ts';
import { plainText, singular } from './words.ts';

const before = 60;
const most = 190;

/**
 * The words of a text around the first of those that were looked for, at most some 190 characters, with an ellipsis
 * where it was cut. Null where the text is empty.
 * @param looked plain words and concepts
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
  const words: string[] = [];
  const places: number[] = [];
  for (const word of line.matchAll(/[\p{L}\p{N}]+/gu)) {
    const plain = singular(plainText(word[0]));
    if (looked.has(plain)) return word.index;
    words.push(plain);
    places.push(word.index);
  }
  const named = findConcepts(words).find(({ concept }) => looked.has(concept));
  return named === undefined ? 0 : (places[named.start] ?? 0);
}
