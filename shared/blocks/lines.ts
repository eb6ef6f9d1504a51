import type { Block, TableBlock } from './block.ts';

/** A line of any kind of block. */
export type TableLine = TableBlock['lines'][number];

/** True where a block has lines. */
export function isTableBlock(block: Block): block is TableBlock {
  return block.kind !== 'hazard' && block.kind !== 'calculator';
}

/** The blocks that have lines, in their order. */
export function tableBlocks(blocks: readonly Block[]): readonly TableBlock[] {
  return blocks.filter(isTableBlock);
}

/** A block's lines in the order of its table; a caution and a sum have none. */
export function linesOf(block: Block): readonly TableLine[] {
  return isTableBlock(block) ? block.lines : [];
}

/** A block's own address without `#`: its id, else its first line's; null where it has neither. */
export function blockAddress(block: Block): string | null {
  return block.id ?? linesOf(block)[0]?.address ?? null;
}
