import type { Element, RootContent } from 'hast';
import { escapeHtml, openTag } from './html-text.ts';

/** Elements that have no end tag. */
const empty: ReadonlySet<string> = new Set(['br', 'hr', 'img', 'input']);

/**
 * A safe tree's node as HTML. Knows the elements and attributes that `safeTree` lets pass, and no others.
 * @param instead gives the HTML that stands instead of an element; null where the element itself stands
 */
export function treeHtml(node: RootContent, instead: (element: Element) => string | null): string {
  if (node.type === 'text') return escapeHtml(node.value);
  if (node.type !== 'element') return '';
  const other = instead(node);
  if (other !== null) return other;
  const { tagName, properties, children } = node;
  let html = openTag(tagName, attributesOf(properties));
  if (empty.has(tagName)) return html;
  for (const child of children) html += treeHtml(child, instead);
  return `${html}</${tagName}>`;
}

function attributesOf(properties: Element['properties']): Readonly<Record<string, string | number | boolean | null>> {
  const attributes: Record<string, string | number | boolean | null> = {};
  for (const property in properties) {
    const value = properties[property];
    if (value === undefined || value === null) continue;
    attributes[attributeName(property)] = Array.isArray(value) ? value.join(' ') : value;
  }
  return attributes;
}

const names = new Map([
  ['className', 'class'],
  ['tabIndex', 'tabindex'],
  ['ariaDescribedBy', 'aria-describedby'],
]);

/** `dataFootnoteRef` is `data-footnote-ref`, `ariaLabel` is `aria-label`. */
function attributeName(property: string): string {
  const known = names.get(property);
  if (known !== undefined) return known;
  const name = property.replace(/[A-Z]/g, (letter) => `-${letter.toLowerCase()}`);
  names.set(property, name);
  return name;
}
