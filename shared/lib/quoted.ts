/** The longest that a quotation in a sentence is. */
const longest = 60;

/** A text as a sentence may hold it: on one line, and cut where it is longer than 60 characters. */
export function shortened(text: string): string {
  const line = text.slice(0, 4 * longest).replace(/\s+/g, ' ');
  const characters = [...line];
  return characters.length > longest || text.length > 4 * longest ? `${characters.slice(0, longest).join('')}…` : line;
}

/** A text that somebody wrote, in quotation marks and no longer than a sentence can bear. */
export function quoted(text: string): string {
  return `“${shortened(text)}”`;
}
