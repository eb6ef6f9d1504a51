import { displayWidth, padToWidth } from '../lib/display-width.ts';
import type { ColumnAlignment, SourceTable, SourceTableRow } from './source-table.ts';

const delimiterCell = /^:?-+:?$/;
/** What ends a table besides an empty line: a directive's fence, a quote, a heading, a code fence, a list, a rule. */
const otherBlock =
  /^(?: {0,3}(?::{3,}|>|#{1,6}(?:\s|$)|`{3,}|~{3,}|[-*+]\s|1[.)]\s)|\s*(?:(?:\*\s*){3,}|(?:_\s*){3,})$)/;

/**
 * Reads the first GFM table in a source text; null where it has none. Cells are their source text, trimmed, with `\|`
 * undone to `|` (inside code spans too, where a bare pipe also divides cells, as GFM has it).
 * @param firstLine the page's line on which the text begins, counted from 1
 */
export function parseTable(text: string, firstLine: number): SourceTable | null {
  const lines = text.split(/\r\n|\n|\r/);
  for (let at = 0; at + 1 < lines.length; at += 1) {
    const heading = lines[at] ?? '';
    const delimiter = lines[at + 1] ?? '';
    if (heading.trim() === '' || !delimiter.includes('-') || !`${heading}${delimiter}`.includes('|')) continue;
    const headings = splitRow(heading);
    const alignments = readDelimiter(delimiter);
    if (alignments === null || alignments.length !== headings.length) continue;
    const rows = readRows(lines, at + 2, headings.length, firstLine);
    const table = { headings, rows, line: firstLine + at };
    return alignments.every((alignment) => alignment === null) ? table : { ...table, alignments };
  }
  return null;
}

function readRows(
  lines: readonly string[],
  from: number,
  columns: number,
  firstLine: number,
): readonly SourceTableRow[] {
  const rows: SourceTableRow[] = [];
  for (let at = from; at < lines.length; at += 1) {
    const line = lines[at] ?? '';
    if (line.trim() === '' || otherBlock.test(line)) break;
    const cells = [...splitRow(line)];
    while (cells.length < columns) cells.push('');
    rows.push({ cells, line: firstLine + at });
  }
  return rows;
}

function readDelimiter(line: string): readonly ColumnAlignment[] | null {
  const cells = splitRow(line);
  return cells.every((cell) => delimiterCell.test(cell)) ? cells.map(alignmentOf) : null;
}

function alignmentOf(cell: string): ColumnAlignment {
  const left = cell.startsWith(':');
  const right = cell.endsWith(':');
  if (left && right) return 'center';
  if (left) return 'left';
  return right ? 'right' : null;
}

/** Divides a row at its pipes that no backslash escapes; `\\` is a backslash by itself. */
function splitRow(line: string): readonly string[] {
  const text = line.trim();
  const cells: string[] = [];
  let from = text.startsWith('|') ? 1 : 0;
  for (let at = from; at < text.length; at += 1) {
    const character = text.charAt(at);
    if (character === '\\') {
      at += 1;
    } else if (character === '|') {
      cells.push(undoEscapes(text.slice(from, at)));
      from = at + 1;
    }
  }
  // What follows the last pipe is a cell only where something stands there.
  const last = undoEscapes(text.slice(from));
  if (last !== '' || cells.length === 0) cells.push(last);
  return cells;
}

function undoEscapes(cell: string): string {
  const trimmed = cell.trim();
  return trimmed.includes('\\|')
    ? trimmed.replace(/\\([\\|])/g, (pair, escaped: string) => (escaped === '|' ? '|' : pair))
    : trimmed;
}

/**
 * Writes a table as source text with its columns aligned by display width, one line a row, without a last line break.
 * Pipes inside cells are escaped; cells beyond the headings are kept.
 */
export function formatTable({ headings, rows, alignments = [] }: SourceTable): string {
  const body = [headings, ...rows.map(({ cells }) => cells)].map((cells) => cells.map(escapePipes));
  const columns = body.reduce((most, cells) => Math.max(most, cells.length), 0);
  const widths = Array.from({ length: columns }, (_, column) =>
    body.reduce((most, cells) => Math.max(most, displayWidth(cells[column] ?? '')), 3),
  );
  const delimiter = headings.map((_, column) => delimiterOf(alignments[column] ?? null, widths[column] ?? 3));
  const [heading = [], ...rest] = body.map((cells) =>
    cells.map((cell, column) => padToWidth(cell, widths[column] ?? 0, alignments[column] ?? 'left')),
  );
  return [heading, delimiter, ...rest].map((cells) => `| ${cells.join(' | ')} |`).join('\n');
}

function delimiterOf(alignment: ColumnAlignment, width: number): string {
  const left = alignment === 'left' || alignment === 'center' ? ':' : '';
  const right = alignment === 'right' || alignment === 'center' ? ':' : '';
  return `${left}${'-'.repeat(Math.max(1, width - left.length - right.length))}${right}`;
}

function escapePipes(cell: string): string {
  return cell.replace(/\|/g, '\\|');
}
