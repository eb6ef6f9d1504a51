import type { Root, RootContent } from 'mdast';
import { formatBlock } from '../blocks/format-block.ts';
import { directiveSource, isOwnDirective, linesOfNode, type OwnDirective } from './directive-source.ts';
import { lookForLimits } from './look-for-limits.ts';
import { parseMarkdown } from './parse-markdown.ts';
import { sourceLines, type SourceLines } from './source-lines.ts';

/** A stretch of the page's lines, from 1, both ends included, and what takes its place. */
interface Rewrite {
  readonly from: number;
  readonly to: number;
  readonly lines: readonly string[];
}

/**
 * Writes the blocks of a page as the book does: attributes in order, tables with aligned columns. Everything else is left
 * byte for byte, line breaks too. Written twice it is the same; parsed again it has the same blocks. A text that passes a
 * limit is given back as it is.
 */
export function formatPage(markdown: string): string {
  if (lookForLimits(markdown) !== null) return markdown;
  const source = sourceLines(markdown);
  const rewrites = rewritesIn(parseMarkdown(markdown), source).toSorted((a, b) => a.from - b.from);
  if (rewrites.length === 0) return markdown;
  const { lines, offsets } = source;
  let text = '';
  let copied = 0;
  for (const { from, to, lines: written } of rewrites) {
    const start = offsets[from - 1] ?? 0;
    const last = lines[to - 1] ?? '';
    const first = lines[from - 1] ?? '';
    const lineBreak = markdown.slice(start + first.length, offsets[from] ?? markdown.length) || '\n';
    text += markdown.slice(copied, start) + written.join(lineBreak);
    copied = (offsets[to - 1] ?? 0) + last.length;
  }
  return text + markdown.slice(copied);
}

function rewritesIn(node: Root | RootContent, source: SourceLines): Rewrite[] {
  if (!('children' in node)) return [];
  return node.children.flatMap((child): Rewrite[] => {
    if (!isOwnDirective(child)) return [];
    return [...rewritesOf(child, source), ...rewritesIn(child, source)];
  });
}

/**
 * The opening line and the table are written anew; fences and other text inside stay. A block that stands in a quote or a
 * list, or says something that would be lost, is left as it is.
 */
function rewritesOf(node: OwnDirective, source: SourceLines): readonly Rewrite[] {
  const { block, fence, column } = directiveSource(node, source);
  const { line } = block;
  const opening = source.lines[line - 1] ?? '';
  if (column !== 1 || isLossy(opening, node)) return [];
  const [head = '', ...rest] = formatBlock({ ...block, text: '' }).split('\n');
  const rewrites: Rewrite[] = [{ from: line, to: line, lines: [head.replace(/^:+/, ':'.repeat(fence))] }];
  const table = node.children.find(({ type }) => String(type) === 'table');
  if (table !== undefined && block.table !== null && block.name !== 'hazard') {
    const place = linesOfNode(table);
    rewrites.push({ from: place.line, to: place.endLine, lines: rest.slice(0, -1) });
  }
  return rewrites;
}

/** True where the opening line has what is not among its attributes: a label, or an attribute written twice. */
function isLossy(opening: string, node: OwnDirective): boolean {
  const outside = opening.replace(/^:+[a-z]+/, '').replace(/"[^"]*"|'[^']*'/g, '""');
  if (outside.startsWith('[')) return true;
  const written = [...outside.matchAll(/[^\s{}#.="]+(?==)|[#.][^\s{}#.="]+|(?<=[\s{])[^\s{}#.="]+(?=[\s}])/g)].length;
  return written !== Object.keys(node.attributes ?? {}).length;
}
