import type { Root, RootContent } from 'mdast';
import { toString } from 'mdast-util-to-string';
import { finding, type Finding } from '../pages/finding.ts';
import { linesOfNode } from './directive-source.ts';

/** Tags that stand inside a word or a line; where any other one stood a space keeps the words apart. */
const inlineTags = new Set(
  'a abbr b bdi bdo cite code del dfn em font i ins kbd mark q s samp small span strike strong sub sup time tt u var wbr'.split(' '),
);

/**
 * Takes raw HTML out of a parsed page: the tags go, the words between them stay, `<br>` becomes a line break. Gives a
 * hint where there was any, at the first tag.
 */
export function dropHtml(tree: Root): readonly Finding[] {
  let first: number | null = null;
  let tags = 0;
  const visit = (node: Root | RootContent): void => {
    if (!('children' in node)) return;
    for (let at = node.children.length - 1; at >= 0; at -= 1) {
      const child = node.children[at];
      if (child === undefined) continue;
      if (child.type !== 'html') {
        const before = tags;
        visit(child);
        // A remark by itself, or tags around nothing, leave no empty paragraph.
        if (tags > before && child.type === 'paragraph' && toString(child).trim() === '') node.children.splice(at, 1);
        continue;
      }
      const { line } = linesOfNode(child);
      first = first === null ? line : Math.min(first, line);
      tags += 1;
      const instead = insteadOf(child.value);
      // HTML is parsed inside text only, where text and breaks may stand.
      node.children.splice(at, 1, ...((instead === null ? [] : [instead]) as typeof node.children));
    }
  };
  visit(tree);
  if (first === null) return [];
  const what = tags === 1 ? 'An HTML tag is' : `${tags} HTML tags are`;
  const message = `${what} left out; the words between stay. Write Markdown instead: **bold**, lists, tables.`;
  return [finding('html-left-out', message, first)];
}

function insteadOf(tag: string): RootContent | null {
  const name = /^<\/?([a-z][a-z0-9-]*)/i.exec(tag)?.[1]?.toLowerCase();
  if (name === 'br') return { type: 'break' };
  return name === undefined || inlineTags.has(name) ? null : { type: 'text', value: ' ' };
}
