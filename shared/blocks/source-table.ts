/** A table exactly as its source text says, before anybody knows what its columns mean. */
export interface SourceTable {
  readonly headings: readonly string[];
  readonly rows: readonly SourceTableRow[];
  /** Line of the heading row, counted from 1 with the front matter. */
  readonly line: number;
}

/** One row: its cells' source text, trimmed, escaped pipes undone; short rows are filled with empty cells. */
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
