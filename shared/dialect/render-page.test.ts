import { describe, expect, it } from 'vitest';
import { anyVariant, type Variant } from '../pages/applicability.ts';
import type { PageText } from './page-text.ts';
import { readPage } from './read-page.ts';
import { renderPage } from './render-page.ts';

function read(markdown: string): PageText {
  const page = readPage(markdown);
  if (!page.ok) throw new Error(page.refusal.message);
  return page.value;
}

function htmlOf(markdown: string, variant: Variant = anyVariant): string {
  return renderPage(read(markdown), { address: null, variant, marks: 'shown' });
}

/** A row of a rendered page, by the line's address. */
function rowOf(html: string, address: string): string {
  const start = html.indexOf(`data-line="${address}"`);
  return start < 0 ? '' : html.slice(html.lastIndexOf('<tr', start), html.indexOf('</tr>', start));
}

const frontMatter = `---
title: A page
kind: pinouts
sources:
  - {id: m1, kind: factory-manual, title: Manual (invented), where: page 3}
  - {id: s1, kind: standard, title: A standard (invented)}
  - {id: c1, kind: club-measurement, title: Notes (invented)}
---

`;

const connector = `${frontMatter}:::connector{#plug name="Plug" layout="3" seen="wire side" first="top left" cite="c1"}
| Cavity | Wire | Circuit | Goes to | Years | Cite |
| ------ | ---- | ------- | ------- | ----- | ---- |
| 1 | L | Main | horn.+, other.2 | -1979 | m1 |
| 1 | Y | Main | horn.+ | 1980- | c1, s1 |
| 2 | B | Earth | plug.1, frame | | |
:::

:::components{cite="m1"}
| Id | Kind | Name |
| -- | ---- | ---- |
| horn | load | Horn |
:::
`;

