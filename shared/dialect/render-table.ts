import type { Column, ConnectorColumn, ComponentColumn, SwitchColumn, TableBlock, WireColumn, InsideColumn, CheckColumn } from '../blocks/block.ts';
import type { TableLine } from '../blocks/lines.ts';
import type { SourceTableRow } from '../blocks/source-table.ts';
import { escapeHtml, fragment, openTag } from './html-text.ts';
import { renderEarthedBy, renderMark, renderTerminals, renderWire, whySetBack } from './render-cells.ts';
import type { RenderContext } from './render-context.ts';
import { joinsOf } from './switch-joins.ts';

type AnyRole = ConnectorColumn | ComponentColumn | SwitchColumn | WireColumn | InsideColumn | CheckColumn;
type AnyColumn = Column<AnyRole>;

/** The cell that a row is known by, and that links to the row's own address. */
const leadingRoles: ReadonlySet<AnyRole | null> = new Set(['cavity', 'id', 'position', 'check']);
const terminalRoles: ReadonlySet<AnyRole | null> = new Set(['goes-to', 'from', 'to', 'between']);

/**
 * A block's table: a row for each line with its address as its id, the cells as written, with wires drawn and terminals
 * linked, and last its mark. Columns in which nothing stands are left out; rows that are no lines are shown and say so.
 * @param seats the seat of each cavity, for a connector
 */
export function renderTable(block: TableBlock, context: RenderContext, seats: ReadonlyMap<string, number>): string {
  const columns: readonly AnyColumn[] = block.columns;
  const shown = columns.flatMap((column, at) => (isShown(block, column, at) ? [{ column, at }] : []));
  const heads = shown.map(({ column }) => {
    const contact = block.kind === 'switch' && column.role === 'contact' ? context.takeId(`${block.id}.${column.heading}`) : null;
    return `${openTag('th', { scope: 'col', id: contact, class: cellClass(column.role) })}${escapeHtml(column.heading)}</th>`;
  });
  const lines = block.lines.map((line) => ({ line: line.line, html: renderLine(block, line, shown, context, seats) }));
  const unread = (block.unreadRows ?? []).map((row) => ({ line: row.line, html: renderUnread(row, shown, columns.length) }));
  const rows = [...lines, ...unread].toSorted((a, b) => a.line - b.line).map(({ html }) => html);
  return `<table class="lines"><thead><tr>${heads.join('')}<th scope="col" class="cell-mark">Mark</th></tr></thead><tbody>${rows.join('')}</tbody></table>`;
}

function isShown({ lines, unreadRows = [] }: TableBlock, { role }: AnyColumn, at: number): boolean {
  if (lines.length + unreadRows.length === 0) return true;
  if (role === null || role === 'contact' || leadingRoles.has(role)) return true;
  return [...lines, ...unreadRows].some(({ cells }) => (cells[at] ?? '').trim() !== '');
}

interface ShownColumn {
  readonly column: AnyColumn;
  readonly at: number;
}

function renderLine(
  block: TableBlock,
  line: TableLine,
  shown: readonly ShownColumn[],
  context: RenderContext,
  seats: ReadonlyMap<string, number>,
): string {
  const why = whySetBack(line, context);
  const cavity = 'cavity' in line ? line.cavity : null;
  const row = openTag('tr', {
    id: context.takeId(line.address),
    class: `line${why === null ? '' : ' set-back'}${'removed' in line && line.removed ? ' removed' : ''}`,
    'data-line': line.address,
    'data-cavity': cavity,
    'data-seat': cavity === null ? null : (seats.get(cavity) ?? null),
  });
  const joins = block.kind === 'switch' && 'joined' in line ? joinsOf(block, line.joined) : null;
  const cells = shown.map(({ column, at }) => {
    const cell = line.cells[at] ?? '';
    const leads = leadingRoles.has(column.role);
    const attributes = {
      scope: leads ? 'row' : null,
      class: [cellClass(column.role), cell.trim() === '' ? 'empty' : '', joins?.get(at) ?? ''].filter((word) => word !== '').join(' ') || null,
      'data-label': column.heading,
    };
    const name = leads ? 'th' : 'td';
    return `${openTag(name, attributes)}${renderCell(block, line, column.role, cell, context)}</${name}>`;
  });
  const further = renderStray(line.strayCells ?? []);
  const reason = why === null ? '' : ` <span class="why">${escapeHtml(why)}</span>`;
  return `${row}${cells.join('')}${further}<td class="cell-mark" data-label="Mark">${renderMark(line, context)}${reason}</td></tr>`;
}

function renderCell(block: TableBlock, line: TableLine, role: AnyRole | null, cell: string, context: RenderContext): string {
  if (leadingRoles.has(role)) {
    return `${openTag('a', { class: 'line-link', href: fragment(line.address) })}${escapeHtml(cell)}</a>`;
  }
  if (role === 'wire' && 'wire' in line) return renderWire(cell, line.wire);
  if (role === 'earthed-by') return renderEarthedBy(cell, context);
  // Inside a unit, `From` and `To` are its own terminals and stand nowhere else on the page.
  if (terminalRoles.has(role) && block.kind !== 'inside') return renderTerminals(cell, context);
  return escapeHtml(cell);
}

function renderUnread({ cells }: SourceTableRow, shown: readonly ShownColumn[], columns: number): string {
  const written = shown.map(
    ({ column, at }) => `${openTag('td', { 'data-label': column.heading })}${escapeHtml(cells[at] ?? '')}</td>`,
  );
  const further = renderStray(cells.slice(columns));
  return `<tr class="unread-row">${written.join('')}${further}<td class="cell-mark" data-label="Mark"><span class="mark mark-unread">not read</span></td></tr>`;
}

/** What a row has beyond the last heading: shown, though nothing says what it is. */
function renderStray(cells: readonly string[]): string {
  return cells
    .filter((cell) => cell.trim() !== '')
    .map((cell) => `<td class="stray">${escapeHtml(cell)}</td>`)
    .join('');
}

function cellClass(role: AnyRole | null): string {
  return role === null ? '' : `cell-${role}`;
}
