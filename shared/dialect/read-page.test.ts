import { describe, expect, it } from 'vitest';
import type { PageText } from './page-text.ts';
import { readPage } from './read-page.ts';

function read(markdown: string, idsElsewhere: readonly { id: string; page: string }[] = []): PageText {
  const page = readPage(markdown, { idsElsewhere });
  if (!page.ok) throw new Error(page.refusal.message);
  return page.value;
}

function findingsOf(markdown: string): readonly string[] {
  return read(markdown).findings.map(({ line, code }) => `${line} ${code}`);
}

const table = '| Cavity | Wire |\n| - | - |\n| 1 | B |\n';

describe('Reading a page', () => {
  it('refuses a text that passes a limit, and says which', () => {
    expect(readPage('>'.repeat(100))).toEqual({
      ok: false,
      refusal: {
        limit: 'depth',
        line: 1,
        message: 'Line 1: more than 12 quotes and lists stand inside one another. Take some levels away.',
      },
    });
  });

  it('counts lines from 1 with the front matter, whatever the line breaks', () => {
    const page = `---\ntitle: A\n---\n\n## Tail\n\n:::connector{#tail}\n${table}:::\n`;
    for (const text of [page, page.replaceAll('\n', '\r\n'), page.replaceAll('\n', '\r')]) {
      const { outline, blocks } = read(text);
      expect(outline).toEqual([{ level: 2, text: 'Tail', id: 's-tail', line: 5 }]);
      expect(blocks[0]).toMatchObject({ kind: 'connector', line: 7, endLine: 11, lines: [{ line: 10, address: 'tail.1' }] });
    }
  });

  it('gives prose by its headings, without tables and blocks', () => {
    const { sections } = read(`Before.\n\n| a | b |\n| - | - |\n| c | d |\n\n## One\n\nText of *one* and\n\n- a point\n\n:::hazard{signal="notice" of="fuel"}\nNo sparks.\n:::\n\n### Two\n\n> Quoted.\n`);
    expect(sections).toEqual([
      { id: '', heading: '', text: 'Before.' },
      { id: 's-one', heading: 'One', text: 'Text of one and\na point' },
      { id: 's-two', heading: 'Two', text: 'Quoted.' },
    ]);
  });

  it('gives every heading an anchor of its own, in any script', () => {
    const { outline } = read('# Café\n\n# Cafe\n\n# Cafe 2\n\n# 灯\n\n# שלום\n\n#\n');
    expect(outline.map(({ id }) => id)).toEqual(['s-cafe', 's-cafe-2', 's-cafe-2-2', 's-section', 's-section-2', 's-section-3']);
  });

  it('reads blocks wherever they stand, in the order of the text', () => {
    const block = (id: string): string => `:::connector{#${id}}\n${table}:::\n`;
    const indented = block('in-list').replace(/^/gm, '  ').trimEnd();
    const quoted = block('in-quote').replace(/^/gm, '> ').trimEnd();
    const page = `${block('first')}\n- item\n\n${indented}\n\n${quoted}\n\n::::hazard{signal="notice" of="fuel"}\nText.\n\n${block('in-caution')}::::\n\n${block('last')}`;
    expect(read(page).blocks.map(({ id, kind }) => id ?? kind)).toEqual(['first', 'in-list', 'in-quote', 'hazard', 'in-caution', 'last']);
  });

  it('finds a block that another inside it closes, with the line of both', () => {
    const page = `:::hazard{signal="notice" of="fuel"}\nText.\n\n:::connector{#tail}\n${table}:::\n:::\n`;
    const { findings, blocks } = read(page);
    const [closed] = findings.filter(({ code }) => code === 'block-unreadable');
    expect(closed).toMatchObject({ severity: 'stop', line: 1 });
    expect(closed?.message).toContain('line 4');
    expect(closed?.message).toContain('`::::hazard`');
    expect(blocks).toHaveLength(2);
    expect(JSON.stringify(read(page).tree)).not.toContain(':::');
  });

  it('finds fences that are never closed, attributes that do not parse, and names with a letter wrong', () => {
    expect(findingsOf(`:::connector{#tail}\n${table}`)).toContain('1 block-unreadable');
    expect(findingsOf(`Text.\n\n:::connector{#tail name="x}\n${table}:::\n`)).toEqual(['3 block-unreadable']);
    expect(findingsOf(`:::conector{#tail}\n${table}:::\n`)).toEqual(['1 block-unreadable']);
    expect(findingsOf(`::connector{#tail}\n`)).toEqual(['1 block-unreadable']);
    expect(findingsOf('::: connector\n\n:::warning\nText.\n:::\n')).toEqual([]);
  });

  it('finds ids that another page of the subject has', () => {
    const page = `---\nkind: pinouts\n---\n:::connector{#tail}\n${table}:::\n`;
    const { findings } = read(page, [{ id: 'tail', page: 'pinouts-rear' }]);
    expect(findings.filter(({ code }) => code === 'id-repeated')).toMatchObject([{ line: 4, address: '#tail' }]);
  });

  it('gives findings in the order of the lines', () => {
    const lines = read(`:::connector{#b}\n${table}:::\n\n<b>x</b>\n\n:::conector{#a}\n`).findings.map(({ line }) => line);
    expect(lines).toEqual(lines.toSorted((a, b) => a - b));
    expect(lines.length).toBeGreaterThan(2);
  });

  it('says once that HTML is left out, where it first stands', () => {
    const { findings } = read('Text.\n\nOne <b>two</b>.\n\n<div>three</div>\n');
    expect(findings).toMatchObject([{ code: 'html-left-out', severity: 'hint', line: 3 }]);
  });
});
