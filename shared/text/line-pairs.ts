import type { TextLine } from './text-line.ts';
import { wordsOf } from './word-difference.ts';

/** Pairs that are weighed in one stretch of changed lines; more, and only rows with one key are paired. */
const mostWeighedPairs = 10_000;
/** The least share of words in common at which two lines count as one line changed. */
const leastLikeness = 0.5;

/** How alike two lines are, as far as the words go: 0 nothing in common, 1 the same words. */
function likenessOf(from: ReadonlyMap<string, number>, to: ReadonlyMap<string, number>): number {
  let common = 0;
  let all = 0;
  for (const count of from.values()) all += count;
  for (const [word, count] of to) {
    all += count;
    common += Math.min(count, from.get(word) ?? 0);
  }
  return all === 0 ? 0 : (2 * common) / all;
}

function countWords(line: TextLine): Map<string, number> {
  const counts = new Map<string, number>();
  for (const word of wordsOf(line.text)) {
    if (word.trim() !== '' && word !== '|') counts.set(word, (counts.get(word) ?? 0) + 1);
  }
  return counts;
}

/** A row's key is its first cell: the cavity, the id, the position. */
function haveOneKey(from: TextLine, to: TextLine): boolean {
  return from.table && to.table && (from.cells[0] ?? '') !== '' && from.cells[0] === to.cells[0];
}

/** Rows with one key, each to the next such row below the last pair: what remains affordable in a very long stretch. */
function pairByKey(from: readonly TextLine[], to: readonly TextLine[]): [number, number][] {
  const places = new Map<string, number[]>();
  to.forEach((line, index) => {
    const key = line.table ? (line.cells[0] ?? '') : '';
    if (key !== '') places.set(key, [...(places.get(key) ?? []), index].slice(0, 50));
  });
  const pairs: [number, number][] = [];
  let last = -1;
  from.forEach((line, index) => {
    const found = line.table ? places.get(line.cells[0] ?? '')?.find((place) => place > last) : undefined;
    if (found === undefined) return;
    pairs.push([index, found]);
    last = found;
  });
  return pairs;
}

/**
 * Which removed line became which added one, in a stretch of changed lines: the choice of pairs, none crossing another,
 * that are most alike together. A table's row keeps to the row with its key.
 * @returns pairs of indexes, ascending in both
 */
export function pairLines(from: readonly TextLine[], to: readonly TextLine[]): [number, number][] {
  if (from.length === 0 || to.length === 0) return [];
  if (from.length * to.length > mostWeighedPairs) return pairByKey(from, to);
  const fromWords = from.map(countWords);
  const toWords = to.map(countWords);
  const weightOf = (i: number, j: number): number => {
    const [one, other] = [from[i], to[j]];
    const [oneWords, otherWords] = [fromWords[i], toWords[j]];
    if (!one || !other || !oneWords || !otherWords || one.table !== other.table) return 0;
    const likeness = likenessOf(oneWords, otherWords);
    if (haveOneKey(one, other)) return 1 + likeness;
    return likeness >= leastLikeness ? likeness : 0;
  };
  const weights = from.map((_, i) => to.map((__, j) => weightOf(i, j)));
  const width = to.length + 1;
  const best = new Float64Array((from.length + 1) * width);
  const bestAt = (i: number, j: number): number => best[i * width + j] ?? 0;
  for (let i = from.length - 1; i >= 0; i -= 1) {
    for (let j = to.length - 1; j >= 0; j -= 1) {
      const weight = weights[i]?.[j] ?? 0;
      const paired = weight > 0 ? weight + bestAt(i + 1, j + 1) : 0;
      best[i * width + j] = Math.max(paired, bestAt(i + 1, j), bestAt(i, j + 1));
    }
  }
  const pairs: [number, number][] = [];
  let i = 0;
  let j = 0;
  while (i < from.length && j < to.length) {
    const weight = weights[i]?.[j] ?? 0;
    if (weight > 0 && bestAt(i, j) === weight + bestAt(i + 1, j + 1)) {
      pairs.push([i, j]);
      i += 1;
      j += 1;
    } else if (bestAt(i, j) === bestAt(i + 1, j)) i += 1;
    else j += 1;
  }
  return pairs;
}
