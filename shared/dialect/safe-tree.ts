import type { Root as HtmlRoot, RootContent as HtmlContent, Element, ElementContent } from 'hast';
import type { Root } from 'mdast';
import rehypeSanitize, { type Options as Schema } from 'rehype-sanitize';
import remarkRehype from 'remark-rehype';
import { unified } from 'unified';
import type { OutlineEntry } from './page-text.ts';

/**
 * What may stand in a page, and nothing else: a list of our own, since the usual ones allow for raw HTML and this book
 * drops it. There is no `style`, no `on…`, no `class` but the few that Markdown itself makes.
 */
const schema: Schema = {
  tagNames: [
    'a', 'blockquote', 'br', 'code', 'del', 'div', 'em', 'h1', 'h2', 'h3', 'h4', 'h5', 'h6', 'hr', 'img', 'input', 'li', 'ol',
    'p', 'pre', 'section', 'strong', 'sup', 'table', 'tbody', 'td', 'th', 'thead', 'tr', 'ul',
  ],
  attributes: {
    a: [
      'href', 'title', 'ariaLabel', 'dataFootnoteRef', 'dataFootnoteBackref', ['id', /^note-fnref-/],
      ['ariaDescribedBy', 'footnote-label'], ['className', 'data-footnote-backref'],
    ],
    code: [['className', /^language-./]],
    div: [['dataBlock', /^\d+$/], ['className', 'unread']],
    h1: [['dataOutline', /^\d+$/]],
    h2: [['dataOutline', /^\d+$/], ['id', 'footnote-label'], ['className', 'notes-label']],
    h3: [['dataOutline', /^\d+$/]],
    h4: [['dataOutline', /^\d+$/]],
    h5: [['dataOutline', /^\d+$/]],
    h6: [['dataOutline', /^\d+$/]],
    img: ['src', 'alt', 'title'],
    input: [['type', 'checkbox'], ['disabled', true], 'checked'],
    li: [['id', /^note-fn-/], ['className', 'task-list-item']],
    ol: ['start', ['className', 'contains-task-list']],
    section: ['dataFootnotes', ['className', 'footnotes']],
    td: [['align', 'left', 'right', 'center']],
    th: [['align', 'left', 'right', 'center']],
    ul: [['className', 'contains-task-list']],
  },
  protocols: { href: ['http', 'https', 'mailto', 'tel'], src: [] },
  required: { input: { disabled: true, type: 'checkbox' } },
  ancestors: { td: ['table'], th: ['table'], tr: ['table'], thead: ['table'], tbody: ['table'] },
  // Ids come from notes only, and have a prefix of their own already.
  clobber: [],
  strip: ['script', 'style'],
};

const processor = unified()
  .use(remarkRehype, {
    clobberPrefix: 'note-',
    footnoteLabel: 'Notes',
    footnoteLabelProperties: { className: ['notes-label'] },
    footnoteBackLabel: (reference, again) => `Back to where note ${reference + 1} is named${again > 1 ? `, ${again}` : ''}`,
  })
  .use(() => settleAddresses)
  .use(rehypeSanitize, schema)
  .freeze();

/** Turns a page's tree into a safe HTML tree without positions, with its headings' anchors on. */
export function safeTree(tree: Root, outline: readonly OutlineEntry[]): HtmlRoot {
  const safe = processor.runSync(tree);
  for (const child of safe.children) finish(child, outline);
  delete safe.position;
  const { children } = safe;
  safe.children = children.map((child) => (child.type === 'element' ? scrollable(child) : child));
  return safe;
}

const ownPhoto = /^\/photos\/[0-9a-f]{64}\.webp$/;

/**
 * Only the book's own photographs are shown; an image from elsewhere becomes its words, as a link where none is around.
 * Schemes are written in small letters, as the list of safe ones has them.
 */
function settleAddresses(tree: HtmlRoot): void {
  for (const child of tree.children) settleIn(child, false);
}

function settleIn(node: HtmlContent, insideLink: boolean): void {
  if (node.type !== 'element') return;
  const { properties, tagName } = node;
  if (tagName === 'img') settleImage(node, insideLink);
  if (typeof properties['href'] === 'string') {
    properties['href'] = properties['href'].replace(/^[a-z][a-z0-9+.-]*:/i, (scheme) => scheme.toLowerCase());
  }
  for (const child of node.children) settleIn(child, insideLink || tagName === 'a');
}

function settleImage(image: Element, insideLink: boolean): void {
  const { src, alt, title } = image.properties;
  if (typeof src !== 'string' || ownPhoto.test(src)) return;
  const words = typeof alt === 'string' && alt.trim() !== '' ? alt : src;
  const text: ElementContent = { type: 'text', value: words };
  image.tagName = insideLink ? 'span' : 'a';
  image.properties = insideLink ? {} : title === undefined ? { href: src } : { href: src, title };
  image.children = [text];
}

/** Anchors, links that lead away, images that wait, headings below the page's own. */
function finish(node: HtmlContent, outline: readonly OutlineEntry[]): void {
  delete node.position;
  delete node.data;
  if (node.type !== 'element') return;
  const { properties, tagName } = node;
  const entry = typeof properties['dataOutline'] === 'string' ? outline[Number(properties['dataOutline'])] : undefined;
  delete properties['dataOutline'];
  if (entry !== undefined) properties['id'] = entry.id;
  // The page's title is the sheet's only first heading.
  if (tagName === 'h1') node.tagName = 'h2';
  if (tagName === 'a' && leadsAway(properties['href'])) properties['rel'] = ['nofollow', 'noopener'];
  if (tagName === 'img') properties['loading'] = 'lazy';
  for (const child of node.children) finish(child, outline);
}

/** True for another site: a scheme, or two slashes of either kind, which browsers take for the same. */
function leadsAway(href: Element['properties'][string]): boolean {
  return typeof href === 'string' && (/^https?:/i.test(href) || /^[\\/]{2}/.test(href));
}

/** A plain table may be wider than a phone: it scrolls by itself, by keyboard too. */
function scrollable(node: Element): Element {
  if (node.tagName === 'table') {
    const properties = { className: ['table-scroll'], tabIndex: 0, role: 'group', ariaLabel: 'Table' };
    return { type: 'element', tagName: 'div', properties, children: [node] };
  }
  node.children = node.children.map((child) => (child.type === 'element' ? scrollable(child) : child));
  return node;
}
