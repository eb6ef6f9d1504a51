/** A line of a Markdown text as a comparison sees it. */
export interface TextLine {
  /** What is compared and shown: the line as written; a table row's cells joined by ` | `, without their padding. */
  readonly text: string;
  readonly table: boolean;
  /** A table row's cells; empty for any other line. */
  readonly cells: readonly string[];
}

/** The cells of a table row, trimmed; `\|` is part of a cell. */
function cellsOf(row: string): string[] {
  const inner = row
    .trim()
    .replace(/^\|/, '')
    .replace(/(?<!\\)\|$/, '');
  return inner.split(/(?<!\\)\|/).map((cell) => cell.trim());
}

/** The row under a table's headings says the same however many dashes it is drawn with. */
function shortenRule(cell: string): string {
  return /^:?-+:?$/.test(cell) ? cell.replace(/-+/, '---') : cell;
}

/**
 * Divides a text into lines at `\n`. A line that begins with `|` is a table's row: padding cells so that columns
 * align is no change, so its cells stand without it. An empty text has no lines.
 */
export function readTextLines(text: string): TextLine[] {
  if (text === '') return [];
  return text.split('\n').map((line) => {
    if (!/^\s*\|/.test(line)) return { text: line, table: false, cells: [] };
    const cells = cellsOf(line).map(shortenRule);
    return { text: cells.join(' | '), table: true, cells };
  });
}
