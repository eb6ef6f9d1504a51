import type { Column } from './block.ts';
import type { SourceTableRow } from './source-table.ts';

/** The headings by which a column of each role is known, in lower case. */
export type HeadingNames<Role extends string> = Readonly<Record<Role, readonly string[]>>;

/** The columns that every table of a block may have. */
export type CommonColumn = 'years' | 'markets' | 'frames' | 'note' | 'cite';

/** The headings of the columns that every table may have. */
export const commonHeadings: HeadingNames<CommonColumn> = {
  years: ['years'],
  markets: ['markets'],
  frames: ['frames'],
  note: ['note'],
  cite: ['cite'],
};

/** Headings that several kinds of block have. */
export const wireHeadings = {
  wire: ['wire', 'colour', 'color'],
  size: ['mm²', 'mm2', 'size'],
  circuit: ['circuit', 'signal', 'function'],
} as const;

/** Finds each column's role by its heading, in any order. Of two columns with one role the first has it. */
export function readColumns<Role extends string>(
  headings: readonly string[],
  names: HeadingNames<Role>,
): readonly Column<Role>[] {
  const taken = new Set<Role>();
  return headings.map((heading) => {
    const key = headingKey(heading);
    const role = rolesOf(names).find((candidate) => !taken.has(candidate) && names[candidate].includes(key)) ?? null;
    if (role !== null) taken.add(role);
    return { heading, role };
  });
}

function rolesOf<Role extends string>(names: HeadingNames<Role>): readonly Role[] {
  return Object.keys(names).filter((name): name is Role => name in names);
}

function headingKey(heading: string): string {
  return heading.replace(/[*_`]/g, '').trim().replace(/\s+/g, ' ').toLowerCase();
}

/** True where some column has the role. */
export function hasColumn<Role extends string>(columns: readonly Column<Role>[], role: NoInfer<Role>): boolean {
  return columns.some((column) => column.role === role);
}

/** A row's cell in the column of a role, as written; empty where there is no such column. */
export function cellOf<Role extends string>(
  columns: readonly Column<Role>[],
  row: SourceTableRow,
  role: NoInfer<Role>,
): string {
  const at = columns.findIndex((column) => column.role === role);
  return at < 0 ? '' : (row.cells[at] ?? '');
}
