import type { SourceBlock } from './source-table.ts';
import { formatTable } from './table-source.ts';

/**
 * Writes a directive as source text: its id first, its other attributes in their order, its table with aligned columns,
 * then whatever else stands inside. Fences are longer than any fence inside. Nothing that was written is lost; without a
 * last line break.
 */
export function formatBlock(source: SourceBlock): string {
  const { name, table, text } = source;
  const opening = `${name}${formatAttributes(source)}`;
  const inside = [table === null ? '' : formatTable(table), withoutEmptyEnds(text)].filter((part) => part !== '');
  if (name === 'calculator' && inside.length === 0) return `::${opening}`;
  const fence = ':'.repeat(Math.max(3, longestFence(text) + 1));
  return [`${fence}${opening}`, ...(inside.length === 0 ? [] : [inside.join('\n\n')]), fence].join('\n');
}

function withoutEmptyEnds(text: string): string {
  const lines = text.trimEnd().split(/\r\n|\n|\r/);
  const first = lines.findIndex((line) => line.trim() !== '');
  return lines.slice(Math.max(0, first)).join('\n');
}

function formatAttributes({ id, attributes }: SourceBlock): string {
  const written = Object.entries(attributes)
    .filter(([name]) => name !== 'id')
    .map(([name, value]) => `${name}=${quote(value)}`);
  const all = id === null ? written : [/^[\w-]+$/.test(id) ? `#${id}` : `id=${quote(id)}`, ...written];
  return all.length === 0 ? '' : `{${all.join(' ')}}`;
}

/** A value between quotes; character references stand for what would end it or be read as one. */
function quote(value: string): string {
  const plain = value.replace(/&(?=#?\w)/g, '&amp;').replace(/[\r\n]+/g, ' ');
  return plain.includes('"') && !plain.includes("'") ? `'${plain}'` : `"${plain.replace(/"/g, '&quot;')}"`;
}

function longestFence(text: string): number {
  const fences = text.matchAll(/^[ \t]*(:{3,})/gm);
  return [...fences].reduce((longest, [, colons]) => Math.max(longest, colons?.length ?? 0), 2);
}
