import type { FootnoteDefinition, Root, RootContent } from 'mdast';

/**
 * Notes that the page nowhere refers to, and second ones of a name, would not be shown. They are put where they were
 * written, as text, since nothing that a member wrote is dropped.
 */
export function showUnnamedNotes(tree: Root): void {
  const named = new Set<string>();
  collectReferences(tree, named);
  const defined = new Set<string>();
  const visit = (node: Root | RootContent): void => {
    if (!('children' in node)) return;
    const children = node.children.flatMap((child): RootContent[] => {
      visit(child);
      if (child.type !== 'footnoteDefinition') return [child];
      const isShown = named.has(child.identifier) && !defined.has(child.identifier);
      defined.add(child.identifier);
      return isShown ? [child] : asText(child);
    });
    if (children.length !== node.children.length || children.some((child, at) => child !== node.children[at])) {
      node.children.splice(0, node.children.length, ...(children as typeof node.children));
    }
  };
  visit(tree);
}

function collectReferences(node: Root | RootContent, named: Set<string>): void {
  if (node.type === 'footnoteReference') named.add(node.identifier);
  else if ('children' in node) for (const child of node.children) collectReferences(child, named);
}

function asText({ label, identifier, children }: FootnoteDefinition): RootContent[] {
  const sign = { type: 'text', value: `[^${label ?? identifier}]: ` } as const;
  const [first, ...others] = children;
  if (first?.type === 'paragraph') return [{ ...first, children: [sign, ...first.children] }, ...others];
  return [{ type: 'paragraph', children: [sign] }, ...children];
}
