import type { Finding } from '../pages/finding.ts';
import type { FrontMatter } from '../pages/front-matter.ts';
import type { Block } from './block.ts';
import { checkCautions, type PageHeading } from './check-cautions.ts';
import { checkCavities } from './check-cavities.ts';
import { checkIds, type IdsElsewhere } from './check-ids.ts';
import { checkShafts } from './check-shafts.ts';
import { checkSources } from './check-sources.ts';
import { isTableBlock } from './lines.ts';

/**
 * Finds what only a page as a whole can show: ids and cavities that stand twice, cavities outside their face, switches
 * that do not fit on one shaft, blocks without a source, hazards without a caution. In the order of the page's lines.
 * @param context ids of the subject's other pages, safe modifications left out
 * @param headings the page's headings; its title counts as one, on its first line
 */
export function checkBlocks(
  blocks: readonly Block[],
  frontMatter: FrontMatter,
  context: IdsElsewhere,
  headings: readonly PageHeading[],
): readonly Finding[] {
  const titled = [{ text: frontMatter.title, line: 1 }, ...headings];
  const findings = [
    ...checkIds(blocks, context, frontMatter.kind === 'safe-mods'),
    ...blocks.flatMap((block) => (block.kind === 'connector' ? [...checkCavities(block)] : [])),
    ...checkShafts(blocks),
    ...blocks.flatMap((block) => (isTableBlock(block) ? [...checkSources(block, frontMatter.sources)] : [])),
    ...checkCautions(blocks, titled),
  ];
  return findings.toSorted((a, b) => a.line - b.line);
}
