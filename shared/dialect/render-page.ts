import type { Element, ElementContent, Root, RootContent } from 'hast';
import { toHtml } from 'hast-util-to-html';
import type { Block } from '../blocks/block.ts';
import { drawFaceThumbnail } from '../drawing/draw-thumbnails.ts';
import { drawingMarkup } from '../drawing/drawing.ts';
import { faceOf } from '../drawing/face.ts';
import type { PageAddress } from '../pages/address.ts';
import type { Variant } from '../pages/applicability.ts';
import { escapeHtml, fragment, openTag } from './html-text.ts';
import type { PageText } from './page-text.ts';
import { renderBlock } from './render-block.ts';
import { renderMeasuringCaution, renderMissingCautions, renderRoutingCaution } from './render-caution.ts';
import { createRenderContext, type RenderContext } from './render-context.ts';

/** For whom a page is rendered. */
export interface RenderOptions {
  /** Where the page stands; null for a text that has no page yet. */
  readonly address: PageAddress | null;
  /** The bike on the bench: lines that do not hold for it are set back, and say why. */
  readonly variant: Variant;
  readonly marks: 'shown';
}

/**
 * Turns a page's text, as `readPage` gave it, into safe HTML with the drawings in it. The tree has been made safe before;
 * what is added here, ids of lines and drawings, is made by this program and escapes every word that a member wrote.
 */
export function renderPage(text: PageText, { variant }: RenderOptions): string {
  const rendering = new Rendering(text, createRenderContext(text, variant));
  return `${renderMissingCautions(text)}${rendering.render(text.tree)}`;
}

class Rendering {
  readonly #text: PageText;
  readonly #context: RenderContext;
  /** The level of the heading above, which a block's own is one below. */
  #level = 1;
  #hasMeasured = false;
  #hasRouted = false;
  #facesShown = false;

  constructor(text: PageText, context: RenderContext) {
    this.#text = text;
    this.#context = context;
  }

  render({ children }: Root): string {
    const filled: RootContent[] = [];
    for (const child of children) {
      if (!this.#facesShown && this.#isWhereFacesBegin(child)) {
        this.#facesShown = true;
        filled.push(raw(renderFaceList(this.#text.blocks, this.#context)));
      }
      filled.push(child.type === 'element' ? this.#fill(child) : child);
    }
    return toHtml({ type: 'root', children: filled }, { allowDangerousHtml: true });
  }

  /** The small faces stand under the page's first words and cautions, before its first section or block. */
  #isWhereFacesBegin(node: RootContent): boolean {
    if (node.type !== 'element') return false;
    if (/^h[2-6]$/.test(node.tagName)) return true;
    const block = this.#blockOf(node);
    return block !== undefined && block.kind !== 'hazard';
  }

  #blockOf({ properties }: Element): Block | undefined {
    const place = properties['dataBlock'];
    return typeof place === 'string' || typeof place === 'number' ? this.#text.blocks[Number(place)] : undefined;
  }

  /** A node with the blocks in it put where their places are; a node without any is given back as it is. */
  #fill(node: Element): Element | ReturnType<typeof raw> {
    const block = this.#blockOf(node);
    if (block !== undefined) return raw(this.#renderBlock(block, node));
    const level = /^h([2-6])$/.exec(node.tagName)?.[1];
    if (level !== undefined) this.#level = Number(level);
    if (!holdsElements(node)) return node;
    const children = node.children.map((child): ElementContent => (child.type === 'element' ? this.#fill(child) : child));
    return children.some((child, at) => child !== node.children[at]) ? { ...node, children } : node;
  }

  #renderBlock(block: Block, place: Element): string {
    const level = Math.min(6, this.#level + 1);
    const body = block.kind === 'hazard' ? toHtml(place.children.map((child) => (child.type === 'element' ? this.#fill(child) : child)), { allowDangerousHtml: true }) : '';
    return `${this.#cautionBefore(block)}${renderBlock(block, body, level, this.#context)}`;
  }

  #cautionBefore({ kind }: Block): string {
    if (kind === 'checks' && !this.#hasMeasured) {
      this.#hasMeasured = true;
      return renderMeasuringCaution();
    }
    if (kind === 'wires' && this.#text.frontMatter.kind === 'safe-mods' && !this.#hasRouted) {
      this.#hasRouted = true;
      return renderRoutingCaution();
    }
    return '';
  }
}

const flowHolders: ReadonlySet<string> = new Set(['ul', 'ol', 'li', 'blockquote', 'div', 'section']);

function holdsElements({ tagName }: Element): boolean {
  return flowHolders.has(tagName);
}

function raw(value: string): { readonly type: 'raw'; readonly value: string } {
  return { type: 'raw', value };
}

/** The page's connectors as small drawings that lead to them, where there are several. */
function renderFaceList(blocks: readonly Block[], { variant }: RenderContext): string {
  const connectors = blocks.filter((block) => block.kind === 'connector');
  if (connectors.length < 2) return '';
  const items = connectors.map((connector) => {
    const drawing = drawingMarkup(drawFaceThumbnail(faceOf(connector, variant)));
    const name = escapeHtml(connector.name ?? connector.id);
    return `<li>${openTag('a', { href: fragment(connector.id) })}${drawing}<span>${name}</span></a></li>`;
  });
  return `<nav class="faces" aria-label="Connectors on this page"><ul>${items.join('')}</ul></nav>`;
}
