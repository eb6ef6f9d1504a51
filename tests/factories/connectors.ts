import type { ConnectorBlock } from '../../shared/blocks/block.ts';
import { readBlock } from '../../shared/blocks/read-block.ts';
import { parseTable } from '../../shared/blocks/table-source.ts';

/** A connector as `readBlock` reads it: attributes, and rows of `Cavity | Wire | Circuit | Goes to | Years | Markets`. */
export function connectorOf(attributes: Readonly<Record<string, string>>, rows: readonly string[]): ConnectorBlock {
  const table = ['| Cavity | Wire | Circuit | Goes to | Years | Markets |', '| - | - | - | - | - | - |', ...rows].join('\n');
  const source = { name: 'connector', id: 'plug', attributes, table: parseTable(table, 2), text: '', line: 1, endLine: 9 };
  const { block } = readBlock(source, { colours: { name: 'jis' } });
  if (block?.kind !== 'connector') throw new Error('This is no connector.');
  return block;
}
