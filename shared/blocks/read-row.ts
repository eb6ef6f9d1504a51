import { quoted } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import { appliesToAll } from '../pages/applicability.ts';
import { readApplicability, type ApplicabilityReading } from '../pages/read-applicability.ts';
import { readWireSize, type WireSize } from '../electrics/wire-sizes.ts';
import { colourCodes, colourSystemLabels } from '../wire-colours/colour-codes.ts';
import { colourSystemNames, type ColourSystem } from '../wire-colours/colour-system.ts';
import { readWireColour } from '../wire-colours/read-wire-colour.ts';
import { wireColourWords } from '../wire-colours/colour-words.ts';
import type { Column, Line, WrittenColour } from './block.ts';
import { cellText, plainCell } from './cell-text.ts';
import { cellOf, type CommonColumn } from './columns.ts';
import type { SourceTable, SourceTableRow } from './source-table.ts';

/**
 * What any row has besides its address. Readers put it last into their line: an object that begins with a copy and then
 * grows costs three times as much, which a large page feels.
 */
export type CommonCells = Omit<Line, 'address'>;

/** A row whose years cannot be read holds for all of them until they can. */
export interface RowReading {
  readonly common: CommonCells;
  readonly unreadableYears: string | null;
}

const forAll: ApplicabilityReading = { applies: appliesToAll, unreadableYears: null };

/** Reads the cells that every table may have. */
export function readCommonCells<Role extends string>(
  columns: readonly Column<Role | CommonColumn>[],
  row: SourceTableRow,
  blockCite: string | null,
): RowReading {
  const years = plainCell(cellOf(columns, row, 'years'));
  const markets = plainCell(cellOf(columns, row, 'markets'));
  const frames = plainCell(cellOf(columns, row, 'frames'));
  // Most rows hold for all.
  const holdsForAll = years === '' && markets === '' && frames === '';
  const { applies, unreadableYears } = holdsForAll ? forAll : readApplicability({ years, markets, frames });
  const common = {
    line: row.line,
    applies,
    cells: columns.map((_, at) => row.cells[at] ?? ''),
    note: cellText(cellOf(columns, row, 'note')),
    cite: cellText(cellOf(columns, row, 'cite')) ?? blockCite,
    ...(row.cells.length > columns.length ? { strayCells: row.cells.slice(columns.length) } : {}),
  };
  return { common, unreadableYears };
}

/** What is wrong with a row whatever its kind: years that cannot be read, and cells beyond the last column. */
export function checkRow(
  table: SourceTable,
  row: SourceTableRow,
  unreadableYears: string | null,
  address: string,
): readonly Finding[] {
  const findings: Finding[] = [];
  if (unreadableYears !== null) {
    const message = `The years ${quoted(unreadableYears)} cannot be read. Write them as 1978, 1978-1981, 1980- or -1979.`;
    findings.push(finding('block-unreadable', message, row.line, `#${address}`));
  }
  if (row.cells.slice(table.headings.length).some((cell) => cell !== '')) {
    const message = `This row has ${row.cells.length} cells under ${table.headings.length} headings, so nothing says what its last is. Write a | inside a cell as \\|.`;
    findings.push(finding('block-unreadable', message, row.line, `#${address}`));
  }
  return findings;
}

/** A row that is no line, and what settles it. */
export function unreadRow(row: SourceTableRow, message: string, blockAddress: string | null): Finding {
  return finding('block-unreadable', message, row.line, blockAddress === null ? undefined : `#${blockAddress}`);
}

/** Reads the colour in a cell; null where there is none. */
export function readColourCell(cell: string, system: ColourSystem): WrittenColour | null {
  const written = cellText(cell);
  return written === null ? null : { written, reading: readWireColour(written, system) };
}

/** What is to be said of a colour: that it is in no table, or reads as more than one. */
export function checkColour(
  colour: WrittenColour | null,
  system: ColourSystem,
  line: number,
  address: string,
): readonly Finding[] {
  if (colour === null) return [];
  const { written, reading } = colour;
  const label = colourSystemLabels[system.name];
  if (reading.kind === 'ambiguous') {
    const meanings = [reading.colour, ...reading.others].map(wireColourWords).join('; or ');
    const message = `${quoted(written)} may be read as ${meanings}. Write two colours with a / between them, and one as ${label} has it.`;
    return [finding('colour-ambiguous', message, line, `#${address}`)];
  }
  if (reading.kind === 'unknown') {
    const message = `${quoted(written)} is no colour of ${label}. ${elsewhere(written, system)}${expectedCodes(system)}`;
    return [finding('colour-unknown', message, line, `#${address}`)];
  }
  return [];
}

function elsewhere(written: string, system: ColourSystem): string {
  for (const name of colourSystemNames) {
    if (name === 'own' || name === system.name) continue;
    const reading = readWireColour(written, { name });
    if (reading.kind === 'read') {
      return `In ${colourSystemLabels[name]} it is ${wireColourWords(reading.colour)}; if the diagram uses that, write colours="${name}" in the block. `;
    }
  }
  return '';
}

function expectedCodes(system: ColourSystem): string {
  const codes = system.name === 'own' ? Object.keys(system.key) : colourCodes(system.name).map(({ code }) => code);
  return `Otherwise write one of ${codes.slice(0, 30).join(', ')}, or words such as “yellow/red”.`;
}

/** Reads the size in a cell, with a finding where something stands there that is no size. A `?` says not known. */
export function readSizeCell(
  cell: string,
  line: number,
  address: string,
): { readonly size: WireSize | null; readonly findings: readonly Finding[] } {
  const written = cellText(cell);
  if (written === null || written === '?') return { size: null, findings: [] };
  const size = readWireSize(written);
  if (size !== null) return { size, findings: [] };
  const message = `The size ${quoted(written)} cannot be read. Write square millimetres (0.85), a gauge (AWG 18), strands (28/0.30), or ? where nobody knows it.`;
  return { size: null, findings: [finding('block-unreadable', message, line, `#${address}`)] };
}

/** Splits what came of a table's rows into lines and rows that are none. */
export function sortRows<Row extends Line>(
  table: SourceTable,
  read: (row: SourceTableRow) => Row | null,
): { readonly lines: readonly Row[]; readonly rest: { readonly unreadRows?: readonly SourceTableRow[] } } {
  const lines: Row[] = [];
  const unread: SourceTableRow[] = [];
  for (const row of table.rows) {
    const line = read(row);
    if (line === null) unread.push(row);
    else lines.push(line);
  }
  return { lines, rest: unread.length === 0 ? {} : { unreadRows: unread } };
}
