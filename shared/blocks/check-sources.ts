import { shortened } from '../lib/quoted.ts';
import { finding, type Finding } from '../pages/finding.ts';
import type { Source } from '../pages/front-matter.ts';
import type { TableBlock } from './block.ts';
import { namesIn } from './cell-text.ts';
import { blockAddress } from './lines.ts';

/** More than these are not named in one sentence. */
const mostNamed = 10;

/** The ids of the sources that a `cite` names. */
export function citedIds(cite: string | null): readonly string[] {
  return namesIn(cite ?? '');
}

/** Finds a block that says nowhere what it was taken from, or names a source that the page does not list. */
export function checkSources(block: TableBlock, sources: readonly Source[]): readonly Finding[] {
  if (block.lines.length === 0) return [];
  const address = blockAddress(block);
  const at = address === null ? undefined : `#${address}`;
  const label = block.id === null ? `This ${block.kind} block` : `The ${block.kind} block \`${block.id}\``;
  const unlisted = unlistedIds(block, sources);
  if (unlisted.length > 0) {
    const message = `${label} cites ${unlisted
      .slice(0, mostNamed)
      .map((id) => `\`${shortened(id)}\``)
      .join(', ')}, which the page does not list. List it under \`sources\` in the front matter, or correct the id.`;
    return [finding('uncited', message, block.line, at)];
  }
  if (block.cite !== null || block.lines.every(({ cite }) => cite !== null)) return [];
  const message = `${label} does not say where it was taken from. List the source in the front matter and write cite="its id" in the block.`;
  return [finding('uncited', message, block.line, at)];
}

function unlistedIds(block: TableBlock, sources: readonly Source[]): readonly string[] {
  const listed = new Set(sources.map(({ id }) => id));
  const cited = [block.cite, ...block.lines.map(({ cite }) => cite)].flatMap((cite) => [...citedIds(cite)]);
  return [...new Set(cited)].filter((id) => !listed.has(id));
}
