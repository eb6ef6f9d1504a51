import type { Block, CalculatorBlock, TableBlock } from '../blocks/block.ts';
import { escapeHtml, openTag } from './html-text.ts';
import { renderHazard } from './render-caution.ts';
import { renderConnector } from './render-connector.ts';
import type { RenderContext } from './render-context.ts';
import { heading } from './render-heading.ts';
import { renderTable } from './render-table.ts';

const noSeats: ReadonlyMap<string, number> = new Map();

/** What a table is called that has no name of its own. */
const kindNames: Readonly<Record<Exclude<TableBlock['kind'], 'connector'>, string>> = {
  components: 'Components',
  switch: 'Switch',
  wires: 'Wires',
  inside: 'Inside',
  checks: 'Checks',
};

/**
 * A block as HTML.
 * @param body for a caution, its own words as safe HTML
 * @param level the level of the block's heading, 2 to 6
 */
export function renderBlock(block: Block, body: string, level: number, context: RenderContext): string {
  switch (block.kind) {
    case 'connector':
      return renderConnector(block, level, context);
    case 'hazard':
      return renderHazard(block, body);
    case 'calculator':
      return renderCalculator(block);
    case 'components':
    case 'switch':
    case 'wires':
    case 'inside':
    case 'checks':
      return renderTableBlock(block, level, context);
  }
}

function renderTableBlock(block: Exclude<TableBlock, { kind: 'connector' }>, level: number, context: RenderContext): string {
  const name = block.name ?? (block.id === null ? null : `${kindNames[block.kind]} ${block.id}`);
  // An inside block names a component that stands elsewhere, and leaves the id to it.
  const id = block.id === null || block.kind === 'inside' ? null : context.takeId(block.id);
  const head =
    name === null
      ? `<p class="block-kind">${kindNames[block.kind]}</p>`
      : heading(level, name, block.name === null ? null : block.id);
  return `${openTag('div', { class: `block ${block.kind}`, id })}${head}${renderFacts(block)}<div class="table-plate">${renderTable(block, context, noSeats)}</div></div>`;
}

function renderFacts(block: Exclude<TableBlock, { kind: 'connector' }>): string {
  const facts: (readonly [string, string])[] = [];
  if (block.kind === 'switch') {
    if (block.zone !== null) facts.push(['Where', block.zone]);
    if (block.role !== 'other') facts.push(['Role', block.role]);
    if (block.rest !== null) facts.push(['Left at', block.rest]);
    if (block.sprung.length > 0) facts.push(['Sprung', block.sprung.join(', ')]);
    if (block.movesWith !== null) facts.push(['Moves with', block.movesWith]);
  }
  facts.push(...Object.entries(block.otherAttributes));
  if (facts.length === 0) return '';
  const written = facts.map(([name, value]) => `<div><dt>${escapeHtml(name)}</dt><dd>${escapeHtml(value)}</dd></div>`);
  return `<dl class="block-facts">${written.join('')}</dl>`;
}

/** A sum with its figures as written; the sum itself is not worked here. */
function renderCalculator({ sum, figures }: CalculatorBlock): string {
  const words = sum.replace(/-/g, ' ');
  const written = Object.entries(figures).map(
    ([name, value]) => `<div><dt>${escapeHtml(name)}</dt><dd>${escapeHtml(value)}</dd></div>`,
  );
  return `${openTag('aside', { class: 'block calculator', 'data-sum': sum })}<p class="block-kind">Sum: ${escapeHtml(words)}</p><dl class="block-facts">${written.join('')}</dl></aside>`;
}
