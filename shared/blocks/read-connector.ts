import { shortened } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import type { ConnectorBlock, ConnectorColumn, ConnectorLine, Corner, FaceSide, LatchSide } from './block.ts';
import {
  attribute,
  blockLabel,
  readColours,
  readHead,
  requireId,
  requireTable,
  oneOf,
  unreadable,
  type BlockReading,
  type PageOfBlock,
} from './block-reading.ts';
import { cellText, plainCell, saysNothing } from './cell-text.ts';
import { cellOf, commonHeadings, hasColumn, readColumns, wireHeadings, type HeadingNames } from './columns.ts';
import { cavityAddress } from './line-address.ts';
import type { FaceLayout } from './face-layout.ts';
import { mostCavities, readLayout } from './read-layout.ts';
import {
  checkColour,
  checkRow,
  readColourCell,
  readCommonCells,
  readSizeCell,
  sortRows,
  unreadRow,
} from './read-row.ts';
import { cavityNames } from './seats.ts';
import type { SourceBlock } from './source-table.ts';
import { readTerminalNames } from './terminal-name.ts';

const headings: HeadingNames<ConnectorColumn> = {
  cavity: ['cavity', 'pin'],
  ...wireHeadings,
  'goes-to': ['goes to', 'to'],
  ...commonHeadings,
};
const attributes = [
  'zone',
  'layout',
  'seen',
  'first',
  'latch',
  'contacts',
  'housing',
  'terminals',
  'mates',
  'colours',
] as const;
const sides: readonly FaceSide[] = ['wire side', 'mating side'];
const corners: readonly Corner[] = ['top left', 'top right', 'bottom left', 'bottom right'];
const latches: readonly LatchSide[] = ['top', 'bottom', 'left', 'right'];
const contactKinds = ['pins', 'sockets'] as const;

/** Reads a connector: its face, and a line for each wire in a cavity. */
export function readConnector(source: SourceBlock, page: PageOfBlock): BlockReading {
  const findings: Finding[] = [];
  const id = requireId(source, findings);
  const table = requireTable(source, '`| Cavity | Wire | Goes to |`', findings);
  if (id === null || table === null) return { block: null, findings };
  const columns = readColumns(table.headings, headings);
  if (!hasColumn(columns, 'cavity')) {
    findings.push(
      unreadable(
        source,
        'has no column `Cavity` (or `Pin`). Name the column that says which cavity a row is about.',
        table.line,
      ),
    );
    return { block: null, findings };
  }
  const head = readHead(source, attributes);
  const colours = readColours(source, page, findings);
  const cavities = new Set<string>();
  const { lines, rest } = sortRows(table, (row): ConnectorLine | null => {
    const { common, unreadableYears } = readCommonCells(columns, row, head.cite);
    const written = plainCell(cellOf(columns, row, 'cavity'));
    if (written === '') {
      findings.push(unreadRow(row, 'This row names no cavity. Write its number or letter in the first column.', id));
      return null;
    }
    const { cavity, further } = readCavity(written, cavities);
    const address = cavityAddress(id, cavity, further, common.applies);
    const wireCell = cellOf(columns, row, 'wire');
    const goesToCell = plainCell(cellOf(columns, row, 'goes-to'));
    const circuit = cellText(cellOf(columns, row, 'circuit'));
    const destinations = readTerminalNames(goesToCell).filter((name) => !isBlankWord(name.id));
    const goesTo = destinations.filter((name) => !isCapped(name.id));
    const blank = isBlank(wireCell, circuit, goesToCell) && destinations.length === 0;
    const wire = blank || isBlankWord(wireCell) ? null : readColourCell(wireCell, colours);
    const { size, findings: sizeFindings } = readSizeCell(cellOf(columns, row, 'size'), row.line, address);
    findings.push(...checkRow(table, row, unreadableYears, address), ...sizeFindings);
    findings.push(...checkColour(wire, colours, row.line, address));
    const capped = destinations.length > goesTo.length;
    return { address, cavity, further, blank, capped, wire, size, circuit, goesTo, ...common };
  });
  const face = readFace(source, lines, findings);
  const block: ConnectorBlock = {
    kind: 'connector',
    ...head,
    id,
    zone: attribute(source, 'zone'),
    ...face,
    latch: oneOf(source, 'latch', latches, findings),
    contacts: oneOf(source, 'contacts', contactKinds, findings),
    housing: attribute(source, 'housing'),
    terminals: attribute(source, 'terminals'),
    mates: attribute(source, 'mates'),
    colours,
    columns,
    lines,
    ...rest,
  };
  return { block, findings };
}

