import type { Block } from '../blocks/block.ts';
import { linesOf } from '../blocks/lines.ts';
import { isContainerName } from './block-names.ts';
import type { SourceLines } from './source-lines.ts';
import { isDelimiterRow } from './table-shape.ts';

/** A text whose blocks have tables with empty rows, and which rows were emptied. */
export interface SparedText {
  readonly markdown: string;
  /** Line numbers, counted from 1. */
  readonly rows: ReadonlySet<number>;
}

const opening = /^ {0,3}:{3,}([a-z]+)(?:[ {[]|$)/;
const closing = /^ {0,3}:{3,}[ \t]*$/;
const row = /^ {0,3}\|/;

/**
 * Empties the rows of blocks' tables for the parser, which would spend half of its time on them: their cells are read
 * from the source. A row that begins with a pipe can be nothing but a row where a table goes on, so the tree has the same
 * nodes on the same lines. The look is a cheap one and may err, in code for instance: `areSpared` tells.
 * @returns null where there is nothing to empty
 */
export function spareRows(markdown: string, { lines, offsets }: SourceLines): SparedText | null {
  const rows = new Set<number>();
  let inBlock = false;
  let inTable = false;
  let spared = '';
  let copied = 0;
  for (const [index, line] of lines.entries()) {
    if (inTable && row.test(line)) {
      const start = offsets[index] ?? 0;
      rows.add(index + 1);
      spared += markdown.slice(copied, start + line.indexOf('|') + 1);
      copied = start + line.length;
      continue;
    }
    inTable = inBlock && isDelimiterRow(line);
    if (inTable) continue;
    const name = opening.exec(line)?.[1];
    if (name !== undefined && isContainerName(name)) inBlock = name !== 'hazard';
    else if (closing.test(line)) inBlock = false;
  }
  return rows.size === 0 ? null : { markdown: spared + markdown.slice(copied), rows };
}

/** True where every emptied row is a line of a block, so that none of them is shown as it was parsed. */
export function areSpared(rows: ReadonlySet<number>, blocks: readonly Block[]): boolean {
  const read = new Set(blocks.flatMap((block) => linesOf(block).map(({ line }) => line)));
  for (const line of rows) if (!read.has(line)) return false;
  return true;
}
