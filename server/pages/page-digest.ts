import type { Block, ConnectorBlock } from '../../shared/blocks/block.ts';
import { isCited } from '../../shared/blocks/cited.ts';
import { linesOf } from '../../shared/blocks/lines.ts';
import type { PageText } from '../../shared/dialect/page-text.ts';
import type { FaceLayout } from '../../shared/blocks/face-layout.ts';
import type { Applicability } from '../../shared/pages/applicability.ts';
import type { FrontMatter } from '../../shared/pages/front-matter.ts';
import { parseYears } from '../../shared/pages/years.ts';
import type { ConnectorEntry, PageDigest, StoredDocument } from '../db/schema/derived.ts';

/** What is counted of a page, and its digest. */
export interface CountedDigest {
  readonly lines: number;
  /** Lines that a factory manual or a standard says. */
  readonly cited: number;
  readonly digest: PageDigest;
}

function cavitiesOf(layout: FaceLayout): number {
  return layout.kind === 'ring' ? layout.cavities : layout.rows.flat().filter((isCavity) => isCavity).length;
}

/** A layout as a block may write it: `xx.xx+xxxxx`, `round 6`. */
function writtenLayout(layout: FaceLayout): string {
  if (layout.kind === 'ring') return `round ${String(layout.cavities)}`;
  return layout.rows.map((row) => row.map((isCavity) => (isCavity ? 'x' : '.')).join('')).join('+');
}

function connectorEntry(block: ConnectorBlock): ConnectorEntry {
  return {
    id: block.id,
    name: block.name ?? block.id,
    zone: block.zone,
    cavities: cavitiesOf(block.layout),
    layout: writtenLayout(block.layout),
  };
}

/** The ids that a block gives; `inside` names a component that stands elsewhere, and gives none. */
function idsOf(block: Block): string[] {
  if (block.kind === 'inside') return [];
  const own = block.id === null ? [] : [block.id];
  return block.kind === 'components' ? [...own, ...block.lines.map((line) => line.id)] : own;
}

/** What the donor's own facts say of its years and markets: a reader may choose those before any line differs. */
function factsApplicability({ facts }: FrontMatter): Applicability {
  const years = facts.years === null ? null : parseYears(facts.years);
  return { years: years ?? [], markets: facts.markets, frames: [] };
}

function distinct(applicabilities: readonly Applicability[]): Applicability[] {
  return [...new Map(applicabilities.map((one) => [JSON.stringify(one), one])).values()];
}

/** Counts a page's lines, and digests it for lists and for the subject's other pages. */
export function digestOf({ frontMatter, blocks }: PageText): CountedDigest {
  const lines = blocks.flatMap((block) => [...linesOf(block)]);
  const connectors = blocks.filter((block) => block.kind === 'connector');
  return {
    lines: lines.length,
    cited: lines.filter((line) => isCited(line.cite, frontMatter.sources)).length,
    digest: {
      facts: frontMatter.facts,
      connectors: connectors.map(connectorEntry),
      ids: [...new Set(blocks.flatMap(idsOf))],
      applicabilities: distinct([
        factsApplicability(frontMatter),
        frontMatter.applies,
        ...lines.map(({ applies }) => applies),
      ]),
    },
  };
}

/** What the search indexes of a page: everything that was read but the tree. */
export function documentOf({ frontMatter, outline, sections, blocks }: PageText): StoredDocument {
  return { frontMatter, outline, sections, blocks };
}
