/** Collects values and gives each its place, the most frequent first, so that a column of places is mostly small numbers. */
export interface DictionaryBuilder {
  add(value: string): void;
  /** The values in their order, and each one's place. */
  finish(): { readonly values: readonly string[]; placeOf(value: string): number };
}

/** Makes a dictionary; the values of `first` come first in any case. */
export function createDictionary(first: readonly string[] = []): DictionaryBuilder {
  const counts = new Map<string, number>();
  return {
    add(value) {
      counts.set(value, (counts.get(value) ?? 0) + 1);
    },
    finish() {
      const frequent = [...counts]
        .filter(([value]) => !first.includes(value))
        .sort(([a, countA], [b, countB]) => countB - countA || (a < b ? -1 : a > b ? 1 : 0))
        .map(([value]) => value);
      const values = [...first, ...frequent];
      const places = new Map(values.map((value, place) => [value, place]));
      return {
        values,
        placeOf(value) {
          const place = places.get(value);
          if (place === undefined) throw new Error(`not in the dictionary: ${value}`);
          return place;
        },
      };
    },
  };
}
