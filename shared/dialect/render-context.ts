import type { Block, TerminalName } from '../blocks/block.ts';
import { formatTerminalName } from '../blocks/terminal-name.ts';
import type { Variant } from '../pages/applicability.ts';
import type { Source } from '../pages/front-matter.ts';
import { appliesTo } from '../pages/variant.ts';
import type { PageText } from './page-text.ts';

/** What the rendering of one page knows everywhere. */
export interface RenderContext {
  readonly variant: Variant;
  readonly sources: readonly Source[];
  /** Where a terminal stands on this page, as an address; null where it does not. */
  placeOf(name: TerminalName): string | null;
  /** Gives an id back the first time that it is asked for, null after: a page has each id once. */
  takeId(id: string): string | null;
}

/** Gathers what the blocks of a page refer to. */
export function createRenderContext({ blocks, frontMatter, outline }: PageText, variant: Variant): RenderContext {
  const places = placesOf(blocks, variant);
  const components = new Set(
    blocks.flatMap((block) => (block.kind === 'components' ? block.lines.map(({ id }) => id) : [])),
  );
  const used = new Set(outline.map(({ id }) => id));
  return {
    variant,
    sources: frontMatter.sources,
    placeOf(name) {
      // A component's terminals have no lines of their own: its own line stands for them.
      return places.get(formatTerminalName(name)) ?? (components.has(name.id) ? (places.get(name.id) ?? null) : null);
    },
    takeId(id) {
      const attribute = id.replace(/\s+/g, '-');
      if (used.has(attribute) || attribute === '') return null;
      used.add(attribute);
      return attribute;
    },
  };
}

/** The address at which each terminal and block of a page stands; of several lines, the first that holds for the variant. */
function placesOf(blocks: readonly Block[], variant: Variant): ReadonlyMap<string, string> {
  const places = new Map<string, string>();
  const setBack = new Map<string, string>();
  for (const block of blocks) {
    if (block.kind === 'connector' || block.kind === 'switch') places.set(block.id, block.id);
    if (block.kind === 'connector' || block.kind === 'components') {
      for (const line of block.lines) {
        const name = 'cavity' in line ? `${block.id ?? ''}.${line.cavity}` : line.id;
        const chosen = appliesTo(line.applies, variant).applies ? places : setBack;
        if (!chosen.has(name)) chosen.set(name, line.address);
      }
    }
    if (block.kind === 'switch') {
      for (const contact of block.contacts) places.set(`${block.id}.${contact}`, `${block.id}.${contact}`);
    }
  }
  for (const [name, address] of setBack) if (!places.has(name)) places.set(name, address);
  return places;
}
