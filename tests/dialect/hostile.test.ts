import { JSDOM } from 'jsdom';
import { describe, expect, it } from 'vitest';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';
import { ownLines, ownPages, pageEverywhere, publishedLines } from '../factories/hostile-pages.ts';

/** What this program itself writes, and nothing else. */
const elements = new Set(
  (
    'a aside b blockquote br code dd del details div dl dt em figcaption figure h2 h3 h4 h5 h6 hr img input label li nav ol p ' +
    'pre section span strong summary sup table tbody td th thead tr ul svg circle g path rect text'
  ).split(' '),
);
const attributes = new Set(
  (
    'alt align aria-describedby aria-hidden aria-label checked class cx cy d data-across data-cavity data-connector ' +
    'data-footnote-backref data-footnote-ref data-footnotes data-label data-line data-seat data-sum disabled fill focusable ' +
    'font-size font-weight for height href id loading pointer-events r rel role rx scope src start stroke stroke-dasharray ' +
    'stroke-linejoin stroke-width tabindex text-anchor title transform type viewbox visibility width x y'
  ).split(' '),
);
const { document } = new JSDOM('').window;

function htmlOf(markdown: string): string {
  const page = readPage(markdown);
  if (!page.ok) return '';
  return renderPage(page.value, { address: null, variant: anyVariant, marks: 'shown' });
}

/** Everything in a page that could make a browser act, as a sentence each. */
function dangersIn(html: string): readonly string[] {
  const body = document.createElement('body');
  body.innerHTML = html;
  const dangers: string[] = [];
  for (const element of body.querySelectorAll('*')) {
    const name = element.tagName.toLowerCase();
    if (!elements.has(name)) dangers.push(`<${name}> stands in the page`);
    for (const { name: attribute, value } of element.attributes) {
      if (!attributes.has(attribute.toLowerCase())) dangers.push(`<${name}> has ${attribute}="${value}"`);
      if (attribute === 'href' && !isSafeHref(value)) dangers.push(`<${name}> leads to ${value}`);
      if (attribute === 'src' && !/^\/photos\/[0-9a-f]{64}\.webp$/.test(value)) dangers.push(`<${name}> shows ${value}`);
    }
  }
  const ids = [...body.querySelectorAll('[id]')].map(({ id }) => id);
  if (new Set(ids).size < ids.length) dangers.push(`an id stands twice among ${ids.join(' ')}`);
  return dangers;
}

/** Resolved as a browser would, from a page of ours. */
function isSafeHref(href: string): boolean {
  const { protocol } = new URL(href, 'https://book.example/donors/a/b');
  return ['http:', 'https:', 'mailto:', 'tel:'].includes(protocol);
}

/** A page with a text in it and in a block's table. */
function pageWith(text: string): string {
  const cell = text.replace(/[\r\n]+/g, ' ').replace(/\|/g, '\\|');
  return `${text}\n\n:::connector{#plug}\n| Cavity | Wire | Goes to |\n| - | - | - |\n| ${cell} | ${cell} | ${cell} |\n:::\n`;
}

/** Some texts at a time, so that a test is neither one of hundreds nor one that takes long. */
function inTens(texts: readonly string[]): readonly (readonly string[])[] {
  const tens: string[][] = [];
  for (let at = 0; at < texts.length; at += 10) tens.push(texts.slice(at, at + 10));
  return tens;
}

describe('Texts that were written to do harm', () => {
  it('are many', () => {
    expect(ownLines.length + ownPages.length).toBeGreaterThan(150);
    expect(publishedLines.length).toBeGreaterThan(100);
  });

  it.each(inTens(ownLines))('do nothing anywhere in a page: %s and nine more', (...texts) => {
    for (const text of texts) {
      const html = htmlOf(pageEverywhere(text));
      expect(html, text).not.toBe('');
      expect(dangersIn(html), text).toEqual([]);
    }
  });

  it.each(inTens(ownLines))('do nothing as pages of their own: %s and nine more', (...texts) => {
    for (const text of texts) expect(dangersIn(htmlOf(text)), text).toEqual([]);
  });

  it.each(inTens(ownPages))('do nothing as whole pages: %s and more', (...pages) => {
    for (const page of pages) expect(dangersIn(htmlOf(page)), page).toEqual([]);
  });

  it.each(inTens(publishedLines))('do nothing, of those that are published: %s and nine more', (...texts) => {
    for (const text of texts) expect(dangersIn(htmlOf(pageWith(text))), text).toEqual([]);
  });
});
