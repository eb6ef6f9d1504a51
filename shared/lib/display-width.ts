const zeroWidth = /[\p{M}\p{Cf}]/u;
/** East Asian wide and fullwidth letters, and pictographs; what is only ambiguous, like ●, is one column wide. */
const wide =
  /[\u1100-\u115F\u2E80-\u303E\u3041-\uA4CF\uA960-\uA97C\uAC00-\uD7A3\uF900-\uFAFF\uFE30-\uFE6F\uFF00-\uFF60\uFFE0-\uFFE6\u{1F300}-\u{1FAFF}\u{20000}-\u{3FFFD}]/u;

/** How many columns a text takes in a fixed-width font. */
export function displayWidth(text: string): number {
  let width = 0;
  for (const character of text) {
    if (!zeroWidth.test(character)) width += wide.test(character) ? 2 : 1;
  }
  return width;
}

/** Fills a text with spaces up to a number of columns; one that is wider stays as it is. */
export function padToWidth(text: string, columns: number, side: 'left' | 'right' | 'center' = 'left'): string {
  const missing = Math.max(0, columns - displayWidth(text));
  if (side === 'right') return ' '.repeat(missing) + text;
  if (side === 'left') return text + ' '.repeat(missing);
  const before = Math.floor(missing / 2);
  return ' '.repeat(before) + text + ' '.repeat(missing - before);
}
