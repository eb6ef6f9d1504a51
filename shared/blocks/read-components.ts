import { quoted } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import {
  componentKinds,
  type ComponentColumn,
  type ComponentKind,
  type ComponentLine,
  type ComponentsBlock,
} from './block.ts';
import { idExpected, isBlockId, readHead, requireTable, unreadable, type BlockReading } from './block-reading.ts';
import { cellText, plainCell } from './cell-text.ts';
import { cellOf, commonHeadings, hasColumn, readColumns, type HeadingNames } from './columns.ts';
import { componentAddress } from './line-address.ts';
import { readRating } from './read-rating.ts';
import { checkRow, readCommonCells, sortRows, unreadRow } from './read-row.ts';
import type { SourceBlock } from './source-table.ts';

const headings: HeadingNames<ComponentColumn> = {
  id: ['id'],
  kind: ['kind'],
  name: ['name'],
  rating: ['rating'],
  'earthed-by': ['earthed by', 'grounded by'],
  zone: ['zone'],
  ...commonHeadings,
};

/** Reads a table of components, a line each. */
export function readComponents(source: SourceBlock): BlockReading {
  const findings: Finding[] = [];
  const table = requireTable(source, '`| Id | Kind | Name | Rating |`', findings);
  if (table === null) return { block: null, findings };
  const columns = readColumns(table.headings, headings);
  if (!hasColumn(columns, 'id') || !hasColumn(columns, 'kind')) {
    findings.push(unreadable(source, 'needs the columns `Id` and `Kind`.', table.line));
    return { block: null, findings };
  }
  const head = readHead(source, []);
  const { lines, rest } = sortRows(table, (row): ComponentLine | null => {
    const { common, unreadableYears } = readCommonCells(columns, row, head.cite);
    const id = plainCell(cellOf(columns, row, 'id'));
    if (!isBlockId(id)) {
      findings.push(unreadRow(row, `${quoted(id)} is no id for a component. Write ${idExpected}.`, source.id));
      return null;
    }
    const kindWritten = plainCell(cellOf(columns, row, 'kind'));
    const componentKind = readKind(kindWritten);
    if (componentKind === null) {
      const message = `${quoted(kindWritten)} is no kind of component. Write one of: ${componentKinds.join(', ')}.`;
      findings.push(unreadRow(row, message, id));
      return null;
    }
    const address = componentAddress(id, common.applies);
    const earthWritten = cellText(cellOf(columns, row, 'earthed-by'));
    const earthedBy = earthWritten === null ? null : readEarthedBy(earthWritten);
    if (earthWritten !== null && earthedBy === null) {
      const message = `“Earthed by ${earthWritten}” cannot be read. Write the earth's id (frame), or a terminal and the earth (85: frame).`;
      findings.push(finding('block-unreadable', message, row.line, `#${address}`));
    }
    findings.push(...checkRow(table, row, unreadableYears, address));
    return {
      address,
      id,
      componentKind,
      name: cellText(cellOf(columns, row, 'name')),
      rating: readRating(cellText(cellOf(columns, row, 'rating')) ?? ''),
      earthedBy,
      zone: cellText(cellOf(columns, row, 'zone')),
      ...common,
    };
  });
  const block: ComponentsBlock = { kind: 'components', ...head, columns, lines, ...rest };
  return { block, findings };
}

function readKind(written: string): ComponentKind | null {
  const plain = written.toLowerCase().replace(/\s+/g, '-');
  return componentKinds.find((kind) => kind === plain) ?? null;
}

/** `frame`, or a named terminal: `85: frame`. */
function readEarthedBy(written: string): ComponentLine['earthedBy'] {
  const match = /^(?:([^\s:]+)\s*:\s*)?(\S+)$/.exec(written);
  const earth = match?.[2];
  return earth !== undefined && isBlockId(earth) ? { terminal: match?.[1] ?? null, earth } : null;
}
