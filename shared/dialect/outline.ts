import type { Heading, Root, RootContent } from 'mdast';
import { toString } from 'mdast-util-to-string';
import { slugOf } from '../lib/slug.ts';
import { linesOfNode } from './directive-source.ts';
import type { OutlineEntry } from './page-text.ts';

/**
 * The headings of a page in the order of its text, each with an anchor of its own that begins with `s-`. In the tree each
 * heading is given its number in the outline, by which the anchor is put on once the tree has been made safe.
 */
export function readOutline(tree: Root): readonly OutlineEntry[] {
  const anchors = new Anchors();
  const outline: OutlineEntry[] = [];
  const visit = (node: Root | RootContent): void => {
    if (node.type === 'heading') {
      const text = textOfHeading(node);
      const index = outline.push({ level: node.depth, text, id: anchors.take(text), line: linesOfNode(node).line }) - 1;
      node.data = { ...node.data, hProperties: { dataOutline: String(index) } };
    } else if ('children' in node) {
      node.children.forEach(visit);
    }
  };
  visit(tree);
  return outline;
}

function textOfHeading(heading: Heading): string {
  return toString(heading, { includeImageAlt: true }).replace(/\s+/g, ' ').trim();
}

/** Anchors that have not been used yet. */
class Anchors {
  readonly #used = new Set<string>();
  readonly #next = new Map<string, number>();

  take(text: string): string {
    const slug = slugOf(text);
    const base = `s-${slug === '' ? 'section' : slug}`;
    let anchor = base;
    for (let count = this.#next.get(base) ?? 2; this.#used.has(anchor); count += 1) {
      anchor = `${base}-${count}`;
      this.#next.set(base, count + 1);
    }
    this.#used.add(anchor);
    return anchor;
  }
}
