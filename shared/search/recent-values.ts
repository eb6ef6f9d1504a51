/**
 * Writes numbers as what changed: 0 where a number is as it last was in its context, else the number and one more. A
 * circuit mostly has the colour that it had a line or a model ago, so that such a column is nearly all zeros.
 */
export function asRecent(numbers: readonly number[], contexts: ArrayLike<number>): number[] {
  const recent = new Map<number, number>();
  return numbers.map((number, at) => {
    const context = contexts[at] ?? 0;
    const same = recent.get(context) === number;
    recent.set(context, number);
    return same ? 0 : number + 1;
  });
}

/** Reads back what `asRecent` wrote, with the same contexts. */
export function fromRecent(written: Uint32Array, contexts: ArrayLike<number>): Uint32Array {
  const recent = new Map<number, number>();
  return written.map((code, at) => {
    const context = contexts[at] ?? 0;
    const number = code === 0 ? (recent.get(context) ?? 0) : code - 1;
    if (code !== 0) recent.set(context, number);
    return number;
  });
}

/** One context of two: so that each pair is its own. The second must be below 65,536. */
export function bothOf(first: ArrayLike<number>, second: ArrayLike<number>): Float64Array {
  return Float64Array.from({ length: first.length }, (_, at) => (first[at] ?? 0) * 65_536 + (second[at] ?? 0));
}

/** Each number as often as the counts say: a line's context for each of its ends. */
export function repeated(numbers: ArrayLike<number>, counts: ArrayLike<number>): Float64Array {
  const all: number[] = [];
  for (let at = 0; at < counts.length; at += 1) {
    for (let time = counts[at] ?? 0; time > 0; time -= 1) all.push(numbers[at] ?? 0);
  }
  return Float64Array.from(all);
}
