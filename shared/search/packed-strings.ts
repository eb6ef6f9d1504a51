import { createDictionary } from './dictionary.ts';
import { packNumbers, unpackNumbers, type PackedNumbers } from './packed-numbers.ts';
import { asRecent, fromRecent } from './recent-values.ts';

/** A column of short texts: each different text once, and the column of their places. */
export interface PackedStrings {
  /** The different texts, each on a line of its own. */
  readonly values: string;
  readonly places: PackedNumbers;
}

/** A column of short texts, unpacked. */
export interface StringColumn {
  readonly values: readonly string[];
  readonly places: Uint32Array;
}

/** A text on one line, for lines are what divides them. */
export function onOneLine(text: string): string {
  return text.replace(/\s+/g, ' ').trim();
}

/**
 * Packs texts; line breaks in them become spaces.
 * @param first texts that come first in any case, such as the empty one
 * @param contexts what each text is likely to depend on: one that is as it last was in its context costs next to nothing
 */
export function packStrings(
  texts: readonly string[],
  first: readonly string[] = [],
  contexts: ArrayLike<number> | null = null,
): PackedStrings {
  const builder = createDictionary(first);
  const lines = texts.map(onOneLine);
  for (const line of lines) builder.add(line);
  const { values, placeOf } = builder.finish();
  const places = lines.map(placeOf);
  return { values: values.join('\n'), places: packNumbers(contexts === null ? places : asRecent(places, contexts)) };
}

/** Unpacks a column of so many texts, with the contexts that it was packed with. */
export function unpackStrings(
  { values, places }: PackedStrings,
  count: number,
  contexts: ArrayLike<number> | null = null,
): StringColumn {
  const unpacked = unpackNumbers(places, count);
  return { values: values.split('\n'), places: contexts === null ? unpacked : fromRecent(unpacked, contexts) };
}

/** The place of each text of a column that is packed in the same way: what a context is made of. */
export function placesIn(texts: readonly string[], first: readonly string[] = []): Uint32Array {
  return unpackStrings(packStrings(texts, first), texts.length).places;
}
