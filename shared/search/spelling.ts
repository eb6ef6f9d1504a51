/** How many slips a word of this length is forgiven: none below five letters, and none where it has a digit or a slash. */
export function slipsForgiven(word: string): number {
  if (word.length < 5 || /[^a-z]/.test(word)) return 0;
  return word.length < 10 ? 1 : 2;
}

/**
 * How many slips lie between two words, where a letter left out, put in, changed, or two neighbours swapped is one slip.
 * Gives `most + 1` as soon as there are more than `most`.
 */
export function slipsBetween(a: string, b: string, most: number): number {
  if (Math.abs(a.length - b.length) > most) return most + 1;
  let before: number[] = [];
  let previous = Array.from({ length: b.length + 1 }, (_, index) => index);
  for (let i = 1; i <= a.length; i += 1) {
    const row = [i];
    let least = i;
    for (let j = 1; j <= b.length; j += 1) {
      const same = a[i - 1] === b[j - 1];
      let slips = Math.min((previous[j] ?? 0) + 1, (row[j - 1] ?? 0) + 1, (previous[j - 1] ?? 0) + (same ? 0 : 1));
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        slips = Math.min(slips, (before[j - 2] ?? 0) + 1);
      row.push(slips);
      least = Math.min(least, slips);
    }
    if (least > most) return most + 1;
    before = previous;
    previous = row;
  }
  return Math.min(previous[b.length] ?? 0, most + 1);
}

/** The word with each pair of neighbouring letters swapped, one pair at a time: what `neutrla` may have been. */
export function swapped(word: string): string[] {
  const variants: string[] = [];
  for (let at = 0; at + 1 < word.length; at += 1) {
    if (word[at] !== word[at + 1])
      variants.push(word.slice(0, at) + (word[at + 1] ?? '') + (word[at] ?? '') + word.slice(at + 2));
  }
  return variants;
}
