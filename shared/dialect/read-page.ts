import type { Root } from 'mdast';
import { checkBlocks } from '../blocks/check-blocks.ts';
import { accept, refuse, type Result } from '../lib/result.ts';
import type { Finding } from '../pages/finding.ts';
import type { FrontMatter } from '../pages/front-matter.ts';
import { readFrontMatter, type FrontMatterReading } from '../pages/read-front-matter.ts';
import { dropHtml } from './drop-html.ts';
import { linesOfNode } from './directive-source.ts';
import { lookForLimits } from './look-for-limits.ts';
import { readOutline } from './outline.ts';
import type { PageText, SubjectContext, TextRefusal } from './page-text.ts';
import { parseMarkdown } from './parse-markdown.ts';
import { placeBlocks, type PlacedBlocks } from './place-blocks.ts';
import { safeTree } from './safe-tree.ts';
import { readSections } from './sections.ts';
import { sourceLines, type SourceLines } from './source-lines.ts';
import { showUnnamedNotes } from './unnamed-notes.ts';
import { areSpared, spareRows, type SparedText } from './spare-rows.ts';
import { findUnreadOpenings } from './unread-openings.ts';

const nothingElsewhere: SubjectContext = { idsElsewhere: [] };

/**
 * Reads a page's Markdown: front matter, outline, prose, blocks, findings in the order of lines, and the safe tree that
 * `renderPage` turns into HTML. Never throws; refuses a text that passes one of `textLimits`, and says which.
 * @param markdown the page's whole text, in any line breaks
 * @param context what the subject's other pages have, for ids that stand twice
 */
export function readPage(markdown: string, context: SubjectContext = nothingElsewhere): Result<PageText, TextRefusal> {
  const limit = lookForLimits(markdown);
  if (limit !== null) return refuse(limit);
  const { tree, frontMatter, blocks, findings: unread } = placePage(markdown, sourceLines(markdown));
  const leftOut = dropHtml(tree);
  showUnnamedNotes(tree);
  showFurtherCells(tree);
  const outline = readOutline(tree);
  const findings = [...unread, ...leftOut, ...checkBlocks(blocks, frontMatter, context, outline)];
  return accept({
    frontMatter,
    outline,
    sections: readSections(tree, outline),
    blocks,
    findings: findings.toSorted((a, b) => a.line - b.line),
    tree: safeTree(tree, outline),
  });
}

interface PlacedPage extends PlacedBlocks {
  readonly tree: Root;
  readonly frontMatter: FrontMatter;
}

/** Parses a page and reads its blocks. */
function placePage(markdown: string, source: SourceLines): PlacedPage {
  const spared = spareRows(markdown, source);
  const placed = spared === null ? null : placeSpared(spared, source);
  return placed ?? placeParsed(parseWithBlocks(markdown, source), source);
}

/** The page by the text whose rows are empty; null where the parser has to see them, or to parse twice. */
function placeSpared({ markdown, rows }: SparedText, source: SourceLines): PlacedPage | null {
  const tree = parseMarkdown(markdown);
  const openings = findUnreadOpenings(tree, source);
  if (openings.some(({ attributes }) => attributes !== null)) return null;
  const findings = openings.map((opening) => opening.finding);
  const placed = placeParsed({ tree, unreadOpenings: new Map(), findings }, source);
  return areSpared(rows, placed.blocks) ? placed : null;
}

function placeParsed({ tree, unreadOpenings, findings: openings }: ParsedPage, source: SourceLines): PlacedPage {
  const { frontMatter, findings: unreadFields } = takeFrontMatter(tree);
  const { blocks, findings: unreadBlocks } = placeBlocks(tree, { source, page: frontMatter, unreadOpenings });
  return { tree, frontMatter, blocks, findings: [...unreadFields, ...openings, ...unreadBlocks] };
}

interface ParsedPage {
  readonly tree: Root;
  readonly unreadOpenings: ReadonlyMap<number, string>;
  readonly findings: readonly Finding[];
}

/**
 * Parses a page. Where a block's attributes do not parse, the parser would take its fence for text and its table for a
 * plain one: it is parsed again with those attributes blanked out, so that the block is known by its place and its end.
 */
function parseWithBlocks(markdown: string, source: SourceLines): ParsedPage {
  const tree = parseMarkdown(markdown);
  const openings = findUnreadOpenings(tree, source);
  const findings = openings.map((opening) => opening.finding);
  const blanked = openings.flatMap(({ attributes }) => (attributes === null ? [] : [attributes]));
  if (blanked.length === 0) return { tree, unreadOpenings: new Map(), findings };
  let text = '';
  let copied = 0;
  for (const { from, to } of blanked) {
    text += markdown.slice(copied, from) + ' '.repeat(to - from);
    copied = to;
  }
  const unreadOpenings = new Map(
    openings.flatMap(({ line, attributes, finding: { message } }) => (attributes === null ? [] : [[line, message] as const])),
  );
  return { tree: parseMarkdown(text + markdown.slice(copied)), unreadOpenings, findings };
}

/** Takes the front matter out of the tree and reads it. */
function takeFrontMatter(tree: Root): FrontMatterReading {
  const first = tree.children[0];
  if (first?.type === 'yaml') {
    tree.children.shift();
    return readFrontMatter(first.value, linesOfNode(first).line + 1);
  }
  return readFrontMatter('', 1);
}

/** A row may have more cells than its table has headings; they are shown too, without a heading. */
function showFurtherCells(tree: Root): void {
  for (const node of tree.children) {
    if (node.type !== 'table') continue;
    const widest = node.children.reduce((most, { children }) => Math.max(most, children.length), 0);
    const align = node.align ?? [];
    while (align.length < widest) align.push(null);
    node.align = align;
  }
}
