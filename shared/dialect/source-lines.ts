/** A page's text by its lines. */
export interface SourceLines {
  /** The lines without their line breaks. */
  readonly lines: readonly string[];
  /** Where each line begins in the text. */
  readonly offsets: readonly number[];
}

/** Divides a text at its line breaks (`\n`, `\r\n`, `\r`). */
export function sourceLines(text: string): SourceLines {
  const lines: string[] = [];
  const offsets: number[] = [];
  let start = 0;
  for (const { 0: ending, index } of text.matchAll(/\r\n|\n|\r/g)) {
    lines.push(text.slice(start, index));
    offsets.push(start);
    start = index + ending.length;
  }
  lines.push(text.slice(start));
  offsets.push(start);
  return { lines, offsets };
}

/** Some lines of a text, counted from 1, both ends included, without the signs of quotes and lists that stand before a column. */
export function linesBetween(source: SourceLines, first: number, last: number, column: number): readonly string[] {
  return source.lines.slice(first - 1, Math.max(first - 1, last)).map((line) => withoutSigns(line, column));
}

/** A line without what stands before a column (from 1), as far as that is white space or the signs of quotes. */
function withoutSigns(line: string, column: number): string {
  let at = 0;
  while (at < column - 1 && ' \t>'.includes(line.charAt(at)) && at < line.length) at += 1;
  return line.slice(at);
}