/** A cavity holds a few wires; more pluses are part of a name. */
const mostFurther = 20;

/** `2++` below a row `2` is the third wire in cavity 2; without such a row it is the name of a cavity. */
function readCavity(written: string, cavities: Set<string>): { readonly cavity: string; readonly further: number } {
  for (let further = Math.min(mostFurther, trailingPluses(written)); further > 0; further -= 1) {
    const cavity = written.slice(0, -further).trim();
    if (cavities.has(cavity)) return { cavity, further };
  }
  cavities.add(written);
  return { cavity: written, further: 0 };
}

function trailingPluses(text: string): number {
  return text.length - text.replace(/\++$/, '').length;
}

function isBlankWord(cell: string): boolean {
  return /^blank$/i.test(plainCell(cell));
}

function isCapped(word: string): boolean {
  return /^capped$/i.test(word);
}

function isBlank(wireCell: string, circuit: string | null, goesTo: string): boolean {
  const wire = plainCell(wireCell);
  if (isBlankWord(wire) || (wire !== '' && saysNothing(wire))) return true;
  return wire === '' && (isBlankWord(circuit ?? '') || isBlankWord(goesTo));
}

interface FaceReading {
  readonly layout: FaceLayout;
  readonly seen: FaceSide;
  readonly first: Corner | null;
}

/**
 * Reads what the face looks like. A corner counts only where the layout and the side it is seen from are known: a
 * mirrored face with numbers on it would lead to the wrong cavity.
 */
function readFace(source: SourceBlock, lines: readonly ConnectorLine[], findings: Finding[]): FaceReading {
  const layoutWritten = attribute(source, 'layout');
  const layout = layoutWritten === null ? null : readLayout(layoutWritten);
  if (layoutWritten !== null && layout === null) {
    const expected = `Write rows × columns (2x3), one row (5), rows of their own length (3+4), gaps (xx.xx+xxxxx) or a ring (round 6), ${mostCavities} cavities at most.`;
    findings.push(
      unreadable(source, `has \`layout="${shortened(layoutWritten)}"\`, which cannot be read. ${expected}`),
    );
  }
  const seen = oneOf(source, 'seen', sides, findings);
  const first = oneOf(source, 'first', corners, findings);
  const certain = layout !== null && seen !== null ? first : null;
  if (certain === null) findings.push(unoriented(source, layout !== null, seen !== null));
  const count = Math.max(1, cavityNames({ lines }).length);
  return {
    layout: layout ?? { kind: 'rows', rows: [Array.from({ length: count }, () => true)] },
    seen: seen ?? 'wire side',
    first: certain,
  };
}

function unoriented(source: SourceBlock, hasLayout: boolean, hasSide: boolean): Finding {
  const missing = !hasLayout
    ? 'says nothing that can be read of its layout'
    : hasSide
      ? 'does not say where its first cavity is'
      : 'does not say from which side it is seen';
  const settles =
    'Look at the plug and write layout="2x3", seen="wire side" or "mating side", and first="top left" or another corner.';
  const message = `${blockLabel(source)} ${missing}, so its numbering is not confirmed. ${settles}`;
  return finding('face-unoriented', message, source.line, source.id === null ? undefined : `#${source.id}`);
}
