/** How a column's text stands, from the colons in the table's second row; null where it has none. */
export type ColumnAlignment = 'left' | 'right' | 'center' | null;

/** A table exactly as its source text says, before anybody knows what its columns mean. */
export interface SourceTable {
  readonly headings: readonly string[];
  readonly rows: readonly SourceTableRow[];
  /** Line of the heading row, counted from 1 with the front matter. */
  readonly line: number;
  /** Column by column; absent where no column says how it stands. */
  readonly alignments?: readonly ColumnAlignment[];
}

/**
 * One row: its cells' source text, trimmed, escaped pipes undone; short rows are filled with empty cells. A row that is
 * too long keeps its further cells here, though a table does not show them.
 */
export interface SourceTableRow {
  readonly cells: readonly string[];
  readonly line: number;
}

/** A directive as written: its name, its attributes and the table inside it, where there is one. */
export interface SourceBlock {
  readonly name: string;
  readonly id: string | null;
  readonly attributes: Readonly<Record<string, string>>;
  readonly table: SourceTable | null;
  /** The source text of what stands inside besides the table. */
  readonly text: string;
  readonly line: number;
  readonly endLine: number;
}
