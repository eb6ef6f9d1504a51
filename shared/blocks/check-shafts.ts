import { quoted, shortened } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import type { Block, SwitchBlock } from './block.ts';

/** More than these are not named in one sentence. */
const mostNamed = 10;

/**
 * Finds switches on one shaft (`moves-with`) whose positions are not called the same, since one position chooses both by
 * its name. A switch on another page is not looked at here.
 */
export function checkShafts(blocks: readonly Block[]): readonly Finding[] {
  return blocks.flatMap((block) => {
    if (block.kind !== 'switch' || block.movesWith === null) return [];
    const other = blocks.find(({ id, kind }) => id === block.movesWith && kind !== 'inside');
    if (other === undefined) return [];
    const problem =
      other.kind === 'switch' && other !== block
        ? differentPositions(block, other)
        : `\`${shortened(block.movesWith)}\` is no other switch`;
    if (problem === null) return [];
    const message = `The switch \`${block.id}\` moves with \`${shortened(block.movesWith)}\`, but ${problem}. Both tables need the same positions, by the same names.`;
    return [finding('block-unreadable', message, block.line, `#${block.id}`)];
  });
}

function differentPositions(one: SwitchBlock, other: SwitchBlock): string | null {
  const missing = [...positionsLacking(one, other), ...positionsLacking(other, one)];
  return missing.length === 0 ? null : missing.slice(0, mostNamed).join('; ');
}

function positionsLacking(has: SwitchBlock, lacks: SwitchBlock): readonly string[] {
  const known = new Set(lacks.lines.map(({ position }) => position.toLowerCase()));
  const names = [...new Set(has.lines.map(({ position }) => position))];
  return names
    .filter((name) => !known.has(name.toLowerCase()))
    .map((name) => `${quoted(name)} of \`${has.id}\` is no position of \`${lacks.id}\``);
}
