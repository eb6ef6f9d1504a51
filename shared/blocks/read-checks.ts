import { isSlug } from '../lib/slug.ts';
import { quoted } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import type { CheckColumn, CheckLine, ChecksBlock, TerminalName } from './block.ts';
import { readHead, requireTable, unreadable, type BlockReading } from './block-reading.ts';
import { cellText, plainCell } from './cell-text.ts';
import { cellOf, commonHeadings, hasColumn, readColumns, type HeadingNames } from './columns.ts';
import { checkAddress } from './line-address.ts';
import { readExpectation } from './read-expectation.ts';
import { checkRow, readCommonCells, sortRows, unreadRow } from './read-row.ts';
import type { SourceBlock } from './source-table.ts';
import { readTerminalName } from './terminal-name.ts';

const headings: HeadingNames<CheckColumn> = {
  check: ['check'],
  between: ['between'],
  expect: ['expect'],
  at: ['at'],
  how: ['how'],
  ...commonHeadings,
};
const expected =
  'a range (100–130 Ω), a tolerance (5 ± 0.5 Ω, 5 ± 10 % Ω), a limit (< 0.2 V, max 5 Ω), `continuity` or `open`';

/** A place in words may be a sentence; two terminals are shorter. */
const longestPlace = 200;

/** Reads a table of checks, a line each. */
export function readChecks(source: SourceBlock): BlockReading {
  const findings: Finding[] = [];
  const table = requireTable(source, '`| Check | Between | Expect | At | How |`', findings);
  if (table === null) return { block: null, findings };
  const columns = readColumns(table.headings, headings);
  if (!hasColumn(columns, 'check') || !hasColumn(columns, 'expect')) {
    findings.push(unreadable(source, 'needs the columns `Check` and `Expect`.', table.line));
    return { block: null, findings };
  }
  const head = readHead(source, []);
  const { lines, rest } = sortRows(table, (row): CheckLine | null => {
    const { common, unreadableYears } = readCommonCells(columns, row, head.cite);
    const check = plainCell(cellOf(columns, row, 'check'));
    if (check === '') {
      findings.push(
        unreadRow(row, 'This row does not say what is checked. Write a few words under `Check`.', source.id),
      );
      return null;
    }
    const address = checkAddress(check, common.applies);
    const expectWritten = plainCell(cellOf(columns, row, 'expect'));
    const expect = readExpectation(expectWritten);
    if (expect === null) {
      const said =
        expectWritten === '' ? 'Nothing is said of what to expect' : `${quoted(expectWritten)} is no expectation`;
      findings.push(
        finding('expect-unreadable', `${said}. Write ${expected}, each figure with its unit.`, row.line, `#${address}`),
      );
    }
    findings.push(...checkRow(table, row, unreadableYears, address));
    const between = plainCell(cellOf(columns, row, 'between'));
    return {
      address,
      check,
      between,
      terminals: readBetween(between),
      expect,
      expectWritten,
      at: cellText(cellOf(columns, row, 'at')),
      how: cellText(cellOf(columns, row, 'how')),
      ...common,
    };
  });
  const block: ChecksBlock = { kind: 'checks', ...head, columns, lines, ...rest };
  return { block, findings };
}

/**
 * The terminals that a check is made between, where it names terminals: `igniter.1 – igniter.2`, `battery.+ and frame`.
 * None where it names a place in words.
 */
export function readBetween(text: string): readonly TerminalName[] {
  if (text.length > longestPlace) return [];
  const parts = text.split(/\s+[-–—]\s+|\s*[–—]\s*|\s+(?:and|to)\s+|\s*[,;]\s*/).filter((part) => part !== '');
  const names = parts.map(readTerminalName).filter((name) => name !== null);
  const allNamed = names.every(({ id, terminal }) => isSlug(id) && !(terminal ?? '').includes(' '));
  return allNamed && names.some(({ terminal }) => terminal !== null) ? names : [];
}