describe('A rendered page', () => {
  it('sets back the lines that do not hold for the bike on the bench, and says why', () => {
    const html = htmlOf(connector, { year: 1981, market: null, frame: null });
    expect(rowOf(html, 'plug.1~-1979')).toContain('class="line set-back"');
    expect(rowOf(html, 'plug.1~-1979')).toContain('<span class="why">up to 1979, not 1981</span>');
    expect(rowOf(html, 'plug.1~1980-')).toContain('class="line"');
    expect(rowOf(html, 'plug.2')).not.toContain('why');
    expect(htmlOf(connector)).not.toContain('set-back');
  });

  it('stamps a line cited where a factory manual or a standard says so, the row before its block', () => {
    const html = htmlOf(connector);
    expect(rowOf(html, 'plug.1~-1979')).toContain('title="Manual (invented), page 3">cited<');
    expect(rowOf(html, 'plug.1~1980-')).toContain('>cited<');
    expect(rowOf(html, 'plug.2')).toContain('<span class="mark mark-unchecked" title="Notes (invented)">unchecked</span>');
    expect(rowOf(html, 'horn')).toContain('>cited<');
  });

  it('links terminals to where they stand on the page, to the line that holds, and leaves others as text', () => {
    const html = htmlOf(connector, { year: 1981, market: null, frame: null });
    expect(rowOf(html, 'plug.1~-1979')).toContain('<a href="#horn">horn.+</a>, <code>other.2</code>');
    expect(rowOf(html, 'plug.2')).toContain('<a href="#plug.1~1980-">plug.1</a>, frame');
    expect(rowOf(htmlOf(connector), 'plug.2')).toContain('<a href="#plug.1~-1979">plug.1</a>');
  });

  it('gives each cavity of the face the row that it stands for', () => {
    const html = htmlOf(connector, { year: 1981, market: null, frame: null });
    expect(html).toContain('data-seat="1" data-cavity="1" aria-label="cavity 1, yellow, main" href="#plug.1~1980-"');
    expect(rowOf(html, 'plug.1~1980-')).toContain('data-cavity="1" data-seat="1"');
    expect(html.match(/class="face-drawing face-side face-seen"/g)).toHaveLength(1);
    expect(html.match(/class="face-drawing face-side face-turned"/g)).toHaveLength(1);
    expect(html).toContain('<input type="checkbox" class="face-turn" id="turn-plug"><label for="turn-plug" class="face-turn-label">');
  });

  it('draws a wire with its letters and its words, and both wires where letters are in doubt', () => {
    const html = htmlOf(`${frontMatter}:::connector{#plug layout="2"}\n| Cavity | Wire |\n| - | - |\n| 1 | BR |\n| 2 | QQ |\n:::\n`);
    expect(rowOf(html, 'plug.1').match(/<svg class="wire-drawing"/g)).toHaveLength(2);
    expect(rowOf(html, 'plug.1')).toContain('brown, or black, red tracer');
    expect(rowOf(html, 'plug.2')).toContain('not a colour of this system');
  });

  it('puts a block’s heading one level below the section that it stands in', () => {
    const block = ':::connector{#plug name="Plug"}\n| Cavity | Wire |\n| - | - |\n| 1 | B |\n:::\n';
    expect(htmlOf(`${frontMatter}${block}`)).toContain('<h2 class="block-name">Plug');
    expect(htmlOf(`${frontMatter}## A\n\n${block}`)).toContain('<h3 class="block-name">Plug');
    expect(htmlOf(`${frontMatter}## A\n\n### B\n\n${block}`)).toContain('<h4 class="block-name">Plug');
    expect(htmlOf(`${frontMatter}###### A\n\n${block}`)).toContain('<h6 class="block-name">Plug');
  });

  it('shows the page’s faces small under its first words where there are several', () => {
    const block = (id: string): string => `:::connector{#${id} name="${id}"}\n| Cavity | Wire |\n| - | - |\n| 1 | B |\n:::\n\n`;
    const html = htmlOf(`${frontMatter}Words.\n\n## First\n\n${block('one')}${block('two')}`);
    expect(html).toMatch(/<p>Words\.<\/p>\s*<nav class="faces".*<a href="#one">.*<a href="#two">.*<\/nav>\s*<h2 id="s-first">/s);
    expect(htmlOf(`${frontMatter}${block('one')}`)).not.toContain('class="faces"');
  });

  it('puts the book’s own caution first where a page touches a hazard and says nothing of it', () => {
    const html = htmlOf(`${frontMatter}## The fuel tap\n\nText.\n`);
    expect(html).toMatch(/^<aside class="caution caution-warning caution-of-the-book" role="note"/);
    expect(html).toContain('<b>Fuel.</b>');
    const said = htmlOf(`${frontMatter}## The fuel tap\n\n:::hazard{signal="danger" of="fuel"}\nNo sparks.\n:::\n`);
    expect(said).not.toContain('caution-of-the-book');
    expect(said).toContain('<details class="caution-more"><summary>More</summary><p><b>Fuel.</b>');
  });

  it('says before the first check how one measures, once', () => {
    const checks = ':::checks\n| Check | Between | Expect |\n| - | - | - |\n| A | b | open |\n:::\n\n';
    const html = htmlOf(`${frontMatter}${checks}${checks.replace('| A |', '| B |')}`);
    expect(html.match(/Before you measure/g)).toHaveLength(1);
    expect(html.indexOf('Before you measure')).toBeLessThan(html.indexOf('data-line="check@a"'));
  });

  it('says before the first wire of a safe modification how one is laid, and nowhere else', () => {
    const wires = ':::wires\n| From | To | Wire |\n| - | - | - |\n| a.1 | b.1 | R |\n:::\n';
    expect(htmlOf(`${frontMatter}${wires}`)).not.toContain('Before you lay a wire');
    expect(htmlOf(`${frontMatter.replace('pinouts', 'safe-mods')}${wires}`)).toContain('Before you lay a wire');
  });

  it('has each id once, also where blocks and headings repeat', () => {
    const html = htmlOf(`${connector}\n${connector.slice(frontMatter.length)}\n## A\n\n## A\n`);
    const ids = [...html.matchAll(/\sid="([^"]*)"/g)].map(([, id]) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });
});
