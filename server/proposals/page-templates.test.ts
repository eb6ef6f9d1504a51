import { describe, expect, it } from 'vitest';
import { readPage } from '../../shared/dialect/read-page.ts';
import { linesOf } from '../../shared/blocks/lines.ts';
import { shelves } from '../../shared/pages/address.ts';
import { pageKinds } from '../../shared/pages/page-kind.ts';
import { kindOfSlug, templateOf } from './page-templates.ts';

describe.each(shelves)('the skeletons of %s', (shelf) => {
  it.each(pageKinds)('%s: can be read, says its own kind, and has no finding but hints', (kind) => {
    const read = readPage(templateOf(kind, shelf));
    if (!read.ok) throw new Error(read.refusal.message);
    expect(read.value.frontMatter.kind).toBe(kind);
    expect(read.value.findings.filter(({ severity }) => severity !== 'hint')).toEqual([]);
  });

  it.each(pageKinds)('%s: claims nothing that would stand if it were left in', (kind) => {
    const read = readPage(templateOf(kind, shelf));
    if (!read.ok) throw new Error(read.refusal.message);
    const { frontMatter, blocks } = read.value;
    const { years, earth, battery, maker, model } = frontMatter.facts;
    expect({ years, earth, battery, maker, model }).toEqual({
      years: null,
      earth: null,
      battery: null,
      maker: null,
      model: null,
    });
    expect(frontMatter.sources.map((source) => source.kind)).toEqual(['club-measurement']);
    expect(blocks.flatMap((block) => linesOf(block)).length).toBeLessThanOrEqual(1);
  });
});

it.each([
  ['overview', 'overview'],
  ['pinouts-front', 'pinouts'],
  ['safe-mods', 'safe-mods'],
  ['starter', 'notes'],
] as const)('the slug %s speaks of %s', (slug, kind) => {
  expect(kindOfSlug(slug)).toBe(kind);
});
