const nothingPattern = /^[-–—]?$/;

/** True where a cell says nothing: it is empty or a dash. */
export function saysNothing(cell: string): boolean {
  return nothingPattern.test(cell.trim());
}

/** A cell's text, without white space at its ends and without the backquotes of a code span round all of it. */
export function plainCell(cell: string): string {
  const trimmed = cell.trim();
  const code = /^(`+)([^`]+)\1$/.exec(trimmed);
  return (code?.[2] ?? trimmed).trim();
}

/** A cell's text, or null where it says nothing. */
export function cellText(cell: string): string | null {
  const text = plainCell(cell);
  return saysNothing(text) ? null : text;
}

/** The names in a cell or an attribute with commas or semicolons between them. */
export function namesIn(text: string): readonly string[] {
  return text
    .split(/[,;]/)
    .map((name) => name.trim())
    .filter((name) => name !== '');
}
