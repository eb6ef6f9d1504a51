import { quoted } from '../lib/quoted.ts';
import type { Finding } from '../pages/finding.ts';
import type { InsideBlock, InsideColumn, InsideLine } from './block.ts';
import { readHead, requireId, requireTable, unreadable, type BlockReading } from './block-reading.ts';
import { plainCell } from './cell-text.ts';
import { cellOf, commonHeadings, hasColumn, readColumns, type HeadingNames } from './columns.ts';
import { insideAddress } from './line-address.ts';
import { readCondition, readInsideJoin } from './read-inside-join.ts';
import { checkRow, readCommonCells, sortRows, unreadRow } from './read-row.ts';
import type { SourceBlock } from './source-table.ts';

const headings: HeadingNames<InsideColumn> = {
  from: ['from'],
  to: ['to'],
  as: ['as'],
  when: ['when'],
  ...commonHeadings,
};
const joinsExpected = 'joins, diode, resistor 20 Ω, output 10 A, input to earth, input to live';

/** Reads what is known of the inside of a unit, a line for each join. */
export function readInside(source: SourceBlock): BlockReading {
  const findings: Finding[] = [];
  const id = requireId(source, findings);
  const table = requireTable(source, '`| From | To | As | When |`', findings);
  if (id === null || table === null) return { block: null, findings };
  const columns = readColumns(table.headings, headings);
  if (!hasColumn(columns, 'from') || !hasColumn(columns, 'as')) {
    findings.push(unreadable(source, 'needs the columns `From` and `As`.', table.line));
    return { block: null, findings };
  }
  const head = readHead(source, []);
  const { lines, rest } = sortRows(table, (row): InsideLine | null => {
    const { common, unreadableYears } = readCommonCells(columns, row, head.cite);
    const from = readOwnTerminal(cellOf(columns, row, 'from'), id);
    const to = readOwnTerminal(cellOf(columns, row, 'to'), id);
    const asWritten = plainCell(cellOf(columns, row, 'as'));
    const as = readInsideJoin(asWritten);
    if (from === null) {
      findings.push(unreadRow(row, 'This row names no terminal of the unit. Write it under `From`.', id));
      return null;
    }
    if (as === null) {
      findings.push(
        unreadRow(row, `${quoted(asWritten)} is nothing that a unit does inside. Write one of: ${joinsExpected}.`, id),
      );
      return null;
    }
    if (to === null && needsBothEnds(as.kind)) {
      findings.push(unreadRow(row, `${quoted(asWritten)} has two ends. Write the other terminal under \`To\`.`, id));
      return null;
    }
    const address = insideAddress(id, from, to, common.applies);
    findings.push(...checkRow(table, row, unreadableYears, address));
    return { address, from, to, as, when: readCondition(plainCell(cellOf(columns, row, 'when'))), ...common };
  });
  const block: InsideBlock = { kind: 'inside', ...head, id, columns, lines, ...rest };
  return { block, findings };
}

function needsBothEnds(kind: InsideLine['as']['kind']): boolean {
  return kind === 'joins' || kind === 'diode' || kind === 'resistor';
}

/** A terminal of the unit itself, with or without the unit's id before it; a hyphen is a terminal's name, a dash is none. */
function readOwnTerminal(cell: string, unit: string): string | null {
  const written = plainCell(cell);
  if (written === '' || written === '–' || written === '—') return null;
  return written.startsWith(`${unit}.`) && written.length > unit.length + 1 ? written.slice(unit.length + 1) : written;
}
