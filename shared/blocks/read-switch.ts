import { quoted, shortened } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import { switchRoles, type Column, type SwitchBlock, type SwitchColumn, type SwitchLine } from './block.ts';
import { attribute, oneOf, readHead, requireId, requireTable, unreadable, type BlockReading } from './block-reading.ts';
import { namesIn, plainCell, saysNothing } from './cell-text.ts';
import { cellOf, commonHeadings, hasColumn, readColumns, type HeadingNames } from './columns.ts';
import { positionAddress } from './line-address.ts';
import { checkRow, readCommonCells, sortRows, unreadRow } from './read-row.ts';
import type { SourceBlock, SourceTableRow } from './source-table.ts';

const headings: HeadingNames<Exclude<SwitchColumn, 'contact'>> = { position: ['position'], ...commonHeadings };
const attributes = ['zone', 'role', 'rest', 'sprung', 'moves-with'] as const;

/** `●`, `x` and `o`, and the other circles and crosses that keyboards have for them: all one mark. */
const oneMark = /^[●•○◯⬤◉xXoO×✕✗✓]$/;
const groupLetter = /^\p{L}$/u;

/** More than these are not named in one sentence, nor looked for in one attribute. */
const mostNamed = 20;

/** Reads a switch: a line for each position, with the contacts that it joins. */
export function readSwitch(source: SourceBlock): BlockReading {
  const findings: Finding[] = [];
  const id = requireId(source, findings);
  const table = requireTable(source, '`| Position | R | BR |` (a column for each contact)', findings);
  if (id === null || table === null) return { block: null, findings };
  const columns = contactColumns(readColumns(table.headings, headings));
  if (!hasColumn(columns, 'position')) {
    findings.push(
      unreadable(source, 'has no column `Position`. Name the column that says where the switch stands.', table.line),
    );
    return { block: null, findings };
  }
  const contacts = readContacts(source, columns, table.line, findings);
  const head = readHead(source, attributes);
  const { lines, rest } = sortRows(table, (row): SwitchLine | null => {
    const { common, unreadableYears } = readCommonCells(columns, row, head.cite);
    const position = plainCell(cellOf(columns, row, 'position'));
    if (position === '') {
      findings.push(
        unreadRow(
          row,
          'This row names no position. Write what stands beside the switch, or what one does with it.',
          id,
        ),
      );
      return null;
    }
    const address = positionAddress(id, position, common.applies);
    const { joined, unread } = readJoined(columns, row);
    if (unread.length > 0) {
      const message = `${unread.slice(0, mostNamed).map(quoted).join(', ')} is no mark. Contacts that are joined in this position have ● (or x, o) in their column; a second group has a letter.`;
      findings.push(finding('block-unreadable', message, row.line, `#${address}`));
    }
    findings.push(...checkRow(table, row, unreadableYears, address));
    return { address, position, joined, ...common };
  });
  const block: SwitchBlock = {
    kind: 'switch',
    ...head,
    id,
    zone: attribute(source, 'zone'),
    role: oneOf(source, 'role', switchRoles, findings) ?? 'other',
    rest: readPosition(source, 'rest', attribute(source, 'rest'), lines, findings),
    sprung: namesIn(attribute(source, 'sprung') ?? '')
      .slice(0, mostNamed)
      .map((name) => readPosition(source, 'sprung', name, lines, findings))
      .filter((name) => name !== null),
    movesWith: attribute(source, 'moves-with'),
    contacts,
    columns,
    lines,
    ...rest,
  };
  return { block, findings };
}

/** Every column that is nothing else is a contact. */
function contactColumns(columns: readonly Column<Exclude<SwitchColumn, 'contact'>>[]): readonly Column<SwitchColumn>[] {
  return columns.map(({ heading, role }) => ({
    heading,
    role: role ?? (contactName(heading) === '' ? null : 'contact'),
  }));
}

function contactName(heading: string): string {
  return plainCell(heading);
}

function readContacts(
  source: SourceBlock,
  columns: readonly Column<SwitchColumn>[],
  line: number,
  findings: Finding[],
): readonly string[] {
  const names = columns.filter(({ role }) => role === 'contact').map(({ heading }) => contactName(heading));
  const contacts = [...new Set(names)];
  if (contacts.length < names.length) {
    findings.push(
      unreadable(source, 'has two contacts of one name. Give each terminal its own, as in `R1` and `R2`.', line),
    );
  }
  return contacts;
}

function readJoined(
  columns: readonly Column<SwitchColumn>[],
  row: SourceTableRow,
): { readonly joined: SwitchLine['joined']; readonly unread: readonly string[] } {
  const groups = new Map<string, string[]>();
  const unread: string[] = [];
  columns.forEach(({ heading, role }, at) => {
    const cell = plainCell(row.cells[at] ?? '');
    if (role !== 'contact' || saysNothing(cell)) return;
    const mark = oneMark.test(cell) ? '●' : cell.toLowerCase();
    if (mark !== '●' && !groupLetter.test(mark)) {
      unread.push(cell);
      return;
    }
    const group = groups.get(mark) ?? [];
    const contact = contactName(heading);
    if (!group.includes(contact)) group.push(contact);
    groups.set(mark, group);
  });
  return { joined: [...groups.values()].filter((group) => group.length > 1), unread };
}

/** A position that an attribute names, as the table writes it; null, with a finding, where no row has it. */
function readPosition(
  source: SourceBlock,
  name: string,
  written: string | null,
  lines: readonly SwitchLine[],
  findings: Finding[],
): string | null {
  if (written === null) return null;
  const found = lines.find(({ position }) => position.toLowerCase() === written.toLowerCase());
  if (found === undefined) {
    const positions = [...new Set(lines.map(({ position }) => position))].slice(0, mostNamed).map(shortened).join(', ');
    findings.push(
      unreadable(source, `has \`${name}\` ${quoted(written)}, which is none of its positions (${positions}).`),
    );
  }
  return found?.position ?? null;
}
