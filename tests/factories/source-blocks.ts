import remarkDirective from 'remark-directive';
import remarkParse from 'remark-parse';
import { unified } from 'unified';
import type { Block } from '../../shared/blocks/block.ts';
import { readBlock } from '../../shared/blocks/read-block.ts';
import type { SourceBlock } from '../../shared/blocks/source-table.ts';
import { parseTable } from '../../shared/blocks/table-source.ts';
import type { Finding } from '../../shared/pages/finding.ts';
import type { ColourSystem } from '../../shared/wire-colours/colour-system.ts';

const parser = unified().use(remarkParse).use(remarkDirective).freeze();

/** Reads the one directive in a text as the dialect would, with a parser that is not ours for its first line. */
export function sourceBlock(text: string): SourceBlock {
  const [node] = parser.parse(text).children;
  if (node?.type !== 'containerDirective' && node?.type !== 'leafDirective') throw new Error(`No directive in ${text}`);
  const line = node.position?.start.line ?? 1;
  const endLine = node.position?.end.line ?? line;
  const { id, ...attributes } = node.attributes ?? {};
  const inner = text.split('\n').slice(line, node.type === 'leafDirective' ? line : endLine - 1);
  const table = parseTable(inner.join('\n'), line + 1);
  const rest =
    table === null ? inner : inner.filter((_, at) => !isOfTable(at + line + 1, table.line, table.rows.length));
  const written = Object.entries(attributes).map(([name, value]): [string, string] => [name, value ?? '']);
  return {
    name: node.name,
    id: id ?? null,
    attributes: Object.fromEntries(written),
    table,
    text: rest.join('\n').trim(),
    line,
    endLine,
  };
}

function isOfTable(line: number, first: number, rows: number): boolean {
  return line >= first && line <= first + 1 + rows;
}

/** Reads a directive as a block of the kind that a test is about. */
export function blockOf<Kind extends Block['kind']>(
  kind: Kind,
  text: string,
  colours: ColourSystem = { name: 'jis' },
): { readonly block: Extract<Block, { kind: Kind }>; readonly findings: readonly Finding[] } {
  const { block, findings } = readBlock(sourceBlock(text), { colours });
  if (block === null || !isOfKind(block, kind))
    throw new Error(`No ${kind}: ${findings.map(({ message }) => message).join(' ')}`);
  return { block, findings };
}

function isOfKind<Kind extends Block['kind']>(block: Block, kind: Kind): block is Extract<Block, { kind: Kind }> {
  return block.kind === kind;
}

/** The findings of a directive that may give no block. */
export function findingsOf(text: string, colours: ColourSystem = { name: 'jis' }): readonly Finding[] {
  return readBlock(sourceBlock(text), { colours }).findings;
}
