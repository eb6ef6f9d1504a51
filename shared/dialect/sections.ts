import type { Root, RootContent } from 'mdast';
import { toString } from 'mdast-util-to-string';
import { linesOfNode } from './directive-source.ts';
import type { OutlineEntry, Section } from './page-text.ts';

/** Nodes that are not prose: tables and blocks are searched as lines, definitions are nowhere shown. */
const leftOut: ReadonlySet<string> = new Set(['table', 'blockPlace', 'definition', 'yaml', 'thematicBreak']);

/**
 * The page's prose by its headings, as plain text without tables and blocks. What stands before the first heading comes
 * first, where there is any.
 * @param outline the headings of the same tree
 */
export function readSections(tree: Root, outline: readonly OutlineEntry[]): readonly Section[] {
  const sections: { id: string; heading: string; parts: string[] }[] = [{ id: '', heading: '', parts: [] }];
  const byLine = new Map(outline.map((entry) => [entry.line, entry]));
  const visit = (node: RootContent): void => {
    if (leftOut.has(node.type)) return;
    if (node.type === 'heading') {
      const entry = byLine.get(linesOfNode(node).line);
      sections.push({ id: entry?.id ?? '', heading: entry?.text ?? '', parts: [] });
    } else if (hasFlow(node)) {
      node.children.forEach(visit);
    } else {
      const text = toString(node, { includeImageAlt: true }).replace(/\s+/g, ' ').trim();
      if (text !== '') sections.at(-1)?.parts.push(text);
    }
  };
  tree.children.forEach(visit);
  return sections
    .map(({ id, heading, parts }) => ({ id, heading, text: parts.join('\n') }))
    .filter(({ id, text }) => id !== '' || text !== '');
}

function hasFlow(node: RootContent): node is Extract<RootContent, { type: 'list' | 'listItem' | 'blockquote' | 'footnoteDefinition' }> {
  return ['list', 'listItem', 'blockquote', 'footnoteDefinition'].includes(node.type);
}
