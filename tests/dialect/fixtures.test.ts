import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { formatPage } from '../../shared/dialect/format-page.ts';
import { readPage } from '../../shared/dialect/read-page.ts';
import { renderPage } from '../../shared/dialect/render-page.ts';
import { anyVariant } from '../../shared/pages/applicability.ts';

/*
 * Each folder of tests/fixtures/dialect is a page, what is read from it (blocks.json: outline, sections, blocks, findings)
 * and what it looks like (page.html, a tag a line). Drawings are left out there: they are tested beside their subject.
 */
const folder = new URL('../fixtures/dialect/', import.meta.url);
const cases = readdirSync(folder, { withFileTypes: true }).flatMap((entry) => (entry.isDirectory() ? [entry.name] : []));

function fixture(name: string, file: string): string {
  return new URL(`${name}/${file}`, folder).pathname;
}

function readCase(name: string): string {
  return readFileSync(fixture(name, 'page.md'), 'utf8');
}

function read(markdown: string): Extract<ReturnType<typeof readPage>, { ok: true }>['value'] {
  const page = readPage(markdown);
  if (!page.ok) throw new Error(page.refusal.message);
  return page.value;
}

/** One tag a line where lines help a reader; drawings by their class alone. */
function readable(html: string): string {
  return `${html
    .replace(/<svg class="([^"]*)".*?<\/svg>/gs, '<svg class="$1"/>')
    .replace(/(?<!^)(?=<(?:aside|section|figure|figcaption|table|thead|tbody|tr|th |td|nav|li|div|dl|dt|h[1-6]|p[ >]|ul|ol|blockquote|details|svg)\b)/g, '\n')
    .replace(/\n{2,}/g, '\n')}\n`;
}

describe('The pages of tests/fixtures/dialect', () => {
  it.each(cases)('%s: has the blocks, outline and findings that its blocks.json says', async (name) => {
    const { frontMatter, outline, sections, blocks, findings } = read(readCase(name));
    const data = { title: frontMatter.title, outline, sections, blocks, findings };
    await expect(`${JSON.stringify(data, null, 2)}\n`).toMatchFileSnapshot(fixture(name, 'blocks.json'));
  });

  it.each(cases)('%s: looks as its page.html says', async (name) => {
    const html = renderPage(read(readCase(name)), { address: null, variant: anyVariant, marks: 'shown' });
    await expect(readable(html)).toMatchFileSnapshot(fixture(name, 'page.html'));
  });

  it.each(cases)('%s: written by the book it has the same blocks, and written twice it is the same', (name) => {
    const written = formatPage(readCase(name));
    expect(formatPage(written)).toBe(written);
    expect(read(written).blocks).toEqual(read(readCase(name)).blocks);
  });
});
