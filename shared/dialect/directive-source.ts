import type { Root, RootContent } from 'mdast';
import type {} from 'remark-directive';
import type { SourceBlock } from '../blocks/source-table.ts';
import { parseTable } from '../blocks/table-source.ts';
import { linesBetween, type SourceLines } from './source-lines.ts';

/** A directive of the book in a parsed page. */
export type OwnDirective = Extract<RootContent, { type: 'containerDirective' | 'leafDirective' }>;

/** True for a directive node; the parser knows none but the book's own. */
export function isOwnDirective(node: RootContent): node is OwnDirective {
  return node.type === 'containerDirective' || node.type === 'leafDirective';
}

/** First and last line of a node, counted from 1. A parsed node always has them. */
export function linesOfNode(node: RootContent | Root): { readonly line: number; readonly endLine: number } {
  return { line: node.position?.start.line ?? 1, endLine: node.position?.end.line ?? 1 };
}

/** A directive as its source text has it. */
export interface DirectiveSource {
  readonly block: SourceBlock;
  /** Its first line, as written. */
  readonly opening: string;
  /** How many colons it begins with. */
  readonly fence: number;
  /** True where a line of colons ends it, or it is a leaf. */
  readonly closed: boolean;
  /** The column, from 1, at which it stands. */
  readonly column: number;
}

/** Reads a directive from the page's own text: attributes, the first table inside it, and the rest of the text. */
export function directiveSource(node: OwnDirective, source: SourceLines): DirectiveSource {
  const { line, endLine } = linesOfNode(node);
  const column = node.position?.start.column ?? 1;
  const opening = source.lines[line - 1]?.slice(column - 1) ?? '';
  const fence = /^:*/.exec(opening)?.[0].length ?? 0;
  const isContainer = node.type === 'containerDirective';
  const closed = !isContainer || (endLine > line && closes(source.lines[endLine - 1] ?? '', fence));
  const table = isContainer ? node.children.find(({ type }) => type === 'table') : undefined;
  const lastInside = isContainer ? endLine - (closed ? 1 : 0) : line;
  const inside = linesBetween(source, line + 1, lastInside, column);
  const tableLines = table === undefined ? null : linesOfNode(table);
  const block: SourceBlock = {
    name: node.name,
    id: node.attributes?.['id'] ?? null,
    attributes: attributesOf(node),
    table: tableLines === null ? null : readTable(inside, line + 1, tableLines.line, tableLines.endLine),
    text: textBeside(inside, line + 1, tableLines).join('\n').trim(),
    line,
    endLine,
  };
  return { block, opening, fence, closed, column };
}

function closes(lastLine: string, fence: number): boolean {
  const colons = /^[\s>]*(:{3,})[ \t]*$/.exec(lastLine)?.[1];
  return colons !== undefined && colons.length >= fence;
}

function attributesOf({ attributes }: OwnDirective): Readonly<Record<string, string>> {
  const written = Object.entries(attributes ?? {}).filter(([name]) => name !== 'id');
  return Object.fromEntries(written.map(([name, value]) => [name, value ?? '']));
}

function readTable(inside: readonly string[], firstLine: number, from: number, to: number): SourceBlock['table'] {
  return parseTable(inside.slice(from - firstLine, to - firstLine + 1).join('\n'), from);
}

function textBeside(
  inside: readonly string[],
  firstLine: number,
  table: { readonly line: number; readonly endLine: number } | null,
): readonly string[] {
  if (table === null) return inside;
  return inside.filter((_, at) => at + firstLine < table.line || at + firstLine > table.endLine);
}
