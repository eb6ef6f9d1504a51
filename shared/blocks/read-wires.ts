import { quoted } from '../lib/quoted.ts';
import { readDecimal } from '../lib/decimal.ts';
import { finding, type Finding } from '../pages/finding.ts';
import type { WireColumn, WireLine, WiresBlock } from './block.ts';
import {
  readColours,
  readHead,
  requireTable,
  unreadable,
  type BlockReading,
  type PageOfBlock,
} from './block-reading.ts';
import { cellText, plainCell } from './cell-text.ts';
import { cellOf, commonHeadings, hasColumn, readColumns, wireHeadings, type HeadingNames } from './columns.ts';
import { wireAddress } from './line-address.ts';
import {
  checkColour,
  checkRow,
  readColourCell,
  readCommonCells,
  readSizeCell,
  sortRows,
  unreadRow,
} from './read-row.ts';
import type { SourceBlock } from './source-table.ts';
import { readTerminalName } from './terminal-name.ts';

const headings: HeadingNames<WireColumn> = {
  from: ['from'],
  to: ['to', 'goes to'],
  ...wireHeadings,
  length: ['length m', 'length (m)', 'length'],
  ...commonHeadings,
};

/** Reads a table of wires, a line each. */
export function readWires(source: SourceBlock, page: PageOfBlock): BlockReading {
  const findings: Finding[] = [];
  const table = requireTable(source, '`| From | To | Wire | mm² |`', findings);
  if (table === null) return { block: null, findings };
  const columns = readColumns(table.headings, headings);
  if (!hasColumn(columns, 'from') || !hasColumn(columns, 'to')) {
    findings.push(unreadable(source, 'needs the columns `From` and `To`.', table.line));
    return { block: null, findings };
  }
  const head = readHead(source, ['colours']);
  const colours = readColours(source, page, findings);
  const { lines, rest } = sortRows(table, (row): WireLine | null => {
    const { common, unreadableYears } = readCommonCells(columns, row, head.cite);
    const from = readTerminalName(cellText(cellOf(columns, row, 'from')) ?? '');
    const to = readTerminalName(cellText(cellOf(columns, row, 'to')) ?? '');
    if (from === null || to === null) {
      findings.push(
        unreadRow(row, 'A wire has two ends. Write both as terminals: battery.+ and main-fuse.in.', source.id),
      );
      return null;
    }
    const address = wireAddress(from, to, common.applies);
    const wireCell = cellOf(columns, row, 'wire');
    const removed = /^removed$/i.test(plainCell(wireCell));
    const wire = removed ? null : readColourCell(wireCell, colours);
    const { size, findings: sizeFindings } = readSizeCell(cellOf(columns, row, 'size'), row.line, address);
    const lengthWritten = cellText(cellOf(columns, row, 'length'));
    const lengthMetres = lengthWritten === null ? null : readLengthMetres(lengthWritten);
    findings.push(...checkRow(table, row, unreadableYears, address), ...sizeFindings);
    findings.push(...checkColour(wire, colours, row.line, address));
    if (lengthWritten !== null && lengthWritten !== '?' && lengthMetres === null) {
      const message = `The length ${quoted(lengthWritten)} cannot be read. Write metres (0.25), or a length with its unit (250 mm).`;
      findings.push(finding('block-unreadable', message, row.line, `#${address}`));
    }
    const circuit = cellText(cellOf(columns, row, 'circuit'));
    return { address, from, to, removed, wire, size, lengthMetres, circuit, ...common };
  });
  const block: WiresBlock = { kind: 'wires', ...head, colours, columns, lines, ...rest };
  return { block, findings };
}

const metresIn = { m: 1, cm: 0.01, mm: 0.001 } as const;

/** A length in metres, or with its unit; null where it is none, or no wire on a motorcycle is as long (100 m). */
export function readLengthMetres(text: string): number | null {
  const match = /^([^\sa-z]+) ?(m|cm|mm)?$/i.exec(text.trim().replace(/\s+/g, ' '));
  const figure = readDecimal(match?.[1] ?? '');
  if (figure === null || figure < 0) return null;
  const unit = match?.[2]?.toLowerCase();
  const factor = unit === 'mm' || unit === 'cm' ? metresIn[unit] : metresIn.m;
  const metres = Number((figure * factor).toPrecision(12));
  return metres <= 100 ? metres : null;
}
